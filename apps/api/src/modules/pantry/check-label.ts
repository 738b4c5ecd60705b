import type { IngredientDraft } from '#shared/contracts/pantry.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { euCereals, euTreeNuts, usTreeNuts } from '#shared/kitchen/allergen-names.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { Issue } from '#api/platform/app-error.ts';

/** Species the laws' lists name, and the wheats that US labels call wheat. */
const speciesOf: Partial<Record<AllergenId, readonly string[]>> = {
  'tree-nuts': [...new Set([...usTreeNuts, ...euTreeNuts])],
  'gluten-cereals': [...euCereals, 'durum', 'emmer', 'einkorn'],
};

/**
 * Refuses a label that cannot be: an allergen or a measure said twice, a species that is none of
 * its kind, a reading that is still to come, an egg without egg.
 * @throws `invalid-input`
 */
export function refuseImpossibleLabel(draft: IngredientDraft, today: string): void {
  const issues = [
    ...allergenIssues(draft),
    ...measureIssues(draft),
    ...(draft.labelCheckedOn !== null && draft.labelCheckedOn > today
      ? [issue(['labelCheckedOn'], 'That day is still to come.')]
      : []),
    ...(draft.eggPart !== null && !declaresEgg(draft)
      ? [issue(['allergens'], 'It is part of an egg: say that it contains egg.')]
      : []),
  ];
  if (issues.length > 0) throw new AppError('invalid-input', { issues });
}

const issue = (path: readonly (string | number)[], message: string): Issue => ({
  path: ['draft', ...path],
  message,
});

function declaresEgg({ allergens }: IngredientDraft): boolean {
  return allergens.some(({ allergen, state }) => allergen === 'egg' && state === 'contains');
}

function allergenIssues({ allergens }: IngredientDraft): Issue[] {
  const said = new Set<string>();
  return allergens.flatMap(({ allergen, species }, at) => {
    const kinds = species.length === 0 ? [''] : species;
    const issues = kinds.flatMap((each): Issue[] => {
      if (each !== '' && speciesOf[allergen]?.includes(each) !== true) {
        return [issue(['allergens', at, 'species'], 'Choose a kind from the list.')];
      }
      const name = `${allergen}:${each}`;
      if (said.has(name)) return [issue(['allergens', at], 'This one is there already.')];
      said.add(name);
      return [];
    });
    return issues.slice(0, 1);
  });
}

function measureIssues({ measures }: IngredientDraft): Issue[] {
  const said = new Set<string>();
  return measures.flatMap(({ measure, qualifier }, at) => {
    const name = `${measure}:${qualifier ?? ''}`;
    if (said.has(name)) return [issue(['measures', at], 'This measure is there already.')];
    said.add(name);
    return [];
  });
}
