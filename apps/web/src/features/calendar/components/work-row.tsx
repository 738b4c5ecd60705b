import { Link } from 'react-router-dom';
import type { CalendarLane, PlannedTask } from '#shared/contracts/staff.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { TaskGlyph, sortOf } from '#web/components/order/task-glyph.tsx';
import { paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';

type Props = { readonly lane: CalendarLane; readonly task: PlannedTask };

/** One piece of work in a list: its time, its bead, what and whose. */
export function WorkRow({ lane, task }: Props) {
  const done = task.state === 'finished';
  return (
    <div className="flex items-baseline gap-2.5 py-1">
      <span className="w-11 shrink-0 tabular-nums">{formatTime(task.start)}</span>
      <TaskGlyph sort={sortOf[task.kind]} done={done} className="size-4 translate-y-0.5" />
      <span className={classNames('min-w-0 flex-1', done && 'text-slate')}>
        {task.label}{' '}
        <span className="text-slate">
          <Link
            to={paths.staffOrder(lane.number)}
            className="link inline-block py-0.5 tabular-nums"
          >
            {lane.number}
          </Link>{' '}
          {lane.customer}
        </span>
        {task.state === 'late' && <strong className="text-berry"> late</strong>}
        {task.state === 'started' && <strong className="text-leaf"> begun</strong>}
        {done && <strong className="text-leaf"> done</strong>}
      </span>
      <span className="shrink-0 text-sm text-slate tabular-nums">
        {formatDuration(task.minutes)}
      </span>
    </div>
  );
}

/** One pickup in a list: its box, whose, and how far the cake is. */
export function PickupBox({ start }: { readonly start: number }) {
  return (
    <span className="inline-grid h-8 w-[3.6rem] shrink-0 place-items-center rounded-action border-2 border-cobalt bg-enamel font-display text-sm font-bold text-cobalt tabular-nums">
      {formatTime(start)}
    </span>
  );
}
