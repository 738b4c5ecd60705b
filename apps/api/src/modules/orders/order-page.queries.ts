import type { Order } from '#api/db/models/order.ts';
import { contentChangeViews } from '#api/modules/contents/content-changes.queries.ts';
import { messagesOf } from '#api/modules/messages/messages.queries.ts';
import { photosOf } from '#api/modules/photos/photos.queries.ts';
import { nearestOpenDays } from '#api/modules/plan/nearest-open-days.queries.ts';
import { activeHoldsOf } from '#api/modules/plan/plan.queries.ts';
import { liftedStopsOf } from './lifted-stops.queries.ts';
import { designOf } from './order-design.queries.ts';
import { loadOrderRecord, offeredDatesOf } from './orders.queries.ts';
import type { OrderRecord } from './orders.queries.ts';
import type { OrderPage } from './orders.presenter.ts';

/** Everything the customer's page of an order shows. */
export async function loadOrderPage(order: Order): Promise<OrderPage> {
  const [record, holds, photos, messages] = await Promise.all([
    loadOrderRecord(order),
    activeHoldsOf([order.id]),
    photosOf([order.id]),
    messagesOf(order.id),
  ]);
  const hold = holds.get(order.id) ?? null;
  const lifted = await liftedStopsOf(record.revision);
  return {
    ...record,
    hold,
    photos: photos.get(order.id) ?? [],
    messages,
    lifted,
    contentChanges: await contentChangeViews(record.revision),
    otherDates: await otherDatesOf(record, hold !== null),
  };
}

/** Days to choose from instead: those offered with a decline, or while nothing is promised. */
async function otherDatesOf(record: OrderRecord, hasHold: boolean): Promise<string[]> {
  const { order, revision } = record;
  if (order.status === 'declined') return offeredDatesOf(order.id);
  if (order.status !== 'asked' || hasHold || order.pickupDate === null) return [];
  return nearestOpenDays(designOf(revision), order.pickupDate, 3);
}
