import type { SaveAllergyTable } from '#shared/contracts/allergy-table.ts';
import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import { Studio } from '#api/db/models/studio.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { loadAllergyWords } from './allergy-table.queries.ts';

/**
 * Puts the owner's words in place of the present ones. Orders that wait are judged by the new table
 * at once; what their customers were told when they sent them stays as it was.
 * @throws `changed-meanwhile` when somebody else saved since `version` was read
 */
export async function saveAllergyTable(actor: Staff, words: SaveAllergyTable): Promise<void> {
  await inTransaction(async () => {
    const before = await loadAllergyWords();
    if (before.version !== words.version) throw new AppError('changed-meanwhile');
    await AllergyRule.destroy({ where: {} });
    await AllergyRule.bulkCreate(words.rules.map((it) => ({ ...it })));
    await KitchenAllergen.destroy({ where: {} });
    await KitchenAllergen.bulkCreate(
      words.kitchen
        .filter((it) => it.handled || it.assessment !== '')
        .map(({ allergen, handled, assessment, assessedOn }) => ({
          allergen,
          handled,
          assessment: assessment === '' ? null : assessment,
          assessedOn: assessment === '' ? null : assessedOn,
        })),
    );
    const { kitchenNotice, homeKitchenText, eggAdvisory } = words;
    await Studio.update({ kitchenNotice, homeKitchenText, eggAdvisory }, { where: { id: 1 } });
    await noteCatalogueChange();
    await noteAudit(actor, {
      action: 'save-allergy-table',
      subjectKind: 'allergy-table',
      subjectId: '1',
      data: { rules: words.rules.length, handled: words.kitchen.filter((it) => it.handled).length },
    });
  });
}
