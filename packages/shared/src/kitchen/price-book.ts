import type { Menu, PriceBook } from '#shared/contracts/menu.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { decorationPrice, type DecorationWork } from './decoration-price.ts';

/** Only what the price of a cake needs; what the owner alone sees stays out. */
export function publicPriceBook(versionId: string, content: PriceBookContent): PriceBook {
  return {
    versionId,
    currency: content.currency,
    tierBands: content.tierBands,
    sheetPerPortionMinor: content.sheetPerPortionMinor,
    dummyTierMinor: content.dummyTierMinor,
    finishes: content.finishes,
    wordsMinor: content.wordsMinor,
    minimumMinor: content.minimumMinor,
    rush: content.rush,
    taxInclusive: content.taxInclusive,
    taxes: content.taxes,
    roundToMinor: content.roundToMinor,
    depositPpm: content.depositPpm,
    depositFloorMinor: content.depositFloorMinor,
    balanceDueDays: content.balanceDueDays,
  };
}

/** The menu as it would be priced by another book; what the book does not name costs nothing more. */
export function menuPricedBy(
  menu: Menu,
  versionId: string,
  content: PriceBookContent,
  works: readonly DecorationWork[],
): Menu {
  const withSurcharge =
    (surcharges: Readonly<Record<string, number>>) =>
    <Part extends { readonly id: string }>(part: Part) => ({
      ...part,
      surchargePerPortionMinor: surcharges[part.id] ?? 0,
    });
  return {
    ...menu,
    studio: { ...menu.studio, currency: content.currency },
    sponges: menu.sponges.map(withSurcharge(content.spongeSurcharges)),
    fillings: menu.fillings.map(withSurcharge(content.fillingSurcharges)),
    styles: menu.styles.map(withSurcharge(content.styleSurcharges)),
    coverings: menu.coverings.map(withSurcharge(content.coveringSurcharges)),
    decorations: menu.decorations.map((it) => {
      const work = works.find(({ id }) => id === it.id);
      return work === undefined ? it : { ...it, priceMinor: decorationPrice(work, content) };
    }),
    extras: menu.extras.map((it) => ({ ...it, priceMinor: content.extraPrices[it.id] ?? 0 })),
    priceBook: publicPriceBook(versionId, content),
  };
}
