import { Handover } from '#api/db/models/handover.ts';
import type { Order } from '#api/db/models/order.ts';
import { Photo } from '#api/db/models/photo.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { refuseOpenContents } from '#api/modules/contents/refuse-open-contents.queries.ts';
import { changeOrderStatus } from '#api/modules/orders/change-order-status.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { invalidField } from '#api/platform/app-error.ts';
import { factsOf } from './blockers.queries.ts';

/** Hands a cake over: to whom, when, in what condition, and by whom. */
export async function collectOrder(
  { clock }: Pick<Deps, 'clock'>,
  input: {
    readonly order: Order;
    readonly actor: Staff;
    readonly rowVersion: number;
    readonly collectedBy: string;
    readonly condition: string;
    readonly photoId: string | null;
  },
): Promise<void> {
  const { order, actor, rowVersion, collectedBy, condition, photoId } = input;
  const now = clock.now();
  await inTransaction(async () => {
    await refuseOpenContents(order);
    if (photoId !== null) await refuseForeignPhoto(photoId, order.id);
    await changeOrderStatus({
      order,
      rowVersion,
      action: 'collect',
      actor,
      // Blockers were settled before it was confirmed; here money counts, and what has changed.
      facts: await factsOf(order, []),
      values: { endedAt: now },
    });
    await Handover.create({
      orderId: order.id,
      collectedBy,
      condition,
      photoId,
      at: now,
      byUserId: actor.userId,
    });
  });
}

async function refuseForeignPhoto(photoId: string, orderId: string): Promise<void> {
  const photo = await Photo.findOne({ where: { id: photoId, orderId, removedAt: null } });
  if (photo === null) throw invalidField(['photoId'], 'That photo is not with this order.');
}
