import { changeOne } from '#api/db/change-one.ts';
import { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { changedMeanwhile } from '#api/modules/orders/change-order-status.command.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Staff } from '#api/platform/actor.ts';
import { hashKey } from '#api/platform/ids.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';

/** Makes an order another private link and sends it; the old one opens nothing any more. */
export async function renewLink(
  { clock, env }: Pick<Deps, 'clock' | 'env'>,
  input: { readonly order: Order; readonly actor: Staff; readonly rowVersion: number },
): Promise<void> {
  const { order, actor, rowVersion } = input;
  const keyRenewedAt = clock.now();
  const key = privateKeyOf(env.sessionSecret, { id: order.id, keyRenewedAt });
  await inTransaction(async () => {
    const renewed = await changeOne(
      Order,
      { keyRenewedAt, privateKeyHash: hashKey(key), rowVersion: rowVersion + 1 },
      { id: order.id, rowVersion },
    );
    if (!renewed) throw changedMeanwhile(await order.reload());
    await noteOrderEvent({ orderId: order.id, kind: 'link-renewed', actor });
    await enqueue(
      'private-link-renewed',
      { orderId: order.id },
      { uniqueKey: `private-link-renewed:${order.id}:${rowVersion + 1}`, orderId: order.id },
    );
  });
}
