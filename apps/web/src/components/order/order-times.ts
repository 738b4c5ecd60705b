import type { Pickup } from '#shared/contracts/orders.ts';
import { formatDay, formatTime, formatWindow } from '#shared/dates/format.ts';
import { localAt } from '#shared/dates/local-time.ts';

/** "Saturday 19 June 2027, 10:00 to 10:30". */
export function pickupWords({ date, start, minutes }: Pickup, locale: string): string {
  return `${formatDay(date, { locale, year: true })}, ${formatWindow(start, minutes)}`;
}

/** An instant in the studio's own time: "Thursday 17 June, 10:05". */
export function instantWords(instant: string, zone: string, locale: string): string {
  const { date, minute } = localAt(new Date(instant), zone);
  return `${formatDay(date, { locale })}, ${formatTime(minute)}`;
}
