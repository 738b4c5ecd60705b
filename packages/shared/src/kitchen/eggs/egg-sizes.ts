import type { EggPart } from '#shared/contracts/pantry.ts';
import { eggG, type EggClass } from './egg-weights.ts';

/** The weight classes a studio buys, heaviest first. */
export const eggSizes = ['jumbo', 'extra-large', 'large', 'medium'] as const satisfies EggClass[];

/** What an egg of a size gives, in whole milligrams; the bench weighs, since a real egg differs. */
export function eggWeightsMg(size: EggClass): Readonly<Record<EggPart, number>> {
  const mg = (part: EggPart) => eggG(part, size) * 1000;
  return { whole: mg('whole'), white: mg('white'), yolk: mg('yolk') };
}

/** How many eggs a weight of one part takes, whole eggs. Grams not negative. */
export function eggsFor(grams: number, part: EggPart, size: EggClass): number {
  return Math.ceil(Math.ceil(grams * 1000) / eggWeightsMg(size)[part]);
}
