import { Op } from 'sequelize';
import { changeOne } from '#api/db/change-one.ts';
import { currentClock } from '#api/db/current-database.ts';
import { BatchShare } from '#api/db/models/batch-share.ts';
import { Batch } from '#api/db/models/batch.ts';
import { Hold } from '#api/db/models/hold.ts';
import type { HoldKind, HoldReleased } from '#api/db/models/hold.ts';
import { Studio } from '#api/db/models/studio.ts';
import { Task } from '#api/db/models/task.ts';
import { takeNextPlanVersion } from '#api/db/plan-versions.ts';
import { removeWork } from './store-work.ts';

/** Commands on a place an order has; each joins the transaction of its cause. */

/** Releases the running hold, if there is one. */
export async function releaseHold(orderId: string, reason: HoldReleased): Promise<boolean> {
  return changeOne(
    Hold,
    { releasedAt: currentClock().now(), releasedReason: reason },
    { orderId, releasedAt: null },
  );
}

/** The order has ended before its cake was made: its work, times and hold go. */
export async function releasePlace(
  orderId: string,
  reason: 'ended' | 'ran-out' = 'ended',
): Promise<void> {
  await releaseHold(orderId, reason);
  await removeWork(orderId);
  await takeNextPlanVersion();
}

/** The order is confirmed: its work stays in the plan and no longer runs out. */
export async function keepPlace(orderId: string): Promise<void> {
  await releaseHold(orderId, 'confirmed');
}

/**
 * Lets the running hold last until another instant, for another reason.
 * @returns false when no hold of the order runs any more
 */
export async function extendHold(hold: {
  readonly orderId: string;
  readonly kind: HoldKind;
  readonly expiresAt: Date;
}): Promise<boolean> {
  return changeOne(
    Hold,
    { kind: hold.kind, expiresAt: hold.expiresAt },
    {
      orderId: hold.orderId,
      releasedAt: null,
      expiresAt: { [Op.gt]: currentClock().now() },
    },
  );
}

/** The guest has opened the link of the first e-mail: the hold lasts the studio's answer time. */
export async function lengthenGuestHold(orderId: string): Promise<boolean> {
  const running = await Hold.findOne({ where: { orderId, releasedAt: null, kind: 'guest-link' } });
  if (running === null) return false;
  return extendHold({ orderId, kind: 'answer', expiresAt: await answerTime() });
}

/** Until when the studio has to answer what is asked now. */
export async function answerTime(): Promise<Date> {
  const { answerHours } = await Studio.findByPk(1, { rejectOnEmpty: true });
  return new Date(currentClock().now().getTime() + answerHours * 3_600_000);
}

/** The cake is done: all of the order's work is noted as finished. */
export async function finishWork(orderId: string, userId: string | null): Promise<void> {
  const done = {
    state: 'finished' as const,
    finishedAt: currentClock().now(),
    finishedByUserId: userId,
  };
  const open = ['planned', 'started', 'late'];
  await Task.update(done, { where: { orderId, state: open } });
  const shares = await BatchShare.findAll({ where: { orderId } });
  await Batch.update(done, { where: { id: shares.map((it) => it.batchId), state: open } });
  await takeNextPlanVersion();
}
