import { Message } from '#api/db/models/message.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { userIdOf } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';

/**
 * Keeps what a customer or the studio writes about an order, and has the other side told by
 * e-mail.
 */
export async function writeMessage(input: {
  readonly order: Order;
  readonly actor: Actor;
  readonly body: string;
}): Promise<void> {
  const { order, actor, body } = input;
  await inTransaction(async () => {
    const message = await Message.create({
      orderId: order.id,
      sender: actor.kind === 'staff' ? 'studio' : 'customer',
      authorUserId: userIdOf(actor),
      authorName: await authorOf(order, actor),
      body,
    });
    await noteOrderEvent({
      orderId: order.id,
      kind: 'message-written',
      actor,
      data: { messageId: message.id },
    });
    await enqueue(
      'message-written',
      { orderId: order.id, messageId: message.id },
      { uniqueKey: `message-written:${message.id}`, orderId: order.id },
    );
  });
}

/** Staff and customers by their account; a guest by the name on the order. */
async function authorOf(order: Order, actor: Actor): Promise<string> {
  if (actor.kind === 'staff' || actor.kind === 'customer') return actor.name;
  const contact = await OrderContact.findOne({ where: { orderId: order.id, role: 'ordered' } });
  return contact?.name ?? '';
}
