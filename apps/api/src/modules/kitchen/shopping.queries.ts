import type { EggSizeName, Shopping } from '#shared/contracts/kitchen-sheet.ts';
import { jointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { shoppingList } from '#shared/kitchen/needs/shopping.ts';
import { presentUnknown } from './kitchen-sheet.presenter.ts';
import { eggTasksOf, needsOfSpan } from './span-needs.queries.ts';
import type { Span } from './span-needs.queries.ts';

/** What to buy for everything that is made in a span, in whole packs. */
export async function shoppingOfSpan(
  question: Span & { readonly size?: EggSizeName },
): Promise<Shopping> {
  const { from, to, size = 'large' } = question;
  const span = await needsOfSpan({ from, to });
  const { shell, cartons } = jointEggPlan(eggTasksOf(span), span.index, {
    size,
    keeping: eggKeeping,
  });
  const eggs = {
    shell: shell.eggs,
    cartons: new Map(
      cartons.flatMap(({ ingredient, plan }) =>
        plan === null ? [] : [[ingredient.id, plan.cartons] as const],
      ),
    ),
  };
  const list = shoppingList(span.needs, eggs, span.pantry.ingredients);
  return {
    from,
    to,
    currency: span.pantry.currency,
    lines: list.lines.map(({ ingredient, ...line }) => ({
      id: ingredient.id,
      name: ingredient.name,
      brand: ingredient.brand,
      family: ingredient.family,
      packG: ingredient.pack?.grams ?? null,
      ...line,
    })),
    usedMinor: list.usedMinor,
    buyMinor: list.buyMinor,
    unpriced: [...list.unpriced],
    unknown: span.unknown.map(presentUnknown),
    orders: span.orders,
    unplaced: span.unplaced,
  };
}
