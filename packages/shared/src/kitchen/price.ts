import { add, dinero, halfUp, multiply, toSnapshot, transformScale, type Dinero } from 'dinero.js';
import type { Price, PriceLine } from '#shared/contracts/estimates.ts';
import type { PriceBook } from '#shared/contracts/menu.ts';
import { daysBetween } from '#shared/dates/local-time.ts';
import { chargedPortions, pricePortion } from './charged-portions.ts';
import { lengthFigure } from './measures.ts';
import { minorDigits, splitByLargestRemainder } from './money.ts';
import { coatingName, type ResolvedDesign, type ResolvedTier } from './resolve-design.ts';
import { named } from './sentences.ts';

/**
 * Tax categories of the lines. A price book that does not list one taxes it as its first
 * category, so a studio with a single rate lists a single category.
 */
export const taxCategories = { cake: 'cake', goods: 'goods' } as const;

export type PriceTerms = {
  /** Day the cake is for; null while it is not chosen (no rush is reckoned). */
  readonly date: string | null;
  readonly today: string;
  /** Taken off before tax, with the reason the customer reads. */
  readonly discount?: { readonly reason: string; readonly amountMinor: number };
  /** A buyer whose exemption certificate is on file. */
  readonly taxExempt?: boolean;
};

/** Share of an amount in parts per million, halves up, in whole minor units. */
export function shareOf(amountMinor: number, ppm: number, currency: string): number {
  const exponent = minorDigits(currency);
  const exact = multiply(money(amountMinor, currency), { amount: ppm, scale: 6 });
  return amountOf(transformScale(exact, exponent, halfUp));
}

function money(amountMinor: number, currency: string): Dinero<number> {
  return dinero({
    amount: amountMinor,
    currency: { code: currency, base: 10, exponent: minorDigits(currency) },
  });
}

const amountOf = (it: Dinero<number>): number => toSnapshot(it).amount;

function sumOf(lines: readonly PriceLine[], currency: string): number {
  return amountOf(
    lines.reduce((sum, it) => add(sum, money(it.amountMinor, currency)), money(0, currency)),
  );
}

/**
 * The price of a design, line by line in the order of the quote; the lines add up to the total
 * exactly. A design without a cake has only its extras.
 */
export function priceDesign(resolved: ResolvedDesign, terms: PriceTerms): Price {
  const { priceBook: book } = resolved.menu;
  const { currency } = book;
  const lines: PriceLine[] = cakeLines(resolved);
  lines.push(...rushLines(lines, book, terms));
  lines.push(...extraLines(resolved));
  lines.push(...minimumLines(lines, book, resolved.design.cake !== null));
  if (terms.discount !== undefined && terms.discount.amountMinor !== 0) {
    const { reason, amountMinor } = terms.discount;
    lines.push(lineOf('discount', reason, 1, -Math.abs(amountMinor), null));
  }
  const exempt = terms.taxExempt === true;
  const taxable = exempt ? new Map<string, number>() : taxableByCategory(lines, book);
  const net = sumOf(lines, currency);
  if (!book.taxInclusive) lines.push(...taxLines(taxable, book));
  const beforeRounding = sumOf(lines, currency);
  const rounding = roundTo(beforeRounding, book.roundToMinor) - beforeRounding;
  if (rounding !== 0) lines.push(lineOf('rounding', 'Rounding', 1, rounding, null));
  const totalMinor = sumOf(lines, currency);
  return {
    currency,
    priceBookVersionId: book.versionId,
    lines,
    subtotalMinor: book.taxInclusive ? totalMinor : net,
    taxMinor: book.taxInclusive
      ? includedTax(totalMinor, taxable, book)
      : sumOf(
          lines.filter((it) => it.kind === 'tax'),
          currency,
        ),
    taxInclusive: book.taxInclusive,
    totalMinor,
    depositMinor: depositOf(totalMinor, book),
  };
}

/** The deposit a total asks for: the book's share with its floor, never more than the total. */
export function depositOf(totalMinor: number, book: PriceBook): number {
  if (totalMinor <= 0) return 0;
  const share = shareOf(totalMinor, book.depositPpm, book.currency);
  return Math.min(totalMinor, Math.max(share, book.depositFloorMinor));
}

function lineOf(
  kind: PriceLine['kind'],
  label: string,
  quantity: number,
  amountMinor: number,
  taxCategory: string | null,
): PriceLine {
  return { kind, label, quantity, amountMinor, taxCategory };
}

/** Everything that is cake: tiers, surcharges, decorations, words, finish. */
function cakeLines(resolved: ResolvedDesign): PriceLine[] {
  const { design, tiers, menu } = resolved;
  if (design.cake === null) return [];
  const { kind } = design.cake;
  const portioned = tiers.map((tier) => ({ tier, portions: chargedPortions(tier, kind, menu) }));
  const cake = taxCategories.cake;
  const surcharges = (
    lineKind: 'sponge' | 'filling' | 'frosting' | 'finish',
    of: (tier: ResolvedTier) => { label: string; perPortionMinor: number } | null,
  ): PriceLine[] => {
    const grouped = new Map<string, { portions: number; perPortionMinor: number }>();
    for (const { tier, portions } of portioned) {
      const surcharge = of(tier);
      if (surcharge === null || surcharge.perPortionMinor === 0 || portions === 0) continue;
      const known = grouped.get(surcharge.label);
      grouped.set(surcharge.label, {
        portions: portions + (known?.portions ?? 0),
        perPortionMinor: surcharge.perPortionMinor,
      });
    }
    return [...grouped].map(([label, it]) =>
      lineOf(lineKind, label, it.portions, it.portions * it.perPortionMinor, cake),
    );
  };
  return [
    ...portioned.map(({ tier, portions }) => tierLine(tier, portions, kind, resolved)),
    ...surcharges('sponge', ({ sponge }) =>
      sponge === null
        ? null
        : {
            label: named(sponge.name, 'sponge'),
            perPortionMinor: sponge.surchargePerPortionMinor,
          },
    ),
    ...surcharges('filling', ({ filling }) =>
      filling === null
        ? null
        : {
            label: named(filling.name, 'filling'),
            perPortionMinor: filling.surchargePerPortionMinor,
          },
    ),
    ...surcharges('frosting', ({ coating }) =>
      coating === null
        ? null
        : {
            label: coatingName(coating),
            perPortionMinor:
              coating.covering.surchargePerPortionMinor +
              (coating.style?.surchargePerPortionMinor ?? 0),
          },
    ),
    ...decorationLines(resolved),
    ...wordsLines(resolved),
    ...surcharges('finish', ({ coating }) => {
      const finish = menu.priceBook.finishes.find((it) => it.id === coating?.finish);
      return finish === undefined
        ? null
        : { label: finishLabels[finish.id], perPortionMinor: finish.perPortionMinor };
    }),
  ];
}

const finishLabels = {
  smooth: 'Smooth finish',
  textured: 'Textured finish',
  piped: 'Piped finish',
} as const;

function tierLine(
  tier: ResolvedTier,
  portions: number,
  kind: 'tiered' | 'sheet',
  { menu, design, portionSize }: ResolvedDesign,
): PriceLine {
  const { priceBook: book, studio } = menu;
  const { widthMm, depthMm, shape } = tier.block;
  const cake = taxCategories.cake;
  const reckoned = pricePortion(menu);
  // The guests' own count is another number, so the line says what its number counts.
  const by =
    reckoned.id === portionSize.id ? '' : `, by the ${reckoned.name.toLowerCase()} portion`;
  if (kind === 'sheet') {
    const name = menu.sheetSizes.find((it) => it.id === design.cake?.sheet?.sizeId)?.name ?? '';
    const label = `${name}${by}`;
    return lineOf('sheet', label, portions, portions * book.sheetPerPortionMinor, cake);
  }
  const lead = studio.lengthLead;
  const across =
    widthMm === depthMm
      ? lengthFigure(widthMm, lead)
      : `${lengthFigure(widthMm, lead)} × ${lengthFigure(depthMm, lead)}`;
  const label = `${across} ${lead} ${shape} tier`;
  if (!tier.real) return lineOf('tier', `${label}, a dummy`, 1, book.dummyTierMinor, cake);
  const widest = Math.max(widthMm, depthMm);
  const band = book.tierBands.find((it) => widest <= it.upToMm) ?? book.tierBands.at(-1);
  const amount = portions * (band?.perPortionMinor ?? 0);
  const kept = tier.keepsake ? ', to keep' : '';
  return lineOf('tier', `${label}${kept}${by}`, portions, amount, cake);
}

function decorationLines({ decorations, tiers }: ResolvedDesign): PriceLine[] {
  return decorations.map(({ placed, decoration }) => {
    const times = {
      piece: placed.quantity,
      tier: placed.tier === null ? tiers.length : 1,
      cake: 1,
    }[decoration.per];
    const amount = times * decoration.priceMinor;
    return lineOf('decoration', decoration.name, times, amount, taxCategories.cake);
  });
}

function wordsLines({ design, menu }: ResolvedDesign): PriceLine[] {
  const count = (design.look?.words ?? []).filter((it) => it.text.trim() !== '').length;
  const each = menu.priceBook.wordsMinor;
  if (count === 0 || each === 0) return [];
  return [lineOf('words', 'Words on the cake', count, count * each, taxCategories.cake)];
}

/** The share of the lines so far that short notice adds; the tightest band that covers it. */
function rushLines(
  lines: readonly PriceLine[],
  book: PriceBook,
  { date, today }: PriceTerms,
): PriceLine[] {
  if (date === null) return [];
  const notice = Math.max(0, daysBetween(today, date));
  const band = book.rush
    .filter((it) => notice < it.underDays)
    .toSorted((a, b) => a.underDays - b.underDays)[0];
  if (band === undefined) return [];
  const amount = shareOf(sumOf(lines, book.currency), band.addPpm, book.currency);
  if (amount === 0) return [];
  const label = `Short notice (under ${band.underDays} days)`;
  return [lineOf('rush', label, 1, amount, taxCategories.cake)];
}

function extraLines({ extras }: ResolvedDesign): PriceLine[] {
  return extras.map(({ extra, quantity }) => {
    const category = extra.taxCategory ?? taxCategories.goods;
    return lineOf('extra', extra.name, quantity, quantity * extra.priceMinor, category);
  });
}

function minimumLines(lines: readonly PriceLine[], book: PriceBook, hasCake: boolean): PriceLine[] {
  const missing = book.minimumMinor - sumOf(lines, book.currency);
  if (!hasCake || missing <= 0) return [];
  return [lineOf('minimum', 'Up to our smallest order', 1, missing, taxCategories.cake)];
}

/** The category a line is taxed in: its own if the book lists it, else the book's first. */
function categoryIn(book: PriceBook, category: string): string | null {
  const own = book.taxes.find((it) => it.category === category) ?? book.taxes[0];
  return own?.category ?? null;
}

/** Taxable amounts by category; lines of no category (a discount) lie on all in proportion. */
function taxableByCategory(lines: readonly PriceLine[], book: PriceBook): Map<string, number> {
  const sums = new Map<string, number>();
  let shared = 0;
  for (const line of lines) {
    const category = line.taxCategory === null ? null : categoryIn(book, line.taxCategory);
    if (category === null) shared += line.amountMinor;
    else sums.set(category, (sums.get(category) ?? 0) + line.amountMinor);
  }
  const shares = splitByLargestRemainder(shared, [...sums.values()]);
  return new Map([...sums].map(([category, sum], i) => [category, sum + (shares[i] ?? 0)]));
}

function taxLines(taxable: ReadonlyMap<string, number>, book: PriceBook): PriceLine[] {
  return book.taxes.flatMap((tax) => {
    const base = Math.max(0, taxable.get(tax.category) ?? 0);
    const amount = shareOf(base, tax.ratePpm, book.currency);
    const label = `${tax.name} ${String(tax.ratePpm / 10_000)} %`;
    return amount === 0 ? [] : [lineOf('tax', label, 1, amount, tax.category)];
  });
}

/**
 * Tax inside an inclusive total: the total goes to the categories in proportion, and each share
 * is split 100 : rate, both by largest remainder.
 */
function includedTax(
  totalMinor: number,
  taxable: ReadonlyMap<string, number>,
  book: PriceBook,
): number {
  const shares = splitByLargestRemainder(
    Math.max(0, totalMinor),
    [...taxable.values()].map((it) => Math.max(0, it)),
  );
  return [...taxable.keys()].reduce((sum, category, index) => {
    const rate = book.taxes.find((it) => it.category === category)?.ratePpm ?? 0;
    const [, tax = 0] = splitByLargestRemainder(shares[index] ?? 0, [1_000_000, rate]);
    return sum + tax;
  }, 0);
}

/** To the nearest multiple of the step, halves up. */
function roundTo(amountMinor: number, stepMinor: number): number {
  return stepMinor > 1
    ? Math.floor((2 * amountMinor + stepMinor) / (2 * stepMinor)) * stepMinor
    : amountMinor;
}
