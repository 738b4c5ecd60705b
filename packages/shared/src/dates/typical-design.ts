import type { Cake, Coating, Design, PlacedDecoration } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { portionsWanted } from '#shared/kitchen/portions.ts';
import { plainWish, proposeStacks, tiersOf } from '#shared/kitchen/proposals.ts';
import { cuttingCakeOf, proposeShows } from '#shared/kitchen/propose-cutting.ts';

/** A design that can be planned, and whether it is the customer's own or a likely one. */
export type PlannableDesign = { readonly design: Design; readonly likely: boolean };

/** Occasions whose cakes usually carry a great deal of handwork. */
const grandOccasions: readonly string[] = ['wedding', 'anniversary'];

/**
 * Fills in what is not chosen yet with a cautious typical choice for the head count and occasion:
 * the proposal with the most tiers, a buttercream that takes its time, words, and on grand
 * occasions the most laborious decoration. Nothing that asks for notice is put on, so that no day
 * is refused that a plainer cake could keep.
 */
export function typicalDesign(design: Design, menu: Menu): PlannableDesign {
  const { cake, look } = design;
  const chosen =
    cake !== null && (cake.kind === 'sheet' ? cake.sheet !== null : cake.tiers.length > 0);
  if (chosen && cake.coating !== null && look !== null) return { design, likely: false };
  const whole = chosen
    ? { ...cake, coating: cake.coating ?? typicalCoating(menu) }
    : {
        ...typicalCake(design, menu),
        coating: cake?.coating ?? typicalCoating(menu),
      };
  return {
    design: { ...design, cake: whole, look: look ?? typicalLook(design, menu) },
    likely: true,
  };
}

function typicalCake({ guests }: Design, menu: Menu): Omit<Cake, 'coating'> {
  const portion =
    menu.portionSizes.find((it) => it.id === guests.portionSizeId) ?? menu.portionSizes[0];
  const inside = { spongeId: menu.sponges[0]?.id ?? null, fillingId: menu.fillings[0]?.id ?? null };
  const none: Omit<Cake, 'coating'> = { kind: 'tiered', tiers: [], sheet: null, cuttingCakes: [] };
  if (portion === undefined) return none;
  const wanted = portionsWanted(guests, menu);
  const [most] = proposeStacks(wanted, menu, portion).toSorted(
    (a, b) => b.sizes.length - a.sizes.length,
  );
  if (most !== undefined) return { ...none, tiers: tiersOf(most, inside, menu.kitchen) };
  // Beyond what the studio stacks, a grand show and cutting cakes for the rest.
  const [show] = proposeShows(wanted, menu, portion, { ...plainWish, alone: false }).toSorted(
    (a, b) => b.stack.sizes.length - a.stack.sizes.length,
  );
  if (show === undefined) return none;
  const { stack, cut } = show;
  return {
    ...none,
    tiers: tiersOf(stack, inside, menu.kitchen),
    cuttingCakes: [cuttingCakeOf(cut.size, cut.count, inside)],
  };
}

function typicalCoating(menu: Menu): Coating {
  const style = menu.styles.find((it) => it.id === 'swiss') ?? menu.styles[0];
  return { covering: 'buttercream', style: style?.id ?? null, finish: 'smooth', colour: null };
}

function typicalLook({ guests }: Design, menu: Menu): NonNullable<Design['look']> {
  const grand = grandOccasions.includes(guests.occasionId);
  const [hardest] = menu.decorations
    .filter((it) => it.noticeDays === 0 && it.sources.includes('studio'))
    .toSorted((a, b) => b.minutes - a.minutes);
  const decorations: PlacedDecoration[] =
    grand && hardest !== undefined
      ? [{ decorationId: hardest.id, tier: null, quantity: 3, colour: null, source: 'studio' }]
      : [];
  return { palette: [], words: [{ tier: 0, text: 'For a happy day' }], decorations, note: '' };
}
