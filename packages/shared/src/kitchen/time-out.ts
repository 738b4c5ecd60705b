import type { Setting } from '#shared/contracts/design.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { fahrenheitToCelsius, formatTemperature, type TemperatureLead } from './measures.ts';

/**
 * USDA FSIS, "Danger Zone": between 40 and 140 °F (4 and 60 °C) at most two hours in all, one
 * hour above 90 °F (32 °C).
 */
export const fsis = {
  coldF: 40,
  coldC: 4,
  hotF: 140,
  hotC: 60,
  hotDayF: 90,
  hotDayC: 32,
  minutesInAll: 120,
  minutesOnHotDay: 60,
} as const;

/** A hair over, so that a day told as 90 °F is not above 90 °F by the way it is converted. */
const roundingC = 0.01;

/** How long the cake may be out in all, drive and setting up included, minutes. */
export function minutesAllowed(warmestC: number): number {
  return warmestC > fahrenheitToCelsius(fsis.hotDayF) + roundingC
    ? fsis.minutesOnHotDay
    : fsis.minutesInAll;
}

/** The rule in words, with its figures as FSIS gives them in both scales. */
export function timeRule(warmestC: number, lead: TemperatureLead): string {
  const allowed = minutesAllowed(warmestC);
  const hot = lead === 'F' ? '90 °F / 32 °C' : '32 °C / 90 °F';
  return allowed === fsis.minutesOnHotDay
    ? `above ${hot} it may be out for ${formatDuration(allowed)} in all (USDA FSIS)`
    : `between ${zoneWords(lead)} it may be out for ${formatDuration(allowed)} in all (USDA FSIS)`;
}

function zoneWords(lead: TemperatureLead): string {
  return lead === 'F' ? '40 and 140 °F (4 and 60 °C)' : '4 and 60 °C (40 and 140 °F)';
}

/** Cold holding: 41 °F / 5 °C (FDA Food Code 3-501.16); 8 °C in the UK (4 °C is not asked). */
export function coldHoldingC(region: LabelRegion): number {
  return region === 'UK' ? 8 : 5;
}

export type KeepCool = {
  /** How long it may be out of the cold in all, minutes. */
  readonly allowed: number;
  /** When to take it out before it is cut, minutes; never more than the drive leaves. */
  readonly before: number;
  /** When to take it out, minutes since midnight; null while nobody knows when it is cut. */
  readonly until: number | null;
};

/** Until when a cake stays in the fridge: what is left of the time out after the drive. */
export function keepCoolOf(setting: Setting, warmestC: number): KeepCool {
  const allowed = minutesAllowed(warmestC);
  const before = Math.min(Math.max(0, allowed - setting.driveMinutes), setting.minutesOut);
  const { servedAt } = setting;
  return { allowed, before, until: servedAt === null ? null : Math.max(0, servedAt - before) };
}

export type KeepCoolInput = {
  readonly setting: Setting | null;
  readonly warmestC: number | null;
  readonly studio: Pick<StudioCard, 'labelRegion' | 'temperatureLead'>;
  readonly rules: Pick<KitchenRules, 'largeTierMm' | 'softenLeastHours' | 'softenMostHours'>;
  /** The widest tier that is eaten, mm; 0 while there is none. */
  readonly widestMm: number;
  /** When it is collected, minutes since midnight; null while nobody knows. */
  readonly collectAt: number | null;
  /** Whether it has to be kept cold at all: the owner's flag, by default yes. */
  readonly perishable: boolean;
};

/** "Keep it in the fridge until ...": what goes on the care card and under the setting. */
export function keepCoolText(input: KeepCoolInput): string {
  const { setting, warmestC, studio, rules, widestMm, collectAt, perishable } = input;
  const lead = studio.temperatureLead;
  if (!perishable) return 'Keep it in a cool room, out of the sun, until you cut it.';
  const cold = formatTemperature(coldHoldingC(studio.labelRegion), lead);
  const fridge = `Keep it in the fridge, at ${cold} or colder`;
  if (setting === null || warmestC === null) {
    const hot = lead === 'F' ? '90 °F / 32 °C' : '32 °C / 90 °F';
    return `${fridge}, until shortly before cutting. Between ${zoneWords(lead)} it may be out for ${formatDuration(fsis.minutesInAll)} in all, the drive and setting up included; above ${hot} for ${formatDuration(fsis.minutesOnHotDay)} (USDA FSIS).`;
  }
  const { before, until } = keepCoolOf(setting, warmestC);
  const rule = timeRule(warmestC, lead);
  const inAll = `${rule.charAt(0).toUpperCase()}${rule.slice(1)}, the drive and setting up included.`;
  const there = collectAt === null ? null : collectAt + setting.driveMinutes;
  const straight = until !== null && there !== null && there >= until;
  return [
    straight
      ? `Straight from us to the table: it is there at ${formatTime(Math.min(there, 24 * 60))} and cut at ${formatTime(setting.servedAt ?? 0)}. Until then and afterwards: the fridge, at ${cold} or colder.`
      : `${fridge}, ${untilWords(setting, before, until)}.`,
    inAll,
    ...(before > 0 && widestMm >= rules.largeTierMm
      ? [
          `A tier this large takes ${rules.softenLeastHours} to ${rules.softenMostHours} h to soften all through; that is for the taste, and the limit comes first.`,
        ]
      : []),
  ].join(' ');
}

function untilWords({ servedAt }: Setting, before: number, until: number | null): string {
  if (until === null || servedAt === null) {
    return before === 0 ? 'until you cut it' : `until ${formatDuration(before)} before you cut it`;
  }
  return before === 0
    ? `until you cut it at ${formatTime(servedAt)}`
    : `until ${formatTime(until)}; you cut it at ${formatTime(servedAt)}`;
}
