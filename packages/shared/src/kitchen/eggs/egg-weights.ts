import type { EggPart } from '#shared/contracts/pantry.ts';

/** Grams in one US large egg without its shell: USDA SR28 NDB 01123, 01124, 01125. */
export const largeEggG: Readonly<Record<EggPart, number>> = { whole: 50, white: 33, yolk: 17 };

/**
 * Least net ounces of a dozen in the shell by size: USDA AMS 56, United States Standards, Grades,
 * and Weight Classes for Shell Eggs.
 */
export const dozenOunces = {
  jumbo: 30,
  'extra-large': 27,
  large: 24,
  medium: 21,
} as const;
export type EggClass = keyof typeof dozenOunces;

/**
 * Grams of a part of one egg of a weight class, from the large egg in proportion to the classes'
 * least weights (memory: shell, white and yolk do not grow quite alike).
 */
export function eggG(part: EggPart, size: EggClass = 'large'): number {
  return (largeEggG[part] * dozenOunces[size]) / dozenOunces.large;
}
