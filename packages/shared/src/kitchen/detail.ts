import type { Detail } from '#shared/contracts/vocabulary.ts';
import type { ResolvedDesign, ResolvedTier } from './resolve-design.ts';
import type { Coat } from './situation.ts';

/** Kinds of fine work in order. */
export const fineness: Readonly<Record<Detail, number>> = { none: 0, soft: 1, fine: 2 };

/** How much detail a coat holds: the covering's own where that is outermost, else the style's. */
export function detailOf({ covering, style }: Coat): Detail {
  return style === null || covering.id === 'fondant' || covering.id === 'ganache'
    ? covering.detail
    : style.detail;
}

/** The finest work that stands on any of these tiers. */
export function finestOn(
  { decorations }: Pick<ResolvedDesign, 'decorations'>,
  tiers: readonly Pick<ResolvedTier, 'index'>[],
): number {
  const on = new Set(tiers.map((it) => it.index));
  return decorations
    .filter(({ placed }) => placed.tier === null || on.has(placed.tier))
    .reduce((finest, { decoration }) => Math.max(finest, fineness[decoration.needs]), 0);
}
