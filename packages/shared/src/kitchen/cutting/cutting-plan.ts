import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { pieceName } from '../piece-name.ts';
import { portionSizeOf } from '../portions.ts';
import { blockOfSheet, sheetFootprint, sheetSizeOf, type Block, type Footprint } from '../sizes.ts';
import { cutBlock, type BlockCut } from './cut-block.ts';
import { formatLength, type LengthLead } from '../measures.ts';
import { cuttingSteps } from './cutting-steps.ts';

/** One tier, the sheet, or one kind of cutting cake, and how it is cut. */
export type PieceCut = {
  readonly kind: 'tier' | 'sheet' | 'cutting-cake';
  /** From the board up, or into the design's cutting cakes. */
  readonly index: number;
  /** "Top tier", "The sheet", "Cutting cake: Half sheet". */
  readonly name: string;
  /** How many are cut this way. */
  readonly count: number;
  /** Why it is not cut on the day; null where it is. */
  readonly left: 'dummy' | 'keepsake' | null;
  /** Null for a dummy; a keepsake's is for the day it is eaten. */
  readonly cut: BlockCut | null;
  /** What to do, in words; both units, the studio's first. */
  readonly steps: readonly string[];
};

export type CuttingPlan = {
  /** In the order they are cut: the top tier first, cutting cakes last. */
  readonly pieces: readonly PieceCut[];
  /** "Dessert, 1 in / 2.5 cm by 2 in / 5 cm" is put together from these. */
  readonly portion: { readonly name: string } & Footprint;
  /** Portions served on the day; the same as the estimate's `fed`. */
  readonly portions: number;
};

/**
 * How a design is cut into the portion its guests chose; null while there is no cake. Throws
 * `UnknownPart`.
 */
export function cuttingPlanOf(design: Design, menu: Menu): CuttingPlan | null {
  const { cake } = design;
  if (cake === null) return null;
  const portion = portionSizeOf(design.guests, menu);
  const lead = menu.studio.lengthLead;
  const flat = sheetFootprint(portion);
  const piece = (it: Omit<PieceCut, 'cut' | 'steps'>, block: Block, footprint: Footprint) => {
    const cut = it.left === 'dummy' ? null : cutBlock(block, footprint, menu.kitchen);
    return { ...it, cut, steps: cuttingSteps(it.left, cut, lead) };
  };
  const pieces: PieceCut[] = [];
  if (cake.kind === 'tiered') {
    const tiers = cake.tiers.map(({ shape, widthMm, depthMm, heightMm, real, keepsake }, index) =>
      piece(
        {
          kind: 'tier',
          index,
          name: pieceName({ kind: 'tier', index }, cake, menu),
          count: 1,
          left: real ? (keepsake ? 'keepsake' : null) : 'dummy',
        },
        { shape, widthMm, depthMm, heightMm },
        portion,
      ),
    );
    pieces.push(...tiers.toReversed());
  } else if (cake.sheet !== null) {
    const size = sheetSizeOf(cake.sheet, menu);
    pieces.push(
      piece(
        { kind: 'sheet', index: 0, name: size.name, count: 1, left: null },
        blockOfSheet(size),
        flat,
      ),
    );
  }
  for (const [index, it] of cake.cuttingCakes.entries()) {
    const size = sheetSizeOf(it, menu, ['cake', 'cuttingCakes', index]);
    pieces.push(
      piece(
        {
          kind: 'cutting-cake',
          index,
          name: pieceName({ kind: 'cutting-cake', index }, cake, menu),
          count: it.count,
          left: null,
        },
        blockOfSheet(size),
        flat,
      ),
    );
  }
  return {
    pieces,
    portion: { name: portion.name, widthMm: portion.widthMm, depthMm: portion.depthMm },
    portions: pieces
      .filter((it) => it.left === null)
      .reduce((sum, it) => sum + it.count * (it.cut?.portions ?? 0), 0),
  };
}

/**
 * "77 portions of the dessert size, 1 in / 2.5 cm by 2 in / 5 cm at full height." Sheets are cut by
 * a size of their own, which their steps tell, so the guests' portion is said of tiers alone.
 */
export function portionsSentence(
  { pieces, portion, portions }: CuttingPlan,
  lead: LengthLead,
): string {
  const count = `${portions} ${portions === 1 ? 'portion' : 'portions'}`;
  const tiers = pieces.filter((it) => it.kind === 'tier').length;
  const size = `of the ${portion.name.toLowerCase()} size, ${formatLength(portion.widthMm, lead)} by ${formatLength(portion.depthMm, lead)} at full height`;
  if (tiers === 0) return `${count}.`;
  return tiers === pieces.length ? `${count} ${size}.` : `${count}; from tiers, ${size}.`;
}
