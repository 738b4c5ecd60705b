import { changeOne } from '#api/db/change-one.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { endSessionsOf } from '#api/modules/sessions/end-sessions.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import type { StaffRecord } from './people.queries.ts';

/** Gives a member of staff another role; they sign in again with it. */
export async function changeRole(
  actor: Staff,
  person: StaffRecord,
  role: StaffRole,
): Promise<void> {
  await inTransaction(async () => {
    const changed = await changeOne(
      User,
      { role },
      { id: person.id, role: person.role, endedAt: null },
    );
    if (!changed) throw new AppError('changed-meanwhile');
    await endSessionsOf(person.id);
    await noteAudit(actor, {
      action: 'change-role',
      subjectKind: 'user',
      subjectId: person.id,
      data: { from: person.role, to: role },
    });
  });
}
