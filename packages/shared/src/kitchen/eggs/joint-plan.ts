import type { EggPart, Ingredient } from '#shared/contracts/pantry.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import type { PantryIndex } from '../formulas/pantry-index.ts';
import { eggOf } from './egg-of.ts';
import { leftoverDays, leftoverUses, type LeftoverDay, type LeftoverUse } from './egg-uses.ts';
import type { EggClass } from './egg-weights.ts';
import { planCartons, type CartonPlan } from './plan-cartons.ts';
import { eggKeeping, planEggs, type EggKeeping, type EggPlan } from './plan-eggs.ts';

/** Egg that one making of a formula takes on a day, for one or more orders. */
export type EggTask = {
  readonly date: LocalDate;
  readonly formulaId: string;
  readonly formulaName: string;
  readonly ingredient: Ingredient;
  readonly part: EggPart;
  readonly grams: number;
  readonly orders: readonly number[];
};

export type JointEggPlan = {
  readonly shell: EggPlan<EggTask>;
  /** By the day they were cracked on. */
  readonly leftovers: readonly (LeftoverDay & { readonly uses: readonly LeftoverUse[] })[];
  readonly cartons: readonly {
    readonly ingredient: Ingredient;
    readonly tasks: readonly EggTask[];
    readonly grams: number;
    /** Null while nobody knows what a carton weighs. */
    readonly plan: CartonPlan | null;
  }[];
  readonly alternatives: readonly CartonInstead[];
};

/** A formula made with a carton instead of cracked eggs. */
export type CartonInstead = {
  readonly formulaId: string;
  readonly formulaName: string;
  readonly part: 'white' | 'yolk';
  readonly ingredient: Ingredient;
  readonly grams: number;
  readonly cartons: number;
  /** Eggs to crack in all if this formula takes the carton, and how many fewer that is. */
  readonly eggs: number;
  readonly fewer: number;
  /** Whites that are whipped: many cartons whip poorly and must be tried first. */
  readonly whipped: boolean;
};

export type JointOptions = { readonly size: EggClass; readonly keeping: EggKeeping };

const usual: JointOptions = { size: 'large', keeping: eggKeeping };

/**
 * One plan for everything the span's orders take of egg: shell eggs together with the fewest to
 * crack, cartons each with the fewest to open, what is left and what it could become, and which
 * formulas could take a carton instead.
 */
export function jointEggPlan(
  tasks: readonly EggTask[],
  index: PantryIndex,
  { size, keeping }: JointOptions = usual,
): JointEggPlan {
  const cracked = tasks.filter((it) => eggOf(it.ingredient)?.shell === true);
  const poured = tasks.filter((it) => eggOf(it.ingredient)?.shell === false);
  const shell = planEggs(cracked, size, keeping);
  return {
    shell,
    leftovers: leftoverDays(shell.leftovers).map((day) => ({
      ...day,
      uses: leftoverUses(day, index),
    })),
    cartons: [...groupBy(poured, (it) => it.ingredient.id).values()].flatMap((of) => {
      const [first] = of;
      if (first === undefined) return [];
      const { pack } = first.ingredient;
      return {
        ingredient: first.ingredient,
        tasks: of,
        grams: of.reduce((sum, it) => sum + it.grams, 0),
        plan: pack === null ? null : planCartons(of, pack.grams),
      };
    }),
    alternatives: instead(cracked, poured, shell.eggs, index, { size, keeping }),
  };
}

/** Formulas that crack for one part alone, where the studio buys that part in a carton. */
function instead(
  cracked: readonly EggTask[],
  poured: readonly EggTask[],
  eggs: number,
  index: PantryIndex,
  { size, keeping }: JointOptions,
): CartonInstead[] {
  return [...groupBy(cracked, (it) => it.formulaId).values()].flatMap((of): CartonInstead[] => {
    const [first] = of;
    if (first === undefined || of.some((it) => it.part !== first.part)) return [];
    const { part } = first;
    if (part === 'whole') return [];
    const carton = cartonOf(part, index);
    if (carton === undefined || carton.pack === null) return [];
    const rest = cracked.filter((it) => it.formulaId !== first.formulaId);
    const fewer = eggs - planEggs(rest, size, keeping).eggs;
    if (fewer <= 0) return [];
    const sharing = poured.filter((it) => it.ingredient.id === carton.id);
    const { grams: packG } = carton.pack;
    const before = planCartons(sharing, packG).cartons;
    return [
      {
        formulaId: first.formulaId,
        formulaName: first.formulaName,
        part,
        ingredient: carton,
        grams: of.reduce((sum, it) => sum + it.grams, 0),
        cartons: planCartons([...sharing, ...of], packG).cartons - before,
        eggs: eggs - fewer,
        fewer,
        whipped: part === 'white',
      },
    ];
  });
}

function cartonOf(part: EggPart, index: PantryIndex): Ingredient | undefined {
  for (const it of index.ingredients.values()) {
    const egg = eggOf(it);
    const poured = egg !== null && egg.part === part && !egg.shell;
    if (poured && it.pasteurised === 'yes' && it.archivedAt === null) return it;
  }
  return undefined;
}

/** Every need on the same day, whichever it is. */
const oneDay = '2000-01-01';

/** Shell eggs for one order by itself: how many to crack, and the grams that are left of them. */
export function eggsAlone(
  needs: readonly { readonly ingredient: Ingredient; readonly grams: number }[],
): { readonly crack: number; readonly leftWhiteG: number; readonly leftYolkG: number } {
  const plan = planEggs(
    needs.flatMap(({ ingredient, grams }) => {
      const egg = eggOf(ingredient);
      return egg?.shell === true ? { date: oneDay, part: egg.part, grams } : [];
    }),
  );
  const [left] = leftoverDays(plan.leftovers);
  return { crack: plan.eggs, leftWhiteG: left?.whiteG ?? 0, leftYolkG: left?.yolkG ?? 0 };
}
