import { SentMail } from '#api/db/models/sent-mail.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { AppError } from '#api/platform/app-error.ts';

/**
 * Sends a mail once more as it was, to the same address. Pressing twice is once: the next copy can
 * be asked for when the last has left.
 * @throws `wrong-state` while it or a copy is on its way, for one that was erased, and for one
 *   whose link works once: that is asked for anew
 */
export async function sendMailAgain(mail: SentMail, byUserId: string): Promise<void> {
  const { id, state, erasedAt, tokenId, orderId } = mail;
  if (erasedAt !== null) throw refused('What it said was erased.');
  if (tokenId !== null) throw refused('Its link works once. Please ask for a new one instead.');
  if (state === 'queued' || state === 'leased') throw refused('It is still on its way.');
  await inTransaction(async () => {
    const copies = await SentMail.findAll({ where: { resendOfId: id } });
    if (copies.some((copy) => copy.state === 'queued' || copy.state === 'leased')) {
      throw refused('A copy of it is on its way already.');
    }
    const uniqueKey = `mail-to-send-again:${id}:${copies.length}`;
    const asked = { sentMailId: id, byUserId };
    const first = await enqueue('mail-to-send-again', asked, {
      uniqueKey,
      orderId: orderId ?? undefined,
    });
    if (!first) throw refused('A copy of it is on its way already.');
  });
}

function refused(detail: string): AppError {
  return new AppError('wrong-state', { detail });
}
