import { openBook } from '#shared/dates/answer-dates.ts';
import type { OpenBook } from '#shared/dates/answer-dates.ts';
import type { Demand } from '#shared/dates/model.ts';

/** Notice, how far the book is open and places kept back bind customers, not the staff. */
export function bookForStaff(open: OpenBook, orderId: string): OpenBook {
  const supply = { ...open.supply, keptBack: 0, bookOpenUntil: '9999-12-31' };
  return openBook(supply, withoutOrder(open, orderId));
}

/** The same for the order's work. */
export function demandForStaff(demand: Demand): Demand {
  return { ...demand, noticeDays: 0 };
}

/** What stands beside an order: moving it, its own work is in nobody's way. */
export function withoutOrder(open: OpenBook, orderId: string): OpenBook['standing']['orders'] {
  return open.standing.orders.filter((it) => it.orderId !== orderId);
}
