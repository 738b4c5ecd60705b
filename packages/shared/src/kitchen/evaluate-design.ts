import type { Estimate, EstimateRequest } from '#shared/contracts/estimates.ts';
import type { AllergenEntry, Menu } from '#shared/contracts/menu.ts';
import { adviseOn } from './advice.ts';
import { isPerishable } from './advice-time.ts';
import { amountsOf, carriedPieces, carriedWeightG, heightMm } from './amounts.ts';
import { mergeAllergens } from './merge-allergens.ts';
import { containedAllergens, partsOf } from './parts.ts';
import { countPortions } from './portions.ts';
import { priceDesign } from './price.ts';
import { proposeCakes } from './propose-cakes.ts';
import { rankCoats } from './rank-coats.ts';
import { resolveDesign, type ResolvedDesign } from './resolve-design.ts';
import { tableOf } from './situation.ts';
import { keepCoolText } from './time-out.ts';

const handled = new WeakMap<Menu, readonly AllergenEntry[]>();

/** What the kitchen handles, merged once for a menu. */
function handledBy(menu: Menu): AllergenEntry[] {
  const entries = handled.get(menu) ?? mergeAllergens([menu.studio.handles]);
  handled.set(menu, entries);
  return [...entries];
}

/**
 * Everything worked out about a design: portions, proposals, price, allergens, ranks, advice,
 * amounts. Pure; the same in the browser and on the server. `today` is the studio's local date.
 * Never throws on a design that passes the contract and names what the menu has; throws
 * `UnknownPart` (with the path inside the design) otherwise. What hangs on the menu alone is
 * remembered per `menu` object, so pass the same one again while it has not changed.
 */
export function evaluateDesign(request: EstimateRequest, menu: Menu, today: string): Estimate {
  const { design, date, collectAt = null } = request;
  const resolved = resolveDesign(design, menu);
  const terms = { date, today };
  const portions = countPortions(design, menu);
  const proposals = proposeCakes(resolved, terms);
  const parts = partsOf(resolved);
  const table = tableOf(resolved, parts, { date, collectAt });
  const coats = rankCoats(table);
  const amounts = amountsOf(resolved);
  return {
    portions,
    proposals,
    price: priceDesign(resolved, terms),
    allergens: containedAllergens(parts),
    handled: handledBy(menu),
    ranks: coats.map((it) => it.rank),
    advice: adviseOn({ ...table, coats }, portions, proposals),
    weightG: carriedWeightG(resolved, amounts),
    pieces: carriedPieces(resolved, amounts),
    amounts: {
      spongeG: Math.round(amounts.spongeG),
      fillingG: Math.round(amounts.fillingG),
      frostingG: Math.round(amounts.frostingG),
      coveringG: Math.round(amounts.coveringG),
    },
    heightMm: heightMm(resolved),
    keepCool: keepCoolText({
      setting: design.setting,
      warmestC: table.warmth?.celsius ?? null,
      studio: menu.studio,
      rules: menu.kitchen,
      widestMm: widestEatenMm(resolved),
      collectAt,
      perishable: resolved.tiers.length === 0 || isPerishable(resolved),
    }),
  };
}

function widestEatenMm({ tiers }: ResolvedDesign): number {
  return Math.max(0, ...tiers.filter((it) => it.real).map((it) => it.block.widthMm));
}
