import type { CalendarLane, PlannedTask } from '#shared/contracts/staff.ts';

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
