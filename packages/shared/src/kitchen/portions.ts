import type { Design } from '#shared/contracts/design.ts';
import type { Guests } from '#shared/contracts/design.ts';
import type { Menu, PortionSize } from '#shared/contracts/menu.ts';
import { portionsOfSheet, portionsPerTier, sheetSizeOf } from './sizes.ts';
import { UnknownPart } from './unknown-part.ts';

/** The portion the guests chose. Throws `UnknownPart`. */
export function portionSizeOf(guests: Guests, menu: Menu): PortionSize {
  const size = menu.portionSizes.find((it) => it.id === guests.portionSizeId);
  if (size === undefined) throw new UnknownPart(['guests', 'portionSizeId'], guests.portionSizeId);
  return size;
}

/** Portions to aim for: everybody, or the studio's share of them where there are other desserts. */
export function portionsWanted(
  guests: Pick<Guests, 'headCount' | 'otherDesserts'>,
  menu: Menu,
): number {
  if (!guests.otherDesserts) return guests.headCount;
  return Math.max(1, Math.ceil((guests.headCount * menu.studio.dessertFactorPpm) / 1_000_000));
}

export type PortionCount = {
  readonly wanted: number;
  readonly fed: number;
  readonly perTier: number[];
  /** Per kind of cutting cake, all of its count together. */
  readonly perCuttingCake: number[];
};

/** Portions wanted and served; nothing is served while there is no cake. Throws `UnknownPart`. */
export function countPortions(design: Design, menu: Menu): PortionCount {
  const size = portionSizeOf(design.guests, menu);
  const perTier = portionsServed(design, menu, size);
  const perCuttingCake = (design.cake?.cuttingCakes ?? []).map(
    (it, index) =>
      it.count * portionsOfSheet(sheetSizeOf(it, menu, ['cake', 'cuttingCakes', index]), size),
  );
  return {
    wanted: portionsWanted(design.guests, menu),
    fed: [...perTier, ...perCuttingCake].reduce((sum, it) => sum + it, 0),
    perTier,
    perCuttingCake,
  };
}

function portionsServed({ cake }: Design, menu: Menu, size: PortionSize): number[] {
  if (cake === null) return [];
  if (cake.kind === 'tiered') return portionsPerTier(cake.tiers, size, menu.kitchen);
  return cake.sheet === null ? [] : [portionsOfSheet(sheetSizeOf(cake.sheet, menu), size)];
}
