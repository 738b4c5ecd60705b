import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { changeOrderStatus } from '#api/modules/orders/change-order-status.command.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { releasePlace } from '#api/modules/plan/keep-place.command.ts';
import { nearestOpenDays } from '#api/modules/plan/nearest-open-days.queries.ts';
import type { Staff } from '#api/platform/actor.ts';

/** How many other days a customer is offered. */
const daysOffered = 3;

/** Says no to an order, with the reason the customer reads and, if wanted, the nearest open days. */
export async function declineOrder(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly revision: OrderRevision;
    readonly actor: Staff;
    readonly rowVersion: number;
    readonly reason: string;
    readonly offerDates: boolean;
  },
): Promise<void> {
  const { order, revision, actor, rowVersion, reason, offerDates } = input;
  const dates =
    offerDates && order.pickupDate !== null
      ? await nearestOpenDays(designOf(revision), order.pickupDate, daysOffered)
      : [];
  await inTransaction(async () => {
    await changeOrderStatus({
      order,
      rowVersion,
      action: 'decline',
      actor,
      values: { endedAt: clock.now(), endedBy: 'studio', endedReason: reason },
      data: { offerDates, otherDates: dates.join(',') },
    });
    await releasePlace(order.id, 'ended');
  });
}
