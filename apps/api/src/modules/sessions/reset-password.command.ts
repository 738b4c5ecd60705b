import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import { AppError } from '#api/platform/app-error.ts';
import { endSessionsOf } from './end-sessions.command.ts';
import { hashNewPassword } from './hash-new-password.command.ts';
import { findLink } from './links.queries.ts';
import { spendLink } from './spend-link.command.ts';

/**
 * Spends a password link and sets the new password; every session of the account ends, and the
 * second factor stays. A refused password leaves the link unspent.
 */
export async function resetPassword(
  deps: Pick<Deps, 'clock'>,
  given: { readonly token: string; readonly password: string },
): Promise<void> {
  const link = await findLink(deps, given.token);
  const user = link.userId === null ? null : await User.findByPk(link.userId);
  if (user === null || user.role === 'customer' || user.endedAt !== null) {
    throw new AppError('link-spent');
  }
  const passwordHash = await hashNewPassword(given.password, user, ['password']);
  await inTransaction(async () => {
    await spendLink(deps, given.token, ['password-reset']);
    await user.update({ passwordHash });
    await endSessionsOf(user.id);
    await noteAudit('system', {
      action: 'reset-password',
      subjectKind: 'user',
      subjectId: user.id,
    });
  });
}
