import type { Order } from '#api/db/models/order.ts';
import type { Actor } from '#api/platform/actor.ts';
import { mayOrder } from './orders.policy.ts';
import type { OrderAction } from './orders.policy.ts';
import { resourceOf } from './orders.queries.ts';

/** The policy of orders, for what belongs to one. */
export function mayOrderAs(actor: Actor, action: OrderAction, order: Order): boolean {
  return mayOrder(actor, action, resourceOf(order));
}
