import { createHash } from 'node:crypto';
import type { AllergyTable, KitchenNote } from '#shared/contracts/allergy-table.ts';
import { allergenIds, severities } from '#shared/contracts/vocabulary.ts';
import { kitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import { Studio } from '#api/db/models/studio.ts';
import { handledAllergens, loadCakeRows } from '#api/modules/menu/cake-parts.queries.ts';
import { currentPantry } from '#api/modules/pantry/load-pantry.queries.ts';

/** The owner's words as they are kept, in one order whatever order they were written in. */
export async function loadAllergyWords(): Promise<Omit<AllergyTable, 'fromLabels'>> {
  const [rules, notes, studio] = await Promise.all([
    AllergyRule.findAll(),
    KitchenAllergen.findAll(),
    Studio.findByPk(1, { rejectOnEmpty: true }),
  ]);
  const order = [null, ...allergenIds];
  const words = {
    rules: rules
      .map(({ allergen, severity, answer }) => ({ allergen, severity, answer }))
      .sort(
        (a, b) =>
          order.indexOf(a.allergen) - order.indexOf(b.allergen) ||
          severities.indexOf(a.severity) - severities.indexOf(b.severity),
      ),
    kitchen: notes
      .map(({ allergen, handled, assessment, assessedOn }): KitchenNote => ({
        allergen,
        handled,
        assessment: assessment ?? '',
        assessedOn,
      }))
      .sort((a, b) => order.indexOf(a.allergen) - order.indexOf(b.allergen)),
    kitchenNotice: studio.kitchenNotice,
    homeKitchenText: studio.homeKitchenText,
    eggAdvisory: studio.eggAdvisory,
  };
  const version = createHash('sha256').update(JSON.stringify(words)).digest('base64url');
  return { version: version.slice(0, 16), ...words };
}

/** The owner's words, and what the labels of what is bought say is handled here anyway. */
export async function loadAllergyTable(): Promise<AllergyTable> {
  const [words, pantry, rows] = await Promise.all([
    loadAllergyWords(),
    currentPantry(),
    loadCakeRows(),
  ]);
  const fromLabels = handledAllergens({ ...rows, owners: [] }, kitchenBook(pantry));
  return { ...words, fromLabels };
}
