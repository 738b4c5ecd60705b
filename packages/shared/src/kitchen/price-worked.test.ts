import { codes } from 'currency-codes';
import fc from 'fast-check';
import { add, floor, fraction, type Fraction } from 'mathjs';
import { describe, expect, it } from 'vitest';
import type { Price } from '#shared/contracts/estimates.ts';
import type { Menu, PriceBook } from '#shared/contracts/menu.ts';
import { priceDesign, type PriceTerms } from './price.ts';
import { resolveDesign } from './resolve-design.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

/*
 * Whole quotes, each step reckoned by hand beside it: 6, 8 and 10 in rounds are 13, 25 and 39
 * dessert portions; Swiss meringue asks 40 minor units a portion, lemon curd 30. Then the same
 * sums by a route of their own, in fractions.
 */

const withBook = (change: Partial<PriceBook>): Menu => ({
  ...menuFixture,
  priceBook: { ...menuFixture.priceBook, ...change },
});

const lines = (price: Price) => price.lines.map((it) => [it.kind, it.quantity, it.amountMinor]);

describe('a quote in yen, tax inside, 8 % on food and 10 % on goods', () => {
  const menu = withBook({
    currency: 'JPY',
    tierBands: [
      { upToMm: 160, perPortionMinor: 780 },
      { upToMm: 400, perPortionMinor: 720 },
    ],
    taxInclusive: true,
    taxes: [
      { category: 'cake', name: 'Tax on food', ratePpm: 80_000 },
      { category: 'goods', name: 'Tax', ratePpm: 100_000 },
    ],
    roundToMinor: 10,
  });
  const design = designWith({
    cake: { tiers: [roundTier(8)], coating: coat({}) },
    extras: [{ extraId: 'knife', quantity: 1 }],
  });
  const terms: PriceTerms = {
    date: '2027-06-19',
    today: '2027-05-01',
    discount: { reason: 'Fifth cake this year', sharePpm: 50_000 },
  };
  const price = priceDesign(resolveDesign(design, menu), terms);

  it('has no fractions of a yen', () => {
    expect(lines(price)).toEqual([
      ['tier', 25, 18_000], // 25 x 720
      ['frosting', 25, 1_000], // 25 x 40
      ['extra', 1, 600],
      ['discount', 1, -980], // 5 % of 19,600
    ]);
  });

  it('says the tax that is inside', () => {
    // The discount lies on food and goods as 19,000 to 600: 950 and 30 off.
    // Food 18,050: x 8/108 = 1,337.04, and 16,712.96 without; the one left over goes to the latter.
    // Goods 570: x 10/110 = 51.82, and 518.18 without; the one left over goes to the tax.
    expect(price).toMatchObject({
      totalMinor: 18_620,
      subtotalMinor: 18_620,
      taxMinor: 1_337 + 52,
      depositMinor: 5_586, // 30 %
    });
  });
});

describe('a quote in dinars, of a thousand fils, tax on top', () => {
  const menu = withBook({
    currency: 'KWD',
    tierBands: [
      { upToMm: 160, perPortionMinor: 1_650 },
      { upToMm: 400, perPortionMinor: 1_500 },
    ],
    taxes: [{ category: 'cake', name: 'Tax', ratePpm: 50_000 }],
    roundToMinor: 250,
  });
  const design = designWith({
    cake: { tiers: [roundTier(8), roundTier(6)], coating: coat({ finish: 'textured' }) },
  });
  const price = priceDesign(resolveDesign(design, menu), {
    date: '2027-06-16',
    today: '2027-06-14',
    deliveryMinor: 3_500,
    discount: { reason: 'We answered late', amountMinor: 2_000 },
  });

  it('comes out to the fils', () => {
    expect(lines(price)).toEqual([
      ['tier', 25, 37_500], // 25 x 1.500
      ['tier', 13, 21_450], // 13 x 1.650
      ['frosting', 38, 1_520], // 38 x 0.040
      ['finish', 38, 950], // 38 x 0.025
      ['rush', 1, 15_355], // 25 % of 61.420
      ['delivery', 1, 3_500],
      ['discount', 1, -2_000],
      ['tax', 1, 3_914], // 5 % of 78.275 = 3.91375
      ['rounding', 1, 61], // 82.189 to the nearest 0.250
    ]);
    expect(price).toMatchObject({
      subtotalMinor: 78_275,
      taxMinor: 3_914,
      totalMinor: 82_250,
      depositMinor: 24_675, // 30 %
    });
  });
});

describe('an exempt buyer', () => {
  const exemption = { certificate: 'GB-7731', until: '2027-12-31' };
  const design = designWith({ cake: { tiers: [roundTier(8)], coating: coat({}) } });
  const terms = { date: '2027-06-19', today: '2027-05-01' };
  const taxes = [{ category: 'cake', name: 'VAT', ratePpm: 200_000 }];

  it('has the tax inside taken off again', () => {
    const menu = withBook({ currency: 'GBP', taxInclusive: true, taxes });
    const resolved = resolveDesign(design, menu);
    expect(priceDesign(resolved, terms)).toMatchObject({ totalMinor: 13_500, taxMinor: 2_250 });
    const exempt = priceDesign(resolved, { ...terms, exemption });
    // 25 x 5.00 + 25 x 0.40 = 135.00; 135.00 / 6 = 22.50.
    expect(exempt.lines.at(-1)).toMatchObject({
      kind: 'tax',
      label: 'VAT 20 % taken off, exempt',
      amountMinor: -2_250,
    });
    expect(exempt).toMatchObject({ totalMinor: 11_250, taxMinor: 0 });
  });

  it('has none put on top', () => {
    const resolved = resolveDesign(design, withBook({ currency: 'GBP', taxes }));
    expect(priceDesign(resolved, terms)).toMatchObject({ totalMinor: 16_200, taxMinor: 2_700 });
    expect(priceDesign(resolved, { ...terms, exemption })).toMatchObject({
      totalMinor: 13_500,
      taxMinor: 0,
    });
  });
});

describe('cutting cakes', () => {
  it('are priced like sheets and carry the surcharges of what they are made of', () => {
    const cuttingCakes = [
      { sizeId: 'half', count: 2, layers: 2, spongeId: 'vanilla', fillingId: 'lemon-curd' },
    ];
    const design = designWith({
      cake: { tiers: [roundTier(8)], coating: coat({ finish: 'piped' }), cuttingCakes },
    });
    const price = priceDesign(resolveDesign(design, withBook({ roundToMinor: 1 })), {
      date: null,
      today: '2027-05-01',
    });
    expect(price.lines.map((it) => [it.label, it.quantity, it.amountMinor])).toEqual([
      ['8 in round tier', 25, 12_500],
      ['Cutting cake, 2 × Half sheet, 13 x 18 in', 108, 34_560], // 2 x 54 x 3.20
      ['Lemon curd filling', 108, 3_240], // 108 x 0.30
      ['Swiss meringue buttercream', 133, 5_320], // 25 + 108, x 0.40
      ['Piped finish', 25, 3_000], // the cake on show alone
    ]);
  });
});

describe('by a route of its own', () => {
  const cents = (it: Fraction): number => Number(it.s * it.n) / Number(it.d);
  const halfUp = (it: Fraction): Fraction => floor(add(it, fraction(1, 2)));
  const share = (of: Fraction, ppm: number): Fraction =>
    halfUp(fraction(cents(of) * ppm, 1_000_000));

  it('any quote comes to the same in fractions, in every currency', () => {
    expect(codes().length).toBeGreaterThan(150);
    fc.assert(
      fc.property(
        arbitraryDesign,
        fc.constantFrom(...codes()),
        fc.constantFrom(1, 5, 50, 1000),
        fc.integer({ min: 0, max: 300_000 }),
        fc.constantFrom(0, 100_000, 250_000),
        fc.integer({ min: 0, max: 50_000 }),
        (design, currency, roundToMinor, ratePpm, addPpm, amountMinor) => {
          const rush = addPpm === 0 ? [] : [{ underDays: 400, addPpm }];
          const taxes = [{ category: 'all', name: 'Tax', ratePpm }];
          const menu = withBook({ currency, roundToMinor, rush, taxes });
          const price = priceDesign(resolveDesign(design, menu), {
            date: '2027-06-19',
            today: '2027-06-01',
            discount: { reason: 'A test', amountMinor },
          });
          const of = (...kinds: readonly string[]) =>
            price.lines
              .filter((it) => kinds.includes(it.kind))
              .reduce((sum, it) => add(sum, fraction(it.amountMinor)), fraction(0));
          const worked = ['extra', 'rush', 'minimum', 'discount', 'tax', 'rounding'];
          const made = price.lines
            .filter((it) => !worked.includes(it.kind))
            .reduce((sum, it) => add(sum, fraction(it.amountMinor)), fraction(0));
          const hurried = add(add(made, share(made, addPpm)), of('extra'));
          const least = design.cake === null ? 0 : menu.priceBook.minimumMinor;
          const gross = Math.max(cents(hurried), least);
          const net = fraction(gross - Math.min(gross, amountMinor));
          const due = add(net, share(net, ratePpm));
          const steps = halfUp(fraction(cents(due), roundToMinor));
          expect(price.subtotalMinor).toBe(cents(net));
          expect(price.taxMinor).toBe(cents(share(net, ratePpm)));
          expect(price.totalMinor).toBe(cents(steps) * roundToMinor);
          expect(price.lines.reduce((sum, it) => sum + it.amountMinor, 0)).toBe(price.totalMinor);
        },
      ),
    );
  });
});
