import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { innermostFirst, requireSound } from './check-formula.ts';
import { faultOf } from './formula-problem.ts';
import type { FormulaBody, PantryIndex } from './pantry-index.ts';

export type ExplodedFormula = {
  /** Grams of each bought ingredient, by its id, through all formulas. */
  readonly ingredients: ReadonlyMap<string, number>;
  /** Grams that must come out of each formula inside, outermost first; not of the formula itself. */
  readonly formulas: readonly { readonly version: FormulaVersion; readonly outG: number }[];
};

/**
 * What goes into so many grams of the result, down to what is bought: what each formula loses is
 * added back on the way (German buttercream needs more milk than its custard weighs).
 * Throws `FormulaFault`.
 */
export function explodeFormula(
  body: FormulaBody,
  index: PantryIndex,
  outG: number,
): ExplodedFormula {
  requireSound(body, index);
  if (!(outG >= 0) || !Number.isFinite(outG)) {
    throw faultOf('not-an-amount', 'Write a weight, not below nothing.');
  }
  const ingredients = new Map<string, number>();
  const wanted = new Map<string, number>();
  const add = (it: FormulaBody, grams: number) => {
    const perGram = grams / (sumG(it) * (it.yieldPpm / 1e6));
    for (const { part, grams: lineG } of it.lines) {
      const [into, id] =
        part.kind === 'ingredient'
          ? [ingredients, part.ingredientId]
          : [wanted, part.formulaVersionId];
      into.set(id, (into.get(id) ?? 0) + lineG * perGram);
    }
  };
  add(body, outG);
  // Outermost first: all that wants a formula is known before it is taken apart.
  const formulas: { version: FormulaVersion; outG: number }[] = [];
  for (const version of innermostFirst(body.lines, index).toReversed()) {
    const grams = wanted.get(version.id) ?? 0;
    formulas.push({ version, outG: grams });
    add(version, grams);
  }
  return { ingredients, formulas };
}

const sumG = (body: FormulaBody) => body.lines.reduce((sum, it) => sum + it.grams, 0);
