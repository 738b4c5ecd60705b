import { addDays, type LocalDate } from '#shared/dates/local-time.ts';

/** What is wanted of one part of the unit, by day; whole numbers of any small measure. */
export type DayDemand = { readonly date: LocalDate; readonly amount: number };

/** One part of what a unit gives when it is opened: an egg's white, a carton's contents. */
export type CoverPart = {
  readonly demands: readonly DayDemand[];
  /** How much of this part one unit gives, more than nothing. */
  readonly perUnit: number;
  /** Days it is still good after the day it was opened; 0 is that day only. */
  readonly keepsDays: number;
};

/**
 * The fewest units to open, and on which days, so that every part covers its demands with what was
 * opened on the day or at most `keepsDays` before it.
 *
 * For each stretch of demand days of each part, what is opened from `keepsDays` before its first
 * to its last must give what the stretch takes (Hall's condition). Each condition speaks of one
 * run of days, so opening what is missing as late as possible, earliest end first, is the fewest;
 * a test tries every way on small cases.
 */
export function coverDays(parts: readonly CoverPart[]): Map<LocalDate, number> {
  const demanded = parts.map((part) => ({ ...part, days: sumByDay(part.demands) }));
  const dates = [...new Set(demanded.flatMap((it) => it.days.map(({ date }) => date)))].toSorted();
  const opened = new Map<LocalDate, number>();
  for (const last of dates) {
    let missing = 0;
    for (const { days, perUnit, keepsDays } of demanded) {
      if (!days.some(({ date }) => date === last)) continue;
      let wanted = 0;
      for (const { date, amount } of days.toReversed()) {
        if (date > last) continue;
        wanted += amount;
        const from = addDays(date, -keepsDays);
        missing = Math.max(missing, Math.ceil(wanted / perUnit) - openedIn(opened, from, last));
      }
    }
    if (missing > 0) opened.set(last, missing);
  }
  return opened;
}

function openedIn(opened: ReadonlyMap<LocalDate, number>, from: LocalDate, to: LocalDate): number {
  let sum = 0;
  for (const [date, count] of opened) if (date >= from && date <= to) sum += count;
  return sum;
}

/** Days with something wanted, in order. */
function sumByDay(demands: readonly DayDemand[]): DayDemand[] {
  const sums = new Map<LocalDate, number>();
  for (const { date, amount } of demands) {
    if (amount > 0) sums.set(date, (sums.get(date) ?? 0) + amount);
  }
  return [...sums]
    .map(([date, amount]) => ({ date, amount }))
    .toSorted((a, b) => (a.date < b.date ? -1 : 1));
}
