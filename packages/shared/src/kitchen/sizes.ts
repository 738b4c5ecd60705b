import type { Cake, Sheet, Tier } from '#shared/contracts/design.ts';
import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { Menu, PortionSize, SheetSize } from '#shared/contracts/menu.ts';
import type { Shape } from '#shared/contracts/vocabulary.ts';
import { UnknownPart } from './unknown-part.ts';

/** A block of cake seen from above and its height, millimetres. */
export type Block = {
  readonly shape: Shape;
  readonly widthMm: number;
  readonly depthMm: number;
  readonly heightMm: number;
};

/** What is cut: width along the ring or row, depth towards the middle, millimetres. */
export type Footprint = Pick<PortionSize, 'widthMm' | 'depthMm'>;

/** Sums of quotients can fall a hair short of a whole number; half a millionth is not cake. */
const hair = 1e-9;

/** Seen from above, square millimetres. */
export function areaMm2(block: Pick<Block, 'shape' | 'widthMm' | 'depthMm'>): number {
  return block.shape === 'round'
    ? (Math.PI * block.widthMm ** 2) / 4
    : block.widthMm * block.depthMm;
}

/** Around the side, millimetres. */
export function perimeterMm(block: Pick<Block, 'shape' | 'widthMm' | 'depthMm'>): number {
  return block.shape === 'round' ? Math.PI * block.widthMm : 2 * (block.widthMm + block.depthMm);
}

/** Millilitres: V = pi d^2 h / 4 for a round. */
export function volumeMl(block: Block): number {
  return (areaMm2(block) * block.heightMm) / 1000;
}

/** One cut of a round: a ring from `outerMm` to `innerMm` (radii), or the core where inner is 0. */
export type Ring = {
  readonly outerMm: number;
  readonly innerMm: number;
  readonly pieces: number;
};

/**
 * Cuts a round outside in: rings as deep as a portion, each cut across into pieces as wide as a
 * portion along its middle, then the core in wedges. Every ring rounds down, so the whole is
 * never more than area / footprint.
 */
export function cutRound(diameterMm: number, portion: Footprint): Ring[] {
  const rings: Ring[] = [];
  let outer = diameterMm / 2;
  while (outer > 0) {
    const inner = outer >= portion.depthMm ? outer - portion.depthMm : 0;
    const area = Math.PI * (outer ** 2 - inner ** 2);
    rings.push({
      outerMm: outer,
      innerMm: inner,
      pieces: Math.floor(area / (portion.widthMm * portion.depthMm) + hair),
    });
    outer = inner;
  }
  return rings;
}

/** Rows and columns of a grid cut, the portion turned whichever way gives more. */
export function cutGrid(
  widthMm: number,
  depthMm: number,
  portion: Footprint,
): { readonly columns: number; readonly rows: number } {
  const grid = (across: number, along: number) => ({
    columns: Math.floor(widthMm / across + hair),
    rows: Math.floor(depthMm / along + hair),
  });
  const straight = grid(portion.widthMm, portion.depthMm);
  const turned = grid(portion.depthMm, portion.widthMm);
  return straight.columns * straight.rows >= turned.columns * turned.rows ? straight : turned;
}

/** How a tall tier is told from others. */
export type TallRule = Pick<KitchenRules, 'doubleHeightMm'>;

/** Decks a block is cut in: two where an inner board divides a tall tier. */
export function decksOf({ heightMm }: Pick<Block, 'heightMm'>, rules: TallRule): 1 | 2 {
  return heightMm > rules.doubleHeightMm ? 2 : 1;
}

/** Portions a block gives when it is all cut, by the cutting plan. */
export function portionsOfBlock(block: Block, portion: Footprint, rules: TallRule): number {
  const decks = decksOf(block, rules);
  if (block.shape === 'round') {
    return decks * cutRound(block.widthMm, portion).reduce((sum, ring) => sum + ring.pieces, 0);
  }
  const { columns, rows } = cutGrid(block.widthMm, block.depthMm, portion);
  return decks * columns * rows;
}

/**
 * A sheet is half as high as a tier, so its portion is laid down: twice as wide for the same
 * amount of cake. For the 25 x 50 mm dessert portion that is the usual 50 x 50 mm.
 */
export function sheetFootprint(portion: Footprint): Footprint {
  return { widthMm: portion.widthMm * 2, depthMm: portion.depthMm };
}

/** Portions a sheet gives, cut in a grid. */
export function portionsOfSheet(size: SheetSize, portion: Footprint): number {
  const { columns, rows } = cutGrid(size.widthMm, size.depthMm, sheetFootprint(portion));
  return columns * rows;
}

/** Portions served per tier from the board up; keepsakes and dummies are kept out of it. */
export function portionsPerTier(
  tiers: readonly Tier[],
  portion: Footprint,
  rules: TallRule,
): number[] {
  return tiers.map((tier) =>
    tier.real && !tier.keepsake ? portionsOfBlock(tier, portion, rules) : 0,
  );
}

/**
 * The studio's measures of a chosen sheet or cutting cake; `path` leads to it in the design. Throws
 * `UnknownPart`.
 */
export function sheetSizeOf(
  sheet: Pick<Sheet, 'sizeId'>,
  menu: Menu,
  path: UnknownPart['path'] = ['cake', 'sheet'],
): SheetSize {
  const size = menu.sheetSizes.find((it) => it.id === sheet.sizeId);
  if (size === undefined) throw new UnknownPart([...path, 'sizeId'], sheet.sizeId);
  return size;
}

/** The blocks a cake is made of, from the board up; a sheet is one. Throws `UnknownPart`. */
export function blocksOf(cake: Cake, menu: Menu): Block[] {
  if (cake.kind === 'tiered') {
    return cake.tiers.map(({ shape, widthMm, depthMm, heightMm }) => ({
      shape,
      widthMm,
      depthMm,
      heightMm,
    }));
  }
  if (cake.sheet === null) return [];
  return [blockOfSheet(sheetSizeOf(cake.sheet, menu))];
}

/** A sheet seen as a block of cake. */
export function blockOfSheet({ widthMm, depthMm, heightMm }: SheetSize): Block {
  return { shape: 'rectangle', widthMm, depthMm, heightMm };
}

/**
 * The board the cake stands on, wide enough all round for hands to lift it; null while there is no cake. Throws
 * `UnknownPart`.
 */
export function boardOf(cake: Cake, menu: Menu): Block | null {
  const blocks = blocksOf(cake, menu);
  const { boardMarginMm, boardThicknessMm } = menu.kitchen;
  const lowest = blocks[0];
  if (lowest === undefined) return null;
  return {
    shape: lowest.shape,
    widthMm: Math.max(...blocks.map((it) => it.widthMm)) + 2 * boardMarginMm,
    depthMm: Math.max(...blocks.map((it) => it.depthMm)) + 2 * boardMarginMm,
    heightMm: boardThicknessMm,
  };
}

/** The top of one tier that stays in sight around the tier above it. */
export type Ledge = {
  /** Index of the tier whose top it is. */
  readonly tier: number;
  readonly areaMm2: number;
  /** How far the tier sticks out on each side; 0 where the upper one is as wide. */
  readonly widthMm: number;
};

/** Visible tops from the board up; the last block shows its whole top. */
export function ledgesOf(blocks: readonly Block[]): Ledge[] {
  return blocks.map((block, tier) => {
    const above = blocks[tier + 1];
    if (above === undefined) {
      return { tier, areaMm2: areaMm2(block), widthMm: Math.min(block.widthMm, block.depthMm) / 2 };
    }
    return {
      tier,
      areaMm2: Math.max(0, areaMm2(block) - areaMm2(above)),
      widthMm: Math.max(
        0,
        Math.min(block.widthMm - above.widthMm, block.depthMm - above.depthMm) / 2,
      ),
    };
  });
}
