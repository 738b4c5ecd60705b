import { changeOne } from '#api/db/change-one.ts';
import { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { lengthenGuestHold } from '#api/modules/plan/keep-place.command.ts';
import { notFound } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';
import { senderKeyOf } from '#api/platform/private-link.ts';
import { noteOrderEvent } from './note-order-event.command.ts';

/**
 * Checks the key of an order's private link, or the one its sender's browser was given. The link's
 * own key shows, the first time, that the e-mail arrived, which lengthens the place that is kept.
 * @returns the order it opens
 * @throws `not-found` for a wrong code and a wrong key alike
 */
export async function openPrivateLink(
  { clock, env }: Pick<Deps, 'clock' | 'env'>,
  { code, key }: { code: string; key: string },
): Promise<Order> {
  const order = await Order.findOne({ where: { code } });
  const given = hashKey(key);
  const isLink = order?.privateKeyHash === given;
  // Hashes are compared, so the time it takes tells nothing of the key.
  if (order === null || !(isLink || hashKey(senderKeyOf(env.sessionSecret, order)) === given)) {
    throw notFound('This link does not open an order any more.');
  }
  if (isLink && order.linkOpenedAt === null) {
    await inTransaction(async () => {
      const first = await changeOne(
        Order,
        { linkOpenedAt: clock.now() },
        { id: order.id, linkOpenedAt: null },
      );
      if (!first) return;
      await lengthenGuestHold(order.id);
      await noteOrderEvent({
        orderId: order.id,
        kind: 'link-opened',
        actor: { kind: 'guest', orderIds: [order.id] },
      });
    });
  }
  return order;
}
