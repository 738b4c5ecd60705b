import type { Cake, Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { formatLength } from '../measures.ts';
import { countPortions } from '../portions.ts';
import { tierName } from '../tier-name.ts';

/** The same design with one tier, or the sheet, a size up or down. */
export type SizedDesign = { readonly label: string; readonly design: Design };

/**
 * The next sizes of each tier that the studio bakes and that still stack, and the next sheets;
 * none that feeds fewer than the guests there are.
 */
export function otherSizes(design: Design, menu: Menu): SizedDesign[] {
  const { cake } = design;
  if (cake === null) return [];
  const found = cake.kind === 'sheet' ? otherSheets(cake, menu) : otherTiers(cake, menu);
  return found
    .map(({ label, cake: other }) => ({ label, design: { ...design, cake: other } }))
    .filter((it) => {
      const { fed, wanted } = countPortions(it.design, menu);
      return fed >= wanted;
    });
}

type SizedCake = { readonly label: string; readonly cake: Cake };

function otherTiers(cake: Cake, menu: Menu): SizedCake[] {
  const lead = menu.studio.lengthLead;
  return cake.tiers.flatMap((tier, index) => {
    if (!tier.real) return [];
    const sizes = menu.tierSizes
      .filter((it) => it.shape === tier.shape && it.heightsMm.includes(tier.heightMm))
      .toSorted((a, b) => a.widthMm - b.widthMm || a.depthMm - b.depthMm);
    const at = sizes.findIndex((it) => it.widthMm === tier.widthMm && it.depthMm === tier.depthMm);
    if (at < 0) return [];
    return [sizes[at - 1], sizes[at + 1]].flatMap((size) => {
      if (size === undefined) return [];
      const { widthMm, depthMm } = size;
      const tiers = cake.tiers.map((it, n) => (n === index ? { ...it, widthMm, depthMm } : it));
      if (!stacks(tiers, index, menu.kitchen)) return [];
      const [to, from] = [widthMm, tier.widthMm].map((mm) => formatLength(mm, lead));
      return {
        label: `${tierName(index, tiers.length)} ${to} instead of ${from}`,
        cake: { ...cake, tiers },
      };
    });
  });
}

/** A step wide enough to the tier below and above. */
function stacks(tiers: Cake['tiers'], index: number, { smallestStepMm }: Menu['kitchen']): boolean {
  const [below, here, above] = [tiers[index - 1], tiers[index], tiers[index + 1]];
  const steps = (lower: typeof here, upper: typeof here) =>
    lower === undefined ||
    upper === undefined ||
    (lower.widthMm - upper.widthMm >= smallestStepMm &&
      lower.depthMm - upper.depthMm >= smallestStepMm);
  return steps(below, here) && steps(here, above);
}

function otherSheets(cake: Cake, menu: Menu): SizedCake[] {
  const { sheet } = cake;
  if (sheet === null) return [];
  const sizes = menu.sheetSizes.toSorted((a, b) => a.widthMm * a.depthMm - b.widthMm * b.depthMm);
  const at = sizes.findIndex((it) => it.id === sheet.sizeId);
  if (at < 0) return [];
  return [sizes[at - 1], sizes[at + 1]].flatMap((size) =>
    size === undefined
      ? []
      : {
          label: `${size.name} instead of ${sizes[at]?.name ?? ''}`,
          cake: { ...cake, sheet: { ...sheet, sizeId: size.id } },
        },
  );
}
