import type { DayAnswer, PickupWindow } from '#shared/contracts/dates.ts';

/** The pickup window of a day nearest to the wished-for time that can be had; null if none can. */
export function nearestWindow(day: DayAnswer | null, wished: number | null): PickupWindow | null {
  const open = (day?.windows ?? []).filter(
    (it) => it.answer !== 'closed' && it.answer !== 'checking',
  );
  const distance = (it: PickupWindow) => Math.abs(it.start - (wished ?? it.start));
  return open.toSorted((a, b) => distance(a) - distance(b) || a.start - b.start)[0] ?? null;
}
