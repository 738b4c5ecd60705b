import type { EggSizeName } from '#shared/contracts/kitchen-sheet.ts';
import { jointEggPlan } from '#shared/kitchen/eggs/joint-plan.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { shoppingList, type ShoppingList } from '#shared/kitchen/needs/shopping.ts';
import { eggTasksOf, needsOfSpan } from './span-needs.queries.ts';
import type { Span, SpanNeeds } from './span-needs.queries.ts';

export type ShoppingOfSpan = Span & { readonly span: SpanNeeds; readonly list: ShoppingList };

/** What to buy for everything that is made in a span, in whole packs. */
export async function shoppingOfSpan(
  question: Span & { readonly size?: EggSizeName },
): Promise<ShoppingOfSpan> {
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
  return { span, list, from, to };
}
