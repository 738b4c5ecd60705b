import { useState } from 'react';
import { DayPicker } from 'react-day-picker';
import type { Design } from '#shared/contracts/design.ts';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import { formatDay, formatMonth } from '#shared/dates/format.ts';
import { addMonths, type LocalDate } from '#shared/dates/local-time.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { fromPickerDate, monthRange, toPickerDate } from '../../dates/calendar-day.ts';
import { dayWord } from '../../dates/day-word.ts';
import { useDates } from '../../dates/use-dates.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { CalendarDays, DayCell } from './day-cell.tsx';
import { NearestDays } from './nearest-days.tsx';
import { WindowChoice } from './window-choice.tsx';

const classes = {
  months: 'w-full',
  month: 'w-full',
  month_grid: 'w-full border-collapse table-fixed',
  weekday: 'pb-1 text-center text-sm font-medium text-slate',
  day: 'p-0 text-center align-top',
  month_caption: 'sr-only',
} as const;

/** The month, each day with how full the bench is and a word; closed days say why when pressed. */
export function DayCalendar({ design }: { readonly design: Design }) {
  const { values, change, menu, today } = useWizard();
  const { day } = values;
  const [month, setMonth] = useState<LocalDate>(monthRange(day.date ?? today).from);
  const [looked, setLooked] = useState<LocalDate | null>(null);
  const { from, to } = monthRange(month);
  const dates = useDates(design, from, to);
  const last = addMonths(today, menu.studio.bookOpenMonths);

  const choose = (date: LocalDate) => {
    setLooked(date);
    const answer = dates.days.get(date) ?? null;
    if (answer === null || !dayWord(answer).open) return;
    const windows = answer.windows.filter((it) => it.answer !== 'closed');
    const kept = windows.find((it) => it.start === day.windowStart) ?? null;
    const only = windows.length === 1 ? windows[0] : undefined;
    const window = kept ?? only ?? null;
    change({
      day: { ...day, date, windowStart: window?.start ?? null },
      askWithoutDate: answer.answer === 'ask-us' || window?.answer === 'ask-us',
    });
  };

  return (
    <div className="grid gap-4">
      <MonthLine month={month} first={monthRange(today).from} last={last} onMonth={setMonth} />
      <CalendarDays value={dates.days}>
        <DayPicker
          mode="single"
          month={toPickerDate(month)}
          onMonthChange={(date) => setMonth(monthRange(fromPickerDate(date)).from)}
          startMonth={toPickerDate(today)}
          endMonth={toPickerDate(last)}
          weekStartsOn={1}
          hideNavigation
          showOutsideDays={false}
          classNames={classes}
          components={{ DayButton: DayCell }}
          labels={{
            labelDayButton: (date) => dayLabel(fromPickerDate(date), dates.days),
            labelGrid: () => `${formatMonth(month)}, the days we can make it for`,
          }}
          selected={day.date === null ? undefined : toPickerDate(day.date)}
          onSelect={(_, date) => choose(fromPickerDate(date))}
          onDayFocus={(date) => setLooked(fromPickerDate(date))}
        />
      </CalendarDays>
      <Looked date={looked ?? day.date} days={dates.days} />
      {dates.error !== null && <Failure error={dates.error} onRetry={dates.retry} />}
      <p className="text-sm text-slate">
        The jug shows how full the kitchen is.{' '}
        {dates.likely
          ? `These days look good for a cake for ${design.guests.headCount}; we check again as you design it.`
          : 'Every day with a jug is one the bench can keep for this cake.'}
      </p>
      <NearestDays dates={dates} month={month} onMonth={setMonth} />
      <WindowChoice day={day.date === null ? null : (dates.days.get(day.date) ?? null)} />
    </div>
  );
}

function dayLabel(date: LocalDate, days: ReadonlyMap<LocalDate, DayAnswer>): string {
  return `${formatDay(date)}. ${dayWord(days.get(date) ?? null).said}`;
}

type MonthLineProps = {
  readonly month: LocalDate;
  readonly first: LocalDate;
  readonly last: LocalDate;
  readonly onMonth: (month: LocalDate) => void;
};

function MonthLine({ month, first, last, onMonth }: MonthLineProps) {
  const before = addMonths(month, -1);
  const after = addMonths(month, 1);
  const name = (it: LocalDate) => formatMonth(it).split(' ')[0];
  return (
    <div className="flex items-center justify-between gap-4">
      <h3 aria-live="polite">{formatMonth(month)}</h3>
      <div className="flex gap-4">
        {before >= first && (
          <button type="button" className="link min-h-11 px-1" onClick={() => onMonth(before)}>
            {name(before)}
          </button>
        )}
        {after <= last && (
          <button type="button" className="link min-h-11 px-1" onClick={() => onMonth(after)}>
            {name(after)}
          </button>
        )}
      </div>
    </div>
  );
}

type LookedProps = {
  readonly date: LocalDate | null;
  readonly days: ReadonlyMap<LocalDate, DayAnswer>;
};

/** What the day one is on has to say. */
function Looked({ date, days }: LookedProps) {
  const day = date === null ? null : (days.get(date) ?? null);
  return (
    <p role="status" className="min-h-6 font-medium">
      {day !== null && `${formatDay(day.date)}: ${lowerFirst(dayWord(day).said)}`}
    </p>
  );
}

function lowerFirst(text: string): string {
  return text.charAt(0).toLowerCase() + text.slice(1);
}
