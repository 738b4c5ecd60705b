import type { DayAnswer } from '#shared/contracts/dates.ts';

export type DayWord = {
  /** Under the figure: short, since a phone's seventh is narrow. Empty for a plain open day. */
  readonly word: string;
  /** Whether pressing it chooses it; otherwise pressing says why not. */
  readonly open: boolean;
  /** The same in full, for the day's label and the line under the calendar. */
  readonly said: string;
};

const reasons = {
  'closed-day': 'closed',
  'too-soon': 'soon',
  'too-far': 'later',
  'too-big': 'too big',
  'window-full': 'full',
  full: 'full',
} as const;

/** How full the bench is, in words. */
function load(fill: number): string {
  if (fill < 0.05) return 'the bench is free';
  if (fill < 0.4) return 'the bench has plenty of room';
  if (fill < 0.75) return 'the bench is about half full';
  return 'the bench is nearly full';
}

/** A day of the customer's calendar in words; null while it is not known. */
export function dayWord(day: DayAnswer | null): DayWord {
  if (day === null || day.answer === 'checking') {
    return { word: '…', open: false, said: 'We are still looking at this day.' };
  }
  switch (day.answer) {
    case 'open':
      return { word: '', open: true, said: `Open; ${load(day.fill)}.` };
    case 'last-place':
      return { word: 'last', open: true, said: 'Open; the last place for a cake like this.' };
    case 'ask-us':
      return {
        word: 'ask us',
        open: true,
        said: 'We cannot promise this day, but you may ask: the baker looks at it and answers you.',
      };
    case 'closed':
      return {
        word: day.reason === null ? 'closed' : reasons[day.reason.code],
        open: false,
        said: day.reason?.sentence ?? 'We cannot make this cake for that day.',
      };
  }
}
