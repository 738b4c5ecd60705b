import type { Design } from '#shared/contracts/design.ts';
import { addDays } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { answersOf } from './answers-of.ts';
import { demandOf } from './demand-of.ts';
import { currentBook } from './kept-book.ts';

/** How far to either side other days are looked for. */
const lookAroundDays = 60;

/** The nearest open days to a day, on both sides of it, nearest first. */
export async function nearestOpenDays(
  design: Design,
  around: LocalDate,
  count: number,
): Promise<LocalDate[]> {
  const { menu } = await preparedMenu();
  const book = await currentBook(addDays(around, lookAroundDays));
  const { today } = book.open.supply;
  const { demand } = demandOf(design, menu, book.settings);
  const earliest = addDays(around, -lookAroundDays);
  const from = earliest < today ? today : earliest;
  const { days } = answersOf(book, demand, from, addDays(around, lookAroundDays));
  const distance = (date: LocalDate) => Math.abs(Date.parse(date) - Date.parse(around));
  return days
    .filter((it) => (it.answer === 'open' || it.answer === 'last-place') && it.date !== around)
    .map((it) => it.date)
    .toSorted((a, b) => distance(a) - distance(b) || (a < b ? -1 : 1))
    .slice(0, count)
    .toSorted();
}
