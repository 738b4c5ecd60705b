import type { CalendarLane, PlannedTask } from '#shared/contracts/staff.ts';
import { groupBy } from '#shared/group-by.ts';
import { type WorkSort, sortOf, taskWords } from '#web/components/order/task-glyph.tsx';

export type Work = { readonly lane: CalendarLane; readonly task: PlannedTask };

/** The day's pieces of work over all cakes, by their time; handovers are the pickups. */
export function workOf(lanes: readonly CalendarLane[], date: string): readonly Work[] {
  return lanes
    .flatMap((lane) => lane.tasks.map((task) => ({ lane, task })))
    .filter(({ task }) => task.date === date && task.kind !== 'handover')
    .toSorted((a, b) => a.task.start - b.task.start || a.lane.number - b.lane.number);
}

/** The cakes that go out that day, by their time. */
export function pickupsOf(lanes: readonly CalendarLane[], date: string): readonly CalendarLane[] {
  return lanes
    .filter((it) => it.pickup.date === date)
    .toSorted((a, b) => a.pickup.start - b.pickup.start || a.number - b.number);
}

/** A stretch of a cake's day that is of one sort: "fill, final". */
export type Stretch = {
  readonly sort: WorkSort;
  readonly words: string;
  readonly done: boolean;
  readonly late: boolean;
};

export type CakeDay = {
  readonly lane: CalendarLane;
  readonly start: number;
  readonly minutes: number;
  readonly stretches: readonly Stretch[];
};

/** The day by cake: when work on it begins, how long it takes in all, and its sorts in order. */
export function cakesOf(lanes: readonly CalendarLane[], date: string): readonly CakeDay[] {
  const byCake = groupBy(workOf(lanes, date), ({ lane }) => lane);
  return [...byCake].map(([lane, work]) => {
    const runs: PlannedTask[][] = [];
    for (const { task } of work) {
      const run = runs.at(-1);
      if (run?.[0] !== undefined && sortOf[run[0].kind] === sortOf[task.kind]) run.push(task);
      else runs.push([task]);
    }
    return {
      lane,
      start: Math.min(...work.map(({ task }) => task.start)),
      minutes: work.reduce((sum, { task }) => sum + task.minutes, 0),
      stretches: runs.flatMap((run) => {
        const [first] = run;
        if (first === undefined) return [];
        return {
          sort: sortOf[first.kind],
          words: [...new Set(run.map((it) => taskWords[it.kind]))].join(', '),
          done: run.every((it) => it.state === 'finished'),
          late: run.some((it) => it.state === 'late'),
        };
      }),
    };
  });
}
