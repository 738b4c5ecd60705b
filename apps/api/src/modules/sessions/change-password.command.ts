import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { invalidField, notFound } from '#api/platform/app-error.ts';
import { passwordMatches } from '#api/platform/passwords.ts';
import { countAttempt, forgiveAttempts } from './attempts.ts';
import { endSessionsOf } from './end-sessions.command.ts';
import { hashNewPassword } from './hash-new-password.command.ts';

/** Replaces one's own password, knowing the old one; the other sessions end. */
export async function changePassword(
  deps: Pick<Deps, 'clock'>,
  given: {
    readonly actor: Staff;
    readonly password: string;
    readonly newPassword: string;
    readonly address: string;
    /** The session that stays. */
    readonly keep: string;
  },
): Promise<void> {
  const user = await User.findByPk(given.actor.userId);
  if (user === null) throw notFound();
  const attempt = { account: `password:${user.email ?? ''}`, address: given.address };
  await countAttempt(deps, attempt);
  if (!(await passwordMatches(user.passwordHash, given.password))) {
    throw invalidField(['password'], 'That is not your present password.');
  }
  const passwordHash = await hashNewPassword(given.newPassword, user, ['newPassword']);
  await inTransaction(async () => {
    await forgiveAttempts(attempt);
    await user.update({ passwordHash });
    await endSessionsOf(user.id, given.keep);
    await noteAudit(given.actor, {
      action: 'change-password',
      subjectKind: 'user',
      subjectId: user.id,
    });
  });
}
