import type { PriceBookContent } from '#shared/contracts/prices.ts';

/** What a decoration takes: bench minutes and materials, in minor units. */
export type DecorationWork = {
  readonly id: string;
  readonly minutes: number;
  readonly materialsCostMinor: number;
};

type Rates = Pick<
  PriceBookContent,
  'decorationPrices' | 'decoratingPerHourMinor' | 'materialsMarkupPpm' | 'roundToMinor'
>;

/** What a decoration sells for: the owner's fixed price, else what its work comes to. */
export function decorationPrice(work: DecorationWork, book: Rates): number {
  return book.decorationPrices[work.id] ?? workedOutDecorationPrice(work, book);
}

/**
 * Minutes at the decorating rate and materials with their markup, to the nearest of the book's
 * rounding steps, halves up; minor units.
 */
export function workedOutDecorationPrice(work: DecorationWork, book: Rates): number {
  // In sixty-millionths of a minor unit, so that neither hours nor parts per million divide early.
  const exact =
    work.minutes * book.decoratingPerHourMinor * 1_000_000 +
    work.materialsCostMinor * (1_000_000 + book.materialsMarkupPpm) * 60;
  const step = Math.max(1, book.roundToMinor) * 60_000_000;
  return Math.floor((2 * exact + step) / (2 * step)) * Math.max(1, book.roundToMinor);
}
