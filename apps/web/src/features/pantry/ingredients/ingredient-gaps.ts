import type { Ingredient } from '#shared/contracts/pantry.ts';
import { labelAllergens } from '#shared/kitchen/label-allergens.ts';
import { factNames } from './ingredient-words.ts';

/** What is not known of a product; the first two stop orders, the rest are said where they matter. */
export type IngredientGaps = {
  /** Nobody has read its label. */
  readonly label: boolean;
  /** An allergen that its label does not settle. */
  readonly allergens: boolean;
  /** Gelatin, alcohol and the like; for egg, whether it is pasteurised. */
  readonly facts: number;
  readonly price: boolean;
  /** How heavy a measure of it is. */
  readonly measures: boolean;
};

/** What is missing of a product, so that unknown is never taken for none. */
export function gapsOf(ingredient: Ingredient): IngredientGaps {
  const facts = factNames.filter((it) => ingredient[it] === 'unknown').length;
  return {
    label: ingredient.labelCheckedOn === null,
    allergens: labelAllergens(ingredient).some((it) => it.state === 'unknown'),
    facts: facts + (ingredient.eggPart !== null && ingredient.pasteurised === 'unknown' ? 1 : 0),
    price: ingredient.pack === null,
    measures: ingredient.measures.length === 0 && ingredient.densityGPerMl === null,
  };
}

/** How much is missing, what stops orders weighing most; 0 where nothing is. */
export function gapWeight(gaps: IngredientGaps): number {
  return (
    (gaps.label || gaps.allergens ? 100 : 0) + (gaps.price ? 10 : 0) + (gaps.facts > 0 ? 5 : 0)
  );
}

/** What a kilo costs in minor units, not rounded; null where the price is unknown. */
export function pricePerKgMinor({ pack }: Pick<Ingredient, 'pack'>): number | null {
  return pack === null ? null : (pack.priceMinor / pack.grams) * 1000;
}
