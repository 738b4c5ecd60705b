import type { CuttingCake, Sheet } from '#shared/contracts/design.ts';
import type { Menu, PortionSize, SheetSize } from '#shared/contracts/menu.ts';
import {
  idOfStack,
  nameOfStack,
  stacksOf,
  usualTiers,
  type Stack,
  type StackWish,
} from './proposals.ts';
import { cuttingWords } from './sentences.ts';
import { decksOf, portionsOfSheet } from './sizes.ts';

/** So many sheets of one size, cut in the kitchen. */
type Cut = { readonly size: SheetSize; readonly count: number; readonly portions: number };

/** A stack on show, and what is cut in the kitchen for the rest. */
export type ProposedShow = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly portions: number;
  readonly stack: Stack;
  readonly cut: Cut;
};

/** A sheet on the table, and more of the same in the kitchen where one does not feed everybody. */
export type ProposedSheet = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly portions: number;
  readonly size: SheetSize;
  readonly cut: Cut | null;
};

/** No more than this many of one kind in an order. */
const mostOfOneKind = 100;

/** The sheets of one size that feed a number with the least waste, then the fewest of them. */
export function sheetsFor(wanted: number, menu: Menu, portion: PortionSize): Cut | null {
  if (wanted <= 0) return null;
  const slack = Math.max(2, wanted * 0.05);
  return (
    menu.sheetSizes
      .flatMap((size): Cut[] => {
        const each = portionsOfSheet(size, portion);
        if (each === 0) return [];
        const count = Math.ceil(wanted / each);
        return count > mostOfOneKind ? [] : [{ size, count, portions: count * each }];
      })
      .toSorted((a, b) => costOf(a) - costOf(b) || a.portions - b.portions)[0] ?? null
  );

  /** A sheet more to bake, coat and carry weighs as much as a little waste. */
  function costOf({ count, portions }: Cut): number {
    return Math.floor((portions - wanted) / slack) + count * 0.75;
  }
}

/**
 * Show cakes with cutting cakes in the kitchen. Where a stack alone would do there is one, for
 * large tables; where none does there are two, a grand and a smaller show. Empty where the studio
 * bakes no sheets or no stack.
 */
export function proposeShows(
  wanted: number,
  menu: Menu,
  portion: PortionSize,
  { alone, ...wish }: StackWish & { readonly alone: boolean },
): ProposedShow[] {
  const { kitchen } = menu;
  const showShare = {
    least: kitchen.showLeastPpm / 1e6,
    most: kitchen.showMostPpm / 1e6,
    best: kitchen.showBestPpm / 1e6,
  };
  const fewestOnShow = kitchen.fewestTiersOnShow;
  if (alone && wanted < kitchen.cuttingFromPortions) return [];
  const stacks = stacksOf(menu, portion, wish).filter((it) => decksOf(it, kitchen) === 1);
  const largest = stacks.at(-1)?.portions ?? 0;
  const least = Math.min(wanted * showShare.least, largest * 0.5);
  const most = wanted * showShare.most;
  const ideal = Math.min(wanted * showShare.best, largest * 0.8);
  const best = (tiers: number): ProposedShow | null => {
    const found = stacks
      .filter((it) => it.sizes.length === tiers && it.portions >= least && it.portions <= most)
      .flatMap((stack) => {
        const cut = sheetsFor(wanted - stack.portions, menu, portion);
        return cut === null ? [] : [{ stack, cut, portions: stack.portions + cut.portions }];
      })
      .toSorted((a, b) => costOf(a) - costOf(b) || a.portions - b.portions)[0];
    return found === undefined ? null : describe(found, menu);
  };
  const slack = Math.max(2, wanted * 0.05);
  const costOf = (it: { stack: Stack; cut: Cut; portions: number }) =>
    (it.portions - wanted) / slack +
    it.cut.count * 0.5 +
    (Math.abs(it.stack.portions - ideal) / Math.max(1, ideal)) * 2;
  const usual = Math.max(fewestOnShow, usualTiers(wanted * showShare.best, kitchen));
  const grand = best(usual) ?? best(usual - 1) ?? best(usual + 1);
  if (grand === null) return [];
  if (alone) return [grand];
  const small = usual > fewestOnShow ? best(fewestOnShow) : null;
  return (small === null ? [grand] : [grand, { ...small, blurb: 'A smaller show' }]).sort(
    (a, b) => a.portions - b.portions,
  );
}

function describe(
  { stack, cut, portions }: { stack: Stack; cut: Cut; portions: number },
  menu: Menu,
): ProposedShow {
  return {
    id: `${idOfStack(stack)}+${cut.count}-${cut.size.id}`,
    name: `${nameOfStack(stack, menu)}, with ${cuttingWords(cut.count)}`,
    blurb: 'On show and in the kitchen',
    portions,
    stack,
    cut,
  };
}

/**
 * A sheet for so many, the smallest that feeds them alone; where that leaves too much or there is
 * none, a sheet with more of them in the kitchen. Null where neither is sensible.
 */
export function proposeSheet(
  wanted: number,
  menu: Menu,
  portion: PortionSize,
): ProposedSheet | null {
  const bySize = menu.sheetSizes
    .map((size) => ({ size, each: portionsOfSheet(size, portion) }))
    .filter((it) => it.each > 0)
    .toSorted((a, b) => a.each - b.each);
  const { sheetOverPpm, sheetOverPortions } = menu.kitchen;
  const most = Math.max(wanted * (1 + sheetOverPpm / 1e6), wanted + sheetOverPortions);
  const single = bySize.find((it) => it.each >= wanted && it.each <= most);
  if (single !== undefined) return describeSheet(single.size, single.each, null);
  const shown = bySize.findLast((it) => it.each < wanted);
  if (shown === undefined) return null;
  const cut = sheetsFor(wanted - shown.each, menu, portion);
  if (cut === null || shown.each + cut.portions > most) return null;
  return describeSheet(shown.size, shown.each, cut);
}

function describeSheet(size: SheetSize, portions: number, cut: Cut | null): ProposedSheet {
  const own = { id: `sheet-${size.id}`, name: size.name, blurb: 'Flat', size, cut };
  if (cut === null) return { ...own, portions };
  return {
    ...own,
    id: `${own.id}+${cut.count}-${cut.size.id}`,
    name: `${size.name}, with ${cuttingWords(cut.count)}`,
    portions: portions + cut.portions,
  };
}

/** Layers of a sheet of cake on the table: two where it is high enough for a filling. */
export function usualSheetLayers({ heightMm }: Pick<SheetSize, 'heightMm'>): number {
  return heightMm >= 60 ? 2 : 1;
}

/** Layers of a plain cutting cake: the guests eat the same cake as on show, filling and all. */
const cuttingLayers = 2;

type Inside = { readonly spongeId: string | null; readonly fillingId: string | null };

/** Cutting cakes as they stand in a design, with the inside of the cake on show. */
export function cuttingCakeOf(size: SheetSize, count: number, inside: Inside): CuttingCake {
  return { sizeId: size.id, count, layers: cuttingLayers, ...inside };
}

/** A sheet as it stands in a design. */
export function sheetOf(size: SheetSize, { spongeId, fillingId }: Inside): Sheet {
  const layers = usualSheetLayers(size);
  return { sizeId: size.id, layers, spongeId, fillingId: layers > 1 ? fillingId : null };
}
