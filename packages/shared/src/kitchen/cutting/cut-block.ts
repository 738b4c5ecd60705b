import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import { cutGrid, cutRound, decksOf, type Block, type Footprint, type Ring } from '../sizes.ts';

/**
 * One cut of the knife seen from above, millimetres from the upper left corner of the block's
 * bounding box, y downwards.
 */
export type Cut =
  | {
      readonly kind: 'line';
      readonly x1: number;
      readonly y1: number;
      readonly x2: number;
      readonly y2: number;
    }
  | { readonly kind: 'circle'; readonly cx: number; readonly cy: number; readonly r: number };

export type CutGrid = {
  readonly columns: number;
  readonly rows: number;
  /** The block divided evenly: never smaller than the portion. */
  readonly pieceWidthMm: number;
  readonly pieceDepthMm: number;
};

/** How one block of cake is cut. */
export type BlockCut = {
  readonly block: Block;
  /** Two where an inner board divides a tall tier; each is cut the same way. */
  readonly decks: 1 | 2;
  /** Outside in, the core last; empty where it is cut in a grid. */
  readonly rings: readonly Ring[];
  /** Null for a round. */
  readonly grid: CutGrid | null;
  /** Of one deck. */
  readonly cuts: readonly Cut[];
  readonly perDeck: number;
  /** All decks. */
  readonly portions: number;
};

/** The studio's figures for cutting. */
type CutRules = Pick<KitchenRules, 'doubleHeightMm' | 'narrowestCoreMm'>;

/** The cuts of a block into portions; their number agrees with `portionsOfBlock`. */
export function cutBlock(block: Block, portion: Footprint, rules: CutRules): BlockCut {
  const decks = decksOf(block, rules);
  if (block.shape === 'round') {
    const rings = withoutCrumb(cutRound(block.widthMm, portion), rules);
    const perDeck = rings.reduce((sum, it) => sum + it.pieces, 0);
    const cuts = cutsOfRings(block.widthMm / 2, rings);
    return { block, decks, rings, grid: null, cuts, perDeck, portions: decks * perDeck };
  }
  const { columns, rows } = cutGrid(block.widthMm, block.depthMm, portion);
  const perDeck = columns * rows;
  const grid = {
    columns,
    rows,
    pieceWidthMm: block.widthMm / Math.max(1, columns),
    pieceDepthMm: block.depthMm / Math.max(1, rows),
  };
  const cuts = cutsOfGrid(block, grid);
  return { block, decks, rings: [], grid, cuts, perDeck, portions: decks * perDeck };
}

/** A core too narrow to be cut out by hand: the ring round it is cut to the middle. */
function withoutCrumb(rings: readonly Ring[], { narrowestCoreMm }: CutRules): readonly Ring[] {
  const core = rings.at(-1);
  const around = rings.at(-2);
  if (core === undefined || around === undefined) return rings;
  if (core.pieces > 0 || 2 * core.outerMm >= narrowestCoreMm) return rings;
  return [...rings.slice(0, -2), { ...around, innerMm: 0 }];
}

function cutsOfRings(centreMm: number, rings: readonly Ring[]): Cut[] {
  return rings.flatMap(({ outerMm, innerMm, pieces }): Cut[] => {
    const circle: Cut[] =
      innerMm > 0 ? [{ kind: 'circle', cx: centreMm, cy: centreMm, r: innerMm }] : [];
    // One piece of a ring or the core is served whole.
    const slices = Array.from({ length: pieces < 2 ? 0 : pieces }, (_, n): Cut => {
      const turn = (2 * Math.PI * n) / pieces - Math.PI / 2;
      const at = (radius: number) => ({
        x: centreMm + radius * Math.cos(turn),
        y: centreMm + radius * Math.sin(turn),
      });
      const from = at(outerMm);
      const to = at(innerMm);
      return { kind: 'line', x1: from.x, y1: from.y, x2: to.x, y2: to.y };
    });
    return [...circle, ...slices];
  });
}

function cutsOfGrid({ widthMm, depthMm }: Block, grid: CutGrid): Cut[] {
  const down = Array.from({ length: Math.max(0, grid.columns - 1) }, (_, n): Cut => {
    const x = (n + 1) * grid.pieceWidthMm;
    return { kind: 'line', x1: x, y1: 0, x2: x, y2: depthMm };
  });
  const across = Array.from({ length: Math.max(0, grid.rows - 1) }, (_, n): Cut => {
    const y = (n + 1) * grid.pieceDepthMm;
    return { kind: 'line', x1: 0, y1: y, x2: widthMm, y2: y };
  });
  return [...down, ...across];
}
