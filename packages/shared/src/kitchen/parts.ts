import type { ContainedAllergen } from '#shared/contracts/estimates.ts';
import type { Contents } from '#shared/contracts/menu.ts';
import { mergeAllergens } from './merge-allergens.ts';
import type { ResolvedDesign } from './resolve-design.ts';
import { named } from './sentences.ts';

/** Something of the whole cake that can contain something. */
export type Part = {
  readonly kind: 'sponge' | 'filling' | 'buttercream' | 'covering' | 'decoration';
  readonly id: string;
  /** As the customer reads it: "Lemon curd filling". */
  readonly name: string;
  readonly contents: Contents;
  /** Eaten, but brought by somebody else: nobody here has read its label. */
  readonly unread: boolean;
};

/** Every part of the whole cake and its cutting cakes once, from the inside out. */
export function partsOf({ tiers, cuttingCakes, decorations }: ResolvedDesign): Part[] {
  const parts = new Map<string, Part>();
  const put = (part: Part) => {
    parts.set(`${part.kind}:${part.id}:${String(part.unread)}`, part);
  };
  const bodies = [...tiers, ...cuttingCakes];
  for (const { sponge } of bodies) {
    if (sponge === null) continue;
    const name = named(sponge.name, 'sponge');
    put({ kind: 'sponge', id: sponge.id, name, contents: sponge.contents, unread: false });
  }
  for (const { filling } of bodies) {
    if (filling === null) continue;
    const name = named(filling.name, 'filling');
    put({ kind: 'filling', id: filling.id, name, contents: filling.contents, unread: false });
  }
  for (const { coating } of bodies) {
    if (coating === null) continue;
    const { covering, style } = coating;
    if (style !== null) {
      const name = named(style.name, 'buttercream');
      put({ kind: 'buttercream', id: style.id, name, contents: style.contents, unread: false });
    }
    if (covering.id === 'fondant' || covering.id === 'ganache') {
      const { id, name, contents } = covering;
      put({ kind: 'covering', id, name, contents, unread: false });
    }
  }
  for (const { placed, decoration } of decorations) {
    const unread = decoration.edge === 'edible' && placed.source !== 'studio';
    put({
      kind: 'decoration',
      id: decoration.id,
      name: unread ? `${decoration.name} (brought to us)` : decoration.name,
      contents: decoration.contents,
      unread,
    });
  }
  return [...parts.values()];
}

/** The allergens of the whole cake, each with every part it comes from. */
export function containedAllergens(parts: readonly Part[]): ContainedAllergen[] {
  return mergeAllergens(parts.map((it) => it.contents.allergens)).map((entry) => ({
    ...entry,
    parts: parts
      .filter(({ contents }) =>
        contents.allergens.some(
          (it) =>
            it.allergen === entry.allergen &&
            it.state === entry.state &&
            overlap(it.species, entry.species),
        ),
      )
      .map((part) => part.name),
  }));
}

/** No species means any of them. */
function overlap(a: readonly string[], b: readonly string[]): boolean {
  return a.length === 0 || b.length === 0 || a.some((it) => b.includes(it));
}
