import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { changeOrderStatus } from '#api/modules/orders/change-order-status.command.ts';
import { refuseOpenContents } from '#api/modules/contents/refuse-open-contents.queries.ts';
import { finishWork } from '#api/modules/plan/keep-place.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { factsOf } from './blockers.queries.ts';

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
    if (action === 'ready') await refuseOpenContents(order);
    const ended = { endedAt: clock.now(), endedBy: 'time' as const };
    await changeOrderStatus({
      order,
      rowVersion,
      action,
      actor,
      // Only what may not leave the kitchen is held up by more than the order's state.
      facts: action === 'ready' ? await factsOf(order, []) : undefined,
      values: action === 'uncollected' ? ended : {},
    });
    if (action === 'ready') await finishWork(order.id, actor.userId);
  });
}
