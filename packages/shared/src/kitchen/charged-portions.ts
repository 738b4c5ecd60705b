import type { Menu, PortionSize } from '#shared/contracts/menu.ts';
import type { ResolvedBody } from './resolve-design.ts';
import { portionsOfBlock, portionsOfSheet } from './sizes.ts';

/**
 * The portion prices are reckoned in, whatever portion the guests chose: the same cake cut
 * smaller is the same work and the same sponge.
 */
export function pricePortion(menu: Menu): PortionSize {
  const size = menu.portionSizes.find((it) => it.id === 'dessert') ?? menu.portionSizes[0];
  if (size === undefined) throw new RangeError('The menu has no portion sizes.');
  return size;
}

/**
 * Portions of a tier, a sheet or one cutting cake that are paid for: a keepsake is cake although nobody eats it on the day, a
 * dummy is not.
 */
export function chargedPortions(body: ResolvedBody, kind: 'tiered' | 'sheet', menu: Menu): number {
  if (!body.real) return 0;
  const portion = pricePortion(menu);
  return kind === 'tiered'
    ? portionsOfBlock(body.block, portion, menu.kitchen)
    : portionsOfSheet({ id: '', name: '', ...body.block }, portion);
}
