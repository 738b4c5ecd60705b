import { Order } from '#api/db/models/order.ts';

/** The order whose cake a code is of, however it was typed; null for any other. */
export async function findOrderByCareCode(code: string): Promise<Order | null> {
  return Order.findOne({ where: { careCode: code.trim().toUpperCase() } });
}
