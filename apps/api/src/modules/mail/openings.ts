import { formatTime, formatWeekday } from '#shared/dates/format.ts';
import { addDays } from '#shared/dates/local-time.ts';

export type OpenWindow = {
  /** ISO 8601: Monday is 1. */
  readonly weekday: number;
  readonly startMinute: number;
  readonly minutes: number;
};

/** When cakes are handed over in an ordinary week: "Tuesday to Friday, 10:00 to 17:00". */
export function openingsOf(windows: readonly OpenWindow[], locale: string): string[] {
  const runs: { first: number; last: number; hours: string }[] = [];
  for (let weekday = 1; weekday <= 7; weekday += 1) {
    const hours = hoursOf(windows.filter((window) => window.weekday === weekday));
    const before = runs.at(-1);
    if (hours === '') continue;
    if (before?.hours === hours && before.last === weekday - 1) before.last = weekday;
    else runs.push({ first: weekday, last: weekday, hours });
  }
  return runs.map(({ first, last, hours }) => {
    const days = [first, last].map((weekday) => weekdayName(weekday, locale));
    if (first === last) return `${days.slice(0, 1).join()}, ${hours}`;
    return `${days.join(last === first + 1 ? ' and ' : ' to ')}, ${hours}`;
  });
}

/** A day's windows, those that meet taken together: "10:00 to 13:00, 14:00 to 17:00". */
function hoursOf(windows: readonly OpenWindow[]): string {
  const spans: { start: number; end: number }[] = [];
  for (const { startMinute, minutes } of windows.toSorted(
    (a, b) => a.startMinute - b.startMinute,
  )) {
    const before = spans.at(-1);
    const end = startMinute + minutes;
    if (before !== undefined && startMinute <= before.end) before.end = Math.max(before.end, end);
    else spans.push({ start: startMinute, end });
  }
  return spans.map(({ start, end }) => `${formatTime(start)} to ${formatTime(end)}`).join(', ');
}

/** A Monday, to name weekdays by. */
const someMonday = '2026-06-01';

function weekdayName(weekday: number, locale: string): string {
  return formatWeekday(addDays(someMonday, weekday - 1), 'long', locale);
}
