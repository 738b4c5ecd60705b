import type { OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import type { CostOfOrder } from './order-cost.queries.ts';

/** What an order costs and leaves; for the owner alone. */
export function presentOrderCost({ cost, agreed, levers }: CostOfOrder): OrderCost {
  return {
    currency: cost.currency,
    lines: cost.lines.map(({ kind, amountMinor, items }) => ({
      kind,
      amountMinor,
      items: items.map((it) => ({
        label: it.label,
        grams: it.grams,
        minutes: it.minutes,
        count: it.count,
        amountMinor: it.amountMinor,
      })),
    })),
    totalMinor: cost.totalMinor,
    unknown: [...cost.unknown],
    netPriceMinor: cost.netPriceMinor,
    agreed,
    marginMinor: cost.marginMinor,
    marginPpm: cost.marginPpm,
    targetMarginPpm: cost.targetMarginPpm,
    minutes: cost.minutes,
    levers: levers.map(({ kind, title, sentence, enough }) => ({ kind, title, sentence, enough })),
  };
}
