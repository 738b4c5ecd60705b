import type { Tier } from '#shared/contracts/design.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { Menu, PortionSize, TierSize } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { lengthFigure } from './measures.ts';
import { countOf } from './sentences.ts';
import { decksOf, portionsOfBlock } from './sizes.ts';

/** A stack of the studio's tins, from the board up, and how many it feeds. */
export type Stack = {
  readonly sizes: readonly TierSize[];
  readonly heightMm: number;
  /** The top tier is kept back and feeds nobody on the day. */
  readonly keepTop: boolean;
  readonly portions: number;
};

export type ProposedStack = Stack & {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
};

/** What somebody wants of a stack beside its size. */
export type StackWish = {
  /** The top tier is a keepsake and the others feed everybody. */
  readonly keepTop: boolean;
  /** The studio's own usual shape takes its place where it bakes none of this one. */
  readonly shape: 'round' | 'square';
};

/** A round cake that is all eaten. */
export const plainWish: StackWish = { keepTop: false, shape: 'round' };

/** A millimetre lost between inches and millimetres is not a smaller step. */
const roundingMm = 1;

const stacksByMenu = new WeakMap<Menu, Map<string, readonly Stack[]>>();

/**
 * Every sensible stack of the studio's sizes of one shape, fewest portions first; of the other
 * shape where it bakes none of it.
 */
export function stacksOf(menu: Menu, portion: PortionSize, wish: StackWish): readonly Stack[] {
  let byPortion = stacksByMenu.get(menu);
  if (byPortion === undefined) {
    byPortion = new Map();
    stacksByMenu.set(menu, byPortion);
  }
  const key = `${portion.id}:${wish.shape}:${String(wish.keepTop)}`;
  let stacks = byPortion.get(key);
  if (stacks === undefined) {
    stacks = enumerate(menu, portion, wish);
    byPortion.set(key, stacks);
  }
  return stacks;
}

function enumerate(menu: Menu, portion: PortionSize, { keepTop, shape }: StackWish): Stack[] {
  const { kitchen } = menu;
  const { smallestStepMm, largestStepMm, mostTiers } = kitchen;
  const wished = menu.tierSizes.filter((it) => it.shape === shape);
  const even = menu.tierSizes.filter((it) => it.shape !== 'rectangle');
  const widestFirst = (wished.length > 0 ? wished : even).toSorted((a, b) => b.widthMm - a.widthMm);
  const largestKept = Math.max(kitchen.largestKeepsakeMm, widestFirst.at(-1)?.widthMm ?? 0);
  const isKept = (sizes: readonly TierSize[]) =>
    sizes.length > 1 && (sizes.at(-1)?.widthMm ?? 0) <= largestKept;
  const stacks: Stack[] = [];
  const grow = (sizes: readonly TierSize[], from: number) => {
    if (sizes.length > 0 && (!keepTop || isKept(sizes))) {
      stacks.push(...atHeights(sizes, portion, keepTop, kitchen));
    }
    if (sizes.length === mostTiers) return;
    const top = sizes.at(-1);
    for (const [index, next] of widestFirst.entries()) {
      if (index < from) continue;
      if (top !== undefined) {
        const step = top.widthMm - next.widthMm;
        if (step < smallestStepMm - roundingMm || step > largestStepMm) continue;
      }
      grow([...sizes, next], index + 1);
    }
  };
  grow([], 0);
  return stacks.sort((a, b) => a.portions - b.portions);
}

/** A stack at the usual height, and again with double tiers for tables that need more. */
function atHeights(
  sizes: readonly TierSize[],
  portion: PortionSize,
  keepTop: boolean,
  rules: KitchenRules,
): Stack[] {
  const { usualHeightMm, doubleHeightMm } = rules;
  const common = (sizes[0]?.heightsMm ?? []).filter((height) =>
    sizes.every((it) => it.heightsMm.includes(height)),
  );
  const nearest = (heights: readonly number[], wanted: number) =>
    heights.toSorted((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted))[0];
  const usual = nearest(
    common.filter((it) => it <= doubleHeightMm),
    usualHeightMm,
  );
  const double = nearest(
    common.filter((it) => it > doubleHeightMm),
    doubleHeightMm,
  );
  return [usual, double].flatMap((heightMm) =>
    heightMm === undefined
      ? []
      : [
          {
            sizes,
            heightMm,
            keepTop,
            portions: sizes
              .slice(0, keepTop ? -1 : undefined)
              .reduce((sum, it) => sum + portionsOfBlock({ ...it, heightMm }, portion, rules), 0),
          },
        ],
  );
}

/** How many tiers look right for a table, by the studio's figures. */
export function usualTiers(wanted: number, rules: KitchenRules): number {
  if (wanted <= rules.oneTierPortions) return 1;
  if (wanted <= rules.twoTierPortions) return 2;
  if (wanted <= rules.threeTierPortions) return 3;
  return wanted <= rules.fourTierPortions ? 4 : 5;
}

/**
 * Two or three stacks that feed a number of portions: the one that wastes least, one with some
 * over, and one of another number of tiers. Least waste first; usual heights before
 * double ones. Empty where the studio bakes nothing large enough. The same menu, number and wish
 * always give the same answer.
 */
export function proposeStacks(
  wanted: number,
  menu: Menu,
  portion: PortionSize,
  wish: StackWish = plainWish,
): ProposedStack[] {
  const { kitchen } = menu;
  const enough = stacksOf(menu, portion, wish).filter((it) => it.portions >= wanted);
  const single = enough.filter((it) => decksOf(it, kitchen) === 1);
  const usable = single.length > 0 ? single : enough;
  const tiers = usualTiers(wanted, kitchen);
  const offBy = (it: Stack) => Math.abs(it.sizes.length - tiers);
  // Waste first; between stacks that waste much the same, the more usual number of tiers.
  const slack = Math.max(2, Math.round(wanted * 0.05));
  const cost = (it: Stack, from: number) =>
    Math.floor((it.portions - from) / slack) * 2 + offBy(it) * 1.5;
  const best = (from: number, stacks: readonly Stack[]) =>
    stacks
      .filter((it) => it.portions >= from)
      .toSorted((a, b) => cost(a, from) - cost(b, from) || a.portions - b.portions)[0];

  const just = best(wanted, usable);
  if (just === undefined) return [];
  const over = best(
    Math.max(just.portions + 1, Math.ceil(wanted * (1 + kitchen.someOverPpm / 1e6))),
    usable.filter((it) => it.sizes.length === just.sizes.length),
  );
  const other = best(
    wanted,
    usable.filter(
      (it) => it.sizes.length !== just.sizes.length && it.portions <= wanted + 2 * slack + 2,
    ),
  );
  return [
    describe(just, 'Just enough', menu),
    ...(over === undefined ? [] : [describe(over, 'Some over', menu)]),
    ...(other === undefined ? [] : [describe(other, otherWord(other, just), menu)]),
  ].sort((a, b) => a.portions - b.portions);
}

const otherWord = (other: Stack, just: Stack): string =>
  other.sizes.length > just.sizes.length ? 'Taller' : 'Lower and wider';

function describe(stack: Stack, blurb: string, menu: Menu): ProposedStack {
  return { ...stack, id: idOfStack(stack), name: nameOfStack(stack, menu), blurb };
}

/** The same for the same tiers, whatever they feed. */
export function idOfStack({ sizes, heightMm, keepTop }: Stack): string {
  const tins = sizes.map((it) => `${it.shape}-${it.widthMm}`).join('+');
  return `${tins}x${heightMm}${keepTop ? '-kept' : ''}`;
}

/** "Three tiers, 10, 8 and 6 in", the top kept back where it is. */
export function nameOfStack({ sizes, keepTop }: Stack, menu: Menu): string {
  const lead = menu.studio.lengthLead;
  const figures = sizes.map((it) => lengthFigure(it.widthMm, lead));
  const kept = keepTop ? ', the top one kept back' : '';
  const shape = sizes[0]?.shape === 'square' ? 'square ' : '';
  return `${countOf(sizes.length, `${shape}tier`)}, ${formatList(figures)} ${lead}${kept}`;
}

/** Figures that say how many layers a tier has. */
type LayerRules = Pick<KitchenRules, 'doubleHeightMm' | 'twoLayersUpToMm'>;

/** Layers of sponge for a height: one for about every 35 mm, an even number when cut double. */
export function usualLayers(heightMm: number, rules: LayerRules): number {
  if (heightMm <= rules.twoLayersUpToMm) return 2;
  return decksOf({ heightMm }, rules) === 1 ? 3 : 4;
}

/** The tiers of a stack as they stand in a design. */
export function tiersOf(
  stack: Stack,
  inside: { readonly spongeId: string | null; readonly fillingId: string | null },
  rules: LayerRules,
): Tier[] {
  return stack.sizes.map(({ shape, widthMm, depthMm }, index) => ({
    shape,
    widthMm,
    depthMm,
    heightMm: stack.heightMm,
    layers: usualLayers(stack.heightMm, rules),
    real: true,
    keepsake: stack.keepTop && index === stack.sizes.length - 1,
    spongeId: inside.spongeId,
    fillingId: inside.fillingId,
    coating: null,
  }));
}
