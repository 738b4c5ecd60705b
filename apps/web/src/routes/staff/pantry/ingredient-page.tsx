import { useParams } from 'react-router-dom';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useArchiveIngredient } from '#web/features/pantry/api/archive-ingredient.ts';
import { ArchiveButton, ArchiveFailure } from '#web/features/pantry/components/archive-button.tsx';
import { BackLink } from '#web/features/pantry/components/back-link.tsx';
import { NotInPantry } from '#web/features/pantry/components/not-in-pantry.tsx';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { TitleRow } from '#web/features/pantry/components/title-row.tsx';
import { IngredientEditor } from '#web/features/pantry/ingredients/ingredient-editor.tsx';
import { shelfOf } from '#web/features/pantry/shelf.ts';

/** `/staff/pantry/ingredients/:id` and `/new`: one bought product. */
export function IngredientPage() {
  const { id } = useParams();
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="Ingredient">
        {(pantry) => <OneIngredient key={id ?? 'new'} id={id ?? null} pantry={pantry} />}
      </PantryGate>
    </div>
  );
}

function OneIngredient({ id, pantry }: { readonly id: string | null; readonly pantry: Pantry }) {
  const { studio } = useMenu();
  const archive = useArchiveIngredient();
  const shelf = shelfOf(pantry);
  const ingredient = id === null ? null : (shelf.index.ingredients.get(id) ?? null);
  if (id !== null && ingredient === null) {
    return <NotInPantry what="ingredient" back={paths.staffIngredients} />;
  }
  const archived = ingredient !== null && ingredient.archivedAt !== null;
  return (
    <>
      <BackLink to={paths.staffIngredients}>All ingredients</BackLink>
      <TitleRow title={<PageTitle title={ingredient?.name ?? 'New ingredient'} />}>
        {ingredient !== null && (
          <ArchiveButton
            archived={archived}
            pending={archive.isPending}
            onArchive={(next) => archive.mutate({ id: ingredient.id, archived: next })}
          />
        )}
      </TitleRow>
      {archive.error !== null && <ArchiveFailure error={archive.error} />}
      {archived && (
        <Notice title="Archived: no new formula can take it">
          <p>What was made with it keeps it.</p>
        </Notice>
      )}
      <IngredientEditor
        ingredient={ingredient}
        usedIn={ingredient === null ? [] : shelf.formulasWith(ingredient.id)}
        house={studio}
        currency={pantry.currency}
      />
    </>
  );
}
