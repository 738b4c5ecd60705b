import { isLive } from '#shared/orders/transitions.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';
import { noteOrderEvent } from './note-order-event.command.ts';
import { touchOrder } from './touch-order.command.ts';

/**
 * The customer has read why the owner takes the order against a stop, and accepts it; until then
 * it is not confirmed. Accepting twice is accepting once.
 * @throws `not-found` for a stop of another order, `wrong-state` once the order has ended
 */
export async function acceptLiftedStop(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly actor: Actor;
    readonly rowVersion: number;
    readonly liftedStopId: string;
  },
): Promise<void> {
  const { order, actor, rowVersion, liftedStopId } = input;
  await inTransaction(async () => {
    const lifted = await LiftedStop.findOne({
      where: { id: liftedStopId, orderId: order.id, revisionId: order.currentRevisionId ?? '' },
    });
    if (lifted === null) throw notFound('That is not open any more.');
    if (lifted.acceptedAt !== null) return;
    if (!isLive(order.status)) throw new AppError('wrong-state');
    await touchOrder(order, rowVersion);
    await lifted.update({ acceptedAt: clock.now() });
    await noteOrderEvent({
      orderId: order.id,
      kind: 'lifted-stop-accepted',
      actor,
      data: { liftedStopId },
    });
  });
}
