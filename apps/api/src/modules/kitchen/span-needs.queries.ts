import type { Ingredient } from '#shared/contracts/pantry.ts';
import { localAt } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import { eggOf } from '#shared/kitchen/eggs/egg-of.ts';
import type { EggTask } from '#shared/kitchen/eggs/joint-plan.ts';
import { datedNeeds } from '#shared/kitchen/needs/dated-needs.ts';
import type { UnknownNeed } from '#shared/kitchen/needs/kitchen-needs.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Studio } from '#api/db/models/studio.ts';
import type { WholePantry } from '#api/modules/pantry/load-pantry.queries.ts';
import { makingDaysOf, ordersToMake } from './making-days.queries.ts';
import { needsOfOrders } from './order-needs.queries.ts';

export type Span = { readonly from: LocalDate; readonly to: LocalDate };

/** What is weighed out in a span of days, for whom. */
export type SpanNeeds = {
  readonly needs: readonly {
    readonly date: LocalDate;
    readonly order: number;
    readonly formula: { readonly id: string; readonly name: string } | null;
    readonly ingredient: Ingredient;
    readonly grams: number;
  }[];
  readonly unknown: readonly UnknownNeed[];
  /** Numbers of the orders meant, and of those with a pickup then that the plan does not make. */
  readonly orders: number[];
  readonly unplaced: number[];
  readonly pantry: WholePantry;
  readonly index: PantryIndex;
};

/** By the days the plan makes each formula on; what is made already is left out. */
export async function needsOfSpan({ from, to }: Span): Promise<SpanNeeds> {
  const { zone } = await Studio.findByPk(1, { rejectOnEmpty: true });
  const today = localAt(currentClock().now(), zone).date;
  const { planned, unplaced } = await ordersToMake(from, to);
  const [{ orders, pantry, index }, days] = await Promise.all([
    needsOfOrders(planned),
    makingDaysOf(
      planned.map((it) => it.id),
      today,
    ),
  ]);
  const found = orders.map(({ order, revision, needs }) => {
    const making = days.get(order.id);
    const made = [...(making?.byFormula.values() ?? [])].flat();
    const firstDay = made.map((it) => it.date).toSorted()[0] ?? revision.pickupDate ?? to;
    const dated = datedNeeds(
      needs,
      (formulaId) => making?.byFormula.get(formulaId) ?? [],
      making?.decorating ?? firstDay,
    )
      // Decorations that are on the cake take nothing more.
      .filter((it) => it.formula !== null || making?.decorating !== null)
      .filter((it) => it.grams > 0 && it.date >= from && it.date <= to)
      .map((it) => ({ ...it, order: order.number }));
    return { order: order.number, dated, unknown: needs.unknown };
  });
  const meant = found.filter((it) => it.dated.length > 0);
  return {
    needs: meant.flatMap((it) => it.dated),
    unknown: meant.flatMap((it) => it.unknown),
    orders: meant.map((it) => it.order).toSorted((a, b) => a - b),
    unplaced: unplaced.map((it) => it.number).toSorted((a, b) => a - b),
    pantry,
    index,
  };
}

/** The egg among it: one making of a formula on a day is one task, whoever it is for. */
export function eggTasksOf({ needs }: Pick<SpanNeeds, 'needs'>): EggTask[] {
  const eggs = needs.flatMap((it) => {
    const egg = eggOf(it.ingredient);
    return egg === null ? [] : { ...it, part: egg.part };
  });
  return [
    ...groupBy(eggs, (it) => [it.date, it.formula?.id ?? '', it.ingredient.id].join(' ')).values(),
  ].flatMap((of): EggTask[] => {
    const [first] = of;
    if (first === undefined) return [];
    return [
      {
        date: first.date,
        formulaId: first.formula?.id ?? '',
        formulaName: first.formula?.name ?? 'Decorations',
        ingredient: first.ingredient,
        part: first.part,
        grams: of.reduce((sum, it) => sum + it.grams, 0),
        orders: [...new Set(of.map((it) => it.order))].toSorted((a, b) => a - b),
      },
    ];
  });
}
