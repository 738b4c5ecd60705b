import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { pickupOf } from '#api/modules/orders/pickup.queries.ts';

/** A pickup as the planner is asked about it. */
export type PickupChoice = { readonly date: string; readonly windowStart: number };

/** The row planned work points at, or null where there is no cake. */
export function cakeItemOf(revision: OrderRevision): string | null {
  const cake = revision.items?.find(({ kind }) => kind === 'tiered' || kind === 'sheet');
  return cake?.id ?? null;
}

/** The pickup an order has now, or was asked for. */
export function pickupChoiceOf(order: Order, revision: OrderRevision): PickupChoice {
  const { date, start } = pickupOf(order, revision);
  return { date, windowStart: start };
}
