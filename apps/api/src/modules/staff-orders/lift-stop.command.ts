import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { Message } from '#api/db/models/message.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';
import { touchOrder } from './answer-allergy.command.ts';
import { blockersOf } from './blockers.queries.ts';

/**
 * The owner takes an order against a `stop`, after talking. The written reason stays with the
 * order, and the customer reads it on the order's page and by e-mail.
 * @throws `not-found` when no such stop is open, `not-allowed` for one that nobody may lift
 */
export async function liftStop(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly revision: OrderRevision;
    readonly actor: Staff;
    readonly rowVersion: number;
    readonly about: string;
    readonly reason: string;
  },
): Promise<void> {
  const { order, revision, actor, rowVersion, about, reason } = input;
  await inTransaction(async () => {
    const stop = (await blockersOf(revision)).find((advice) => advice.about === about);
    if (stop === undefined) throw notFound('That is not open any more.');
    if (!stop.talk) {
      throw new AppError('not-allowed', {
        detail: 'The studio’s own rules refuse this. Decline the order, or change the cake.',
      });
    }
    const lifted = await LiftedStop.create({
      orderId: order.id,
      revisionId: revision.id,
      code: stop.code,
      about: stop.about,
      reason,
      liftedByUserId: actor.userId,
      liftedAt: clock.now(),
    });
    await touchOrder(order, rowVersion);
    await Message.create({
      orderId: order.id,
      sender: 'studio',
      authorUserId: actor.userId,
      authorName: actor.name,
      body: `${stop.sentence}\n\n${reason}`,
    });
    await noteOrderEvent({
      orderId: order.id,
      kind: 'stop-lifted',
      actor,
      data: { liftedStopId: lifted.id, code: stop.code },
    });
    await enqueue(
      'stop-lifted',
      { orderId: order.id, liftedStopId: lifted.id },
      { uniqueKey: `stop-lifted:${lifted.id}`, orderId: order.id },
    );
  });
}
