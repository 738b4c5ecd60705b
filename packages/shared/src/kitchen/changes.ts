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
  const inside = (cake: Cake) => [
    ...cake.tiers,
    ...(cake.sheet === null ? [] : [cake.sheet]),
    ...cake.cuttingCakes,
  ];
  const lines = new Set<string>();
  const add = (from: string | null, to: string | null, what: (to: string | null) => string) => {
    if (from !== null && from !== to) lines.add(what(to));
  };
  if (before.tiers.some((it) => it.real) && after.tiers.every((it) => !it.real)) {
    if (after.tiers.length > 0) lines.add('The cake on show is a dummy: nobody eats from it.');
  } else {
    const then = inside(after);
    inside(before).forEach((it, at) => {
      const next = then[at];
      if (next === undefined) return;
      const spongeName = (id: string) => nameIn(menu.sponges, id, 'sponge');
      const fillingName = (id: string) => nameIn(menu.fillings, id, 'filling');
      add(it.spongeId, next.spongeId, (to) =>
        to === null ? '' : `${spongeName(it.spongeId ?? '')} becomes ${spongeName(to)}.`,
      );
      add(it.fillingId, next.fillingId, (to) =>
        to === null
          ? `${fillingName(it.fillingId ?? '')} is left out.`
          : `${fillingName(it.fillingId ?? '')} becomes ${fillingName(to)}.`,
      );
    });
  }
  const coats = (cake: Cake) => [cake.coating, ...cake.tiers.map((it) => it.coating)];
  const coatsAfter = coats(after);
  coats(before).forEach((coat, at) => {
    const from = coatName(coat, menu);
    const to = coatName(coatsAfter[at] ?? null, menu);
    if (to === null || from === to) return;
    // A tier without a coat of its own wears the cake's.
    if (from !== null) lines.add(`${from} becomes ${to}.`);
    else if (at === 0) lines.add(`${to} goes over it.`);
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
  lines.delete('');
  return [...lines];
}

function nameIn(
  items: readonly { readonly id: string; readonly name: string }[],
  id: string,
  kind: string,
): string {
  return named(items.find((it) => it.id === id)?.name ?? id, kind);
}

function coatName(coat: Coating | null, menu: Menu): string | null {
  const covering = menu.coverings.find((it) => it.id === coat?.covering);
  if (coat === null || covering === undefined) return null;
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
