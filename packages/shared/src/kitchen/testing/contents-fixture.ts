import type { AllergenEntry, Contents } from '#shared/contracts/menu.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';

/** One allergen that a part contains, or whatever state is given. */
export function entry(
  allergen: AllergenId,
  species: readonly string[] = [],
  state: AllergenEntry['state'] = 'contains',
): AllergenEntry {
  return { allergen, species: [...species], state };
}

export const wheat = entry('gluten-cereals', ['wheat']);
export const milk = entry('milk');
export const egg = entry('egg');
export const soy = entry('soy');

/** Contents with these allergens and nothing else worth telling but what is given. */
export function contentsWith(
  allergens: readonly AllergenEntry[],
  rest: Partial<Contents> = {},
): Contents {
  return {
    allergens: [...allergens],
    statement: '',
    gelatine: false,
    alcohol: false,
    cochineal: false,
    honey: false,
    animalOrigin: false,
    undercookedEgg: false,
    ...rest,
  };
}
