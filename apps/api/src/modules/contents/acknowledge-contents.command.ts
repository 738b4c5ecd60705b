import { isLive } from '#shared/orders/transitions.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import type { Order } from '#api/db/models/order.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { touchOrder } from '#api/modules/orders/touch-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError, invalidField, notFound } from '#api/platform/app-error.ts';

type Input = {
  readonly order: Order;
  readonly changeId: string;
  readonly actor: Staff;
  readonly rowVersion: number;
};

/**
 * A baker has seen what an order contains now and, where guests declared something against it,
 * writes what is done about it.
 * @throws `wrong-state` when somebody has done so already, `invalid-input` where words are needed
 */
export async function acknowledgeContents(
  { clock }: Pick<Deps, 'clock'>,
  { order, changeId, actor, rowVersion, note }: Input & { readonly note: string },
): Promise<void> {
  await inTransaction(async () => {
    const change = await find(order, changeId);
    if (change.acknowledgedAt !== null) throw done('Somebody has seen to this already.');
    if (change.clashes && note === '') {
      throw invalidField(['note'], 'Write what is done about it: it is against what guests told.');
    }
    await change.update({
      acknowledgedAt: clock.now(),
      acknowledgedByUserId: actor.userId,
      acknowledgedNote: note,
    });
    await touchOrder(order, rowVersion);
    await noteOrderEvent({
      orderId: order.id,
      kind: 'contents-acknowledged',
      actor,
      data: { contentChangeId: change.id },
    });
  });
}

/**
 * Somebody has told the customer, by other means than our e-mail.
 * @throws `wrong-state` when that was noted already
 */
export async function tellContents(
  { clock }: Pick<Deps, 'clock'>,
  { order, changeId, actor, rowVersion, how }: Input & { readonly how: string },
): Promise<void> {
  await inTransaction(async () => {
    const change = await find(order, changeId);
    if (change.toldAt !== null) throw done('It is noted already that the customer knows.');
    await change.update({ toldAt: clock.now(), toldByUserId: actor.userId, toldHow: how });
    await touchOrder(order, rowVersion);
    await noteOrderEvent({
      orderId: order.id,
      kind: 'contents-told',
      actor,
      data: { contentChangeId: change.id },
    });
  });
}

async function find(order: Order, id: string): Promise<ContentChange> {
  if (!isLive(order.status)) throw done('This order has ended: nobody need be told any more.');
  const change = await ContentChange.findOne({ where: { id, orderId: order.id, endedAt: null } });
  if (change === null)
    throw notFound('That was put right, or something newer has taken its place.');
  return change;
}

function done(detail: string): AppError {
  return new AppError('wrong-state', { detail });
}
