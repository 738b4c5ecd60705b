import { useCallback } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { TitleRow } from '#web/features/pantry/components/title-row.tsx';
import { IngredientFilter } from '#web/features/pantry/ingredients/ingredient-filter.tsx';
import {
  IngredientCards,
  IngredientTable,
} from '#web/features/pantry/ingredients/ingredient-list.tsx';
import {
  type IngredientSearch,
  findIngredients,
  readIngredientSearch,
  writeIngredientSearch,
} from '#web/features/pantry/ingredients/ingredient-search.ts';
import { roomForTable, useMedia } from '#web/lib/use-media.ts';

/** `/staff/pantry/ingredients`: what is bought, as its labels read. */
export function IngredientsPage() {
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="Ingredients">{(pantry) => <Shelf pantry={pantry} />}</PantryGate>
    </div>
  );
}

function Shelf({ pantry }: { readonly pantry: Pantry }) {
  const { studio } = useMenu();
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const search = readIngredientSearch(params);
  const found = findIngredients(pantry.ingredients, search);
  const table = useMedia(roomForTable);
  const onSearch = useCallback(
    (next: IngredientSearch) => void navigate(`?${writeIngredientSearch(next)}`, { replace: true }),
    [navigate],
  );
  const List = table ? IngredientTable : IngredientCards;
  return (
    <>
      <TitleRow title={<PageTitle title="Ingredients" />}>
        {pantry.can.save && (
          <LinkButton to={paths.staffIngredientNew} kind="secondary">
            New ingredient
          </LinkButton>
        )}
      </TitleRow>
      <IngredientFilter search={search} ingredients={pantry.ingredients} onSearch={onSearch} />
      {found.length === 0 ? (
        <EmptyState
          title={
            search.archived ? 'Nothing like that is archived' : 'Nothing on the shelf is like that'
          }
          action={
            <LinkButton to={paths.staffIngredients} kind="secondary">
              Show the whole shelf
            </LinkButton>
          }
        >
          Take something away from what narrows the list, or add the ingredient.
        </EmptyState>
      ) : (
        <Rim label="Ingredients" className="overflow-hidden">
          <List ingredients={found} house={studio} currency={pantry.currency} />
        </Rim>
      )}
    </>
  );
}
