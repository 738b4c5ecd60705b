import type { HouseholdMeasure, Ingredient, IngredientMeasure } from '#shared/contracts/pantry.ts';
import { gPerOunce, gPerPound, mlPerUsCup } from '#shared/kitchen/measures.ts';

/** Exact by definition: 16 tablespoons or 48 teaspoons to the US cup, 8 fluid ounces. */
export const mlPerMeasure = {
  cup: mlPerUsCup,
  tablespoon: mlPerUsCup / 16,
  teaspoon: mlPerUsCup / 48,
} as const;
export type VolumeMeasure = keyof typeof mlPerMeasure;

export const isVolume = (measure: HouseholdMeasure): measure is VolumeMeasure =>
  measure in mlPerMeasure;

/** What one measure weighs; `reckoned` where it comes from a density and not from a scale. */
export type MeasureWeight = { readonly grams: number; readonly reckoned: boolean };

/** A qualifier as typed (`sifted`) finds its own weight; without one, the plain or first entry. */
function entryOf(
  ingredient: Ingredient,
  measure: HouseholdMeasure,
  qualifier: string | null,
): IngredientMeasure | null {
  const own = ingredient.measures.filter((it) => it.measure === measure && it.grams > 0);
  const asked = qualifier === null ? undefined : own.find((it) => it.qualifier === qualifier);
  return asked ?? own.find((it) => it.qualifier === null) ?? own[0] ?? null;
}

/**
 * Grams of one measure of an ingredient, by its own weight for that very measure: spoons never
 * make a cup (16 tablespoons of powdered sugar are not a cup by weight). Failing that by its
 * density, marked as reckoned; null where neither is known.
 */
export function weightOfMeasure(
  ingredient: Ingredient,
  measure: HouseholdMeasure,
  qualifier: string | null = null,
): MeasureWeight | null {
  const entry = entryOf(ingredient, measure, qualifier);
  if (entry !== null) return { grams: entry.grams, reckoned: false };
  if (!isVolume(measure) || ingredient.densityGPerMl === null) return null;
  return { grams: ingredient.densityGPerMl * mlPerMeasure[measure], reckoned: true };
}

/**
 * Grams of one millilitre: the density where one is kept, else by the largest measure of volume
 * there is a weight for. Always reckoned.
 */
export function gramsPerMl(ingredient: Ingredient): number | null {
  if (ingredient.densityGPerMl !== null) return ingredient.densityGPerMl;
  for (const measure of ['cup', 'tablespoon', 'teaspoon'] as const) {
    const entry = entryOf(ingredient, measure, null);
    if (entry !== null) return entry.grams / mlPerMeasure[measure];
  }
  return null;
}

export type HouseholdUnits = 'us' | 'metric';

/** An ingredient's grams in household measures beside the grams; null where none is sensible. */
export function formatHousehold(
  ingredient: Ingredient,
  grams: number,
  _units: HouseholdUnits = 'us',
): string | null {
  const cup = weightOfMeasure(ingredient, 'cup');
  return cup === null || !(grams > 0) ? null : `${(grams / cup.grams).toFixed(2)} cups`;
}

/** `1 lb 4¼ oz`, to the quarter ounce. */
export function formatPounds(grams: number): string {
  const quarters = Math.round((grams / gPerOunce) * 4);
  const pounds = Math.floor(quarters / (gPerPound / gPerOunce) / 4);
  return `${pounds} lb ${quarters / 4 - pounds * 16} oz`;
}
