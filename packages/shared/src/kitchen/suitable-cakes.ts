import type { Cake, Coating } from '#shared/contracts/design.ts';
import type { EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Contents, Filling, Menu, Sponge } from '#shared/contracts/menu.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from './allergen-names.ts';
import { changesOf } from './changes.ts';
import { sharper } from './heat.ts';
import { mergeAllergens } from './merge-allergens.ts';
import type { Way } from './note.ts';
import { partsOf } from './parts.ts';
import { priceDesign } from './price.ts';
import { rankCoats } from './rank-coats.ts';
import { coatingName, resolveDesign } from './resolve-design.ts';
import { named } from './sentences.ts';
import { tableOf, type RankedCoat, type Situation } from './situation.ts';
import { withInside } from './ways-out.ts';
import { fareOfFilling, makingsWithout } from './whole-cakes.ts';

/** A whole cake of the menu that nothing guests told speaks against by its ingredients. */
export type SuitableCake = {
  readonly name: string;
  /** What is in it, as the region names it; empty where no label names anything. */
  readonly contains: readonly string[];
  readonly level: AdviceLevel;
  /** How its coat fares where it will stand. */
  readonly holds: string;
  /** Makes the cake as it is designed into this one; null before there is one. */
  readonly way: Way | null;
  /** What the order would cost then, minor units; null before there is a cake. */
  readonly totalMinor: number | null;
};

/** How many are told of; more would be the menu again. */
const most = 4;

/**
 * Whole cakes of the menu for the guests of a design, best first for the day and the place: sponge,
 * filling and coat together, since one part that suits helps nobody beside one that does not. Those
 * that would not hold are left out while others do. Empty where the menu makes none. `today` is the
 * studio's local date.
 */
export function suitableCakes(
  { design, date }: EstimateRequest,
  menu: Menu,
  today: string,
): SuitableCake[] {
  const resolved = resolveDesign(design, menu);
  const table = tableOf(resolved, partsOf(resolved), { date, collectAt: null });
  const situation: Situation = { ...table, coats: rankCoats(table) };
  const clashes = (contents: Contents) => table.guestClashes(contents).length > 0;
  const { sponges, fillings, coats } = makingsWithout(situation, clashes);
  const holding = coats.filter((it) => it.heat !== 'stop');
  const offered = varied(holding.length > 0 ? holding : coats);
  const chosen = resolved.tiers.find((it) => it.real);
  const bake = ownFirst(sponges, chosen?.sponge ?? null);
  const fill = ownFirst(fillings, chosen?.filling ?? null);
  return offered.flatMap((coat, nth): SuitableCake[] => {
    const sponge = bake(nth);
    const filling = fill(nth);
    if (sponge === undefined || filling === undefined) return [];
    const { way, ...cake } = told({ sponge, filling, coat }, situation, clashes);
    if (way === null) return [{ ...cake, way, totalMinor: null }];
    const made = resolveDesign({ ...design, ...way.patch }, menu);
    return [{ ...cake, way, totalMinor: priceDesign(made, { date, today }).totalMinor }];
  });
}

/** What is chosen already stays where it suits; else the menu's own, one after the other. */
function ownFirst<Item extends { readonly id: string }>(
  items: readonly Item[],
  chosen: Item | null,
): (nth: number) => Item | undefined {
  const kept = items.find((it) => it.id === chosen?.id);
  return (nth) => kept ?? items[Math.min(nth, items.length - 1)];
}

/** One of each covering first, then more styles of the best. */
function varied(coats: readonly RankedCoat[]): readonly RankedCoat[] {
  const first = [...new Set(coats.map((it) => it.covering.id))].flatMap(
    (id) => coats.find((it) => it.covering.id === id) ?? [],
  );
  return [...first, ...coats.filter((it) => !first.includes(it))]
    .filter((it) => it.covering.id !== 'semi-naked' || coats.length <= most)
    .slice(0, most);
}

type Made = { readonly sponge: Sponge; readonly filling: Filling; readonly coat: RankedCoat };

function told(
  made: Made,
  situation: Situation,
  clashes: (contents: Contents) => boolean,
): Omit<SuitableCake, 'totalMinor'> {
  const { sponge, filling, coat } = made;
  const { design, menu } = situation.resolved;
  const contents = [
    sponge.contents,
    filling.contents,
    coat.covering.contents,
    ...(coat.style === null ? [] : [coat.style.contents]),
  ];
  const name = formatList([
    named(sponge.name, 'sponge'),
    named(filling.name, 'filling'),
    coatingName(coat),
  ]);
  const patch = patchOf(made, situation, clashes);
  return {
    name,
    contains: mergeAllergens(contents.map((it) => it.allergens))
      .filter((it) => it.state === 'contains')
      .map((it) => allergenLabel(it, menu.studio.labelRegion)),
    level: sharper(coat.heat, fareOfFilling(filling, situation)),
    holds: coat.rank.sentence,
    way: patch === null ? null : { label: name, changes: changesOf(design, patch, menu), patch },
  };
}

function patchOf(
  { sponge, filling, coat }: Made,
  { resolved }: Situation,
  clashes: (contents: Contents) => boolean,
): Way['patch'] | null {
  const { design, decorations } = resolved;
  const { cake, look } = design;
  if (cake === null) return null;
  const { finishes } = coat.covering;
  const wanted = cake.coating?.finish;
  const coating: Coating = {
    covering: coat.covering.id,
    style: coat.style?.id ?? null,
    finish: finishes.find((it) => it === wanted) ?? finishes[0] ?? 'smooth',
    colour: cake.coating?.colour ?? null,
  };
  const inside = withInside(cake, (it) => ({
    // A dummy has nothing inside, and a sheet without a filling stays without.
    spongeId: it.spongeId === null ? null : sponge.id,
    fillingId: it.fillingId === null ? null : filling.id,
  }));
  const changed: Cake = {
    ...inside,
    coating,
    tiers: inside.tiers.map((it) => ({ ...it, coating: null })),
  };
  const bad = new Set(
    decorations.filter((it) => clashes(it.decoration.contents)).map((it) => it.decoration.id),
  );
  if (look === null || bad.size === 0) return { cake: changed };
  const left = look.decorations.filter((it) => !bad.has(it.decorationId));
  return { cake: changed, look: { ...look, decorations: left } };
}
