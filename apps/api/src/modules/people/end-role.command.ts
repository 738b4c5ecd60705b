import { Op } from 'sequelize';
import { changeOne } from '#api/db/change-one.ts';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { Identity } from '#api/db/models/identity.ts';
import { RecoveryCode } from '#api/db/models/recovery-code.ts';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { endSessionsOf } from '#api/modules/sessions/end-sessions.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { StaffRecord } from './people.queries.ts';

/**
 * Ends somebody's role, or withdraws an invitation: every session, way in and unspent link goes
 * with it, and the next request they make is a visitor's. What they did stays in their name.
 */
export async function endRole(
  { clock }: Pick<Deps, 'clock'>,
  actor: Staff,
  person: StaffRecord,
): Promise<void> {
  const now = clock.now();
  await inTransaction(async () => {
    if (person.userId === null) {
      const withdrawn = await changeOne(Token, { usedAt: now }, { id: person.id, usedAt: null });
      if (!withdrawn) throw new AppError('changed-meanwhile');
    } else {
      const { userId } = person;
      const ended = await changeOne(
        User,
        { endedAt: now, passwordHash: null },
        { id: userId, endedAt: null },
      );
      if (!ended) throw new AppError('changed-meanwhile');
      await endSessionsOf(userId);
      await Identity.destroy({ where: { userId } });
      await Authenticator.destroy({ where: { userId } });
      await RecoveryCode.destroy({ where: { userId } });
      await Token.update({ usedAt: now }, { where: { userId, usedAt: { [Op.is]: null } } });
    }
    await noteAudit(actor, {
      action: 'end-role',
      subjectKind: person.userId === null ? 'token' : 'user',
      subjectId: person.id,
      data: { role: person.role },
    });
  });
}
