import { Op, fn, col } from 'sequelize';
import * as z from 'zod/mini';
import type { Message as MessageView } from '#shared/contracts/orders.ts';
import { Message } from '#api/db/models/message.ts';

/** What was written about an order, oldest first. */
export async function messagesOf(orderId: string): Promise<MessageView[]> {
  const messages = await Message.findAll({
    where: { orderId, sender: { [Op.in]: ['customer', 'studio'] } },
    order: [
      ['createdAt', 'ASC'],
      ['id', 'ASC'],
    ],
  });
  return messages.map((message) => ({
    id: message.id,
    from: message.sender === 'customer' ? 'customer' : 'studio',
    authorName: message.authorName,
    body: message.body,
    at: message.createdAt.toISOString(),
  }));
}

const counted = z.array(z.object({ orderId: z.string(), count: z.number() }));

/** How many messages from customers no member of staff has opened, by order. */
export async function unreadOf(orderIds: readonly string[]): Promise<Map<string, number>> {
  const rows = await Message.findAll({
    attributes: ['orderId', [fn('COUNT', col('id')), 'count']],
    where: { orderId: { [Op.in]: [...orderIds] }, sender: 'customer', readAt: null },
    group: ['orderId'],
    // Counts are figures of the database itself: there is no kept text to be read.
    raw: true,
  });
  return new Map(counted.parse(rows).map(({ orderId, count }) => [orderId, count]));
}
