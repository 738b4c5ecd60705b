import { changeOne } from '#api/db/change-one.ts';
import { Order } from '#api/db/models/order.ts';
import { changedMeanwhile } from './change-order-status.command.ts';

/** Counts a change of an order that leaves its state. @throws `changed-meanwhile` */
export async function touchOrder(order: Order, rowVersion: number): Promise<void> {
  const touched = await changeOne(
    Order,
    { rowVersion: rowVersion + 1 },
    { id: order.id, rowVersion, status: order.status },
  );
  if (!touched) throw changedMeanwhile(await order.reload());
}
