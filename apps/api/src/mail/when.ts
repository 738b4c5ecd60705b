import { formatDay, formatTime, formatWindow } from '#shared/dates/format.ts';
import { localAt, type LocalDate } from '#shared/dates/local-time.ts';
import type { House } from './house.ts';
import type { MailOrder, MailPickup } from './mail-data.ts';

/** An instant as the studio's clock shows it: "Monday 4 May, 10:30 (EDT)". */
export function momentText(instant: Date, { studio }: House): string {
  const { date, minute } = localAt(instant, studio.zone);
  const day = formatDay(date, { locale: studio.locale });
  return `${day}, ${formatTime(minute)} (${zoneName(instant, studio)})`;
}

function zoneName(instant: Date, { zone, locale }: House['studio']): string {
  const options = { timeZone: zone, timeZoneName: 'short' } as const;
  const parts = new Intl.DateTimeFormat(locale, options).formatToParts(instant);
  return parts.find(({ type }) => type === 'timeZoneName')?.value ?? zone;
}

/** "Saturday 6 June 2026". */
export function dayText(date: LocalDate, { studio }: House): string {
  return formatDay(date, { locale: studio.locale, year: true });
}

/** "Saturday 6 June 2026, 10:00 to 11:00". */
export function pickupText(pickup: MailPickup, house: House): string {
  return `${dayText(pickup.date, house)}, ${formatWindow(pickup.start, pickup.minutes)}`;
}

/** The order's day among other words: "Saturday 6 June", or "a day still to be found". */
export function orderDay({ pickup }: MailOrder, { studio }: House): string {
  if (pickup === null) return 'a day still to be found';
  return formatDay(pickup.date, { locale: studio.locale });
}
