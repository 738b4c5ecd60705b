import {
  ingredientFamily,
  type Ingredient,
  type IngredientFamily,
} from '#shared/contracts/pantry.ts';
import { gapWeight, gapsOf } from './ingredient-gaps.ts';

export type IngredientSearch = {
  readonly find: string;
  readonly family: IngredientFamily | null;
  /** What something is missing of comes first. */
  readonly gapsFirst: boolean;
  readonly archived: boolean;
};

/** What the address asks for; anything it does not know is left out. */
export function readIngredientSearch(search: URLSearchParams): IngredientSearch {
  const family = ingredientFamily.safeParse(search.get('family'));
  return {
    find: search.get('find') ?? '',
    family: family.success ? family.data : null,
    gapsFirst: search.get('first') === 'unknown',
    archived: search.get('archived') === 'yes',
  };
}

export function writeIngredientSearch(search: IngredientSearch): string {
  const out = new URLSearchParams();
  if (search.find !== '') out.set('find', search.find);
  if (search.family !== null) out.set('family', search.family);
  if (search.gapsFirst) out.set('first', 'unknown');
  if (search.archived) out.set('archived', 'yes');
  return out.toString();
}

/** The shelf as it is asked for, by name; with `gapsFirst` what stops orders comes first. */
export function findIngredients(
  ingredients: readonly Ingredient[],
  { find, family, gapsFirst, archived }: IngredientSearch,
): readonly Ingredient[] {
  const words = find.toLowerCase().split(/\s+/).filter(Boolean);
  const found = ingredients
    .filter((it) => (it.archivedAt !== null) === archived)
    .filter((it) => family === null || it.family === family)
    .filter((it) => {
      const text = `${it.name} ${it.brand ?? ''} ${it.labelName} ${it.labelContents ?? ''}`;
      return words.every((word) => text.toLowerCase().includes(word));
    })
    .toSorted((a, b) => a.name.localeCompare(b.name));
  if (!gapsFirst) return found;
  return found.toSorted((a, b) => gapWeight(gapsOf(b)) - gapWeight(gapsOf(a)));
}
