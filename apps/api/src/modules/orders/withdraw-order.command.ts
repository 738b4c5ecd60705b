import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { releasePlace } from '#api/modules/plan/keep-place.command.ts';
import type { Actor } from '#api/platform/actor.ts';
import { changeOrderStatus } from './change-order-status.command.ts';

/** The customer takes an order back before it is confirmed; its place in the plan is free again. */
export async function withdrawOrder(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly actor: Actor;
    readonly rowVersion: number;
    readonly reason: string;
  },
): Promise<void> {
  const { order, actor, rowVersion, reason } = input;
  await inTransaction(async () => {
    await changeOrderStatus({
      order,
      rowVersion,
      action: 'withdraw',
      actor,
      values: {
        endedAt: clock.now(),
        endedBy: 'customer',
        endedReason: reason === '' ? null : reason,
      },
    });
    await releasePlace(order.id, 'ended');
  });
}
