import { Op } from 'sequelize';
import type { OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import { expandDesign } from '#shared/dates/expand-design.ts';
import type { WorkTimes } from '#shared/dates/work-times.ts';
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
import { loadPlanSettings, loadWorkTimes } from '#api/modules/plan/plan-settings.ts';
import { needsOfOrder } from './order-needs.queries.ts';

/**
 * What an order costs to make by today's prices, wages and packs, against its agreed price or else
 * its offer, and what would make it pay.
 */
export async function costOfOrder(order: Order): Promise<OrderCost> {
  const [record, ground, settings, extras, book] = await Promise.all([
    loadOrderRecord(order),
    needsOfOrder(order),
    loadPlanSettings(),
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
  const workTimes = await loadWorkTimes(record.revision.workTimeVersionId);
  const { equipment } = settings;
  const costOf = (it: ResolvedDesign, paid: { totalMinor: number; taxMinor: number }): DesignCost =>
    costDesign({
      resolved: it,
      needs: ground.needsOf(it),
      work: workOf(it, workTimes, equipment),
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
  return {
    ...cost,
    lines: cost.lines.map((it) => ({ ...it, items: [...it.items] })),
    unknown: [...cost.unknown],
    agreed: record.agreedPrice !== null,
    levers,
  };
}

/** Hands' work by the times the order was planned with; none before there is a cake. */
function workOf(
  resolved: ResolvedDesign,
  workTimes: WorkTimes,
  equipment: Parameters<typeof expandDesign>[0]['equipment'],
) {
  if (resolved.design.cake === null) return [];
  return expandDesign({ resolved, workTimes, equipment, noticeDays: 0 }).work;
}

/** Portions that are charged for, in the tiers and in the kitchen's cutting cakes. */
function portionsOf({ design, tiers, cuttingCakes, menu }: ResolvedDesign): number {
  const kind = design.cake?.kind ?? 'tiered';
  const shown = tiers.map((it) => chargedPortions(it, kind, menu));
  const cut = cuttingCakes.map((it) => it.count * chargedPortions(it, 'sheet', menu));
  return [...shown, ...cut].reduce((sum, it) => sum + it, 0);
}
