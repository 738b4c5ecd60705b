import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import type { Warmth } from './heat.ts';
import { note, type Noted, type WayOut } from './note.ts';
import type { ResolvedDesign } from './resolve-design.ts';
import { showWays } from './show-cake.ts';
import type { Situation } from './situation.ts';
import { minutesAllowed, timeRule } from './time-out.ts';

/** How long it is out of the fridge, whether it can be there in time, and the drive. */
export function timeAdvice(situation: Situation, warmth: Warmth): Noted[] {
  return [
    ...outAdvice(situation, warmth),
    ...arrivalAdvice(situation),
    ...driveAdvice(situation.resolved),
  ];
}

/** Whether anything on the cake has to be kept cold: the owner's flag, by default yes. */
export function isPerishable({ tiers, cuttingCakes }: ResolvedDesign): boolean {
  return [...tiers, ...cuttingCakes].some(
    ({ real, filling, coating }) =>
      real && (filling !== null || coating === null || coating.style?.refrigerate !== false),
  );
}

/** Minutes out, drive and all; a dummy may stand as long as it likes. */
function minutesOutOf({ design, tiers }: ResolvedDesign): number {
  if (design.setting === null) return 0;
  const { minutesOut, driveMinutes } = design.setting;
  return tiers.some((it) => it.real) ? minutesOut + driveMinutes : driveMinutes;
}

function outAdvice(situation: Situation, warmth: Warmth): Noted[] {
  const { resolved } = situation;
  const { design, menu, tiers } = resolved;
  const { setting } = design;
  if (setting === null || tiers.length === 0 || !isPerishable(resolved)) return [];
  const allowed = minutesAllowed(warmth.celsius);
  const out = minutesOutOf(resolved);
  // From some part of the limit on, a late speech is enough to pass it.
  if (out <= (allowed * menu.kitchen.closeToTimePpm) / 1e6) return [];
  const level: AdviceLevel = out > allowed ? 'stop' : 'care';
  const rule = timeRule(warmth.celsius, menu.studio.temperatureLead);
  const before = Math.floor((allowed - setting.driveMinutes) / 15) * 15;
  const shorter: WayOut[] =
    level === 'stop' && before > 0 && tiers.some((it) => it.real)
      ? [
          {
            label: `Out of the fridge ${formatDuration(before)} before cutting`,
            patch: { setting: { ...setting, minutesOut: before } },
          },
        ]
      : [];
  // A drive that is too long by itself is not helped by what stands on show.
  const shown = level === 'stop' && setting.driveMinutes <= allowed ? showWays(situation) : [];
  return [
    note({
      code: 'time-out',
      level,
      step: 'setting',
      about: 'time-out',
      sentence: `${formatDuration(out)} out of the fridge, the drive and setting up included, is ${level === 'stop' ? 'too long' : 'close'}: ${rule}.`,
      plain: `Out of the cold ${formatDuration(out)} in all; allowed ${formatDuration(allowed)} (USDA FSIS, Danger Zone).`,
      instead:
        level === 'care'
          ? 'Keep an eye on the clock.'
          : shorter.length > 0
            ? 'Leave it in the fridge for longer.'
            : 'Carry it in a cold box and put it in a fridge when you arrive.',
      ways: [...shorter, ...shown],
      talk: level === 'stop',
    }),
  ];
}

/** It cannot be cut before it has been collected and driven there. */
function arrivalAdvice({ resolved, collectAt }: Situation): Noted[] {
  const { setting } = resolved.design;
  if (setting === null || setting.servedAt === null || collectAt === null) return [];
  const there = collectAt + setting.driveMinutes;
  if (setting.servedAt >= there) return [];
  return [
    note({
      code: 'time-out',
      level: 'care',
      step: 'day',
      about: 'arrival',
      sentence: `You cut it at ${formatTime(setting.servedAt)}, but it cannot be there before ${formatTime(Math.min(there, 24 * 60 - 1))}.`,
      instead: 'Collect it earlier, or say when you cut it.',
    }),
  ];
}

/** Long drives ask for a word about the car. */
function driveAdvice({ design, tiers, menu }: ResolvedDesign): Noted[] {
  if (design.setting === null || tiers.length === 0) return [];
  const { driveMinutes } = design.setting;
  if (driveMinutes < menu.kitchen.longDriveMinutes) return [];
  const stacked = tiers.length > 1;
  return [
    note({
      code: 'drive',
      level: 'care',
      step: 'setting',
      about: 'drive',
      sentence: `${formatDuration(driveMinutes)} is a long drive for ${stacked ? 'a stacked cake' : 'a cake'}.`,
      plain: `Long drive, ${formatDuration(driveMinutes)}: chill it through, box it level${stacked ? ', check the dowels' : ''}.`,
      instead:
        'Cool the car first, stand the box level on the floor, not on a seat, and take corners gently.',
    }),
  ];
}
