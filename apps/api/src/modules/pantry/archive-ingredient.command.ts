import type { Ingredient as IngredientView } from '#shared/contracts/pantry.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { ingredientIn } from './find-in-pantry.ts';
import { currentPantry } from './load-pantry.queries.ts';
import { refuseUsed, usesOfIngredient } from './uses.queries.ts';

/**
 * Puts an ingredient away: it is not bought any more. Doing so twice is doing so once.
 * @throws `still-used` while a formula in use holds it or a decoration on offer is made with it
 */
export async function archiveIngredient(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  id: string,
): Promise<IngredientView> {
  return inTransaction(async () => {
    const pantry = await currentPantry();
    const ingredient = ingredientIn(pantry, id);
    if (ingredient.archivedAt !== null) return ingredient;
    refuseUsed(ingredient.name, await usesOfIngredient(pantry, id));
    return keep(actor, id, clock.now());
  });
}

/** Brings an ingredient back onto the shelf. */
export async function restoreIngredient(actor: Staff, id: string): Promise<IngredientView> {
  return inTransaction(async () => {
    const ingredient = ingredientIn(await currentPantry(), id);
    return ingredient.archivedAt === null ? ingredient : keep(actor, id, null);
  });
}

async function keep(actor: Staff, id: string, archivedAt: Date | null): Promise<IngredientView> {
  await Ingredient.update({ archivedAt }, { where: { id } });
  await noteAudit(actor, {
    action: archivedAt === null ? 'restore-ingredient' : 'archive-ingredient',
    subjectKind: 'ingredient',
    subjectId: id,
  });
  await noteCatalogueChange();
  return ingredientIn(await currentPantry(), id);
}
