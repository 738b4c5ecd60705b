import { Op } from 'sequelize';
import { addDays, localAt } from '#shared/dates/local-time.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { Studio } from '#api/db/models/studio.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { noteOrderEvent } from './note-order-event.command.ts';

/** By then a forecast is worth asking for, and a coat can still be changed. */
const daysBefore = 3;

/** Nobody is written to at night: from nine to six by the studio's clock. */
const fromMinute = 9 * 60;
const untilMinute = 18 * 60;

/**
 * Asks those who did not know how warm it will be once more, three days before they collect, or as
 * soon as may be after a later confirmation; a pickup that moves is asked about anew. Safe to run
 * twice and beside another.
 * @returns how many were asked
 */
export async function askForWarmth(now: Date): Promise<number> {
  const { zone } = await Studio.findByPk(1, { rejectOnEmpty: true });
  const { date: today, minute } = localAt(now, zone);
  if (minute < fromMinute || minute >= untilMinute) return 0;
  const orders = await Order.findAll({
    where: {
      status: ['confirmed', 'making'],
      pickupDate: { [Op.gt]: today, [Op.lte]: addDays(today, daysBefore) },
    },
  });
  let asked = 0;
  for (const order of orders) {
    const revision = await OrderRevision.findByPk(order.currentRevisionId ?? '');
    if (revision === null || revision.settingWarmestC !== null) continue;
    const uniqueKey = `warmth-to-ask:${order.id}:${order.pickupDate ?? ''}`;
    const isNew = await inTransaction(async () => {
      const added = await enqueue(
        'warmth-to-ask',
        { orderId: order.id },
        { uniqueKey, orderId: order.id },
      );
      if (added) await noteOrderEvent({ orderId: order.id, kind: 'warmth-asked', actor: 'system' });
      return added;
    });
    if (isNew) asked += 1;
  }
  return asked;
}
