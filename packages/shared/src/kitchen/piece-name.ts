import type { Cake } from '#shared/contracts/design.ts';
import type { CarriedPiece } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { tierName } from './tier-name.ts';

/** "Top tier", "Half sheet, 13 × 18 in", "Cutting cake: Half sheet, 13 × 18 in". */
export function pieceName(
  { kind, index }: Pick<CarriedPiece, 'kind' | 'index'>,
  cake: Cake,
  menu: Menu,
): string {
  const sheetName = (sizeId: string | undefined) =>
    menu.sheetSizes.find((it) => it.id === sizeId)?.name ?? sizeId ?? '';
  switch (kind) {
    case 'tier':
      return tierName(index, cake.tiers.length);
    case 'sheet':
      return sheetName(cake.sheet?.sizeId);
    case 'cutting-cake':
      return `Cutting cake: ${sheetName(cake.cuttingCakes[index]?.sizeId)}`;
  }
}
