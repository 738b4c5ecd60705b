import type { Menu } from '#shared/contracts/menu.ts';
import type { PlannedTask, StaffOrder } from '#shared/contracts/staff.ts';
import { formatDay, formatDuration, formatTime } from '#shared/dates/format.ts';
import { groupBy } from '#shared/group-by.ts';
import { TaskGlyph, sortOf } from '#web/components/order/task-glyph.tsx';

const stateWords: Readonly<Record<PlannedTask['state'], string>> = {
  planned: '',
  started: 'begun',
  finished: 'done',
  late: 'late',
};

/** Every piece of work on this order, day by day, with its time in the plan. */
export function OrderPlan({ order, menu }: { readonly order: StaffOrder; readonly menu: Menu }) {
  if (order.tasks.length === 0) {
    return <p className="text-slate">The plan holds no work for it.</p>;
  }
  const days = [...groupBy(order.tasks, (it) => it.date)];
  return (
    <ol className="grid gap-4">
      {days.map(([date, tasks]) => (
        <li key={date} className="grid gap-1">
          <h3>{formatDay(date, { locale: menu.studio.locale })}</h3>
          <ol className="divide-y divide-seam">
            {tasks.map((task) => (
              <li key={task.id} className="flex items-baseline gap-3 py-1.5">
                <span className="w-12 shrink-0 tabular-nums">{formatTime(task.start)}</span>
                <TaskGlyph
                  sort={sortOf[task.kind]}
                  done={task.state === 'finished'}
                  className="size-4 translate-y-0.5"
                />
                <span className="min-w-0 flex-1">
                  {task.label}
                  {stateWords[task.state] !== '' && (
                    <strong className={task.state === 'late' ? 'text-berry' : 'text-leaf'}>
                      {' '}
                      {stateWords[task.state]}
                    </strong>
                  )}
                  {task.pinned && <span className="text-slate"> pinned</span>}
                </span>
                <span className="shrink-0 text-sm text-slate tabular-nums">
                  {formatDuration(task.minutes)}
                </span>
              </li>
            ))}
          </ol>
        </li>
      ))}
    </ol>
  );
}
