import { Message } from '#api/db/models/message.ts';
import { currentClock } from '#api/db/current-database.ts';
import { inTransaction } from '#api/db/transaction.ts';

/** Notes that the studio has opened what a customer wrote; writes only when there is something. */
export async function readMessages(orderId: string): Promise<void> {
  const unread = { orderId, sender: 'customer' as const, readAt: null };
  if ((await Message.count({ where: unread })) === 0) return;
  await inTransaction(() => Message.update({ readAt: currentClock().now() }, { where: unread }));
}
