import type { CalendarDay, WaitingRequest } from '#shared/contracts/staff.ts';
import { formatDuration, formatHours } from '#shared/dates/format.ts';

export type LoadWord = 'closed' | 'free' | 'room' | 'full' | 'overfull';

/** So near the brim a day counts as full: nothing that takes work fits any more. */
const brimMinutes = 15;

/** How a day stands, apart from its figures. */
export function loadOf(
  day: Pick<CalendarDay, 'closed' | 'benchMinutes' | 'plannedMinutes'>,
): LoadWord {
  if (day.plannedMinutes > day.benchMinutes) return 'overfull';
  if (day.closed !== null || day.benchMinutes === 0) return 'closed';
  if (day.plannedMinutes === 0) return 'free';
  return day.benchMinutes - day.plannedMinutes < brimMinutes ? 'full' : 'room';
}

/** How full the jug is: 1 is full, more is overfull. */
export function fillOf({ benchMinutes, plannedMinutes }: CalendarDay): number {
  if (benchMinutes === 0) return plannedMinutes > 0 ? 2 : 0;
  return plannedMinutes / benchMinutes;
}

/** "5.1 of 12 h"; a day without anybody at the bench has no figure. */
export function hoursWords({ benchMinutes, plannedMinutes }: CalendarDay): string {
  if (benchMinutes === 0 && plannedMinutes > 0) return `${formatHours(plannedMinutes)} h of work`;
  if (benchMinutes === 0 && plannedMinutes === 0) return '';
  return `${formatHours(plannedMinutes)} of ${formatHours(benchMinutes)} h`;
}

/** The word under the figure, where there is one. */
export function loadWords(day: CalendarDay): string {
  switch (loadOf(day)) {
    case 'overfull':
      if (day.benchMinutes === 0) return day.closed === null ? 'nobody there' : 'but closed';
      return `${formatDuration(day.plannedMinutes - day.benchMinutes)} too much`;
    case 'full':
      return 'full, and it fits';
    case 'closed':
      return 'closed';
    case 'free':
    case 'room':
      return '';
  }
}

/** A whole day in a sentence, for those who cannot see its jug. */
export function dayWords(day: CalendarDay, waiting: number): string {
  return [
    hoursWords(day) === '' ? '' : `${hoursWords(day)} at the bench`,
    loadWords(day),
    day.pickups === 0 ? '' : pickupsWords(day.pickups),
    waiting === 0 ? '' : waitingWords(waiting),
  ]
    .filter((it) => it !== '')
    .join(', ');
}

export function pickupsWords(pickups: number): string {
  return pickups === 1 ? '1 pickup' : `${pickups} pickups`;
}

export function waitingWords(waiting: number): string {
  return waiting === 1 ? '1 waits for an answer' : `${waiting} wait for an answer`;
}

/** How many requests wait for each day. */
export function waitingByDay(waiting: readonly WaitingRequest[]): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (const { pickup } of waiting) counts.set(pickup.date, (counts.get(pickup.date) ?? 0) + 1);
  return counts;
}
