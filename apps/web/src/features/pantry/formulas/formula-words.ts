import type { FormulaKind, FormulaStep, PartFormulas } from '#shared/contracts/pantry.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { figure } from '#web/lib/figure.ts';
import type { House } from '../house.ts';

export const kindWords: Readonly<Record<FormulaKind, string>> = {
  sponge: 'Sponge',
  filling: 'Filling',
  buttercream: 'Buttercream',
  custard: 'Custard',
  other: 'Other',
};

export const resourceWords: Readonly<Record<FormulaStep['resource'], string>> = {
  bench: 'at the bench',
  mixer: 'in the mixer',
  oven: 'in the oven',
  cold: 'in the cold',
};

/** Hours as shelf lives are said: "36 h", "5 days", "2 days 12 h". */
export function shelfLife(hours: number): string {
  if (hours === 0) return 'not at all';
  const days = Math.floor(hours / 24);
  const rest = hours % 24;
  if (hours < 48) return `${hours} h`;
  return rest === 0 ? `${days} days` : `${days} days ${rest} h`;
}

/** The day a version was made: "11 November 2026, 10:05". */
export function versionDate(
  instant: string,
  { zone, locale }: Pick<House, 'zone' | 'locale'>,
): string {
  const { date, minute } = localAt(new Date(instant), zone);
  return `${formatDay(date, { locale, weekday: false, year: true })}, ${formatTime(minute)}`;
}

/** What a critical limit allows of time: "17 s", "40 min", "6 h". */
export function limitTime(seconds: number): string {
  if (seconds < 120) return `${seconds} s`;
  const minutes = Math.round(seconds / 60);
  if (minutes < 120) return `${minutes} min`;
  const rest = minutes % 60;
  return rest === 0 ? `${minutes / 60} h` : `${Math.floor(minutes / 60)} h ${rest}`;
}

/** What of the menu is made by a formula, by the names the menu gives. */
export function onTheMenu(formulaId: string, parts: PartFormulas, menu: Menu): readonly string[] {
  const names: string[] = [];
  const gather = (
    made: Readonly<Record<string, string | undefined>>,
    sold: readonly { readonly id: string; readonly name: string }[],
    kind: string,
  ) => {
    for (const { id, name } of sold) if (made[id] === formulaId) names.push(`${name}, ${kind}`);
  };
  gather(parts.sponges, menu.sponges, 'sponge');
  gather(parts.fillings, menu.fillings, 'filling');
  gather(parts.styles, menu.styles, 'buttercream');
  gather(parts.coverings, menu.coverings, 'covering');
  for (const { id, name } of menu.decorations) {
    if (parts.decorations[id]?.formulaId === formulaId) names.push(`${name}, decoration`);
  }
  return names;
}

export function percentText(percent: number, locale: string): string {
  const digits = percent < 10 ? 1 : 0;
  return `${figure(percent, locale, digits)} %`;
}
