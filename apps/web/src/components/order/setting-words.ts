import type { Setting } from '#shared/contracts/design.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';

export const placeWords = {
  indoors: 'Indoors',
  shade: 'Outside, in shade',
  sun: 'Outside, in the sun',
} as const;

/** "Outside, in shade, up to 77 °F (25 °C), 1 h 30 out before cutting, 25 min on the road". */
export function settingWords(setting: Setting, studio: StudioCard): string {
  return [
    placeWords[setting.place],
    setting.warmestC === null
      ? 'warmth not known'
      : `up to ${formatTemperature(setting.warmestC, studio.temperatureLead)}`,
    `${formatDuration(setting.minutesOut)} out before cutting`,
    `${formatDuration(setting.driveMinutes)} on the road`,
    ...(setting.servedAt === null ? [] : [`cut at ${formatTime(setting.servedAt)}`]),
  ].join(', ');
}
