import type { CreateFormula, SavedFormula } from '#shared/contracts/pantry.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { Formula } from '#api/db/models/formula.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { newId } from '#api/platform/ids.ts';
import { refuseUnsound } from './check-draft.ts';
import { formulaIn, refuseTakenName, versionIn } from './find-in-pantry.ts';
import { currentPantry } from './load-pantry.queries.ts';
import { writeVersion } from './write-version.ts';

/**
 * A formula and its first version; nothing is made with it yet.
 * @throws `invalid-input` with the line at fault
 */
export async function createFormula(
  actor: Staff,
  { kind, name, draft }: CreateFormula,
): Promise<SavedFormula> {
  return inTransaction(async () => {
    const before = await currentPantry();
    refuseTakenName(before, name);
    refuseUnsound(draft, before);
    const { id } = await Formula.create({ id: newId(), kind, name });
    const versionId = await writeVersion(id, draft, actor.userId);
    await noteAudit(actor, {
      action: 'create-formula',
      subjectKind: 'formula',
      subjectId: id,
      data: { versionId },
    });
    await noteCatalogueChange();
    const after = await currentPantry();
    return {
      formula: formulaIn(after, id),
      version: versionIn(after, versionId),
      carried: [],
      touched: [],
    };
  });
}
