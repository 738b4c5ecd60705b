import type { CalendarDay, CalendarView } from '#shared/contracts/staff.ts';
import { formatList, formatTime, formatWindow } from '#shared/dates/format.ts';
import { sortOf } from '#web/components/order/task-glyph.tsx';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { type Work, pickupsOf, workOf } from '../days/work-of-day.ts';
import { DayExplained } from './day-explained.tsx';
import { DayJug } from './jug-mark.tsx';
import type { LaneAct } from './lane-act.ts';
import { LaneName } from './lane-name.tsx';
import { PickupBox, WorkRow } from './work-row.tsx';

type Props = {
  readonly view: CalendarView;
  readonly day: CalendarDay;
  readonly locale: string;
  readonly onAct: LaneAct;
};

/** One day: its shifts with their people, the work of each along a rule of hours, the pickups. */
export function DayTimeline({ view, day, locale, onAct }: Props) {
  const work = workOf(view.lanes, day.date);
  const pickups = pickupsOf(view.lanes, day.date);
  const inShift = (start: number, end: number) =>
    work.filter(({ task }) => task.start >= start && task.start < end);
  const shifts = day.shifts.map((shift) => ({ ...shift, work: inShift(shift.start, shift.end) }));
  const placed = new Set(shifts.flatMap((it) => it.work.map(({ task }) => task.id)));
  const besides = work.filter(({ task }) => !placed.has(task.id));

  return (
    <>
      <div className="flex items-start gap-4 px-4 py-4 sm:px-6">
        <DayJug day={day} className="h-12" />
        <DayExplained
          day={day}
          waiting={view.waiting}
          mayBlock={view.can.blockDays}
          locale={locale}
          onItsOwn
        />
      </div>
      {shifts.map((shift) => (
        <section
          key={shift.start}
          aria-label={`Shift ${formatWindow(shift.start, shift.end - shift.start)}`}
          className="grid gap-2 border-t border-seam px-4 py-4 sm:px-6"
        >
          <h2 className="text-lg">
            <span className="tabular-nums">
              {formatWindow(shift.start, shift.end - shift.start)}
            </span>
            <span className="font-sans text-base font-normal text-slate">
              {' '}
              {formatList(shift.people)}
            </span>
          </h2>
          <WorkAlong work={shift.work} start={shift.start} end={shift.end} />
        </section>
      ))}
      {besides.length > 0 && (
        <section className="grid gap-2 border-t border-seam px-4 py-4 sm:px-6">
          <h2 className="text-lg">Outside the shifts</h2>
          <WorkAlong work={besides} start={0} end={24 * 60} />
        </section>
      )}
      {shifts.length === 0 && besides.length === 0 && (
        <div className="border-t border-seam p-4 sm:px-6">
          <EmptyState title="Nobody is at the bench this day" />
        </div>
      )}
      <section className="grid gap-3 border-t border-seam px-4 py-4 sm:px-6">
        <h2 className="text-lg">Pickups</h2>
        {pickups.length === 0 ? (
          <p className="text-slate">Nobody collects this day.</p>
        ) : (
          <ul className="grid gap-4 sm:grid-cols-2">
            {pickups.map((lane) => (
              <li key={lane.number} className="flex items-start gap-3">
                <PickupBox start={lane.pickup.start} />
                <LaneName lane={lane} onAct={onAct} />
              </li>
            ))}
          </ul>
        )}
      </section>
    </>
  );
}

type AlongProps = {
  readonly work: readonly Work[];
  readonly start: number;
  readonly end: number;
};

/** Work by its time, each with its stretch on the shift's rule of hours. */
function WorkAlong({ work, start, end }: AlongProps) {
  if (work.length === 0) return <p className="text-slate">Nothing is planned.</p>;
  return (
    <div className="grid">
      <div
        aria-hidden="true"
        className="hidden lg:grid lg:grid-cols-[minmax(0,1fr)_22rem] lg:gap-6"
      >
        <span />
        <Rule start={start} end={end} />
      </div>
      <ol className="divide-y divide-seam">
        {work.map(({ lane, task }) => (
          <li
            key={`${lane.number} ${task.id}`}
            className="grid items-center gap-x-6 lg:grid-cols-[minmax(0,1fr)_22rem]"
          >
            <WorkRow lane={lane} task={task} />
            <Stretch
              from={share(task.start, start, end)}
              to={share(task.start + task.minutes, start, end)}
              batch={sortOf[task.kind] === 'batch'}
            />
          </li>
        ))}
      </ol>
    </div>
  );
}

function share(minute: number, start: number, end: number): number {
  return Math.max(0, Math.min(1, (minute - start) / (end - start)));
}

/** The hours of a shift as a ruler's marks. */
function Rule({ start, end }: { readonly start: number; readonly end: number }) {
  const step = end - start > 12 * 60 ? 240 : end - start > 6 * 60 ? 120 : 60;
  const first = Math.ceil(start / step) * step;
  const hours = Array.from(
    { length: Math.max(0, Math.floor((end - first) / step) + 1) },
    (_, n) => first + n * step,
  );
  return (
    <svg viewBox="0 0 352 22" className="w-full">
      <line x1="0" x2="352" y1="21" y2="21" stroke="var(--color-cobalt)" strokeWidth="1.4" />
      {hours.map((it) => {
        const x = Math.max(0.7, Math.min(351.3, share(it, start, end) * 352));
        return (
          <g key={it}>
            <line x1={x} x2={x} y1="14" y2="21" stroke="var(--color-cobalt)" strokeWidth="1.4" />
            <text
              x={x}
              y="10"
              fontSize="11"
              fill="var(--color-slate)"
              textAnchor={x < 16 ? 'start' : x > 336 ? 'end' : 'middle'}
            >
              {formatTime(it)}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

type StretchProps = { readonly from: number; readonly to: number; readonly batch: boolean };

/** How long a piece of work takes of its shift; the words beside it say the same. */
function Stretch({ from, to, batch }: StretchProps) {
  return (
    <svg
      viewBox="0 0 352 14"
      preserveAspectRatio="none"
      className="mb-2 h-2.5 w-full lg:mb-0 lg:h-3.5"
      aria-hidden="true"
    >
      <line x1="0" x2="352" y1="7" y2="7" stroke="var(--color-seam)" strokeWidth="1.5" />
      <rect
        x={from * 352}
        y="3"
        width={Math.max(4, (to - from) * 352)}
        height="8"
        fill={batch ? 'var(--color-cobalt)' : 'var(--color-ink)'}
      />
    </svg>
  );
}
