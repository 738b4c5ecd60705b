import type { LocalDate } from './local-time.ts';

/**
 * Days, times and lengths as people read them, the same on pages, in e-mails and in refusals.
 * The words come from the locale; the order (weekday, day, month) is the house's own.
 */

type DayParts = { readonly locale?: string; readonly year?: boolean; readonly weekday?: boolean };

const formatters = new Map<string, Intl.DateTimeFormat>();

function wordsOf(date: LocalDate, locale: string, options: Intl.DateTimeFormatOptions): string {
  const key = `${locale} ${Object.keys(options).join()} ${Object.values(options).join()}`;
  let formatter = formatters.get(key);
  if (formatter === undefined) {
    formatter = new Intl.DateTimeFormat(locale, { ...options, timeZone: 'UTC' });
    formatters.set(key, formatter);
  }
  return formatter.format(new Date(`${date}T00:00:00Z`));
}

/** "Saturday 19 June", and the year where asked: "Saturday 19 June 2027". */
export function formatDay(date: LocalDate, options: DayParts = {}): string {
  const locale = options.locale ?? 'en-US';
  const parts = [
    options.weekday === false ? '' : wordsOf(date, locale, { weekday: 'long' }),
    String(Number(date.slice(8, 10))),
    wordsOf(date, locale, { month: 'long' }),
    options.year === true ? date.slice(0, 4) : '',
  ];
  return parts.filter((part) => part !== '').join(' ');
}

/** "Saturday", or "Sat" when short. */
export function formatWeekday(
  date: LocalDate,
  length: 'long' | 'short' = 'long',
  locale = 'en-US',
): string {
  return wordsOf(date, locale, { weekday: length });
}

/** "June 2027". */
export function formatMonth(date: LocalDate, locale = 'en-US'): string {
  return `${wordsOf(date, locale, { month: 'long' })} ${date.slice(0, 4)}`;
}

/** Minutes of the day on a 24-hour clock: "09:05". */
export function formatTime(minuteOfDay: number): string {
  const hours = Math.floor(minuteOfDay / 60);
  const minutes = minuteOfDay % 60;
  return `${String(hours).padStart(2, '0')}:${String(minutes).padStart(2, '0')}`;
}

/** "10:00 to 10:30". */
export function formatWindow(start: number, minutes: number): string {
  return `${formatTime(start)} to ${formatTime(Math.min(start + minutes, 24 * 60))}`;
}

/** Whole minutes as "40 min", "2 h" or "6 h 20". */
export function formatDuration(minutes: number): string {
  const hours = Math.floor(minutes / 60);
  const rest = minutes % 60;
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${hours} h` : `${hours} h ${String(rest).padStart(2, '0')}`;
}

/** Minutes as hours with one decimal, for jugs: "9.4", "12". */
export function formatHours(minutes: number): string {
  const tenths = Math.round(minutes / 6);
  return tenths % 10 === 0 ? String(tenths / 10) : (tenths / 10).toFixed(1);
}

/** "Thursday and Friday", "one, two and three". */
export function formatList(words: readonly string[]): string {
  if (words.length < 2) return words.join('');
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`;
}
