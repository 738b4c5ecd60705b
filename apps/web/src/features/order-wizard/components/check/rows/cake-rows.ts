import type { Menu } from '#shared/contracts/menu.ts';
import { cutWords } from '#shared/kitchen/inside-words.ts';
import { formatLength } from '#shared/kitchen/measures.ts';
import { countOf } from '#shared/kitchen/sentences.ts';
import { summariseCake } from '#shared/kitchen/summarise-design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import { tidyOrder } from '../../../design/tidy-order.ts';
import type { OrderForm } from '../../../draft/empty-order.ts';
import type { CheckRow } from '../check-rows.tsx';

/** What is baked and what is inside, tier by tier from the top. */
export function cakeRows(values: OrderForm, menu: Menu): CheckRow[] {
  const { cake } = tidyOrder(values);
  const inside = (spongeId: string | null, fillingId: string | null, layers: number) =>
    [
      menu.sponges.find((it) => it.id === spongeId)?.name,
      menu.fillings.find((it) => it.id === fillingId)?.name,
      countOf(layers, 'layer').toLowerCase(),
    ]
      .filter((it) => it !== undefined)
      .join(', ');
  const rows: CheckRow[] = [
    { label: 'Cake', value: summariseCake(cake, menu), field: 'cake.tiers' },
  ];
  if (cake.sheet !== null) {
    const { spongeId, fillingId, layers } = cake.sheet;
    rows.push({
      label: 'Inside',
      value: inside(spongeId, fillingId, layers),
      field: 'cake.sheet.spongeId',
    });
  }
  const tiers = cake.tiers.map((tier, at): CheckRow => {
    const lead = menu.studio.lengthLead;
    const across =
      tier.widthMm === tier.depthMm
        ? formatLength(tier.widthMm, lead)
        : `${formatLength(tier.widthMm, lead)} by ${formatLength(tier.depthMm, lead)}`;
    const measures = `${tier.shape}, ${across}, ${formatLength(tier.heightMm, lead)} high`;
    return {
      label: tierName(at, cake.tiers.length),
      value: tier.real
        ? `${inside(tier.spongeId, tier.fillingId, tier.layers)}, ${measures}${tier.keepsake ? ', kept back' : ''}`
        : `For show only, ${measures}`,
      field: `cake.tiers.${at}.spongeId`,
    };
  });
  const cutting = cake.cuttingCakes.map((it, at): CheckRow => ({
    label: 'In the kitchen',
    value: cutWords(it, menu),
    field: `cake.cuttingCakes.${at}.count`,
  }));
  return [...rows, ...tiers.toReversed(), ...cutting];
}
