import type { Menu } from '#shared/contracts/menu.ts';
import type { PriceBookContent, PricesView } from '#shared/contracts/prices.ts';
import { menuPricedBy } from '#shared/kitchen/price-book.ts';
import { priceDesign } from '#shared/kitchen/price.ts';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import type { SampleCake } from '#web/components/sample-cakes/sample-cakes.ts';

/** What a sample would sell for by a book, with notice enough; minor units. */
export function priceOfSample(
  sample: SampleCake,
  content: PriceBookContent,
  { menu, prices, today }: { menu: Menu; prices: PricesView; today: string },
): number {
  const priced = menuPricedBy(menu, prices.versionId, content, prices.decorations);
  return priceDesign(resolveDesign(sample.design, priced), { date: null, today }).totalMinor;
}
