import type { IngredientDraft, SavedIngredient, SaveIngredient } from '#shared/contracts/pantry.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import { IngredientMeasure } from '#api/db/models/ingredient-measure.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import { Studio } from '#api/db/models/studio.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteContentChanges } from '#api/modules/contents/note-content-changes.command.ts';
import { openOrders } from '#api/modules/contents/open-orders.queries.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { newId } from '#api/platform/ids.ts';
import { refuseImpossibleLabel } from './check-label.ts';
import { ingredientIn, refuseTakenProduct } from './find-in-pantry.ts';
import { currentPantry } from './load-pantry.queries.ts';
import { isSameIngredient, isSameLabel } from './same-draft.ts';
import { mgOf } from './write-version.ts';

/** A product that is bought from now on; nothing is made of it yet. @throws `invalid-input` */
export async function createIngredient(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  { draft }: SaveIngredient,
): Promise<SavedIngredient> {
  return inTransaction(async () => {
    refuseTakenProduct(await currentPantry(), draft);
    refuseImpossibleLabel(draft, await localToday(clock.now()));
    const { id } = await Ingredient.create({ id: newId(), ...columnsOf(draft) });
    await writeLabel(id, draft);
    await noteAudit(actor, {
      action: 'create-ingredient',
      subjectKind: 'ingredient',
      subjectId: id,
    });
    await noteCatalogueChange();
    return { ingredient: ingredientIn(await currentPantry(), id), touched: [] };
  });
}

/**
 * Changes a product on the shelf. What is in the cupboard is what goes in, so a changed label
 * reaches every version that holds the product and every order not handed over yet.
 * @throws `changed-meanwhile` with the ingredient as it is now, `invalid-input`
 */
export async function saveIngredient(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  id: string,
  { basedOn, draft }: SaveIngredient,
): Promise<SavedIngredient> {
  return inTransaction(async () => {
    const now = clock.now();
    const pantry = await currentPantry();
    const current = ingredientIn(pantry, id);
    if (basedOn === null || !isSameIngredient(basedOn, current)) {
      throw new AppError('changed-meanwhile', {
        detail: `Somebody has changed ${current.name} meanwhile.`,
        facts: { current },
      });
    }
    refuseTakenProduct(pantry, draft, id);
    refuseImpossibleLabel(draft, await localToday(now));
    if (isSameIngredient(draft, current)) return { ingredient: current, touched: [] };
    const label = !isSameLabel(draft, current);
    const before = label ? await openOrders(now) : null;
    await Ingredient.update(columnsOf(draft), { where: { id } });
    await IngredientAllergen.destroy({ where: { ingredientId: id } });
    await IngredientMeasure.destroy({ where: { ingredientId: id } });
    await writeLabel(id, draft);
    await noteAudit(actor, {
      action: 'save-ingredient',
      subjectKind: 'ingredient',
      subjectId: id,
      data: { label },
    });
    await noteCatalogueChange();
    const cause = { ingredientId: id };
    const touched = before === null ? [] : await noteContentChanges({ before, cause, actor, now });
    return { ingredient: ingredientIn(await currentPantry(), id), touched };
  });
}

async function localToday(now: Date): Promise<string> {
  const { zone } = await Studio.findByPk(1, { rejectOnEmpty: true });
  return localAt(now, zone).date;
}

function columnsOf(draft: IngredientDraft) {
  const { pack, densityGPerMl, roundingG, measures: _, allergens: __, ...columns } = draft;
  return {
    ...columns,
    packMg: pack === null ? null : mgOf(pack.grams),
    packPriceMinor: pack?.priceMinor ?? null,
    densityMgPerMl: densityGPerMl === null ? null : mgOf(densityGPerMl),
    roundingMg: mgOf(roundingG),
  };
}

async function writeLabel(ingredientId: string, draft: IngredientDraft): Promise<void> {
  await IngredientAllergen.bulkCreate(
    draft.allergens.flatMap(({ allergen, species, state }) =>
      (species.length === 0 ? [null] : species).map((each) => ({
        ingredientId,
        allergen,
        species: each,
        state,
      })),
    ),
  );
  await IngredientMeasure.bulkCreate(
    draft.measures.map(({ grams, ...measure }) => ({
      ...measure,
      ingredientId,
      weightMg: mgOf(grams),
    })),
  );
}
