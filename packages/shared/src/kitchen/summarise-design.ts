import type { Cake, Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { lengthFigure } from './measures.ts';
import { countOf, cuttingWords } from './sentences.ts';
import { countPortions } from './portions.ts';
import { formatList } from '#shared/dates/format.ts';
import { sheetSizeOf } from './sizes.ts';

/**
 * A design in one line, the studio's leading unit: "Three tiers, 10, 8 and 5 in, 71 portions".
 * Throws `UnknownPart`.
 */
export function summariseDesign(design: Design, menu: Menu): string {
  const { wanted, fed } = countPortions(design, menu);
  if (design.cake === null) return `A cake for ${wanted}, not chosen yet`;
  return `${summariseCake(design.cake, menu)}, ${fed} ${fed === 1 ? 'portion' : 'portions'}`;
}

/**
 * The cake without its portions: "Two tiers, 10 and 8 in, with three cutting cakes". Throws
 * `UnknownPart`.
 */
export function summariseCake(cake: Cake, menu: Menu): string {
  const cutting = cake.cuttingCakes.reduce((sum, it) => sum + it.count, 0);
  const shown = summariseShown(cake, menu);
  return cutting === 0 ? shown : `${shown}, with ${cuttingWords(cutting)}`;
}

function summariseShown(cake: Cake, menu: Menu): string {
  if (cake.kind === 'sheet') {
    return cake.sheet === null ? 'A sheet' : sheetSizeOf(cake.sheet, menu).name;
  }
  const lead = menu.studio.lengthLead;
  const shapes = new Set(cake.tiers.map((it) => it.shape));
  const sizes = cake.tiers.map((it) =>
    it.widthMm === it.depthMm
      ? lengthFigure(it.widthMm, lead)
      : `${lengthFigure(it.widthMm, lead)} × ${lengthFigure(it.depthMm, lead)}`,
  );
  const dummies = cake.tiers.filter((it) => !it.real).length;
  const [only] = shapes;
  const shape = shapes.size === 1 && only !== undefined && only !== 'round' ? `${only} ` : '';
  const aside = dummies === 0 ? '' : ` (${countOf(dummies, 'dummy', 'dummies').toLowerCase()})`;
  return `${countOf(cake.tiers.length, `${shape}tier`)}${aside}, ${formatList(sizes)} ${lead}`;
}
