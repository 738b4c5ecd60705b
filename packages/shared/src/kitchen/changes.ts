import type { Cake, Coating, Design } from '#shared/contracts/design.ts';
import type { DesignPatch } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatDuration, formatTime } from '#shared/dates/format.ts';
import { formatTemperature } from './measures.ts';
import { coatingName } from './resolve-design.ts';
import { named } from './sentences.ts';

/**
 * What one press makes of a design, part by part, as people read it before they press: "Vanilla
 * sponge becomes Dark cocoa sponge". A stack of other sizes is told by its own name alone.
 */
export function changesOf(design: Design, patch: DesignPatch, menu: Menu): string[] {
  return [
    ...(patch.cake === undefined || design.cake === null
      ? []
      : changesOfCake(design.cake, patch.cake, menu)),
    ...changesOfLook(design, patch, menu),
    ...changesOfSetting(design, patch, menu),
  ];
}

function changesOfCake(before: Cake, after: Cake, menu: Menu): string[] {
  if (before.kind !== after.kind || before.tiers.length !== after.tiers.length) return [];
  const lines = new Set<string>();
  const wasEaten = before.tiers.some((it) => it.real);
  if (wasEaten && after.tiers.every((it) => !it.real)) {
    lines.add('The cake on show is a dummy: nobody eats from it.');
  } else {
    const then = insidesOf(after);
    insidesOf(before).forEach((it, at) => {
      const next = then[at];
      if (next !== undefined) addInside(lines, it, next, menu);
    });
  }
  addCoat(lines, before.coating, after.coating, menu);
  before.tiers.forEach((tier, at) => {
    // A tier without a coat of its own wears the cake's.
    if (tier.coating !== null) addCoat(lines, tier.coating, after.tiers[at]?.coating ?? null, menu);
  });
  for (const cutting of after.cuttingCakes) {
    const known = before.cuttingCakes.some(
      (it) => it.sizeId === cutting.sizeId && it.count === cutting.count,
    );
    const size = menu.sheetSizes.find((it) => it.id === cutting.sizeId);
    if (!known && size !== undefined) {
      lines.add(`Cut in the kitchen, kept cold until then: ${cutting.count} × ${size.name}.`);
    }
  }
  return [...lines];
}

type Inside = { readonly spongeId: string | null; readonly fillingId: string | null };

const insidesOf = ({ tiers, sheet, cuttingCakes }: Cake): readonly Inside[] =>
  sheet === null ? [...tiers, ...cuttingCakes] : [...tiers, sheet, ...cuttingCakes];

function addInside(lines: Set<string>, from: Inside, to: Inside, menu: Menu): void {
  if (from.spongeId !== null && to.spongeId !== null && from.spongeId !== to.spongeId) {
    const name = nameIn(menu.sponges, from.spongeId, 'sponge');
    lines.add(`${name} becomes ${nameIn(menu.sponges, to.spongeId, 'sponge')}.`);
  }
  if (from.fillingId === null || from.fillingId === to.fillingId) return;
  const name = nameIn(menu.fillings, from.fillingId, 'filling');
  lines.add(
    to.fillingId === null
      ? `${name} is left out.`
      : `${name} becomes ${nameIn(menu.fillings, to.fillingId, 'filling')}.`,
  );
}

function addCoat(lines: Set<string>, from: Coating | null, to: Coating | null, menu: Menu): void {
  if (to === null || from === to) return;
  const after = coatName(to, menu);
  if (from === null) {
    lines.add(`${after} goes over it.`);
    return;
  }
  const before = coatName(from, menu);
  if (before !== after) lines.add(`${before} becomes ${after}.`);
}

function nameIn(
  items: readonly { readonly id: string; readonly name: string }[],
  id: string,
  kind: string,
): string {
  return named(items.find((it) => it.id === id)?.name ?? id, kind);
}

function coatName(coat: Coating, menu: Menu): string {
  const covering = menu.coverings.find((it) => it.id === coat.covering);
  if (covering === undefined) return coat.covering;
  const style = menu.styles.find((it) => it.id === coat.style) ?? null;
  return `${coatingName({ covering, style })}, ${coat.finish}`;
}

function changesOfLook({ look }: Design, patch: DesignPatch, menu: Menu): string[] {
  const after = patch.look;
  if (look === null || after === undefined) return [];
  const left = new Set(after.decorations.map((it) => it.decorationId));
  const gone = new Set(look.decorations.map((it) => it.decorationId).filter((it) => !left.has(it)));
  return [...gone].map((id) => {
    const name = menu.decorations.find((it) => it.id === id)?.name ?? id;
    return `${name}: left out.`;
  });
}

function changesOfSetting({ setting }: Design, patch: DesignPatch, menu: Menu): string[] {
  const after = patch.setting;
  if (setting === null || after === undefined) return [];
  const lead = menu.studio.temperatureLead;
  const lines: string[] = [];
  if (after.place !== setting.place || after.warmestC !== setting.warmestC) {
    const where = { indoors: 'inside', shade: 'in the shade', sun: 'in the sun' }[after.place];
    const warmth =
      after.warmestC === null || after.warmestC === setting.warmestC
        ? ''
        : `, at ${formatTemperature(after.warmestC, lead)} or cooler`;
    lines.push(`It stands ${where}${warmth}.`);
  }
  if (after.minutesOut !== setting.minutesOut) {
    lines.push(
      after.servedAt === null
        ? `It comes out of the fridge ${formatDuration(after.minutesOut)} before you cut it.`
        : `It comes out of the fridge at ${formatTime(Math.max(0, after.servedAt - after.minutesOut))}.`,
    );
  }
  return lines;
}
