import type { DietId } from '#shared/contracts/vocabulary.ts';

/** The diets as they are read. */
export const dietWords: Readonly<Record<DietId, string>> = {
  vegetarian: 'vegetarian',
  vegan: 'vegan',
  halal: 'halal',
  kosher: 'kosher',
  'no-alcohol': 'no alcohol',
  'no-gelatine': 'no gelatine',
};
