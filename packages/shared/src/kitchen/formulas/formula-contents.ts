import type { Contents } from '#shared/contracts/menu.ts';
import type { FormulaStep } from '#shared/contracts/pantry.ts';
import {
  deriveContents,
  type FormulaLine as NodeLine,
  type FormulaNode,
} from '#shared/kitchen/derive-contents.ts';
import { kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import type { FormulaBody, PantryIndex } from './pantry-index.ts';

type Body = FormulaBody & { readonly steps: readonly FormulaStep[] };

/** A version or an unsaved draft with everything inside it. It must be sound (`checkFormula`). */
function draftNode(body: Body, index: PantryIndex, name: string): FormulaNode {
  const book = kitchenBook(index.book);
  return {
    kind: 'formula',
    id: body.formulaId ?? '',
    name,
    yieldPpm: body.yieldPpm,
    lines: body.lines.flatMap(({ part, grams, step }): NodeLine[] => {
      const found =
        part.kind === 'ingredient'
          ? book.ingredients.get(part.ingredientId)
          : book.node(part.formulaVersionId);
      const weightMg = Math.round(grams * 1000);
      return found === undefined ? [] : [{ weightMg, joinsAtStep: step, part: found }];
    }),
    steps: body.steps.map(({ critical }) => ({
      mixReachesC: critical?.limitC ?? null,
      holdSeconds: critical?.seconds ?? 0,
    })),
  };
}

/**
 * What is in a formula as it is written now: allergens with unknown ones kept, and the rest of
 * what guests are told. It must be sound (`checkFormula`).
 */
export function formulaContents(body: Body, index: PantryIndex, name: string): Contents {
  return deriveContents(draftNode(body, index, name));
}
