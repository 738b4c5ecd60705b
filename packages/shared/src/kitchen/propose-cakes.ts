import type { Cake, Coating } from '#shared/contracts/design.ts';
import type { Proposal } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { portionsWanted } from './portions.ts';
import { priceDesign, type PriceTerms } from './price.ts';
import { proposeStacks, tiersOf, type StackWish } from './proposals.ts';
import { cuttingCakeOf, proposeSheet, proposeShows, sheetOf } from './propose-cutting.ts';
import { resolveDesign, type ResolvedDesign } from './resolve-design.ts';
import { guestsClash } from './situation.ts';

/** A cake is proposed and priced again and again while other answers change; a few are kept. */
const remembered = new WeakMap<Menu, Map<string, readonly Proposal[]>>();
const mostRemembered = 64;

/**
 * Two or three cakes for the head count and a sheet where that is sensible, priced as cakes alone
 * (no decorations, no extras). Large tables are offered a cake on show with cutting cakes in the
 * kitchen; tables no stack feeds are offered nothing else. They take the sponge, filling and coat
 * already chosen, else the first of the menu that no guest's allergy or diet speaks against; a top
 * tier that is kept back stays kept back, and square stays square.
 */
export function proposeCakes(resolved: ResolvedDesign, terms: PriceTerms): Proposal[] {
  const { design, menu, portionSize } = resolved;
  const wanted = portionsWanted(design.guests, menu);
  const inside = insideOf(resolved);
  const coating = design.cake?.coating ?? null;
  const top = resolved.tiers.length > 1 ? resolved.tiers.at(-1) : undefined;
  const wish: StackWish = {
    keepTop: design.cake?.kind === 'tiered' && top?.keepsake === true,
    shape: resolved.tiers[0]?.block.shape === 'square' ? 'square' : 'round',
  };
  const key = JSON.stringify([
    wanted,
    portionSize.id,
    inside,
    coating,
    wish,
    terms.date,
    terms.today,
  ]);
  let known = remembered.get(menu);
  if (known === undefined) {
    known = new Map();
    remembered.set(menu, known);
  }
  const before = known.get(key);
  if (before !== undefined) return [...before];
  const proposals = unpriced(resolved, inside, wish).map((it): Proposal => {
    const cake = cakeOfProposal(it, coating);
    const alone = resolveDesign({ ...design, cake, look: null, extras: [] }, menu);
    return { ...it, priceMinor: priceDesign(alone, terms).totalMinor };
  });
  const oldest = known.keys().next();
  if (known.size >= mostRemembered && oldest.done !== true) known.delete(oldest.value);
  known.set(key, proposals);
  return [...proposals];
}

/** The cake a proposal stands for, under a coat. */
export function cakeOfProposal(
  { tiers, sheet, cuttingCakes }: Pick<Proposal, 'tiers' | 'sheet' | 'cuttingCakes'>,
  coating: Coating | null,
): Cake {
  return { kind: sheet === null ? 'tiered' : 'sheet', tiers, sheet, coating, cuttingCakes };
}

type Inside = { readonly spongeId: string | null; readonly fillingId: string | null };

function unpriced(
  { design, menu, portionSize }: ResolvedDesign,
  inside: Inside,
  wish: StackWish,
): Omit<Proposal, 'priceMinor'>[] {
  const wanted = portionsWanted(design.guests, menu);
  const stacks = proposeStacks(wanted, menu, portionSize, wish);
  const alone = stacks.length > 0;
  const shows = proposeShows(wanted, menu, portionSize, { ...wish, alone });
  const sheet = proposeSheet(wanted, menu, portionSize);
  // Beside a show cake two stacks are choice enough: a third of another height steps back.
  const beside =
    shows.length === 0
      ? stacks
      : stacks.filter((it) => it.blurb === 'Just enough' || it.blurb === 'Some over');
  return [
    ...beside.map((it) => ({
      id: it.id,
      name: it.name,
      blurb: it.blurb,
      portions: it.portions,
      tiers: tiersOf(it, inside, menu.kitchen),
      sheet: null,
      cuttingCakes: [],
    })),
    ...shows.map(({ id, name, blurb, portions, stack, cut }) => ({
      id,
      name,
      blurb,
      portions,
      tiers: tiersOf(stack, inside, menu.kitchen),
      sheet: null,
      cuttingCakes: [cuttingCakeOf(cut.size, cut.count, inside)],
    })),
    ...(sheet === null
      ? []
      : [
          {
            id: sheet.id,
            name: sheet.name,
            blurb: sheet.blurb,
            portions: sheet.portions,
            tiers: [],
            sheet: sheetOf(sheet.size, inside),
            cuttingCakes:
              sheet.cut === null ? [] : [cuttingCakeOf(sheet.cut.size, sheet.cut.count, inside)],
          },
        ]),
  ];
}

function insideOf(resolved: ResolvedDesign): Inside {
  const { menu, tiers, cuttingCakes } = resolved;
  const chosen = [...tiers, ...cuttingCakes].find((it) => it.real);
  if (chosen !== undefined && chosen.sponge !== null && chosen.filling !== null) {
    return { spongeId: chosen.sponge.id, fillingId: chosen.filling.id };
  }
  const clashes = guestsClash(resolved);
  const first = <Item extends { id: string; contents: Parameters<typeof clashes>[0] }>(
    items: readonly Item[],
  ) => (items.find((it) => !clashes(it.contents)) ?? items[0])?.id ?? null;
  return { spongeId: first(menu.sponges), fillingId: first(menu.fillings) };
}
