import { useState } from 'react';
import type { CalendarDay, CalendarView } from '#shared/contracts/staff.ts';
import { formatDay, formatWeekday } from '#shared/dates/format.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { useRoving } from '#web/lib/use-roving.ts';
import { useWidth } from '#web/lib/use-width.ts';
import { dayWords, waitingByDay } from '../days/day-load.ts';
import { spanOf } from '../string/time-scale.ts';
import { DayExplained } from './day-explained.tsx';
import { DayJug, LoadLines } from './jug-mark.tsx';
import type { LaneAct } from './lane-act.ts';
import { LaneName } from './lane-name.tsx';
import { BeadString } from './bead-string.tsx';

type Props = {
  readonly view: CalendarView;
  readonly locale: string;
  readonly onAct: LaneAct;
};

const columns = 'grid grid-cols-[9.5rem_minmax(0,1fr)] lg:grid-cols-[14rem_minmax(0,1fr)]';

/** Seven days side by side under their jugs, and a string of beads per cake. */
export function WeekGrid({ view, locale, onAct }: Props) {
  const { days, lanes, today, waiting } = view;
  const [ref, width] = useWidth<HTMLDivElement>(840);
  const [shown, setShown] = useState<string | null>(null);
  const todayAt = days.findIndex((it) => it.date === today);
  const itemAt = useRoving(days.length, Math.max(0, todayAt));
  const scale = {
    first: days[0]?.date ?? today,
    days: days.length,
    width,
    span: spanOf(view),
  };
  const waits = waitingByDay(waiting);
  const explained = days.find((it) => it.date === shown);
  const ordered = lanes.toSorted((a, b) => (a.pickup.startAt < b.pickup.startAt ? -1 : 1));

  return (
    <>
      <div className={columns}>
        <div aria-hidden="true" />
        <div ref={ref} className="relative">
          <DayColumns days={days} today={today} />
          <div role="group" aria-label="Days" className="relative grid grid-cols-7">
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
                  'grid min-h-28 content-start gap-1.5 px-2 py-3 lg:px-2.5 text-left -outline-offset-4',
                  day.date === shown && 'border-b-3 border-butter',
                )}
              >
                <span className="flex items-start justify-between gap-1">
                  <span className="grid leading-tight">
                    <span className="text-sm text-slate">
                      {formatWeekday(day.date, 'short', locale)}
                    </span>
                    <span className="font-display text-2xl font-bold tabular-nums">
                      {Number(day.date.slice(8))}
                    </span>
                  </span>
                  <DayJug day={day} className="h-8 lg:h-10" />
                </span>
                <LoadLines day={day} />
              </button>
            ))}
          </div>
        </div>
      </div>
      {explained !== undefined && (
        <div className="border-t border-seam bg-cloud px-5 py-4">
          <DayExplained
            day={explained}
            waiting={waiting}
            mayBlock={view.can.blockDays}
            locale={locale}
          />
        </div>
      )}
      {ordered.length === 0 ? (
        <div className="border-t border-seam p-5">
          <EmptyState title="No cake is on these days">
            Orders appear here as soon as they have a place in the plan.
          </EmptyState>
        </div>
      ) : (
        <ul>
          {ordered.map((lane) => (
            <li key={lane.number} className={classNames(columns, 'border-t border-seam')}>
              <div className="px-3 py-3 lg:px-5">
                <LaneName lane={lane} onAct={onAct} />
              </div>
              <div className="relative flex items-center">
                <DayColumns days={days} today={today} />
                <div className="relative w-full">
                  <BeadString lane={lane} scale={scale} locale={locale} />
                </div>
              </div>
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

/** The hairlines between days, and today's tint. */
function DayColumns({
  days,
  today,
}: {
  readonly days: readonly CalendarDay[];
  readonly today: string;
}) {
  return (
    <div aria-hidden="true" className="absolute inset-0 grid grid-cols-7">
      {days.map((day) => (
        <div
          key={day.date}
          className={classNames('border-l border-seam', day.date === today && 'bg-butter-tint')}
        />
      ))}
    </div>
  );
}
