import type { DayAnswer } from '#shared/contracts/dates.ts';

/** Whether the chosen day and time still stand for the cake as it is now. */
export type DateVerdict = 'unknown' | 'stands' | 'to-ask' | 'lost';

/**
 * @param asked the customer has already agreed to ask for the day without a promise
 */
export function dateVerdict(
  day: DayAnswer | null,
  windowStart: number | null,
  asked: boolean,
): DateVerdict {
  if (day === null || day.answer === 'checking') return 'unknown';
  if (day.answer === 'closed') return 'lost';
  const window = day.windows.find((it) => it.start === windowStart);
  if (windowStart !== null && (window === undefined || window.answer === 'closed')) return 'lost';
  if (window?.answer === 'checking') return 'unknown';
  const promised = day.answer !== 'ask-us' && window?.answer !== 'ask-us';
  return promised || asked ? 'stands' : 'to-ask';
}
