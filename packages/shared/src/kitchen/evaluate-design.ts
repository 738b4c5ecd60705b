import type { Estimate, EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { countPortions } from './portions.ts';

/**
 * Everything worked out about a design: portions, proposals, price, allergens, ranks, advice,
 * amounts. Pure; the same in the browser and on the server. `today` is the studio's local date.
 * Never throws on a design that passes the contract and names what the menu has; throws
 * `UnknownPart` (with the path inside the design) otherwise.
 */
export function evaluateDesign(request: EstimateRequest, menu: Menu, _today: string): Estimate {
  const { design } = request;
  return {
    portions: countPortions(design, menu),
    proposals: [],
    price: {
      currency: menu.priceBook.currency,
      priceBookVersionId: menu.priceBook.versionId,
      lines: [],
      subtotalMinor: 0,
      taxMinor: 0,
      taxInclusive: menu.priceBook.taxInclusive,
      totalMinor: 0,
      depositMinor: 0,
    },
    allergens: [],
    handled: menu.studio.handles,
    ranks: [],
    advice: [],
    weightG: 0,
    amounts: { spongeG: 0, fillingG: 0, frostingG: 0, coveringG: 0 },
    heightMm: 0,
    keepCool: '',
  };
}
