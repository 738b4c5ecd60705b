import type { Coating, Design, PlacedDecoration } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { portionsWanted } from '#shared/kitchen/portions.ts';
import { proposeStacks, tiersOf } from '#shared/kitchen/proposals.ts';

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
        kind: 'tiered' as const,
        tiers: typicalTiers(design, menu),
        sheet: null,
        coating: cake?.coating ?? typicalCoating(menu),
      };
  return {
    design: { ...design, cake: whole, look: look ?? typicalLook(design, menu) },
    likely: true,
  };
}

function typicalTiers({ guests }: Design, menu: Menu) {
  const portion =
    menu.portionSizes.find((it) => it.id === guests.portionSizeId) ?? menu.portionSizes[0];
  const inside = { spongeId: menu.sponges[0]?.id ?? null, fillingId: menu.fillings[0]?.id ?? null };
  if (portion === undefined) return [];
  const wanted = portionsWanted(guests, menu);
  // Beyond what the studio can stack, the largest stack stands for the show and sheets feed the rest.
  for (let portions = wanted; portions > 0; portions = Math.floor(portions * 0.8)) {
    const [most] = proposeStacks(portions, menu, portion).toSorted(
      (a, b) => b.sizes.length - a.sizes.length,
    );
    if (most !== undefined) return tiersOf(most, inside);
  }
  return [];
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
