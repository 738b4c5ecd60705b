import type { Menu } from '#shared/contracts/menu.ts';
import type { CoveringId, StyleId } from '#shared/contracts/vocabulary.ts';
import { reachableTint, type ReachedTint } from './colour.ts';

/** A coat with a colour of its own, which a wanted colour is mixed into. */
export type CoatBase = {
  readonly id: string;
  readonly name: string;
  /** Before anything is mixed into it. */
  readonly colour: string;
  readonly covering: CoveringId;
  readonly style: StyleId | null;
};

/**
 * Every coat a colour may be tried on: each buttercream, then fondant over the buttercream `under`
 * and ganache. A semi-naked coat is too thin to carry a colour of its own.
 */
export function coatBases(menu: Menu, under: StyleId | null): CoatBase[] {
  const styles = menu.styles.map(({ id, name, colour }): CoatBase => ({
    id,
    name,
    colour,
    covering: 'buttercream',
    style: id,
  }));
  const [first] = menu.styles;
  const coverings = menu.coverings
    .filter(({ id }) => id === 'fondant' || id === 'ganache')
    .map(({ id, name, colour }): CoatBase => ({
      id,
      name,
      colour,
      covering: id,
      style: id === 'ganache' ? null : (under ?? first?.id ?? null),
    }));
  return [...styles, ...coverings];
}

export type TriedColour = { readonly base: CoatBase; readonly tint: ReachedTint };

/** A wanted colour on each of the coats, the one that comes nearest first. */
export function tryOnCoats(
  wanted: string,
  bases: readonly CoatBase[],
  { kitchen }: Menu,
): TriedColour[] {
  return bases
    .map((base) => ({ base, tint: reachableTint(wanted, base.colour, kitchen) }))
    .sort((a, b) => a.tint.difference - b.tint.difference);
}
