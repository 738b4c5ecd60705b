import type { Shopping } from '#shared/contracts/kitchen-sheet.ts';
import { presentUnknown } from './kitchen-sheet.presenter.ts';
import type { ShoppingOfSpan } from './shopping.queries.ts';

/** A shopping list as bakers read it. */
export function presentShopping({ from, to, span, list }: ShoppingOfSpan): Shopping {
  return {
    from,
    to,
    currency: span.pantry.currency,
    lines: list.lines.map(({ ingredient, grams, eggs, packs, leftG, usedMinor, buyMinor }) => ({
      id: ingredient.id,
      name: ingredient.name,
      brand: ingredient.brand,
      family: ingredient.family,
      packG: ingredient.pack?.grams ?? null,
      grams,
      eggs,
      packs,
      leftG,
      usedMinor,
      buyMinor,
    })),
    usedMinor: list.usedMinor,
    buyMinor: list.buyMinor,
    unpriced: [...list.unpriced],
    unknown: span.unknown.map(presentUnknown),
    orders: span.orders,
    unplaced: span.unplaced,
  };
}
