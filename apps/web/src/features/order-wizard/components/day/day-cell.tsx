import { createContext, useContext, useEffect, useRef } from 'react';
import type { DayButtonProps } from 'react-day-picker';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { Jug } from '#web/components/ui/jug.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { fromPickerDate } from '../../dates/calendar-day.ts';
import { dayWord } from '../../dates/day-word.ts';

/** The answers the cells read; the picker makes the cells itself. */
const DaysContext = createContext<ReadonlyMap<LocalDate, DayAnswer>>(new Map());
export const CalendarDays = DaysContext.Provider;

/** One day: its figure, a jug as full as the bench if it can be chosen, and a word if one is needed. */
export function DayCell({ day, modifiers, className: _class, ...button }: DayButtonProps) {
  const days = useContext(DaysContext);
  const ref = useRef<HTMLButtonElement>(null);
  const focused = modifiers.focused === true;
  const chosen = modifiers.selected === true;
  const answer = days.get(fromPickerDate(day.date)) ?? null;
  const { word, open } = dayWord(answer);

  useEffect(() => {
    if (focused) ref.current?.focus();
  }, [focused]);

  return (
    <button
      {...button}
      ref={ref}
      type="button"
      aria-disabled={!open || undefined}
      className={classNames(
        'mx-auto flex min-h-14 w-full max-w-14 flex-col items-center justify-start gap-0.5 rounded-action border-2 pt-1 pb-0.5 leading-tight tabular-nums',
        chosen ? 'border-cobalt bg-cobalt-tint' : 'border-transparent',
        open ? 'font-bold text-ink hover:bg-cobalt-tint' : 'cursor-help text-slate',
      )}
    >
      {day.date.getDate()}
      {open && answer !== null && answer.answer !== 'ask-us' && (
        <Jug fill={Math.min(1, answer.fill)} className="h-5" />
      )}
      {word !== '' && <span className="text-xs font-normal">{word}</span>}
    </button>
  );
}
