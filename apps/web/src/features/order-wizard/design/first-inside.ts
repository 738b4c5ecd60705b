import type { Contents, Menu } from '#shared/contracts/menu.ts';
import type { OrderForm } from '../draft/empty-order.ts';
import { clashesOf } from './contains.ts';

/** A sponge and a filling to begin with. */
export type Inside = { readonly spongeId: string | null; readonly fillingId: string | null };

/** The first sponge and filling of the menu that no guest's allergy or diet speaks against. */
export function firstInside(menu: Menu, { allergies, diets }: OrderForm['day']): Inside {
  const first = (items: readonly { readonly id: string; readonly contents: Contents }[]) => {
    const fine = items.find(
      (it) => clashesOf(it.contents, allergies, diets, menu.studio.labelRegion).length === 0,
    );
    return (fine ?? items[0])?.id ?? null;
  };
  return { spongeId: first(menu.sponges), fillingId: first(menu.fillings) };
}
