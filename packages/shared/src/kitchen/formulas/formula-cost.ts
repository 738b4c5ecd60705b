import type { FormulaVersion, Ingredient } from '#shared/contracts/pantry.ts';
import { innermostFirst } from './check-formula.ts';
import { resolvePart, type FormulaBody, type PantryIndex } from './pantry-index.ts';
import { formulaTotals } from './totals.ts';

/**
 * What ingredients cost in minor units, unrounded (round where it is shown or added to money).
 * `unpriced` are ingredients whose price is not known: where there are any, the cost is at least
 * `knownMinor`, never taken for the whole.
 */
export type IngredientCost = {
  readonly knownMinor: number;
  readonly unpriced: readonly Ingredient[];
};

export type FormulaCost = IngredientCost & {
  /** Of what goes in; null for a line that has an unknown price in it, or is not in the pantry. */
  readonly lines: readonly (number | null)[];
  /** One kilogram of what comes out; null while a price is unknown or nothing comes out. */
  readonly perKgOutMinor: number | null;
};

/** Cost of one gram that comes out of a version, kept: neither versions nor an index change. */
const kept = new WeakMap<PantryIndex, Map<string, IngredientCost>>();

/** Minor units for one gram of a bought ingredient; null while its price is unknown. */
export function pricePerGram(ingredient: Ingredient): number | null {
  return ingredient.pack === null ? null : ingredient.pack.priceMinor / ingredient.pack.grams;
}

/** What a formula's ingredients cost at pack prices, through all formulas inside it. */
export function formulaCost(body: FormulaBody, index: PantryIndex): FormulaCost {
  const perGram = perGramOf(innermostFirst(body.lines, index), index);
  const costs = body.lines.map((it) => lineCost(it, index, perGram));
  const knownMinor = costs.reduce((sum, it) => sum + (it?.knownMinor ?? 0), 0);
  const unpriced = unique(costs.flatMap((it) => it?.unpriced ?? []));
  const whole = unpriced.length === 0 && !costs.includes(null);
  const { outG } = formulaTotals(body);
  return {
    knownMinor,
    unpriced,
    lines: costs.map((it) => (it === null || it.unpriced.length > 0 ? null : it.knownMinor)),
    perKgOutMinor: whole && outG > 0 ? (knownMinor / outG) * 1000 : null,
  };
}

function lineCost(
  line: FormulaBody['lines'][number],
  index: PantryIndex,
  perGram: ReadonlyMap<string, IngredientCost>,
): IngredientCost | null {
  const part = resolvePart(index, line.part);
  if (part.kind === 'missing') return null;
  if (part.kind === 'formula') {
    const cost = perGram.get(part.version.id);
    return cost === undefined
      ? null
      : { knownMinor: cost.knownMinor * line.grams, unpriced: cost.unpriced };
  }
  const price = pricePerGram(part.ingredient);
  return price === null
    ? { knownMinor: 0, unpriced: [part.ingredient] }
    : { knownMinor: price * line.grams, unpriced: [] };
}

function perGramOf(
  versions: readonly FormulaVersion[],
  index: PantryIndex,
): ReadonlyMap<string, IngredientCost> {
  let byId = kept.get(index);
  if (byId === undefined) {
    byId = new Map();
    kept.set(index, byId);
  }
  for (const version of versions) {
    if (byId.has(version.id)) continue;
    const { outG } = formulaTotals(version);
    const costs = version.lines.map((it) => lineCost(it, index, byId));
    const knownMinor = costs.reduce((sum, it) => sum + (it?.knownMinor ?? 0), 0);
    byId.set(version.id, {
      knownMinor: outG > 0 ? knownMinor / outG : 0,
      unpriced: unique(costs.flatMap((it) => it?.unpriced ?? [])),
    });
  }
  return byId;
}

const unique = (ingredients: readonly Ingredient[]) => [...new Set(ingredients)];
