import type { Cake, Coating } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { reachableTint } from '#shared/kitchen/colour.ts';
import { coatColour } from '#shared/kitchen/coat-colour.ts';

/** The colour a coat has before anything is mixed into it. */
export function baseOf(coating: Coating, menu: Menu): string {
  return coatColour(menu, { ...coating, colour: null });
}

function reached(coating: Coating | null, menu: Menu): Coating | null {
  if (coating === null || coating.colour === null) return coating;
  const { reached: colour } = reachableTint(coating.colour, baseOf(coating, menu), menu.kitchen);
  return { ...coating, colour };
}

/** The cake with every wished-for tint as its base lets it come out: what the drawing may show. */
export function asItComesOut(cake: Cake, menu: Menu): Cake {
  return {
    ...cake,
    coating: reached(cake.coating, menu),
    tiers: cake.tiers.map((tier) => ({ ...tier, coating: reached(tier.coating, menu) })),
  };
}
