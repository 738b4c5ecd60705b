import { useState } from 'react';
import type { CalendarDay, CalendarView } from '#shared/contracts/staff.ts';
import { formatDay, formatWeekday } from '#shared/dates/format.ts';
import { classNames } from '#web/lib/class-names.ts';
import { alongWeeks, useRoving } from '#web/lib/use-roving.ts';
import { dayWords, loadOf, pickupsWords, waitingByDay } from '../days/day-load.ts';
import { DayExplained } from './day-explained.tsx';
import { DayJug } from './jug-mark.tsx';

type Props = {
  readonly view: CalendarView;
  /** Any day of the month that is shown. */
  readonly date: string;
  readonly locale: string;
};

/** A jug per day of the month, its pickups counted, marks where somebody waits. */
export function MonthGrid({ view, date, locale }: Props) {
  const { days, today, waiting } = view;
  const [shown, setShown] = useState<string | null>(null);
  const start = days.findIndex((it) => it.date === (shown ?? date));
  const itemAt = useRoving(days.length, Math.max(0, start), alongWeeks);
  const waits = waitingByDay(waiting);
  const explained = days.find((it) => it.date === shown);
  return (
    <>
      <div aria-hidden="true" className="grid grid-cols-7">
        {days.slice(0, 7).map((day) => (
          <span
            key={day.date}
            className="px-1 py-2 text-center text-sm text-slate sm:px-2.5 sm:text-left"
          >
            {formatWeekday(day.date, 'short', locale)}
          </span>
        ))}
      </div>
      <div role="group" aria-label="Days" className="grid grid-cols-7">
        {days.map((day, at) => (
          <button
            key={day.date}
            type="button"
            {...itemAt(at)}
            aria-label={`${formatDay(day.date, { locale })}${day.date === today ? ', today' : ''}: ${dayWords(day, waits.get(day.date) ?? 0)}`}
            aria-expanded={day.date === shown}
            onFocus={() => {
              itemAt(at).onFocus();
              setShown(day.date);
            }}
            onClick={() => setShown(day.date)}
            className={classNames(
              'min-h-19 border-t border-seam px-1 py-2 text-left -outline-offset-4 sm:min-h-24 sm:px-2.5',
              at % 7 > 0 && 'border-l',
              day.date === today && 'bg-butter-tint',
              day.date === shown && 'bg-cobalt-tint',
            )}
          >
            <MonthDay
              day={day}
              outside={day.date.slice(0, 7) !== date.slice(0, 7)}
              waiting={waits.get(day.date) ?? 0}
            />
          </button>
        ))}
      </div>
      <div className="min-h-32 border-t border-seam bg-cloud px-4 py-4 sm:px-5">
        {explained === undefined ? (
          <p className="text-slate">Choose a day to read what fills it.</p>
        ) : (
          <DayExplained
            day={explained}
            waiting={waiting}
            mayBlock={view.can.blockDays}
            locale={locale}
          />
        )}
      </div>
    </>
  );
}

type DayProps = {
  readonly day: CalendarDay;
  readonly outside: boolean;
  readonly waiting: number;
};

function MonthDay({ day, outside, waiting }: DayProps) {
  const load = loadOf(day);
  return (
    <span className="grid h-full content-start gap-1">
      <span className="flex flex-col items-center gap-1 sm:flex-row sm:items-start sm:justify-between">
        <span
          className={classNames(
            'font-display text-lg leading-none font-bold tabular-nums',
            outside && 'font-normal text-slate',
          )}
        >
          {Number(day.date.slice(8))}
        </span>
        <DayJug day={day} className="h-6 sm:h-8" />
      </span>
      <span className="hidden text-sm leading-tight sm:grid">
        {day.pickups > 0 && <span>{pickupsWords(day.pickups)}</span>}
        {load === 'closed' && <span className="text-slate">closed</span>}
        {load === 'full' && <span className="font-semibold">full</span>}
        {load === 'overfull' && <span className="font-semibold text-berry">too much</span>}
      </span>
      <span className="flex justify-center gap-0.5 sm:hidden">
        {day.pickups > 0 && (
          <span className="text-xs leading-tight tabular-nums">
            {day.pickups} <PickupSign />
          </span>
        )}
        {load === 'closed' && day.pickups === 0 && (
          <span className="text-[0.6875rem] leading-tight text-slate">closed</span>
        )}
      </span>
      {waiting > 0 && (
        <span className="flex items-center justify-center gap-1 text-xs leading-tight font-semibold sm:justify-start sm:text-sm">
          <WaitingSign />
          {waiting}
          <span className="hidden sm:inline">{waiting === 1 ? 'waits' : 'wait'}</span>
        </span>
      )}
    </span>
  );
}

/** A small box, as the pickups' in the week. */
function PickupSign() {
  return (
    <svg viewBox="0 0 12 10" className="inline h-2.5" aria-hidden="true">
      <rect
        x="1"
        y="1"
        width="10"
        height="8"
        rx="2.5"
        fill="none"
        stroke="var(--color-cobalt)"
        strokeWidth="1.6"
      />
    </svg>
  );
}

/** An envelope's flap: somebody wrote and waits. */
function WaitingSign() {
  return (
    <svg viewBox="0 0 14 11" className="h-3 shrink-0" aria-hidden="true">
      <rect
        x="0.8"
        y="0.8"
        width="12.4"
        height="9.4"
        rx="1.6"
        fill="var(--color-butter)"
        stroke="var(--color-ink)"
        strokeWidth="1.2"
      />
      <path d="M1.4 1.6L7 6.4l5.6-4.8" fill="none" stroke="var(--color-ink)" strokeWidth="1.2" />
    </svg>
  );
}
