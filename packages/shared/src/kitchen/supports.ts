import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { ResolvedTier } from './resolve-design.ts';
import { decksOf, type Block } from './sizes.ts';

type Base = Pick<Block, 'shape' | 'widthMm' | 'depthMm'>;

/** Where a dowel stands, millimetres from the middle of its tier. */
export type DowelPlace = { readonly x: number; readonly y: number };

/** Dowels of one length that stand in one tier and bear what is above them. */
export type DowelSet = {
  readonly bears: 'inner-board' | 'tier-above';
  readonly count: number;
  readonly lengthMm: number;
  readonly at: readonly DowelPlace[];
};

/** What one tier stands on and what stands in it. */
export type TierSupports = {
  /** From the board up. */
  readonly tier: number;
  /** The card under it, as large as it is; null for the lowest, which stands on the cake's board. */
  readonly board: Base | null;
  /** In a tall tier, so high above its foot. */
  readonly innerBoard: (Base & { readonly atMm: number }) | null;
  readonly dowels: readonly DowelSet[];
};

/** What is hidden in a cake and comes out before eating. */
export type Supports = {
  /** Hidden ones: the board the whole cake stands on is in sight and not counted. */
  readonly boards: number;
  readonly dowels: number;
  readonly perTier: readonly TierSupports[];
};

/**
 * Boards and dowels of a stacked cake, and the inner board of each tall tier with the dowels under
 * it. Foam bears what stands on it: a dummy has no dowels and no inner board.
 */
export function supportsOf(
  tiers: readonly Pick<ResolvedTier, 'block' | 'real'>[],
  rules: KitchenRules,
): Supports {
  const perTier = tiers.map(({ block, real }, tier): TierSupports => {
    const { shape, widthMm, depthMm, heightMm } = block;
    const tall = real && decksOf(block, rules) === 2;
    const above = tiers[tier + 1]?.block;
    const lengthMm = tall ? heightMm / 2 : heightMm;
    return {
      tier,
      board: tier === 0 ? null : { shape, widthMm, depthMm },
      innerBoard: tall ? { shape, widthMm, depthMm, atMm: heightMm / 2 } : null,
      dowels: [
        ...(tall ? [dowelsUnder('inner-board', block, lengthMm, rules)] : []),
        ...(real && above !== undefined ? [dowelsUnder('tier-above', above, lengthMm, rules)] : []),
      ],
    };
  });
  const count = (of: (it: TierSupports) => number) => perTier.reduce((sum, it) => sum + of(it), 0);
  return {
    boards: count((it) => (it.board === null ? 0 : 1) + (it.innerBoard === null ? 0 : 1)),
    dowels: count((it) => it.dowels.reduce((sum, set) => sum + set.count, 0)),
    perTier,
  };
}

function dowelsUnder(
  bears: DowelSet['bears'],
  base: Base,
  lengthMm: number,
  { mmPerDowel, fewestDowels, dowelReachPpm }: KitchenRules,
): DowelSet {
  const count = Math.max(
    fewestDowels,
    Math.round(Math.max(base.widthMm, base.depthMm) / mmPerDowel),
  );
  return { bears, count, lengthMm, at: placesUnder(base, count, dowelReachPpm / 1e6) };
}

/** Evenly on a ring under a round, on a frame under a square or rectangle. */
function placesUnder(
  { shape, widthMm, depthMm }: Base,
  count: number,
  reach: number,
): DowelPlace[] {
  const across = (widthMm * reach) / 2;
  const along = (depthMm * reach) / 2;
  return Array.from({ length: count }, (_, n) => {
    const turn = n / count;
    if (shape === 'round') {
      return {
        x: across * Math.cos(2 * Math.PI * turn),
        y: along * Math.sin(2 * Math.PI * turn),
      };
    }
    return onFrame(across, along, turn);
  });
}

/** A point of a rectangle's outline, a share of the way round from its upper left corner. */
function onFrame(across: number, along: number, turn: number): DowelPlace {
  const way = turn * 4 * (across + along);
  if (way < 2 * across) return { x: way - across, y: -along };
  if (way < 2 * (across + along)) return { x: across, y: way - 2 * across - along };
  if (way < 4 * across + 2 * along) return { x: 3 * across + 2 * along - way, y: along };
  return { x: -across, y: 4 * across + 3 * along - way };
}
