import { Order } from '#api/db/models/order.ts';
import { AppError } from '#api/platform/app-error.ts';
import { isLive } from '#shared/orders/transitions.ts';

/** A cake that is asked for or being made needs its customer; erasing comes after. */
export async function refuseWhileOrdersLive(userId: string): Promise<void> {
  const orders = await Order.findAll({ where: { customerUserId: userId } });
  const live = orders.filter(({ status }) => isLive(status));
  if (live.length === 0) return;
  throw new AppError('wrong-state', {
    detail: 'An order of yours is still open. Withdraw it, or come back once it is collected.',
    facts: { orders: live.map(({ code, number }) => ({ code, number })) },
  });
}
