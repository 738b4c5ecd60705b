import { changeOne } from '#api/db/change-one.ts';
import { Hold } from '#api/db/models/hold.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import {
  canMove,
  changedMeanwhile,
  changeOrderStatus,
  wrongState,
} from '#api/modules/orders/change-order-status.command.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { answerTime } from '#api/modules/plan/keep-place.command.ts';
import { activeHoldsOf } from '#api/modules/plan/plan.queries.ts';
import { replanOrder } from '#api/modules/plan/replan-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { cakeItemOf } from './planned-order.ts';
import type { PickupChoice } from './planned-order.ts';

/**
 * Gives an order another pickup that the plan has room for, and has the customer told. It changes
 * when, not what: the revision that was agreed stands, with the note beside it.
 * @throws `date-gone` with the nearest open days
 */
export async function moveOrder(input: {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly actor: Staff;
  readonly rowVersion: number;
  readonly pickup: PickupChoice;
  readonly note: string;
}): Promise<void> {
  const { order, revision, actor, rowVersion, pickup, note } = input;
  if (order.rowVersion !== rowVersion) throw changedMeanwhile(order);
  if (!canMove(order, 'move', actor)) throw wrongState(order);
  await replanOrder(
    {
      orderId: order.id,
      revisionId: revision.id,
      itemId: cakeItemOf(revision),
      design: designOf(revision),
      pickup,
      mustFit: true,
    },
    async ({ window }) => {
      await changeOrderStatus({
        order,
        rowVersion,
        action: 'move',
        actor,
        values: {
          pickupDate: window.date,
          windowStartMinute: window.startMinute,
          windowMinutes: window.minutes,
          pickupAt: window.startAt,
          dateAnswer: 'open',
        },
        data: {
          fromDate: order.pickupDate,
          fromStart: order.windowStartMinute,
          fromMinutes: order.windowMinutes,
        },
      });
      await changeOne(
        OrderRevision,
        { changeNote: note === '' ? null : note },
        { id: revision.id },
      );
      await keepWhileWaiting(order);
    },
  );
}

/** A request that had no place has one now, for as long as the studio's answer takes. */
async function keepWhileWaiting(order: Order): Promise<void> {
  const waiting =
    order.status === 'asked' || order.status === 'quoted' || order.status === 'agreed';
  if (!waiting || (await activeHoldsOf([order.id])).size > 0) return;
  await Hold.create({ orderId: order.id, kind: 'answer', expiresAt: await answerTime() });
}
