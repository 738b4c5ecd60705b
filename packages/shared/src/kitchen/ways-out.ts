import type { Cake, Coating, Setting } from '#shared/contracts/design.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { Filling } from '#shared/contracts/menu.ts';
import { detailOf, fineness, finestOn } from './detail.ts';
import { coatLimitC, fareInHeat } from './heat.ts';
import { formatTemperature } from './measures.ts';
import type { WayOut } from './note.ts';
import { coatingName, type ResolvedCoating } from './resolve-design.ts';
import { named } from './sentences.ts';
import type { Coat, RankedCoat, Situation } from './situation.ts';

/** How many ways are offered at once; more would be a menu again. */
export const mostWays = 3;

/** The same coat in another covering or style; the finish stays where the new one has it. */
function recoat(old: Coating, { covering, style }: Coat): Coating {
  return {
    covering: covering.id,
    style: style?.id ?? null,
    finish: covering.finishes.includes(old.finish)
      ? old.finish
      : (covering.finishes[0] ?? old.finish),
    colour: old.colour,
  };
}

export const sameCoat = (a: Coating, b: Coat | ResolvedCoating): boolean =>
  a.covering === b.covering.id && a.style === (b.style?.id ?? null);

/** A cake whose offending coats, the whole cake's or single tiers', are replaced by one other. */
export function withCoat(cake: Cake, offends: (coating: Coating) => boolean, choice: Coat): Cake {
  const change = (it: Coating | null) => (it !== null && offends(it) ? recoat(it, choice) : it);
  return {
    ...cake,
    coating: change(cake.coating),
    tiers: cake.tiers.map((it) => ({ ...it, coating: change(it.coating) })),
  };
}

/**
 * Whether guests lose nothing by it: whatever of theirs speaks against a coat or a filling speaks
 * against the cake as it is, in the same way.
 */
export function addsNoClash(situation: Situation): (it: Coat | Filling) => boolean {
  const { parts, guestClashes } = situation;
  const before = new Set(parts.flatMap((it) => guestClashes(it.contents)));
  return (it) =>
    contentsOf(it).every((contents) => guestClashes(contents).every((clash) => before.has(clash)));
}

const contentsOf = (it: Coat | Filling) => {
  if (!('covering' in it)) return [it.contents];
  return it.style === null ? [it.covering.contents] : [it.covering.contents, it.style.contents];
};

/** Ways to another coat than `coat`: the best ranked that stand up there and suit the guests. */
export function otherCoats(
  situation: Situation,
  coat: ResolvedCoating,
  suits: (choice: Coat) => boolean = () => true,
): WayOut[] {
  const { resolved } = situation;
  const { cake } = resolved.design;
  if (cake === null) return [];
  const noWorse = addsNoClash(situation);
  const offered = byWorkOn(situation, coat).filter(
    (it) =>
      it.heat !== 'stop' &&
      !(it.covering.id === coat.covering.id && it.style?.id === coat.style?.id) &&
      noWorse(it) &&
      suits(it),
  );
  // Another style of the same covering changes least; then one choice of every other covering.
  const same = offered.filter((it) => it.covering.id === coat.covering.id).slice(0, 2);
  const others = [...new Set(offered.map((it) => it.covering.id))]
    .filter((id) => id !== coat.covering.id && id !== 'semi-naked')
    .flatMap((id) => {
      const ofCovering = offered.filter((it) => it.covering.id === id);
      return ofCovering.find((it) => it.style?.id === coat.style?.id) ?? ofCovering[0] ?? [];
    });
  return [...same, ...others].slice(0, mostWays).map((choice) => ({
    label: coatingName(choice),
    patch: { cake: withCoat(cake, (it) => sameCoat(it, coat), choice) },
  }));
}

/** Coats that hold what stands on this one come first; a way out should not lead into another. */
function byWorkOn({ resolved, coats }: Situation, coat: ResolvedCoating): readonly RankedCoat[] {
  const under = resolved.tiers.filter(
    ({ coating }) =>
      coating?.covering.id === coat.covering.id && coating.style?.id === coat.style?.id,
  );
  const finest = finestOn(resolved, under);
  const holds = (it: Coat) => fineness[detailOf(it)] >= finest;
  return [...coats.filter(holds), ...coats.filter((it) => !holds(it))];
}

/** A room no warmer than a coat likes, kept to until the cake is cut. */
export function roomFor(limitC: number, { usualRoomC, heatMarginC }: KitchenRules): number {
  return Math.min(usualRoomC, Math.floor(limitC - heatMarginC));
}

/** The setting moved indoors, into a room this cool; null where it stands in such a one already. */
export function movedIndoors({ resolved, warmth }: Situation, limitC: number): Setting | null {
  const { setting } = resolved.design;
  if (setting === null || warmth === null) return null;
  const warmestC = roomFor(limitC, resolved.menu.kitchen);
  if (setting.place === 'indoors' && warmth.known && warmth.celsius <= warmestC) return null;
  return { ...setting, place: 'indoors', warmestC };
}

/** Inside until it is cut, in a room no warmer than the coat likes. */
export function indoorsWays(limitC: number, situation: Situation): WayOut[] {
  const setting = movedIndoors(situation, limitC);
  if (setting === null || setting.warmestC === null) return [];
  const { temperatureLead } = situation.resolved.menu.studio;
  const label = `Inside until cutting, at ${formatTemperature(setting.warmestC, temperatureLead)} or cooler`;
  return [{ label, patch: { setting } }];
}

/** Ways for a coat that is too warm where it stands: another that holds, or a cooler place. */
export function heatWays(coat: ResolvedCoating, limitC: number, situation: Situation): WayOut[] {
  const { warmth } = situation;
  if (warmth === null) return [];
  const better = otherCoats(
    situation,
    coat,
    (it) =>
      coatLimitC(it) > limitC &&
      fareInHeat(coatLimitC(it), warmth.celsius, situation.resolved.menu.kitchen) !== 'stop',
  );
  return [...better, ...indoorsWays(limitC, situation)];
}

/** Ways to another filling wherever in the cake this one is. */
export function otherFillings(
  situation: Situation,
  filling: Filling,
  suits: (filling: Filling) => boolean,
): WayOut[] {
  const { design, menu } = situation.resolved;
  const { cake } = design;
  if (cake === null) return [];
  const noWorse = addsNoClash(situation);
  return menu.fillings
    .filter((it) => it.id !== filling.id && suits(it) && noWorse(it))
    .slice(0, mostWays)
    .map((choice) => ({
      label: named(choice.name, 'filling'),
      patch: {
        cake: withInside(cake, (it) => ({
          ...it,
          fillingId: it.fillingId === filling.id ? choice.id : it.fillingId,
        })),
      },
    }));
}

type Inside = { readonly spongeId: string | null; readonly fillingId: string | null };

/** The cake with what is inside it changed: tiers, the sheet and the cutting cakes alike. */
export function withInside(cake: Cake, change: (it: Inside, of: 'tier' | 'sheet') => Inside): Cake {
  return {
    ...cake,
    tiers: cake.tiers.map((it) => ({ ...it, ...change(it, 'tier') })),
    sheet: cake.sheet === null ? null : { ...cake.sheet, ...change(cake.sheet, 'sheet') },
    cuttingCakes: cake.cuttingCakes.map((it) => ({ ...it, ...change(it, 'sheet') })),
  };
}
