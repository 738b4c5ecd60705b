import { Op } from 'sequelize';
import { changeOne } from '#api/db/change-one.ts';
import { Hold } from '#api/db/models/hold.ts';
import { takeNextPlanVersion } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { removeWork } from './store-work.ts';

/**
 * Gives up every hold that has run out: the place goes, the order stays as it is, and both sides
 * are told. Each in a transaction of its own; safe to run twice and beside another.
 * @returns how many ran out
 */
export async function expireHolds(now: Date): Promise<number> {
  const over = { releasedAt: null, expiresAt: { [Op.lte]: now } };
  const holds = await Hold.findAll({ where: over, order: [['expiresAt', 'ASC']] });
  let ranOut = 0;
  for (const hold of holds) {
    const mine = await inTransaction(async () => {
      // Confirmed, lengthened or given up meanwhile: not ours any more.
      const given = { releasedAt: now, releasedReason: 'ran-out' as const };
      if (!(await changeOne(Hold, given, { id: hold.id, ...over }))) return false;
      await removeWork(hold.orderId);
      await takeNextPlanVersion();
      await noteOrderEvent({ orderId: hold.orderId, kind: 'hold-ran-out', actor: 'system' });
      await enqueue(
        'hold-ran-out',
        { orderId: hold.orderId },
        { uniqueKey: `hold-ran-out:${hold.id}`, orderId: hold.orderId },
      );
      return true;
    });
    if (mine) ranOut += 1;
  }
  return ranOut;
}
