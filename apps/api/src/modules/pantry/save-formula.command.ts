import type { FormulaVersion, SaveFormula, SavedFormula } from '#shared/contracts/pantry.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { Formula } from '#api/db/models/formula.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteContentChanges } from '#api/modules/contents/note-content-changes.command.ts';
import { openOrders } from '#api/modules/contents/open-orders.queries.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { carryInto } from './carry-into.ts';
import { refuseUnsound } from './check-draft.ts';
import { isSameDraft } from './same-draft.ts';
import { formulaIn, refuseTakenName, versionIn } from './find-in-pantry.ts';
import { currentPantry } from './load-pantry.queries.ts';
import type { WholePantry } from './load-pantry.queries.ts';
import { substituteInOrders } from './substitute-in-orders.ts';
import { writeVersion } from './write-version.ts';

/**
 * The next version of a formula. Nothing that holds an older one changes by itself: the formulas
 * named get versions of their own with the newest inside, and open orders take it where that is
 * asked for; else they keep what they were ordered with. A draft that changes nothing makes no
 * version.
 * @throws `changed-meanwhile` with the version there is now, `invalid-input` with the line at fault
 */
export async function saveFormula(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  id: string,
  body: SaveFormula,
): Promise<SavedFormula> {
  const { name, draft } = body;
  return inTransaction(async () => {
    const pantry = await currentPantry();
    const based = refuseStale(pantry, id, body.basedOn);
    refuseTakenName(pantry, name, id);
    refuseUnsound(draft, pantry, id);
    const now = clock.now();
    const before = await openOrders(now);
    await Formula.update({ name }, { where: { id } });
    const versionId = isSameDraft(draft, based)
      ? based.id
      : await writeVersion(id, draft, actor.userId);
    const newest = new Map([[id, versionId]]);
    const carried = await carryInto(body.carryInto ?? [], newest, pantry, actor.userId);
    const orders =
      body.inOpenOrders === true ? await substituteInOrders(newest, pantry, before) : 0;
    await noteAudit(actor, {
      action: 'save-formula',
      subjectKind: 'formula',
      subjectId: id,
      data: { versionId, carried: carried.length, orders },
    });
    await noteCatalogueChange();
    const cause = { formulaVersionId: versionId };
    const touched = await noteContentChanges({ before, cause, actor, now });
    const after = await currentPantry();
    return {
      formula: formulaIn(after, id),
      version: versionIn(after, versionId),
      carried: carried.map((carriedId) => versionIn(after, carriedId)),
      touched,
    };
  });
}

/** The version the draft was written over, where that still is the current one. */
function refuseStale(pantry: WholePantry, id: string, basedOn: string): FormulaVersion {
  const formula = formulaIn(pantry, id);
  const current = versionIn(pantry, formula.currentVersionId);
  if (formula.archivedAt !== null) {
    throw new AppError('changed-meanwhile', {
      detail: `${formula.name} was put away meanwhile. Bring it back to change it.`,
      facts: { current },
    });
  }
  if (current.id === basedOn) return current;
  const by = current.createdBy === '' ? 'Somebody' : current.createdBy;
  throw new AppError('changed-meanwhile', {
    detail: `${by} has saved version ${String(current.n)} of ${formula.name} meanwhile.`,
    facts: { current },
  });
}
