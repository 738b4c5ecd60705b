import type { Blocker } from '#shared/contracts/staff.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { touchOrder } from '#api/modules/orders/touch-order.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';
import { blockersOf } from './blockers.queries.ts';

/** Why a stop is not for a reason yet, or at all, by what it waits for. */
const refusals: Readonly<Record<Exclude<Blocker['waitsFor'], 'reason'>, string>> = {
  talk: 'Talk with the customer first and record the talk; then you may take it, with your reason.',
  answer: 'This was told in words: answer it and record the talk. That settles it.',
  customer: 'You have taken it already; the customer has still to read and accept your reason.',
  nothing:
    'The studio’s own table refuses this. Decline the order, have the cake changed, or change the table first.',
};

/**
 * The owner takes an order against a `stop`, after a talk that was recorded. The written reason
 * stays with the order beside the stop; the customer is asked by e-mail to read and accept it on
 * the order's page, and nothing is confirmed before.
 * @throws `not-found` when no such stop is open, `not-allowed` for one that nobody may lift,
 * `wrong-state` before the talk
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
    const stop = (await blockersOf(revision)).find((it) => it.about === about);
    if (stop === undefined) throw notFound('That is not open any more.');
    if (stop.waitsFor !== 'reason') {
      const code = stop.waitsFor === 'nothing' ? 'not-allowed' : 'wrong-state';
      throw new AppError(code, { detail: refusals[stop.waitsFor] });
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
