import { Op } from 'sequelize';
import type { DatesResponse } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { planWindow } from '#shared/dates/answer-dates.ts';
import { formatDuration, formatList, formatWeekday } from '#shared/dates/format.ts';
import { addDays, localAtUtcMinute } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { PlannedOrder } from '#shared/dates/model.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Assignment } from '#api/db/models/assignment.ts';
import { Hold } from '#api/db/models/hold.ts';
import { Task } from '#api/db/models/task.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { answersOf } from './answers-of.ts';
import { demandOf } from './demand-of.ts';
import { bookLimits, currentBook } from './kept-book.ts';
import type { KeptBook } from './kept-book.ts';
import { logFaults } from './log-faults.ts';
import { loadPlanSettings } from './plan-settings.ts';

/** A pickup as people choose it. */
export type PickupChoice = { readonly date: LocalDate; readonly windowStart: number };

/** How far past a range the next open day is looked for, in steps of so many days. */
const lookAheadDays = 60;

/** What `POST /api/dates` answers. Never names another order. */
export async function answerDatesFor(
  design: Design,
  from: LocalDate,
  to: LocalDate,
): Promise<DatesResponse> {
  const [{ menu }, { openUntil }] = await Promise.all([preparedMenu(), bookLimits()]);
  const after = to < openUntil ? addDays(to, 1) : null;
  const last = after === null ? openUntil : earlier(addDays(after, lookAheadDays), openUntil);
  const book = await currentBook(last);
  const { demand, likely } = demandOf(design, menu, book.settings);
  const { days } = answersOf(book, demand, from, to);
  const inside = firstOpenOf(days);
  if (inside !== null || after === null) return { likely, days, firstOpen: inside };
  return { likely, days, firstOpen: firstOpenOf(answersOf(book, demand, after, last).days) };
}

function earlier(a: LocalDate, b: LocalDate): LocalDate {
  return a < b ? a : b;
}

function firstOpenOf(days: DatesResponse['days']): LocalDate | null {
  return days.find((it) => it.answer === 'open' || it.answer === 'last-place')?.date ?? null;
}

/**
 * Whether an order has a place in the plan or would find one, in a sentence for the staff:
 * "Fits: 6 h 20 on Thursday and Friday."
 */
export async function fitOf(order: {
  readonly orderId: string;
  readonly design: Design;
  readonly pickup: PickupChoice;
}): Promise<{ readonly fits: boolean; readonly sentence: string }> {
  const { date, windowStart } = order.pickup;
  const book = await currentBook(date);
  const { open, settings } = book;
  const standing = open.book.standingOf(order.orderId);
  if (standing !== null)
    return { fits: true, sentence: sentenceOf(standing, book, 'Has its place') };
  const { menu } = await preparedMenu();
  const { demand } = demandOf(order.design, menu, settings);
  const plan = planWindow(
    open,
    { ...demand, noticeDays: 0 },
    { date, startMinute: windowStart },
    order.orderId,
  );
  logFaults(plan.faults);
  if (plan.order !== null) return { fits: true, sentence: sentenceOf(plan.order, book, 'Fits') };
  return {
    fits: false,
    sentence: plan.reason?.sentence ?? 'The plan finds no room for it by itself.',
  };
}

function sentenceOf(order: PlannedOrder, { open }: KeptBook, lead: string): string {
  const minutes = order.demand.work.reduce((sum, it) => sum + it.benchMinutes, 0);
  const { zone } = open.supply;
  const dates = new Set(order.places.map((it) => localAtUtcMinute(it.startAt, zone).date));
  const days = [...dates].toSorted().map((it) => formatWeekday(it));
  return `${lead}: ${formatDuration(minutes)} on ${formatList([...new Set(days)])}.`;
}

/** Whether an order has work in the plan. */
export async function hasPlace(orderId: string): Promise<boolean> {
  const placed = await Assignment.findOne({
    include: [{ model: Task, as: 'task', required: true, where: { orderId } }],
  });
  return placed !== null;
}

/** The holds that still run, by order. */
export async function activeHoldsOf(
  orderIds: readonly string[],
): Promise<Map<string, { readonly expiresAt: Date; readonly needsLink: boolean }>> {
  const holds = await Hold.findAll({
    where: {
      orderId: { [Op.in]: [...orderIds] },
      releasedAt: null,
      expiresAt: { [Op.gt]: currentClock().now() },
    },
  });
  return new Map(
    holds.map((it) => [
      it.orderId,
      { expiresAt: it.expiresAt, needsLink: it.kind === 'guest-link' },
    ]),
  );
}

/** For `order_revisions.work_time_version_id`. */
export async function currentWorkTimeVersionId(): Promise<string> {
  return (await loadPlanSettings()).workTimeVersionId;
}
