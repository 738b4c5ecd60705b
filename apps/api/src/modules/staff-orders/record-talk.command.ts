import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { StopTalk } from '#api/db/models/stop-talk.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { touchOrder } from '#api/modules/orders/touch-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, notFound } from '#api/platform/app-error.ts';
import { blockersOf, isAboutAllergy } from './blockers.queries.ts';

/**
 * Records a talk about a stop that no declared allergy stands behind: heat, raw egg, honey. The
 * stop stays until the owner lifts it.
 * @throws `not-found` when no such stop is open, `wrong-state` where the talk is kept elsewhere or
 * was recorded already
 */
export async function recordTalk(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly revision: OrderRevision;
    readonly actor: Staff;
    readonly rowVersion: number;
    readonly about: string;
    readonly text: string;
  },
): Promise<void> {
  const { order, revision, actor, rowVersion, about, text } = input;
  await inTransaction(async () => {
    const stop = (await blockersOf(revision)).find((it) => it.about === about);
    if (stop === undefined) throw notFound('That is not open any more.');
    if (isAboutAllergy(stop) || stop.waitsFor === 'answer') {
      throw new AppError('wrong-state', {
        detail: 'Record this talk with the allergy it is about.',
      });
    }
    if (stop.waitsFor !== 'talk') {
      throw new AppError('wrong-state', { detail: 'There is no talk to record about this.' });
    }
    const { code } = stop;
    await StopTalk.create({
      orderId: order.id,
      revisionId: revision.id,
      code,
      about,
      text,
      byUserId: actor.userId,
      at: clock.now(),
    });
    await touchOrder(order, rowVersion);
    await noteOrderEvent({ orderId: order.id, kind: 'stop-talked', actor, data: { code } });
  });
}
