import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { today } from '#shared/dates/local-time.ts';

export type SampleFigures = { readonly portions: number; readonly price: string };

/** What a sample feeds and costs by the menu's own rules, as the order would say it. */
export function figuresOf(design: Design, menu: Menu): SampleFigures {
  const { studio } = menu;
  const estimate = evaluateDesign({ design, date: null }, menu, today(new Date(), studio.zone));
  return {
    portions: estimate.portions.fed,
    price: formatMoney(estimate.price.totalMinor, estimate.price.currency, studio.locale),
  };
}
