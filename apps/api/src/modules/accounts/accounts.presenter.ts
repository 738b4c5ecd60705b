import type { AccountView } from '#shared/contracts/accounts.ts';
import { localAt } from '#shared/dates/local-time.ts';
import type { AccountRecord } from './accounts.queries.ts';

/** A customer's own account. */
export function presentAccount({ user, google, orders }: AccountRecord): AccountView {
  return {
    name: user.name,
    email: user.email ?? '',
    google,
    orders: orders.map(({ order, revision, summary }) => ({
      code: order.code,
      number: order.number,
      status: order.status,
      // An order that lost its date shows the day it was sent.
      date: order.pickupDate ?? localAt(order.createdAt, order.zone).date,
      summary,
      totalMinor: revision.totalMinor,
      currency: revision.currency,
    })),
  };
}
