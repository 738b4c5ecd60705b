import type { DatesResponse } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { answerDates } from '#shared/dates/answer-dates.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { bookForStaff, demandForStaff } from './as-staff.ts';
import { demandOf } from './demand-of.ts';
import { currentBook } from './kept-book.ts';
import { logFaults } from './log-faults.ts';
import { loadWorkTimes } from './plan-settings.ts';

export type OrderToMove = {
  readonly orderId: string;
  readonly design: Design;
  /** The times it was planned with. */
  readonly workTimeVersionId: string;
};

/**
 * The days an order that exists could move to, as the staff may move it: its own work set aside,
 * without the notice and the limits that bind customers.
 */
export async function answerDatesToMove(
  order: OrderToMove,
  from: LocalDate,
  to: LocalDate,
): Promise<DatesResponse> {
  const [{ menu }, book, workTimes] = await Promise.all([
    preparedMenu(),
    currentBook(to),
    loadWorkTimes(order.workTimeVersionId),
  ]);
  const { demand, likely } = demandOf(order.design, menu, { ...book.settings, workTimes });
  const own = bookForStaff(book.open, order.orderId);
  const { days, faults } = answerDates(own, demandForStaff(demand), from, to);
  logFaults(faults);
  const first = days.find((it) => it.answer === 'open' || it.answer === 'last-place');
  return { likely, days, firstOpen: first?.date ?? null };
}
