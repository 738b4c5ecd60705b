import type { Setting } from '#shared/contracts/design.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatDuration } from '#shared/dates/format.ts';
import { formatTemperature, type TemperatureLead } from './measures.ts';

/**
 * USDA FSIS, "Danger Zone": between 40 and 140 °F (4 and 60 °C) at most two hours in all, one
 * hour above 90 °F (32 °C).
 */
export const fsis = {
  coldC: 4,
  hotC: 60,
  hotDayC: 32,
  minutesInAll: 120,
  minutesOnHotDay: 60,
} as const;

/** How long the cake may be out in all, drive and setting up included, minutes. */
export function minutesAllowed(warmestC: number): number {
  return warmestC > fsis.hotDayC ? fsis.minutesOnHotDay : fsis.minutesInAll;
}

/** Cold holding: 41 °F / 5 °C (FDA Food Code 3-501.16); 8 °C in the UK (4 °C is not asked). */
export function coldHoldingC(region: LabelRegion): number {
  return region === 'UK' ? 8 : 5;
}

/** A large tier takes one to three hours to soften (memory); the shorter one fits the limit. */
const softeningMinutes = 60;

/** "Keep it in the fridge until ...": what goes on the care card and under the setting. */
export function keepCoolText(
  setting: Setting | null,
  warmestC: number | null,
  region: LabelRegion,
  lead: TemperatureLead,
): string {
  const fridge = `Keep it in the fridge, at ${formatTemperature(coldHoldingC(region), lead)} or colder`;
  if (setting === null || warmestC === null) {
    return `${fridge}, until shortly before cutting. It may be out for ${formatDuration(fsis.minutesInAll)} in all, the drive included; above ${formatTemperature(fsis.hotDayC, lead)} for ${formatDuration(fsis.minutesOnHotDay)}.`;
  }
  const allowed = minutesAllowed(warmestC);
  const left = Math.max(0, allowed - setting.driveMinutes);
  const before = Math.min(left, setting.minutesOut);
  const until =
    before === 0 ? 'until you cut it' : `until ${formatDuration(before)} before you cut it`;
  const tip =
    before >= softeningMinutes ? ' A large tier eats best after about an hour in the room.' : '';
  return `${fridge}, ${until}. It may be out for ${formatDuration(allowed)} in all, the drive included.${tip}`;
}
