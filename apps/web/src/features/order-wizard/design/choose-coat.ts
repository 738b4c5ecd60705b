import type { Cake, Coating } from '#shared/contracts/design.ts';
import type { CoatRank } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { finishIds, type CoveringId, type StyleId } from '#shared/contracts/vocabulary.ts';

/** What is chosen of a coat at once; finish and colour stay where they can. */
export type CoatPick = { readonly covering: CoveringId; readonly style: StyleId | null };

/** A coat as the pick says, with the finish and colour it had, or the plainest finish it comes with. */
export function coatOf(pick: CoatPick, before: Coating | null, menu: Menu): Coating {
  const finishes = menu.coverings.find((it) => it.id === pick.covering)?.finishes ?? [];
  const kept = finishes.find((it) => it === before?.finish);
  return {
    covering: pick.covering,
    style: pick.style,
    finish: kept ?? finishIds.find((it) => finishes.includes(it)) ?? 'smooth',
    colour: before?.colour ?? null,
  };
}

/** A covering with the style it had if the covering takes one, else the best for the setting. */
export function pickCovering(
  covering: CoveringId,
  before: Coating | null,
  ranks: readonly CoatRank[],
  menu: Menu,
): CoatPick | null {
  const best = ranks.filter((it) => it.covering === covering);
  const style =
    best.find((it) => it.style === before?.style && it.style !== null)?.style ??
    best[0]?.style ??
    menu.styles[0]?.id ??
    null;
  return { covering, style: covering === 'ganache' ? null : style };
}

/** The coat of one tier; null is the cake's own again. */
export function coatTier(cake: Cake, at: number, coating: Coating | null): Cake {
  return {
    ...cake,
    tiers: cake.tiers.map((it, index) => (index === at ? { ...it, coating } : it)),
  };
}

/** A pick as the value of an option, and back. */
export function pickKey({ covering, style }: CoatPick): string {
  return style === null ? covering : `${covering}/${style}`;
}

export function pickFromKey(key: string, ranks: readonly CoatRank[]): CoatPick | null {
  return ranks.find((it) => pickKey(it) === key) ?? null;
}
