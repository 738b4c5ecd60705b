import type { PriceLine } from '#shared/contracts/estimates.ts';
import type { PriceBook } from '#shared/contracts/menu.ts';
import { splitByLargestRemainder } from './money.ts';
import { lineOf } from './price-line.ts';
import { shareOf } from './shares.ts';

/**
 * Tax categories of the lines. A price book that does not list one taxes it as its first
 * category, so a studio with a single rate lists a single category.
 */
export const taxCategories = { cake: 'cake', goods: 'goods', delivery: 'delivery' } as const;

/** A buyer who pays no tax, by a certificate that the studio has on file. */
export type Exemption = {
  readonly certificate: string;
  /** The last day it is good for, `YYYY-MM-DD`. */
  readonly until: string;
};

/** Whether no tax is due from the buyer on that day; a certificate without a number is none. */
export function isExempt(exemption: Exemption | undefined, day: string): boolean {
  return exemption !== undefined && exemption.certificate.trim() !== '' && day <= exemption.until;
}

type Tax = PriceBook['taxes'][number];

/** The tax a category falls under: its own if the book lists it, else the book's first. */
function taxFor(book: PriceBook, category: string): Tax | undefined {
  return book.taxes.find((it) => it.category === category) ?? book.taxes[0];
}

/** Taxable amounts by tax; lines of no category lie on all in proportion. */
function taxable(lines: readonly PriceLine[], book: PriceBook): Map<Tax, number> {
  const sums = new Map<Tax, number>();
  let shared = 0;
  for (const line of lines) {
    const tax = line.taxCategory === null ? undefined : taxFor(book, line.taxCategory);
    if (tax === undefined) shared += line.amountMinor;
    else sums.set(tax, (sums.get(tax) ?? 0) + line.amountMinor);
  }
  const shares = splitByLargestRemainder(shared, [...sums.values()]);
  return new Map([...sums].map(([tax, sum], i) => [tax, Math.max(0, sum + (shares[i] ?? 0))]));
}

const nameOf = ({ name, ratePpm }: Tax): string => `${name} ${String(ratePpm / 10_000)} %`;

/** Tax on top of prices without it: one line for each that comes to something, in the book's order. */
export function taxOnTop(lines: readonly PriceLine[], book: PriceBook): PriceLine[] {
  const amounts = taxable(lines, book);
  return book.taxes.flatMap((tax) => {
    const amount = shareOf(amounts.get(tax) ?? 0, tax.ratePpm, book.currency);
    return amount === 0 ? [] : [lineOf('tax', nameOf(tax), 1, amount, tax.category)];
  });
}

/**
 * The tax inside a total of inclusive prices, by tax: the total goes to the taxes in proportion to
 * their lines, and each share is split 100 : rate, both by largest remainder.
 */
function taxInside(
  totalMinor: number,
  lines: readonly PriceLine[],
  book: PriceBook,
): Map<Tax, number> {
  const amounts = taxable(lines, book);
  const shares = splitByLargestRemainder(Math.max(0, totalMinor), [...amounts.values()]);
  return new Map(
    [...amounts.keys()].map((tax, index) => {
      const [, inside = 0] = splitByLargestRemainder(shares[index] ?? 0, [1_000_000, tax.ratePpm]);
      return [tax, inside];
    }),
  );
}

/** All the tax inside a total of inclusive prices. */
export function includedTax(
  totalMinor: number,
  lines: readonly PriceLine[],
  book: PriceBook,
): number {
  return [...taxInside(totalMinor, lines, book).values()].reduce((sum, it) => sum + it, 0);
}

/** The tax inside inclusive prices taken off again for an exempt buyer, a line for each. */
export function taxTakenOff(lines: readonly PriceLine[], book: PriceBook): PriceLine[] {
  const total = lines.reduce((sum, it) => sum + it.amountMinor, 0);
  const inside = taxInside(total, lines, book);
  return book.taxes.flatMap((tax) => {
    const amount = inside.get(tax) ?? 0;
    return amount === 0
      ? []
      : [lineOf('tax', `${nameOf(tax)} taken off, exempt`, 1, -amount, tax.category)];
  });
}
