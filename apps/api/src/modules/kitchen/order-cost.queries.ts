import { Op } from 'sequelize';
import type { PayLever } from '#shared/contracts/kitchen-sheet.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { chargedPortions } from '#shared/kitchen/charged-portions.ts';
import { costDesign } from '#shared/kitchen/cost/cost-design.ts';
import type { DesignCost } from '#shared/kitchen/cost/cost-design.ts';
import { makeItPay } from '#shared/kitchen/cost/make-it-pay.ts';
import type { OtherSize } from '#shared/kitchen/cost/make-it-pay.ts';
import { otherSizes } from '#shared/kitchen/cost/other-sizes.ts';
import { priceDesign } from '#shared/kitchen/price.ts';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import type { ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Extra } from '#api/db/models/extra.ts';
import type { Order } from '#api/db/models/order.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { loadOrderRecord } from '#api/modules/orders/orders.queries.ts';
import { workByTimes } from '#api/modules/plan/work-of-design.queries.ts';
import { needsOfOrder } from './order-needs.queries.ts';

export type CostOfOrder = {
  readonly cost: DesignCost;
  /** Its price is agreed, and not an offer any more. */
  readonly agreed: boolean;
  readonly levers: readonly PayLever[];
};

/**
 * What an order costs to make by today's prices, wages and packs, against its agreed price or else
 * its offer, and what would make it pay.
 */
export async function costOfOrder(order: Order): Promise<CostOfOrder> {
  const [record, ground, extras, book] = await Promise.all([
    loadOrderRecord(order),
    needsOfOrder(order),
    Extra.findAll(),
    PriceBookVersion.findOne({
      where: { validFrom: { [Op.lte]: currentClock().now() } },
      order: [['n', 'DESC']],
      rejectOnEmpty: true,
    }),
  ]);
  const { content: rates } = book;
  const { menu, design, resolved, pantry } = ground;
  const price = record.agreedPrice ?? record.revision.estimate.price;
  const workOf = await workByTimes(record.revision.workTimeVersionId);
  const costOf = (it: ResolvedDesign, paid: { totalMinor: number; taxMinor: number }): DesignCost =>
    costDesign({
      resolved: it,
      needs: ground.needsOf(it),
      work: workOf(it),
      parts: pantry.parts,
      extraCosts: new Map(extras.map(({ id, costMinor }) => [id, costMinor])),
      rates,
      price: paid,
    });
  const cost = costOf(resolved, price);
  // Another size is priced as today's book prices it; the order's own price may be older.
  const terms = {
    date: order.pickupDate,
    today: localAt(order.createdAt, order.zone).date,
  };
  const netOf = (it: ResolvedDesign) => {
    const { totalMinor, taxMinor } = priceDesign(it, terms);
    return totalMinor - taxMinor;
  };
  const sizes = otherSizes(design, menu).map(({ label, design: other }): OtherSize => {
    const sized = resolveDesign(other, menu);
    const netPriceMinor = cost.netPriceMinor + netOf(sized) - netOf(resolved);
    const { totalMinor } = costOf(sized, { totalMinor: netPriceMinor, taxMinor: 0 });
    return { label, netPriceMinor, totalCostMinor: totalMinor };
  });
  const levers = makeItPay({
    cost,
    rates,
    price,
    book: menu.priceBook,
    portions: portionsOf(resolved),
    sizes,
    locale: menu.studio.locale,
  });
  return { cost, agreed: record.agreedPrice !== null, levers };
}

/** Portions that are charged for, in the tiers and in the kitchen's cutting cakes. */
function portionsOf({ design, tiers, cuttingCakes, menu }: ResolvedDesign): number {
  const kind = design.cake?.kind ?? 'tiered';
  const shown = tiers.map((it) => chargedPortions(it, kind, menu));
  const cut = cuttingCakes.map((it) => it.count * chargedPortions(it, 'sheet', menu));
  return [...shown, ...cut].reduce((sum, it) => sum + it, 0);
}
