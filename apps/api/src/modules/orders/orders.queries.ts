import type { Estimate, Price } from '#shared/contracts/estimates.ts';
import { price } from '#shared/contracts/estimates.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { Order } from '#api/db/models/order.ts';
import { QuoteLine } from '#api/db/models/quote-line.ts';
import { Quote } from '#api/db/models/quote.ts';
import { estimateNow } from '#api/modules/contents/content-changes.queries.ts';
import { notFound } from '#api/platform/app-error.ts';
import { loadRevision } from './order-design.queries.ts';

export async function findOrderByCode(code: string): Promise<Order> {
  const order = await Order.findOne({ where: { code: code.toUpperCase() } });
  if (order === null) throw notFound();
  return order;
}

export async function findOrderByNumber(number: number): Promise<Order> {
  const order = await Order.findOne({ where: { number } });
  if (order === null) throw notFound();
  return order;
}

/** What a policy decides by. */
export function resourceOf(order: Order) {
  return { id: order.id, customerId: order.customerUserId, status: order.status };
}

/** An order with what every page of it shows. */
export type OrderRecord = {
  readonly order: Order;
  readonly revision: OrderRevision;
  /** What was offered, with what the order contains by today's labels. */
  readonly estimate: Estimate;
  readonly contacts: readonly OrderContact[];
  readonly agreedPrice: Price | null;
};

/** The current revision with all its parts. @throws when the order has none */
export async function loadCurrentRevision(order: Order): Promise<OrderRevision> {
  if (order.currentRevisionId === null) throw new Error(`Order ${order.id} has no revision.`);
  return loadRevision(order.currentRevisionId);
}

export async function loadOrderRecord(order: Order): Promise<OrderRecord> {
  const revision = await loadCurrentRevision(order);
  const [estimate, contacts, agreedPrice] = await Promise.all([
    estimateNow(revision),
    OrderContact.findAll({ where: { orderId: order.id } }),
    agreedPriceOf(order.id),
  ]);
  return { order, revision, estimate, contacts, agreedPrice };
}

/** The price of the quote that was agreed last, or null. */
async function agreedPriceOf(orderId: string): Promise<Price | null> {
  const quote = await Quote.findOne({
    where: { orderId, state: 'agreed' },
    order: [['n', 'DESC']],
    include: [{ model: QuoteLine, as: 'lines', separate: true, order: [['position', 'ASC']] }],
  });
  if (quote === null) return null;
  const lines = quote.lines ?? [];
  const taxMinor = lines
    .filter((line) => line.kind === 'tax')
    .reduce((sum, line) => sum + line.amountMinor, 0);
  const revision = await loadRevision(quote.revisionId);
  const { taxInclusive } = revision.estimate.price;
  return price.parse({
    currency: quote.currency,
    priceBookVersionId: revision.priceBookVersionId,
    lines: lines.map(({ kind, label, quantity, amountMinor, taxCategory }) => ({
      kind,
      label,
      quantity,
      amountMinor,
      taxCategory,
    })),
    subtotalMinor: revision.estimate.price.subtotalMinor,
    taxMinor: taxInclusive ? revision.estimate.price.taxMinor : taxMinor,
    taxInclusive,
    totalMinor: quote.totalMinor,
    depositMinor: quote.depositMinor,
  });
}

/** Days that were offered with the last decline, if it was one. */
export async function offeredDatesOf(orderId: string): Promise<string[]> {
  const declined = await OrderEvent.findOne({
    where: { orderId, kind: 'declined' },
    order: [['seq', 'DESC']],
  });
  const dates = declined?.data['otherDates'];
  return typeof dates === 'string' && dates !== '' ? dates.split(',') : [];
}
