import type { Decoration } from '#shared/contracts/menu.ts';
import type { ResolvedDecoration, ResolvedDesign } from './resolve-design.ts';
import { perimeterMm } from './sizes.ts';

/** A border's own weight is told for a round of 8 in, 203 mm; others go by their length. */
const borderToldForMm = Math.PI * 203;

/**
 * Whether a decoration is piped from the tier's own coat: a border with no ingredients of its own.
 * What is in it is then counted with that coat, in contents and in grams.
 */
export function isPiped({ glyph, edge, contents }: Decoration): boolean {
  return glyph === 'border' && edge === 'edible' && contents.statement === '';
}

/** How many of a decoration there are: pieces, or one on each tier it goes on, or one. */
export function timesOf({ placed, decoration }: ResolvedDecoration, tiers: number): number {
  switch (decoration.per) {
    case 'piece':
      return placed.quantity;
    case 'tier':
      return placed.tier === null ? tiers : 1;
    case 'cake':
      return 1;
  }
}

/** Grams of piped decorations and lettering on each tier from the board up, on the cake. */
export function pipedPerTier({ tiers, decorations, design, menu }: ResolvedDesign): number[] {
  const grams = tiers.map(() => 0);
  const add = (tier: number, g: number) => {
    const at = Math.min(tier, tiers.length - 1);
    grams[at] = (grams[at] ?? 0) + g;
  };
  for (const { placed, decoration } of decorations) {
    if (!isPiped(decoration) || placed.source !== 'studio') continue;
    for (const { index, block } of tiers) {
      if (placed.tier !== null && Math.min(placed.tier, tiers.length - 1) !== index) continue;
      add(index, (decoration.weightG * perimeterMm(block)) / borderToldForMm);
    }
  }
  if (tiers.length > 0) {
    for (const { tier, text } of design.look?.words ?? []) {
      add(tier, text.replaceAll(/\s/gu, '').length * menu.kitchen.letterG);
    }
  }
  return grams;
}

/** Grams of everything put on that is not piped from the coat. */
export function looseDecorationsG({ decorations, tiers }: ResolvedDesign): number {
  return decorations
    .filter(({ decoration }) => !isPiped(decoration))
    .reduce((sum, it) => sum + it.decoration.weightG * timesOf(it, tiers.length), 0);
}
