import { currentClock } from '#api/db/current-database.ts';
import { Order } from '#api/db/models/order.ts';
import { calendarFile } from '#api/mail/calendar-file.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { summariesOf } from './order-summary.queries.ts';
import { loadCurrentRevision } from './orders.queries.ts';
import { pickupOf } from './pickup.queries.ts';

/** The iCalendar file of an order's pickup, as it is attached to the confirming e-mail too. */
export async function calendarFileOf(orderId: string, publicUrl: string): Promise<string> {
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const [{ menu }, summaries, revision] = await Promise.all([
    preparedMenu(),
    summariesOf([order.id]),
    loadCurrentRevision(order),
  ]);
  const pickup = pickupOf(order, revision);
  return calendarFile({
    studio: menu.studio,
    order,
    summary: summaries.get(order.id) ?? '',
    startAt: new Date(pickup.startAt),
    minutes: pickup.minutes,
    now: currentClock().now(),
    url: `${publicUrl}/orders/${order.code}`,
  });
}
