import { changeOne } from '#api/db/change-one.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Closure } from '#api/db/models/closure.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { notFound } from '#api/platform/app-error.ts';

/** Opens a closed day again. @throws `not-found` when it was open, or never closed */
export async function openDay({ id, actor }: { id: string; actor: Staff }): Promise<void> {
  await inTransaction(async () => {
    const reopenedAt = currentClock().now();
    if (!(await changeOne(Closure, { reopenedAt }, { id, reopenedAt: null }))) throw notFound();
    await noteSettingsChange();
    await noteAudit(actor, { action: 'open-day', subjectKind: 'closure', subjectId: id });
  });
}
