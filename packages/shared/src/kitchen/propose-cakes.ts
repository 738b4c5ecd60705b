import type { Cake } from '#shared/contracts/design.ts';
import type { Proposal } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { priceDesign, type PriceTerms } from './price.ts';
import { proposeStacks, tiersOf } from './proposals.ts';
import { portionsWanted } from './portions.ts';
import { resolveDesign, type ResolvedDesign } from './resolve-design.ts';
import { guestsClash } from './situation.ts';

/** A cake is proposed and priced again and again while other answers change; a few are kept. */
const remembered = new WeakMap<Menu, Map<string, readonly Proposal[]>>();
const mostRemembered = 64;

/**
 * Two or three cakes for the head count, priced as cakes alone (no decorations, no extras). They
 * take the sponge, filling and coat already chosen, else the first of the menu that no guest's
 * allergy or diet speaks against.
 */
export function proposeCakes(resolved: ResolvedDesign, terms: PriceTerms): Proposal[] {
  const { design, menu, portionSize } = resolved;
  const wanted = portionsWanted(design.guests, menu);
  const inside = insideOf(resolved);
  const coating = design.cake?.coating ?? null;
  const key = JSON.stringify([wanted, portionSize.id, inside, coating, terms.date, terms.today]);
  let known = remembered.get(menu);
  if (known === undefined) {
    known = new Map();
    remembered.set(menu, known);
  }
  const before = known.get(key);
  if (before !== undefined) return [...before];
  const proposals = proposeStacks(wanted, menu, portionSize).map((stack) => {
    const tiers = tiersOf(stack, inside);
    const cake: Cake = { kind: 'tiered', tiers, sheet: null, coating };
    const alone = resolveDesign({ ...design, cake, look: null, extras: [] }, menu);
    const { totalMinor } = priceDesign(alone, terms);
    const { id, name, blurb, portions } = stack;
    return { id, name, blurb, portions, tiers, priceMinor: totalMinor };
  });
  const oldest = known.keys().next();
  if (known.size >= mostRemembered && oldest.done !== true) known.delete(oldest.value);
  known.set(key, proposals);
  return [...proposals];
}

function insideOf(resolved: ResolvedDesign): {
  readonly spongeId: string | null;
  readonly fillingId: string | null;
} {
  const { menu, tiers } = resolved;
  const chosen = tiers.find((it) => it.real);
  if (chosen !== undefined && chosen.sponge !== null && chosen.filling !== null) {
    return { spongeId: chosen.sponge.id, fillingId: chosen.filling.id };
  }
  const clashes = guestsClash(resolved);
  const first = <Item extends { id: string; contents: Parameters<typeof clashes>[0] }>(
    items: readonly Item[],
  ) => (items.find((it) => !clashes(it.contents)) ?? items[0])?.id ?? null;
  return { spongeId: first(menu.sponges), fillingId: first(menu.fillings) };
}
