import type { Price, PriceLine } from '#shared/contracts/estimates.ts';
import type { PriceBook } from '#shared/contracts/menu.ts';
import { addDays, daysBetween } from '#shared/dates/local-time.ts';
import { chargedPortions, pricePortion } from './charged-portions.ts';
import { lengthFigure } from './measures.ts';
import { lineOf, sumOf } from './price-line.ts';
import {
  coatingName,
  type ResolvedBody,
  type ResolvedCuttingCake,
  type ResolvedDesign,
  type ResolvedTier,
} from './resolve-design.ts';
import { named } from './sentences.ts';
import { roundToStep, shareOf } from './shares.ts';
import {
  includedTax,
  isExempt,
  taxCategories,
  taxOnTop,
  taxTakenOff,
  type Exemption,
} from './tax.ts';

/** Taken off before tax, with the reason the customer reads: an amount, or a share of what stands. */
export type Discount = { readonly reason: string } & (
  { readonly amountMinor: number } | { readonly sharePpm: number }
);

export type PriceTerms = {
  /** Day the cake is for; null while it is not chosen (no rush is reckoned). */
  readonly date: string | null;
  readonly today: string;
  /** What bringing it comes to, where it is not collected. */
  readonly deliveryMinor?: number;
  readonly discount?: Discount;
  readonly exemption?: Exemption;
};

/**
 * The price of a design, line by line in the order of the quote; the lines add up to the total
 * exactly. A design without a cake has only its extras. Throws a `RangeError` on a discount
 * without a reason.
 */
export function priceDesign(resolved: ResolvedDesign, terms: PriceTerms): Price {
  const { priceBook: book } = resolved.menu;
  const lines: PriceLine[] = cakeLines(resolved);
  lines.push(...rushLines(lines, book, terms));
  lines.push(...deliveryLines(terms));
  lines.push(...extraLines(resolved));
  lines.push(...minimumLines(lines, book, resolved.design.cake !== null));
  lines.push(...discountLines(lines, book, terms));
  const taxed = [...lines];
  const exempt = isExempt(terms.exemption, terms.date ?? terms.today);
  if (book.taxInclusive) {
    if (exempt) lines.push(...taxTakenOff(taxed, book));
  } else if (!exempt) {
    lines.push(...taxOnTop(taxed, book));
  }
  const beforeRounding = sumOf(lines);
  const rounding = roundToStep(beforeRounding, book.roundToMinor) - beforeRounding;
  if (rounding !== 0) lines.push(lineOf('rounding', 'Rounding', 1, rounding, null));
  const totalMinor = sumOf(lines);
  const insideMinor = book.taxInclusive && !exempt ? includedTax(totalMinor, taxed, book) : 0;
  const onTopMinor = book.taxInclusive ? 0 : sumOf(lines.filter((it) => it.kind === 'tax'));
  return {
    currency: book.currency,
    priceBookVersionId: book.versionId,
    lines,
    subtotalMinor: book.taxInclusive ? totalMinor : sumOf(taxed),
    taxMinor: insideMinor + onTopMinor,
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

/** The day the balance is due: so many days before pickup, but not before the day it is agreed. */
export function balanceDueOn(pickupDate: string, dueDays: number, today: string): string {
  const due = addDays(pickupDate, -dueDays);
  return due < today ? today : due;
}

/** Everything that is cake: tiers, surcharges, decorations, words, finish. */
function cakeLines(resolved: ResolvedDesign): PriceLine[] {
  const { design, tiers, cuttingCakes, menu } = resolved;
  if (design.cake === null) return [];
  const { kind } = design.cake;
  const shown = tiers.map((body) => ({ body, portions: chargedPortions(body, kind, menu) }));
  const cut = cuttingCakes.map((body) => ({
    body,
    portions: body.count * chargedPortions(body, 'sheet', menu),
  }));
  const surcharges = surchargesOn([...shown, ...cut]);
  return [
    ...shown.map(({ body, portions }) => tierLine(body, portions, kind, resolved)),
    ...cut.map(({ body, portions }) => cuttingCakeLine(body, portions, resolved)),
    ...surcharges('sponge', ({ sponge }) =>
      sponge === null ? null : [named(sponge.name, 'sponge'), sponge.surchargePerPortionMinor],
    ),
    ...surcharges('filling', ({ filling }) =>
      filling === null ? null : [named(filling.name, 'filling'), filling.surchargePerPortionMinor],
    ),
    ...surcharges('frosting', ({ coating }) =>
      coating === null
        ? null
        : [
            coatingName(coating),
            coating.covering.surchargePerPortionMinor +
              (coating.style?.surchargePerPortionMinor ?? 0),
          ],
    ),
    ...decorationLines(resolved),
    ...wordsLines(resolved),
    ...surcharges('finish', ({ coating }) => {
      const finish = menu.priceBook.finishes.find((it) => it.id === coating?.finish);
      return finish === undefined ? null : [finishLabels[finish.id], finish.perPortionMinor];
    }),
  ];
}

type Portioned = { readonly body: ResolvedBody; readonly portions: number };
type Surcharge = readonly [label: string, perPortionMinor: number];

/** A line for each surcharge of a kind, over the portions of everything that has it. */
function surchargesOn(bodies: readonly Portioned[]) {
  return (
    kind: 'sponge' | 'filling' | 'frosting' | 'finish',
    of: (body: ResolvedBody) => Surcharge | null,
  ): PriceLine[] => {
    const grouped = new Map<string, { portions: number; perPortionMinor: number }>();
    for (const { body, portions } of bodies) {
      const [label, perPortionMinor] = of(body) ?? ['', 0];
      if (perPortionMinor === 0 || portions === 0) continue;
      const before = grouped.get(label)?.portions ?? 0;
      grouped.set(label, { portions: before + portions, perPortionMinor });
    }
    return [...grouped].map(([label, { portions, perPortionMinor }]) =>
      lineOf(kind, label, portions, portions * perPortionMinor, taxCategories.cake),
    );
  };
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
  resolved: ResolvedDesign,
): PriceLine {
  const { menu, design } = resolved;
  const { priceBook: book, studio } = menu;
  const { widthMm, depthMm, shape } = tier.block;
  const cake = taxCategories.cake;
  const by = reckonedBy(resolved);
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

function cuttingCakeLine(
  { size, count }: ResolvedCuttingCake,
  portions: number,
  resolved: ResolvedDesign,
): PriceLine {
  const times = count === 1 ? '' : `${count} × `;
  const label = `Cutting cake, ${times}${size.name}${reckonedBy(resolved)}`;
  const amount = portions * resolved.menu.priceBook.sheetPerPortionMinor;
  return lineOf('cutting-cake', label, portions, amount, taxCategories.cake);
}

/** The guests' own count is another number, so the line says what its number counts. */
function reckonedBy({ menu, portionSize }: ResolvedDesign): string {
  const reckoned = pricePortion(menu);
  return reckoned.id === portionSize.id ? '' : `, by the ${reckoned.name.toLowerCase()} portion`;
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
  const amount = shareOf(sumOf(lines), band.addPpm, book.currency);
  if (amount === 0) return [];
  const label = `Short notice (under ${band.underDays} days)`;
  return [lineOf('rush', label, 1, amount, taxCategories.cake)];
}

function deliveryLines({ deliveryMinor = 0 }: PriceTerms): PriceLine[] {
  return deliveryMinor === 0
    ? []
    : [lineOf('delivery', 'Delivery', 1, deliveryMinor, taxCategories.delivery)];
}

function extraLines({ extras }: ResolvedDesign): PriceLine[] {
  return extras.map(({ extra, quantity }) => {
    const category = extra.taxCategory ?? taxCategories.goods;
    return lineOf('extra', extra.name, quantity, quantity * extra.priceMinor, category);
  });
}

function minimumLines(lines: readonly PriceLine[], book: PriceBook, hasCake: boolean): PriceLine[] {
  const missing = book.minimumMinor - sumOf(lines);
  if (!hasCake || missing <= 0) return [];
  return [lineOf('minimum', 'Up to our smallest order', 1, missing, taxCategories.cake)];
}

/** A discount takes off what there is at the most. */
function discountLines(
  lines: readonly PriceLine[],
  book: PriceBook,
  { discount }: PriceTerms,
): PriceLine[] {
  if (discount === undefined) return [];
  const reason = discount.reason.trim();
  if (reason === '') throw new RangeError('A discount needs its reason.');
  const standing = Math.max(0, sumOf(lines));
  const wanted =
    'amountMinor' in discount
      ? Math.abs(discount.amountMinor)
      : shareOf(standing, discount.sharePpm, book.currency);
  const amount = Math.min(standing, wanted);
  return amount === 0 ? [] : [lineOf('discount', reason, 1, -amount, null)];
}
