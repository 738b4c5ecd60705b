import type { Pickup } from '#shared/contracts/orders.ts';
import { instantAt } from '#shared/dates/local-time.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';

/**
 * The pickup of an order; one that has lost its day shows the day it was asked for.
 * @throws when it never had one
 */
export function pickupOf(order: Order, revision: OrderRevision): Pickup {
  const date = order.pickupDate ?? revision.pickupDate;
  const start = order.windowStartMinute ?? revision.windowStartMinute;
  const minutes = order.windowMinutes ?? revision.windowMinutes;
  if (date === null || start === null || minutes === null) {
    throw new Error(`Order ${order.id} was never given a day.`);
  }
  const startAt = order.pickupAt ?? instantAt(date, start, order.zone);
  return { date, start, minutes, zone: order.zone, startAt: startAt.toISOString() };
}
