import type { Menu } from '#shared/contracts/menu.ts';
import type { WeighedPart } from '../part-weights.ts';
import { named } from '../sentences.ts';

/** A part of a cake as the menu calls it: "Vanilla sponge", "Swiss meringue buttercream". */
export function partName({ part, id }: Pick<WeighedPart, 'part' | 'id'>, menu: Menu): string {
  const name = (items: readonly { readonly id: string; readonly name: string }[]) =>
    items.find((it) => it.id === id)?.name ?? id;
  switch (part) {
    case 'sponge':
      return named(name(menu.sponges), 'sponge');
    case 'filling':
      return named(name(menu.fillings), 'filling');
    case 'style':
      return named(name(menu.styles), 'buttercream');
    case 'covering':
      return name(menu.coverings);
    case 'decoration':
      return name(menu.decorations);
  }
}
