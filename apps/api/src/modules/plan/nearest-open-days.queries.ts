import type { Design } from '#shared/contracts/design.ts';
import { addDays, daysBetween } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { answersOf } from './answers-of.ts';
import { demandOf } from './demand-of.ts';
import { bookLimits, currentBook } from './kept-book.ts';

/** How far to either side other days are looked for, in days: near first, then further. */
const reaches = [21, 60];

/** The nearest open days to a day, on both sides of it, in order of date. */
export async function nearestOpenDays(
  design: Design,
  around: LocalDate,
  count: number,
): Promise<LocalDate[]> {
  const [{ menu }, { today, openUntil }] = await Promise.all([preparedMenu(), bookLimits()]);
  const middle = around < today ? today : around > openUntil ? openUntil : around;
  const distance = (date: LocalDate) => Math.abs(daysBetween(middle, date));
  let open: LocalDate[] = [];
  for (const reach of reaches) {
    const earliest = addDays(middle, -reach);
    const latest = addDays(middle, reach);
    const from = earliest < today ? today : earliest;
    const to = latest > openUntil ? openUntil : latest;
    const book = await currentBook(to);
    const { demand } = demandOf(design, menu, book.settings);
    open = answersOf(book, demand, from, to)
      .days.filter((it) => it.answer === 'open' || it.answer === 'last-place')
      .map((it) => it.date)
      .filter((date) => date !== around);
    if (open.length >= count) break;
  }
  return open
    .toSorted((a, b) => distance(a) - distance(b) || (a < b ? -1 : 1))
    .slice(0, count)
    .toSorted();
}
