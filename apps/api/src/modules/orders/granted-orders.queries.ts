import { Order } from '#api/db/models/order.ts';
import { grantOf } from '#api/platform/private-link.ts';
import type { OrderGrant } from '#api/platform/private-link.ts';

/** Orders a browser may still see by the links it has opened: renewing a link ends the old one. */
export async function grantedOrders(grants: readonly OrderGrant[]): Promise<string[]> {
  if (grants.length === 0) return [];
  const renewedAt = new Map(grants.map((grant) => [grant.id, grant.renewedAt]));
  const orders = await Order.findAll({
    attributes: ['id', 'keyRenewedAt'],
    where: { id: [...renewedAt.keys()] },
  });
  return orders
    .filter((order) => grantOf(order).renewedAt === renewedAt.get(order.id))
    .map(({ id }) => id);
}
