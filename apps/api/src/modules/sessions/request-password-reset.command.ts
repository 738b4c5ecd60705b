import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { issueLink } from './issue-link.command.ts';

/** Sends staff a link to choose a new password; nothing is said or sent to anybody else. */
export async function requestPasswordReset(
  deps: Pick<Deps, 'clock' | 'env'>,
  email: string,
): Promise<void> {
  await inTransaction(async () => {
    const user = await User.findOne({ where: { email } });
    if (user === null || user.role === 'customer' || user.endedAt !== null) return;
    const token = await issueLink(deps, { purpose: 'password-reset', userId: user.id, email });
    await enqueue(
      'password-reset-asked',
      { tokenId: token.id },
      { uniqueKey: `password-reset-asked:${token.id}` },
    );
  });
}
