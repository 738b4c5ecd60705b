import type { PricesView } from '#shared/contracts/prices.ts';
import type { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import type { Priceable, PriceBookRecord } from './prices.queries.ts';

/** The price book with everything it prices by name. */
export function presentPrices(input: {
  readonly book: PriceBookVersion;
  readonly priceable: Priceable;
  readonly currencyFixed: boolean;
  readonly books: readonly PriceBookRecord[];
}): PricesView {
  const { book, priceable, currencyFixed, books } = input;
  const named = ({ id, name }: { readonly id: string; readonly name: string }) => ({ id, name });
  return {
    n: book.n,
    versionId: book.id,
    content: book.content,
    currencyFixed,
    sponges: priceable.sponges.map(named),
    fillings: priceable.fillings.map(named),
    styles: priceable.styles.map(named),
    coverings: priceable.coverings.map(named),
    decorations: priceable.decorations.map((it) => ({
      ...named(it),
      per: it.per,
      minutes: it.minutes,
      materialsCostMinor: it.materialsCostMinor,
    })),
    extras: priceable.extras.map(named),
    versions: books.map(({ n, validFrom, by, orders }) => ({
      n,
      since: validFrom.toISOString(),
      by,
      orders,
    })),
  };
}
