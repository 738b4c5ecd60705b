import { formatDay, formatMonth } from '#shared/dates/format.ts';
import {
  type LocalDate,
  addDays,
  addMonths,
  isLocalDate,
  mondayOf,
} from '#shared/dates/local-time.ts';
import { type CalendarViewName, calendarViews } from '#web/config/paths.ts';

export type CalendarPlace = { readonly view: CalendarViewName; readonly date: LocalDate };

/** What an address asks for; anything unreadable is this week. */
export function readPlace(search: URLSearchParams, today: LocalDate): CalendarPlace {
  const view = calendarViews.find((it) => it === search.get('view')) ?? 'week';
  const date = search.get('date') ?? '';
  return { view, date: isLocalDate(date) ? date : today };
}

/** The days a view shows: a month comes in whole weeks. */
export function rangeOf({ view, date }: CalendarPlace): {
  readonly from: LocalDate;
  readonly to: LocalDate;
} {
  switch (view) {
    case 'day':
      return { from: date, to: date };
    case 'week':
      return { from: mondayOf(date), to: addDays(mondayOf(date), 6) };
    case 'month': {
      const first = `${date.slice(0, 7)}-01`;
      const last = addDays(addMonths(first, 1), -1);
      return { from: mondayOf(first), to: addDays(mondayOf(last), 6) };
    }
  }
}

/** The same view one step away. */
export function stepFrom({ view, date }: CalendarPlace, step: 1 | -1): LocalDate {
  switch (view) {
    case 'day':
      return addDays(date, step);
    case 'week':
      return addDays(date, 7 * step);
    case 'month':
      return addMonths(`${date.slice(0, 7)}-01`, step);
  }
}

/** "14 to 20 June", "28 June to 4 July", "June 2027", "Tuesday 15 June"; the year where it is another. */
export function titleOf(place: CalendarPlace, today: LocalDate, locale: string): string {
  const { from, to } = rangeOf(place);
  const year = to.slice(0, 4) === today.slice(0, 4) ? '' : ` ${to.slice(0, 4)}`;
  switch (place.view) {
    case 'day':
      return `${formatDay(place.date, { locale })}${year}`;
    case 'month':
      return formatMonth(place.date, locale);
    case 'week': {
      const end = formatDay(to, { locale, weekday: false });
      const start =
        from.slice(0, 7) === to.slice(0, 7)
          ? String(Number(from.slice(8)))
          : formatDay(from, { locale, weekday: false });
      return `${start} to ${end}${year}`;
    }
  }
}
