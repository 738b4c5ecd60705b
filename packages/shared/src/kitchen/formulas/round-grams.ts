import type { Ingredient } from '#shared/contracts/pantry.ts';
import { largeEggG } from '#shared/kitchen/eggs/egg-weights.ts';

/**
 * What a kitchen's scales are read to. Salts go by 0.1 g, the rest by 1 g and from 500 g up by 5 g
 * (the two steps are the kitchen's definition; where one gives way to the other is memory).
 */
export const roundingRules = {
  coarseFromG: 500,
  coarseStepG: 5,
  plainStepG: 1,
  /** A step that would change a line by more than this is too coarse for it: 5 % (memory). */
  mostDriftPpm: 50_000,
  finestStepG: 0.01,
} as const;

/** Whole steps, without the dust of floating point (0.1 x 3). */
export function toStep(grams: number, stepG: number): number {
  const perGram = Math.round(1 / stepG);
  return stepG < 1 ? Math.round(grams * perGram) / perGram : Math.round(grams / stepG) * stepG;
}

/**
 * Grams as the bench weighs them: by the ingredient's own step (null for a formula's, 1 g), 5 g
 * from 500 g up, and finer than asked where the step would take a small line too far from its
 * exact weight or to nothing.
 */
export function roundGrams(exactG: number, roundingG: number | null): number {
  const own = roundingG ?? roundingRules.plainStepG;
  const coarse = own >= 1 && exactG >= roundingRules.coarseFromG;
  let step = coarse ? Math.max(own, roundingRules.coarseStepG) : own;
  let rounded = toStep(exactG, step);
  while (
    step > roundingRules.finestStepG &&
    Math.abs(rounded - exactG) * 1e6 > roundingRules.mostDriftPpm * exactG
  ) {
    step = step > 1 ? 1 : step / 10;
    rounded = toStep(exactG, step);
  }
  return rounded > 0 ? rounded : exactG;
}

/** Eggs that are cracked, as against poured from a carton: the label gives the weight of one. */
export function shellEggG(ingredient: Ingredient): number | null {
  if (ingredient.eggPart === null) return null;
  const piece = ingredient.measures.find((it) => it.measure === 'piece');
  return piece === undefined ? null : piece.grams > 0 ? piece.grams : largeEggG[ingredient.eggPart];
}
