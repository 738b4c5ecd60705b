import { Link } from 'react-router-dom';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { TaskGlyph } from '#web/components/order/task-glyph.tsx';
import { paths } from '#web/config/paths.ts';
import type { CakeDay } from '../days/work-of-day.ts';

/** One cake's work on one day, in a line of beads. */
export function CakeRow({ cake: { lane, start, minutes, stretches } }: { readonly cake: CakeDay }) {
  return (
    <div className="grid grid-cols-[3.6rem_1fr] gap-x-3">
      <span className="py-0.5 tabular-nums">{formatTime(start)}</span>
      <div className="grid gap-1">
        <p className="flex items-baseline justify-between gap-3">
          <Link to={paths.staffOrder(lane.number)} className="link inline-block min-w-0 py-0.5">
            <span className="tabular-nums">{lane.number}</span> {lane.customer}
          </Link>
          <span className="shrink-0 text-sm text-slate tabular-nums">
            {formatDuration(minutes)}
          </span>
        </p>
        <p className="flex flex-wrap gap-x-3 gap-y-1 text-sm">
          {stretches.map((it, at) => (
            <span key={at} className="inline-flex items-center gap-1.5">
              <TaskGlyph sort={it.sort} done={it.done} />
              {it.words}
              {it.late && <strong className="text-berry">late</strong>}
            </span>
          ))}
        </p>
      </div>
    </div>
  );
}
