import type { CuttingCake, Sheet } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { countOf } from './sentences.ts';

/** "Dark cocoa, filled with raspberry jam". Parts gone from the menu are called by their id. */
export function insideWords(
  { spongeId, fillingId }: { readonly spongeId: string | null; readonly fillingId: string | null },
  menu: Menu,
): string {
  const sponge = menu.sponges.find((it) => it.id === spongeId)?.name ?? spongeId ?? '';
  const filling = menu.fillings.find((it) => it.id === fillingId)?.name ?? fillingId;
  return filling === null ? sponge : `${sponge}, filled with ${filling.toLowerCase()}`;
}

/** "Dark cocoa, filled with raspberry jam, two layers"; empty without a sheet. */
export function sheetInside(sheet: Sheet | null, menu: Menu): string {
  return sheet === null
    ? ''
    : `${insideWords(sheet, menu)}, ${countOf(sheet.layers, 'layer').toLowerCase()}`;
}

/** "2 × Half sheet, 13 × 18 in, to cut: vanilla, filled with raspberry jam, two layers". */
export function cutWords(cut: CuttingCake, menu: Menu): string {
  const name = menu.sheetSizes.find((it) => it.id === cut.sizeId)?.name ?? cut.sizeId;
  const times = cut.count === 1 ? '' : `${cut.count} × `;
  return `${times}${name}, to cut: ${sheetInside(cut, menu)}`;
}
