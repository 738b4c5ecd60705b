import type { Design } from '#shared/contracts/design.ts';
import { OrderRevision } from '#api/db/models/order-revision.ts';
import { takeNextPlanVersion } from '#api/db/plan-versions.ts';
import type { PickupChoice } from './plan.queries.ts';
import { dateGone, planAndWrite } from './plan-order.ts';
import type { FoundPlan, PlacedPickup } from './plan-order.ts';
import { loadWorkTimes } from './plan-settings.ts';
import { hasBegun, removeWork, storeWork } from './store-work.ts';

export type ReplanWish = {
  readonly orderId: string;
  readonly revisionId: string;
  readonly itemId: string | null;
  readonly design: Design;
  readonly pickup: PickupChoice;
  /** Without a plan it is refused; else the order is left without a place. */
  readonly mustFit: boolean;
};

export type ReplanOutcome = {
  readonly answer: FoundPlan['answer'];
  readonly window: PlacedPickup;
};

/**
 * Plans an order that exists: for another pickup, or for the one it has where it has no place yet.
 * The old work goes and the new comes in the transaction in which the writer writes; a hold that
 * runs goes on running. Work that has begun stays where it is. Call it outside a transaction.
 * @throws `date-gone` with the nearest open days
 */
export async function replanOrder<T>(
  wish: ReplanWish,
  write: (outcome: ReplanOutcome) => Promise<T>,
): Promise<{ readonly outcome: ReplanOutcome; readonly value: T }> {
  const { orderId, revisionId, itemId, design, pickup, mustFit } = wish;
  const begun = await hasBegun(orderId);
  const { workTimeVersionId } = await OrderRevision.findByPk(revisionId, { rejectOnEmpty: true });
  const workTimes = await loadWorkTimes(workTimeVersionId);
  const planned = { orderId, design, pickup, asStaff: true, begun, workTimes };
  return planAndWrite(planned, async (plan) => {
    const unplanned = plan.planned === null && !begun;
    if (unplanned && mustFit) throw await dateGone(planned, null);
    if (!begun) await removeWork(orderId);
    if (plan.planned === null) await takeNextPlanVersion();
    else await storeWork({ orderId, revisionId, itemId }, plan.planned, plan.planVersion);
    const outcome = { answer: plan.answer, window: plan.window };
    return { outcome, value: await write(outcome) };
  });
}
