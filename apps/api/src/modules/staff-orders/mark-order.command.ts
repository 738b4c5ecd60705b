import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { changeOrderStatus } from '#api/modules/orders/change-order-status.command.ts';
import { finishWork } from '#api/modules/plan/keep-place.command.ts';
import type { Staff } from '#api/platform/actor.ts';

/** Marks where a cake has got to: begun, ready, or left at the counter. */
export async function markOrder(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly action: 'start' | 'ready' | 'uncollected';
    readonly actor: Staff;
    readonly rowVersion: number;
  },
): Promise<void> {
  const { order, action, actor, rowVersion } = input;
  await inTransaction(async () => {
    const ended = { endedAt: clock.now(), endedBy: 'time' as const };
    await changeOrderStatus({
      order,
      rowVersion,
      action,
      actor,
      values: action === 'uncollected' ? ended : {},
    });
    if (action === 'ready') await finishWork(order.id, actor.userId);
  });
}
