import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { issueLink } from '#api/modules/sessions/issue-link.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Customer } from '#api/platform/actor.ts';
import { refuseWhileOrdersLive } from './live-orders.ts';

/** Sends the e-mail that asks whether everything is to be erased. Throws `wrong-state`. */
export async function requestErasure(
  deps: Pick<Deps, 'clock' | 'env'>,
  actor: Customer,
): Promise<void> {
  await refuseWhileOrdersLive(actor.userId);
  await inTransaction(async () => {
    const token = await issueLink(deps, {
      purpose: 'confirm-action',
      userId: actor.userId,
      email: actor.email,
      data: { action: 'erase-account' },
    });
    await enqueue(
      'action-to-confirm',
      { tokenId: token.id },
      { uniqueKey: `action-to-confirm:${token.id}` },
    );
  });
}
