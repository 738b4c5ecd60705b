import { answerDates, openBook, planWindow } from '#shared/dates/answer-dates.ts';
import type { WindowPlan } from '#shared/dates/answer-dates.ts';
import { checkAddition } from '#shared/dates/check-plan.ts';
import type { DateReason } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { fromUtcMinute } from '#shared/dates/local-time.ts';
import type { PlannedOrder, Window } from '#shared/dates/model.ts';
import type { WorkTimes } from '#shared/dates/work-times.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { readPlanVersions, takeNextPlanVersion } from '#api/db/plan-versions.ts';
import { inTransaction, isInTransaction } from '#api/db/transaction.ts';
import { freshMenu } from '#api/modules/menu/menu.queries.ts';
import { AppError } from '#api/platform/app-error.ts';
import { bookForStaff, demandForStaff, withoutOrder } from './as-staff.ts';
import { demandOf } from './demand-of.ts';
import { currentBook } from './kept-book.ts';
import type { KeptBook } from './kept-book.ts';
import { nearestOpenDays } from './nearest-open-days.queries.ts';
import { logFaults } from './log-faults.ts';
import type { PickupChoice } from './plan.queries.ts';

/** The pickup an order gets, with or without a plan behind it. */
export type PlacedPickup = {
  readonly date: string;
  readonly startMinute: number;
  readonly minutes: number;
  readonly startAt: Date;
};

export type Wish = {
  readonly orderId: string;
  readonly design: Design;
  readonly pickup: PickupChoice;
  /** Customers' limits do not bind the staff. */
  readonly asStaff: boolean;
  /** Times the order was planned with before, where they are not the studio's present ones. */
  readonly workTimes?: WorkTimes;
  /** Work that has begun stays where it is; only its pickup moves. */
  readonly begun: boolean;
};

export type FoundPlan = {
  readonly answer: 'open' | 'last-place' | 'ask-us';
  readonly window: PlacedPickup;
  /** Null with `ask-us`, and where begun work simply stays. */
  readonly planned: PlannedOrder | null;
  readonly planVersion: number;
};

/** One at a time in this process, in the order they came: planning side by side only collides. */
let lastPlanner: Promise<unknown> = Promise.resolve();

/** How often a plan is made again because the book changed while it was made. */
const attempts = 5;

/**
 * Plans an order outside any transaction at plan version v, then writes in one that requires v.
 * On a mismatch it plans again, up to five times; after that the order is written without a
 * plan, since nobody said that its day is gone.
 * @throws `date-gone` only when the day is closed at the version that is current
 */
export function planAndWrite<T>(wish: Wish, write: (plan: FoundPlan) => Promise<T>): Promise<T> {
  if (isInTransaction()) throw new Error('Planning does not belong inside a transaction.');
  const turn = lastPlanner.then(() => tryToWrite(wish, write));
  lastPlanner = turn.catch(() => undefined);
  return turn;
}

async function tryToWrite<T>(wish: Wish, write: (plan: FoundPlan) => Promise<T>): Promise<T> {
  let window: Window | null = null;
  for (let attempt = 0; attempt < attempts; attempt += 1) {
    const book = await currentBook(wish.pickup.date);
    const plan = await planAt(book, wish);
    logFaults(plan.faults);
    window = plan.window ?? window;
    if (plan.answer === 'closed' || plan.window === null) {
      if (await hasMoved(book)) continue;
      throw await dateGone(wish, plan.reason);
    }
    const found = foundPlan(plan, plan.window, book);
    const { planVersion } = book.versions;
    // Without a plan nothing hangs on the version.
    if (found.planned === null) return inTransaction(() => write(found));
    try {
      return await inTransaction(async () => {
        if (!(await takeNextPlanVersion(planVersion))) throw new PlanHasMoved();
        return write(found);
      });
    } catch (error) {
      if (!(error instanceof PlanHasMoved)) throw error;
    }
  }
  if (window === null) throw await dateGone(wish, null);
  const { planVersion } = await readPlanVersions();
  const unplanned = {
    answer: 'ask-us' as const,
    window: placedPickup(window),
    planned: null,
    planVersion,
  };
  currentDatabase().logger.warn(
    { orderId: wish.orderId },
    'the plan moved on too often; kept without a place',
  );
  return inTransaction(() => write(unplanned));
}

class PlanHasMoved extends Error {
  override name = 'PlanHasMoved';
}

async function hasMoved(book: KeptBook): Promise<boolean> {
  const { planVersion } = await readPlanVersions();
  return planVersion !== book.versions.planVersion;
}

type Answered = Omit<WindowPlan, 'answer'> & { readonly answer: FoundPlan['answer'] | 'closed' };

async function planAt(book: KeptBook, wish: Wish): Promise<Answered> {
  const { open, settings } = book;
  const times = { ...settings, workTimes: wish.workTimes ?? settings.workTimes };
  const { demand: full } = demandOf(wish.design, await freshMenu(), times);
  const demand = wish.asStaff ? demandForStaff(full) : full;
  const choice = { date: wish.pickup.date, startMinute: wish.pickup.windowStart };
  const had = open.standing.orders.find((it) => it.orderId === wish.orderId);
  const own = wish.asStaff
    ? bookForStaff(open, wish.orderId)
    : had === undefined
      ? open
      : openBook(open.supply, withoutOrder(open, wish.orderId));
  if (wish.begun) {
    const window =
      own.supply.windows.get(choice.date)?.find((it) => it.startMinute === choice.startMinute) ??
      null;
    if (window === null) return { answer: 'closed', reason: null, window, order: null, faults: [] };
    const moved = had === undefined ? null : { ...had, pickup: window, coldUntil: window.date };
    // Its own times were right when it was planned; only what the new pickup changes can be wrong.
    const broken =
      moved === null
        ? []
        : checkAddition(own.standing, moved).filter((it) => aboutPickup.has(it.rule));
    return {
      answer: broken.length === 0 ? 'open' : 'closed',
      reason: null,
      window,
      order: null,
      faults: [],
    };
  }
  const plan = planWindow(own, demand, choice, wish.orderId);
  if (plan.order === null || wish.asStaff) return plan;
  const day = answerDates(own, demand, choice.date, choice.date).days[0];
  return { ...plan, answer: day?.answer === 'last-place' ? 'last-place' : 'open' };
}

const aboutPickup: ReadonlySet<string> = new Set([
  'after-pickup',
  'too-early',
  'window',
  'cap',
  'cold',
]);

function foundPlan(plan: Answered, window: Window, book: KeptBook): FoundPlan {
  return {
    answer: plan.answer === 'closed' ? 'ask-us' : plan.answer,
    window: placedPickup(window),
    planned: plan.order,
    planVersion: book.versions.planVersion + 1,
  };
}

function placedPickup(window: Window): PlacedPickup {
  const { date, startMinute, minutes } = window;
  return { date, startMinute, minutes, startAt: fromUtcMinute(window.startAt) };
}

/** Says why, and shows the nearest open days. */
export async function dateGone(wish: Wish, reason: DateReason | null): Promise<AppError> {
  const nearest = await nearestOpenDays(wish.design, wish.pickup.date, 4);
  return new AppError('date-gone', {
    detail: reason?.sentence ?? 'There is no pickup at that time any more.',
    issues: [{ path: ['day', 'date'], message: reason?.sentence ?? 'Please choose another time.' }],
    facts: { nearest, reason },
  });
}
