import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import { mergeAllergens } from './merge-allergens.ts';

/** What is kept of a label: its entries, and the day somebody read it. */
export type ReadLabel = {
  readonly allergens: readonly AllergenEntry[];
  /** Null while nobody has. */
  readonly labelCheckedOn: string | null;
};

/**
 * What a bought product is known to hold. Of a label that nobody has read, every allergen it does
 * not name is unknown, and never none; of one that was read, what it does not name is not declared.
 */
export function labelAllergens({ allergens, labelCheckedOn }: ReadLabel): AllergenEntry[] {
  if (labelCheckedOn !== null) return mergeAllergens([allergens]);
  const named = new Set(allergens.map(({ allergen }) => allergen));
  const unread = allergenIds
    .filter((allergen) => !named.has(allergen))
    .map((allergen): AllergenEntry => ({ allergen, species: [], state: 'unknown' }));
  return mergeAllergens([allergens, unread]);
}
