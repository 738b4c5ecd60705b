import { Op } from 'sequelize';
import type { Design } from '#shared/contracts/design.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Hold } from '#api/db/models/hold.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { Order } from '#api/db/models/order.ts';
import { Studio } from '#api/db/models/studio.ts';
import { AppError } from '#api/platform/app-error.ts';
import { answerTime } from './keep-place.command.ts';
import type { PickupChoice } from './plan.queries.ts';
import { planAndWrite } from './plan-order.ts';
import type { PlacedPickup } from './plan-order.ts';
import { storeWork } from './store-work.ts';

export type HoldWish = {
  /** Made beforehand; the writer creates the order under it. */
  readonly orderId: string;
  readonly design: Design;
  readonly pickup: PickupChoice;
  /** A guest has to open the link first; a known address waits for the studio only. */
  readonly holder: 'guest' | 'known';
  readonly email: string;
  /** Of the network address it was sent from. */
  readonly sentFromHash: string | null;
};

export type HoldOutcome = {
  readonly answer: 'open' | 'last-place' | 'ask-us';
  readonly window: PlacedPickup;
  /** Null where nothing could be promised. */
  readonly hold: { readonly expiresAt: Date; readonly needsLink: boolean } | null;
};

/** What the writer answers: the rows the work points at, and whatever its caller wants to know. */
export type WrittenOrder<T> = {
  readonly revisionId: string;
  readonly itemId: string | null;
  readonly value: T;
};

/**
 * Finds a place for a new order and keeps it: the writer writes the order inside the transaction
 * that stores the plan and the hold. Where the planner finds no place but the day is not closed,
 * the order is written without one ("ask us"). Call it outside a transaction.
 * @throws `date-gone` with the nearest open days, `too-many-holds`
 */
export function placeHold<T>(
  wish: HoldWish,
  write: (outcome: HoldOutcome) => Promise<WrittenOrder<T>>,
): Promise<{ readonly outcome: HoldOutcome; readonly value: T }> {
  const { orderId, design, pickup, holder } = wish;
  return planAndWrite({ orderId, design, pickup, asStaff: false, begun: false }, async (plan) => {
    await limitHolds(wish);
    const hold =
      plan.planned === null
        ? null
        : {
            expiresAt: holder === 'guest' ? await guestTime() : await answerTime(),
            needsLink: holder === 'guest',
          };
    const outcome = { answer: plan.answer, window: plan.window, hold };
    const { revisionId, itemId, value } = await write(outcome);
    if (plan.planned !== null && hold !== null) {
      await storeWork({ orderId, revisionId, itemId }, plan.planned, plan.planVersion);
      await Hold.create({
        orderId,
        kind: hold.needsLink ? 'guest-link' : 'answer',
        expiresAt: hold.expiresAt,
      });
    }
    return { outcome, value };
  });
}

async function guestTime(): Promise<Date> {
  const { guestHoldMinutes } = await Studio.findByPk(1, { rejectOnEmpty: true });
  return new Date(currentClock().now().getTime() + guestHoldMinutes * 60_000);
}

/** One address keeps so many unanswered requests with a place, one network address some more. */
async function limitHolds({ email, sentFromHash }: HoldWish): Promise<void> {
  const { holdsPerEmail, holdsPerAddress } = await Studio.findByPk(1, { rejectOnEmpty: true });
  const running = {
    kind: ['guest-link', 'answer'],
    releasedAt: null,
    expiresAt: { [Op.gt]: currentClock().now() },
  };
  const ofEmail = await OrderContact.findAll({
    attributes: ['orderId'],
    where: { email: email.trim().toLowerCase(), role: 'ordered' },
  });
  const byEmail = await Hold.count({
    where: { ...running, orderId: ofEmail.map((it) => it.orderId) },
  });
  const byAddress =
    sentFromHash === null
      ? 0
      : await Hold.count({
          where: running,
          include: [{ model: Order, as: 'order', required: true, where: { sentFromHash } }],
        });
  if (byEmail < holdsPerEmail && byAddress < holdsPerAddress) return;
  throw new AppError('too-many-holds', {
    detail:
      'We already keep several days for you. We answer them soon; or withdraw one you no longer need.',
  });
}
