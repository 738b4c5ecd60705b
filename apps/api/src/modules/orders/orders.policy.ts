import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { findTransition, isLive } from '#shared/orders/transitions.ts';
import { holdsOrder } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';
import { orderActorOf } from './change-order-status.command.ts';

/**
 * What the people an order belongs to may do with it; staff have routes of their own. When it may
 * still be withdrawn is the table of moves'.
 */
export type OrderAction =
  'see' | 'withdraw' | 'write' | 'add-photos' | 'see-calendar-file' | 'accept-lifted-stop';

export type OrderResource = {
  readonly id: string;
  readonly customerId: string | null;
  readonly status: OrderStatus;
};

type Rule = (actor: Actor, order: OrderResource) => boolean;

const rules: Readonly<Record<OrderAction, Rule>> = {
  see: (actor, order) => actor.kind === 'staff' || holdsOrder(actor, order),
  withdraw: holdsOrder,
  write: holdsOrder,
  // What it is about is theirs to accept, and nobody else's.
  'accept-lifted-stop': holdsOrder,
  'add-photos': (actor, order) => holdsOrder(actor, order) && isLive(order.status),
  'see-calendar-file': (actor, order) =>
    (actor.kind === 'staff' || holdsOrder(actor, order)) && hasPromise(order.status),
};

export function mayOrder(actor: Actor, action: OrderAction, order: OrderResource): boolean {
  return rules[action](actor, order);
}

/** Whether the table of an order's life lets this actor send one at all. */
export function maySubmitOrder(actor: Actor): boolean {
  return findTransition(null, 'submit', orderActorOf(actor)) !== null;
}

/** The pickup is promised, so a calendar may hold it. */
function hasPromise(status: OrderStatus): boolean {
  return status === 'confirmed' || status === 'making' || status === 'ready';
}
