import { Order } from '#api/db/models/order.ts';
import { hasCare } from './cards.policy.ts';

/** The order whose cake a code is of, however it was typed; null for any other. */
export async function findOrderByCareCode(code: string): Promise<Order | null> {
  return Order.findOne({ where: { careCode: code.trim().toUpperCase() } });
}

/** The code of an order's cake once there is a promise to make it; null before and after. */
export function careCodeOf(order: Order): string | null {
  return hasCare(order.status) ? order.careCode : null;
}
