import { addDays, daysBetween, isLocalDate, mondayOf } from '#shared/dates/local-time.ts';

/** A stretch of days, both ends in it. */
export type Span = { readonly from: string; readonly to: string };

/** The longest the server plans at once. */
const mostDays = 31;

/** The address's days; a week from today where it names none or what cannot be planned. */
export function readSpan(params: URLSearchParams, today: string): Span {
  const from = params.get('from') ?? '';
  const to = params.get('to') ?? '';
  const usual = { from: today, to: addDays(today, 6) };
  if (!isLocalDate(from)) return usual;
  if (!isLocalDate(to) || to < from) return { from, to: from };
  return daysBetween(from, to) < mostDays
    ? { from, to }
    : { from, to: addDays(from, mostDays - 1) };
}

/** This week and next, Monday to Sunday; of this week what is left of it. */
export function usualSpans(
  today: string,
): readonly { readonly name: string; readonly span: Span }[] {
  const monday = mondayOf(today);
  return [
    { name: 'This week', span: { from: today, to: addDays(monday, 6) } },
    { name: 'Next week', span: { from: addDays(monday, 7), to: addDays(monday, 13) } },
    { name: 'Two weeks', span: { from: today, to: addDays(today, 13) } },
  ];
}
