import type { ResolvedTier } from './resolve-design.ts';
import { doubleHeightMm } from './sizes.ts';

/** What is hidden in a cake and comes out before eating. */
export type Supports = { readonly boards: number; readonly dowels: number };

/** A dowel for so much of the upper tier's width, and never fewer than four (memory). */
const mmPerDowel = 40;
const fewestDowels = 4;

/** Boards and dowels of a stacked cake, and the inner board of each tall tier. */
export function supportsOf(tiers: readonly ResolvedTier[]): Supports {
  const upper = tiers.slice(1);
  const tall = tiers.filter((it) => it.real && it.block.heightMm > doubleHeightMm);
  return {
    boards: upper.length + tall.length,
    dowels: upper.reduce(
      (sum, it) => sum + Math.max(fewestDowels, Math.round(it.block.widthMm / mmPerDowel)),
      0,
    ),
  };
}
