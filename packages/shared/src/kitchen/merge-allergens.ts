import type { AllergenEntry } from '../contracts/menu.ts';
import { allergenIds } from '../contracts/vocabulary.ts';

type AllergenState = AllergenEntry['state'];

/** How much a state weighs when several parts meet: what is known to be in it comes first. */
const weight: Record<AllergenState, number> = {
  'not-declared': 0,
  'may-contain': 1,
  unknown: 2,
  contains: 3,
};

/** The heavier of two states. */
export function heavierState(a: AllergenState, b: AllergenState): AllergenState {
  return weight[a] >= weight[b] ? a : b;
}

/**
 * One list from several: per allergen the heaviest state and every species named. The order is
 * that of the allergen list, so that the same cake always reads the same. Merging never removes
 * an allergen and never makes a state lighter.
 */
export function mergeAllergens(lists: readonly (readonly AllergenEntry[])[]): AllergenEntry[] {
  const merged = new Map<AllergenEntry['allergen'], AllergenEntry>();
  for (const entry of lists.flat()) {
    const known = merged.get(entry.allergen);
    merged.set(entry.allergen, {
      allergen: entry.allergen,
      species: [...new Set([...(known?.species ?? []), ...entry.species])].sort(),
      state: known === undefined ? entry.state : heavierState(known.state, entry.state),
    });
  }
  return allergenIds.flatMap((id) => merged.get(id) ?? []);
}
