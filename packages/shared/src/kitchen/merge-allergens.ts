import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { allergenIds, type AllergenId } from '#shared/contracts/vocabulary.ts';

/** What is known to be in something comes before what nobody knows, and that before a warning. */
const heaviestFirst = ['contains', 'unknown', 'may-contain'] as const;
export type DeclaredState = (typeof heaviestFirst)[number];

/** The heaviest of some states; null where none is declared. */
export function heaviestOf(states: readonly AllergenEntry['state'][]): DeclaredState | null {
  return heaviestFirst.find((it) => states.includes(it)) ?? null;
}

/**
 * One list from several, in the order of the allergen list and heaviest state first. An allergen
 * stands once per state, so that "contains hazelnut" beside "may contain almond" keeps both
 * truths; a lighter entry that a heavier one already covers is left out. No species means any of
 * them. Merging never loses an allergen or a species and never makes a state lighter.
 */
export function mergeAllergens(lists: readonly (readonly AllergenEntry[])[]): AllergenEntry[] {
  const entries = lists.flat();
  return allergenIds.flatMap((allergen) => {
    const own = entries.filter((it) => it.allergen === allergen);
    return own.length === 0 ? [] : mergeOne(allergen, own);
  });
}

function mergeOne(allergen: AllergenId, entries: readonly AllergenEntry[]): AllergenEntry[] {
  const merged: AllergenEntry[] = [];
  for (const state of heaviestFirst) {
    const same = entries.filter((it) => it.state === state);
    if (same.length === 0) continue;
    const any = same.some((it) => it.species.length === 0);
    const species = any ? [] : [...new Set(same.flatMap((it) => it.species))].sort();
    const coveredBy = (heavier: AllergenEntry) =>
      heavier.species.length === 0 || (!any && species.every((it) => heavier.species.includes(it)));
    if (!merged.some(coveredBy)) merged.push({ allergen, species, state });
  }
  return merged;
}
