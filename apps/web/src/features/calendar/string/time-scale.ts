import type { CalendarView } from '#shared/contracts/staff.ts';
import { type LocalDate, daysBetween } from '#shared/dates/local-time.ts';

/** The part of a day that is drawn, minutes since midnight: nights hold no work. */
export type DaySpan = { readonly start: number; readonly end: number };

/** Days side by side, `width` pixels in all. */
export type TimeScale = {
  readonly first: LocalDate;
  readonly days: number;
  readonly width: number;
  readonly span: DaySpan;
};

/** White on both sides of a day, so that work at its edge is plainly that day's. */
const edge = 0.07;

/** From the earliest to the latest anything happens on these days, whole hours, at least four. */
export function spanOf({ days, lanes }: Pick<CalendarView, 'days' | 'lanes'>): DaySpan {
  const from = [
    ...days.flatMap((day) => day.shifts.map((it) => it.start)),
    ...lanes.flatMap((lane) => [lane.pickup.start, ...lane.tasks.map((it) => it.start)]),
  ];
  const to = [
    ...days.flatMap((day) => day.shifts.map((it) => it.end)),
    ...lanes.flatMap((lane) => [
      lane.pickup.start,
      ...lane.tasks.map((it) => Math.min(it.start + it.minutes, 24 * 60)),
    ]),
  ];
  const start = Math.floor(Math.min(...from, 9 * 60) / 60) * 60;
  const end = Math.ceil(Math.max(...to, 13 * 60) / 60) * 60;
  return { start, end };
}

/** Where a local time lies, in pixels from the left edge; before the first day it is negative. */
export function xOf(scale: TimeScale, date: LocalDate, minute: number): number {
  const { start, end } = scale.span;
  const share = Math.max(0, Math.min(1, (minute - start) / (end - start)));
  const day = daysBetween(scale.first, date);
  return (day + edge + share * (1 - 2 * edge)) * (scale.width / scale.days);
}

/** The left and right edge of a day, inside its white. */
export function reachOf(scale: TimeScale, date: LocalDate): readonly [number, number] {
  return [xOf(scale, date, scale.span.start), xOf(scale, date, scale.span.end)];
}
