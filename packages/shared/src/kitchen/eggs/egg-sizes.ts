import type { EggPart } from '#shared/contracts/pantry.ts';

export const eggSizes = ['jumbo', 'extra-large', 'large', 'medium'] as const;
export type EggSize = (typeof eggSizes)[number];

/** Least net weight of a dozen in its shell, ounces: US weight classes, USDA AMS 56. */
export const ouncesADozen: Readonly<Record<EggSize, number>> = {
  jumbo: 30,
  'extra-large': 27,
  large: 24,
  medium: 21,
};

/** Milligrams out of the shell, US large: USDA SR28 NDB 01123, 01124, 01125. */
const largeMg: Readonly<Record<EggPart, number>> = { whole: 50_000, white: 33_000, yolk: 17_000 };

/**
 * What an egg of a size gives, milligrams, whole and exact: the large egg's weights in proportion
 * to the weight classes. A real egg differs; the bench weighs.
 */
export function eggWeightsMg(size: EggSize): Readonly<Record<EggPart, number>> {
  const scaled = (mg: number) => (mg * ouncesADozen[size]) / ouncesADozen.large;
  return { whole: scaled(largeMg.whole), white: scaled(largeMg.white), yolk: scaled(largeMg.yolk) };
}

/** How many eggs a weight of one part takes, whole eggs. Grams not negative. */
export function eggsFor(grams: number, part: EggPart, size: EggSize): number {
  return Math.ceil(Math.ceil(grams * 1000) / eggWeightsMg(size)[part]);
}
