import { type Ingredient, ingredientFamilies, ingredientFamily } from '#shared/contracts/pantry.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { FindField } from '#web/components/ui/find-field.tsx';
import { gapWeight, gapsOf } from './ingredient-gaps.ts';
import type { IngredientSearch } from './ingredient-search.ts';
import { familyWords } from './ingredient-words.ts';

type Props = {
  readonly search: IngredientSearch;
  readonly ingredients: readonly Ingredient[];
  readonly onSearch: (search: IngredientSearch) => void;
};

/** What narrows the shelf; every change is in the address at once. */
export function IngredientFilter({ search, ingredients, onSearch }: Props) {
  const gaps = ingredients.filter(
    (it) => it.archivedAt === null && gapWeight(gapsOf(it)) >= 100,
  ).length;
  const here = new Set(ingredients.map((it) => it.family));
  return (
    <form
      role="search"
      className="flex flex-wrap items-end gap-x-5 gap-y-3"
      onSubmit={(event) => event.preventDefault()}
    >
      <FindField
        hint="A name, a maker, or what a label says is in it."
        find={search.find}
        onFind={(find) => onSearch({ ...search, find })}
      />
      <Select
        label="Family"
        value={search.family ?? ''}
        onChange={(event) => {
          const family = ingredientFamily.safeParse(event.target.value);
          onSearch({ ...search, family: family.success ? family.data : null });
        }}
      >
        <option value="">All families</option>
        {ingredientFamilies
          .filter((it) => here.has(it))
          .map((it) => (
            <option key={it} value={it}>
              {familyWords[it]}
            </option>
          ))}
      </Select>
      <Checkbox
        label={
          gaps === 0
            ? 'What is unknown first'
            : `What is unknown first (${gaps} ${gaps === 1 ? 'stops' : 'stop'} orders)`
        }
        checked={search.gapsFirst}
        onChange={(event) => onSearch({ ...search, gapsFirst: event.target.checked })}
      />
      <Checkbox
        label="Archived"
        checked={search.archived}
        onChange={(event) => onSearch({ ...search, archived: event.target.checked })}
      />
    </form>
  );
}
