import type { Advice } from '#shared/contracts/estimates.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import type { Order } from '#api/db/models/order.ts';
import { QuoteLine } from '#api/db/models/quote-line.ts';
import { Quote } from '#api/db/models/quote.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import {
  canMove,
  changedMeanwhile,
  changeOrderStatus,
  wrongState,
} from '#api/modules/orders/change-order-status.command.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { answerTime, extendHold, keepPlace } from '#api/modules/plan/keep-place.command.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';
import { replanOrder } from '#api/modules/plan/replan-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { today } from '#shared/dates/local-time.ts';
import { balanceDueOn } from '#shared/kitchen/price.ts';
import { blockersOf, factsOf } from './blockers.queries.ts';
import { cakeItemOf, pickupChoiceOf } from './planned-order.ts';

export type ConfirmInput = {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly actor: Staff;
  readonly rowVersion: number;
  /** To the customer, with the e-mail. */
  readonly note: string;
};

/**
 * Takes an unchanged offer in one press: it becomes quote 1, already agreed, and the order is
 * confirmed, or waits for its deposit where one is due. An order without a place is planned first.
 * @throws `advice-stop` with what is open, `date-gone` when no plan has room
 */
export async function confirmOrder(deps: Pick<Deps, 'clock'>, input: ConfirmInput): Promise<void> {
  const { order, revision, rowVersion, actor } = input;
  if (order.rowVersion !== rowVersion) throw changedMeanwhile(order);
  if (!canMove(order, 'confirm', actor)) throw wrongState(order);
  const blockers = await blockersOf(revision);
  if (blockers.length > 0) throw stopped(blockers);
  const write = () => writeConfirmation(deps, input);
  if (await hasPlace(order.id)) {
    await inTransaction(write);
    return;
  }
  await replanOrder(
    {
      orderId: order.id,
      revisionId: revision.id,
      itemId: cakeItemOf(revision),
      design: designOf(revision),
      pickup: pickupChoiceOf(order, revision),
      mustFit: true,
    },
    write,
  );
}

async function writeConfirmation(
  { clock }: Pick<Deps, 'clock'>,
  { order, revision, actor, rowVersion, note }: ConfirmInput,
): Promise<void> {
  // Again inside: a hold that has just run out took its place along.
  const facts = await factsOf(order, await blockersOf(revision));
  const now = clock.now();
  const transition = await changeOrderStatus({
    order,
    rowVersion,
    action: 'confirm',
    actor,
    facts,
    values: {
      agreedRevisionId: revision.id,
      confirmedAt: facts.depositDue ? null : now,
    },
  });
  await writeAgreedQuote({ order, revision, actor, note, now });
  if (transition.to === 'confirmed') await keepPlace(order.id);
  else await extendHold({ orderId: order.id, kind: 'deposit', expiresAt: await answerTime() });
}

/** The offer, line by line, as it stood when it was sent. Lines are closed once it is agreed. */
async function writeAgreedQuote(input: {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly actor: Staff;
  readonly note: string;
  readonly now: Date;
}): Promise<void> {
  const { order, revision, actor, note, now } = input;
  const { price } = revision.estimate;
  const earlier = await Quote.max<number | null, Quote>('n', { where: { orderId: order.id } });
  const quote = await Quote.create({
    orderId: order.id,
    revisionId: revision.id,
    n: (earlier ?? 0) + 1,
    state: 'draft',
    note,
    totalMinor: price.totalMinor,
    depositMinor: order.terms.depositMinor,
    currency: price.currency,
    balanceDueOn:
      order.pickupDate === null
        ? null
        : balanceDueOn(order.pickupDate, order.terms.balanceDueDays, today(now, order.zone)),
    createdByUserId: actor.userId,
  });
  await QuoteLine.bulkCreate(
    price.lines.map(({ kind, label, quantity, amountMinor, taxCategory }, position) => ({
      quoteId: quote.id,
      position,
      kind,
      label,
      quantity,
      amountMinor,
      taxCategory,
    })),
  );
  await quote.update({ state: 'agreed', sentAt: now, agreedAt: now, agreedBy: 'studio' });
}

function stopped(blockers: readonly Advice[]): AppError {
  return new AppError('advice-stop', {
    detail: blockers.map(({ sentence }) => sentence).join(' '),
    facts: { blockers },
  });
}
