import { codes } from 'currency-codes';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import type { Price } from '#shared/contracts/estimates.ts';
import type { Menu, PriceBook } from '#shared/contracts/menu.ts';
import { balanceDueOn, depositOf, priceDesign, type PriceTerms } from './price.ts';
import { resolveDesign } from './resolve-design.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const plenty: PriceTerms = { date: '2027-06-19', today: '2027-05-01' };

const withBook = (change: Partial<PriceBook>): Menu => ({
  ...menuFixture,
  priceBook: { ...menuFixture.priceBook, ...change },
});

const priceOf = (design: Design, terms = plenty, menu = menuFixture): Price =>
  priceDesign(resolveDesign(design, menu), terms);

const lines = (price: Price) => price.lines.map((it) => [it.kind, it.quantity, it.amountMinor]);

describe('a quote worked by hand', () => {
  const design = designWith({
    cake: {
      tiers: [
        roundTier(10, { fillingId: 'lemon-curd' }),
        roundTier(8, { spongeId: 'chocolate' }),
        roundTier(6),
      ],
      coating: coat({ finish: 'piped' }),
    },
    look: {
      words: [{ tier: 0, text: 'Nell and Tom' }],
      decorations: [
        { decorationId: 'sugar-flower', tier: 2, quantity: 2, colour: null, source: 'studio' },
        { decorationId: 'border', tier: null, quantity: 1, colour: null, source: 'studio' },
      ],
    },
    extras: [{ extraId: 'candles', quantity: 2 }],
  });
  const price = priceOf(design, { date: '2027-06-19', today: '2027-06-14' });

  it('comes out line by line, in the order of a quote', () => {
    expect(lines(price)).toEqual([
      ['tier', 39, 19_500], // 39 x 5.00
      ['tier', 25, 12_500], // 25 x 5.00
      ['tier', 13, 7_020], // 13 x 5.40, the band up to 160 mm
      ['sponge', 25, 625], // 25 x 0.25
      ['filling', 39, 1_170], // 39 x 0.30
      ['frosting', 77, 3_080], // 77 x 0.40
      ['decoration', 2, 3_000], // 2 x 15.00
      ['decoration', 3, 2_400], // 3 tiers x 8.00
      ['words', 1, 1_200],
      ['finish', 77, 9_240], // 77 x 1.20
      ['rush', 1, 5_974], // 10 % of 597.35 = 59.735, halves up
      ['extra', 2, 900],
      ['tax', 1, 80], // 8.875 % of 9.00 = 0.79875
      ['rounding', 1, 11], // 666.89 to the nearest 0.50
    ]);
  });

  it('adds up', () => {
    expect(price).toMatchObject({
      currency: 'USD',
      subtotalMinor: 66_609,
      taxMinor: 80,
      totalMinor: 66_700,
      depositMinor: 20_010, // 30 %
    });
  });
});

describe('the lines', () => {
  it('add up to the total to the minor unit in every currency, tax inside or on top', () => {
    fc.assert(
      fc.property(
        arbitraryDesign,
        fc.constantFrom(...codes()),
        fc.boolean(),
        fc.constantFrom(1, 5, 50, 100),
        fc.integer({ min: 0, max: 300_000 }),
        fc.option(fc.integer({ min: 0, max: 40 })),
        (design, currency, taxInclusive, roundToMinor, ratePpm, notice) => {
          const taxes = [
            { category: 'cake', name: 'Reduced rate', ratePpm: Math.floor(ratePpm / 2) },
            { category: 'goods', name: 'Full rate', ratePpm },
          ];
          const menu = withBook({ currency, taxInclusive, roundToMinor, taxes });
          const date =
            notice === null ? null : `2027-06-${String(1 + (notice % 28)).padStart(2, '0')}`;
          const price = priceOf(design, { date, today: '2027-06-01' }, menu);
          const sum = price.lines.reduce((total, it) => total + it.amountMinor, 0);
          expect(price.totalMinor).toBe(sum);
          expect(price.totalMinor % roundToMinor).toBe(0);
          expect(price.lines.every((it) => Number.isSafeInteger(it.amountMinor))).toBe(true);
          expect(price.taxMinor).toBeGreaterThanOrEqual(0);
          expect(price.depositMinor).toBeLessThanOrEqual(price.totalMinor);
          if (taxInclusive) {
            expect(price.lines.some((it) => it.kind === 'tax')).toBe(false);
            expect(price.subtotalMinor).toBe(price.totalMinor);
          }
        },
      ),
    );
  });

  it('are none without a cake but its extras', () => {
    const design = designWith({ cake: null, extras: [{ extraId: 'knife', quantity: 1 }] });
    expect(lines(priceOf(design)).map(([kind]) => kind)).toEqual(['extra', 'tax', 'rounding']);
    expect(priceOf(designWith({ cake: null }))).toMatchObject({ lines: [], totalMinor: 0 });
  });

  it('reckon in one portion size, whatever the guests cut', () => {
    const dessert = priceOf(designWith({}));
    const coffee = priceOf(designWith({ guests: { portionSizeId: 'coffee' } }));
    expect(coffee.totalMinor).toBe(dessert.totalMinor);
    expect(dessert.lines[0]?.label).toBe('10 in round tier');
    expect(coffee.lines[0]?.label).toBe('10 in round tier, by the dessert portion');
  });

  it('charge a keepsake as cake and a dummy as a dummy', () => {
    const tiers = [
      roundTier(10),
      roundTier(8, { real: false, spongeId: null, fillingId: null }),
      roundTier(6, { keepsake: true }),
    ];
    expect(lines(priceOf(designWith({ cake: { tiers } }))).slice(0, 3)).toEqual([
      ['tier', 39, 19_500],
      ['tier', 1, 2_500],
      ['tier', 13, 7_020],
    ]);
  });

  it('price a sheet by its own portions', () => {
    const sheet = { sizeId: 'half', layers: 2, spongeId: 'vanilla', fillingId: 'raspberry' };
    const [first] = priceOf(designWith({ cake: { kind: 'sheet', tiers: [], sheet } })).lines;
    // 457 x 330 mm cut 50 x 50 mm: 9 by 6; 54 x 3.20.
    expect(first).toMatchObject({
      kind: 'sheet',
      label: 'Half sheet, 13 x 18 in',
      quantity: 54,
      amountMinor: 17_280,
    });
  });

  it('name the measures in the studio’s own unit', () => {
    const metric: Menu = {
      ...menuFixture,
      studio: { ...menuFixture.studio, lengthLead: 'cm' },
    };
    expect(priceOf(designWith({}), plenty, metric).lines[0]?.label).toBe('25 cm round tier');
  });
});

describe('short notice', () => {
  const rush = (date: string | null) =>
    priceOf(designWith({}), { date, today: '2027-06-14' }).lines.find((it) => it.kind === 'rush');

  it.each([
    ['2027-06-14', 'Short notice (under 4 days)'],
    ['2027-06-17', 'Short notice (under 4 days)'],
    ['2027-06-18', 'Short notice (under 8 days)'],
    ['2027-06-21', 'Short notice (under 8 days)'],
    ['2027-06-22', undefined],
    [null, undefined],
  ])('for %s is %s', (date, label) => {
    expect(rush(date)?.label).toBe(label);
  });

  it('takes the tightest band, in whatever order they were written', () => {
    const menu = withBook({ rush: [...menuFixture.priceBook.rush].reverse() });
    const terms = { date: '2027-06-15', today: '2027-06-14' };
    const { lines: found } = priceOf(designWith({}), terms, menu);
    expect(found.find((it) => it.kind === 'rush')?.label).toBe('Short notice (under 4 days)');
  });
});

describe('minimum, discount and tax', () => {
  it('lift a small order to the minimum', () => {
    const small = designWith({ cake: { tiers: [roundTier(4)], coating: null } });
    const price = priceOf(small);
    expect(price.lines.find((it) => it.kind === 'minimum')?.amountMinor).toBe(6500 - 6 * 540);
    expect(price.totalMinor).toBe(6500);
  });

  it('take a discount off before tax, with its reason', () => {
    const menu = withBook({
      taxes: [{ category: 'cake', name: 'Sales tax', ratePpm: 100_000 }],
      roundToMinor: 1,
    });
    const plain = priceOf(designWith({}), plenty, menu);
    const discount = { reason: 'For old friends', amountMinor: 1000 };
    const less = priceOf(designWith({}), { ...plenty, discount }, menu);
    expect(less.lines.find((it) => it.kind === 'discount')).toMatchObject({
      label: 'For old friends',
      amountMinor: -1000,
    });
    expect(plain.totalMinor - less.totalMinor).toBe(1100);
  });

  it('never takes off more than there is, and wants its reason', () => {
    const discount = { reason: 'Ours to put right', amountMinor: 1_000_000 };
    const menu = withBook({ taxes: [{ category: 'cake', name: 'Tax', ratePpm: 100_000 }] });
    expect(priceOf(designWith({}), { ...plenty, discount }, menu)).toMatchObject({
      totalMinor: 0,
      taxMinor: 0,
      depositMinor: 0,
    });
    const unsaid = { reason: ' ', amountMinor: 500 };
    expect(() => priceOf(designWith({}), { ...plenty, discount: unsaid })).toThrow(RangeError);
  });

  it('leave tax out for an exempt buyer up to the last day of the certificate', () => {
    const design = designWith({ extras: [{ extraId: 'knife', quantity: 3 }] });
    const taxOf = (until: string, certificate = 'ST-5 0417') =>
      priceOf(design, { ...plenty, exemption: { certificate, until } }).taxMinor;
    expect(priceOf(design).taxMinor).toBe(160); // 8.875 % of 18.00 = 1.5975
    expect(taxOf('2027-06-19')).toBe(0);
    expect(taxOf('2027-06-18')).toBe(160);
    expect(taxOf('2027-12-31', ' ')).toBe(160);
  });

  // By hand: 20 % inside 390.00 is 390.00 / 6 = 65.00.
  it('find the tax inside an inclusive total', () => {
    const menu = withBook({
      taxInclusive: true,
      taxes: [{ category: 'cake', name: 'VAT', ratePpm: 200_000 }],
      roundToMinor: 100,
    });
    const price = priceOf(designWith({ cake: { coating: null } }), plenty, menu);
    expect(price.totalMinor).toBe(39_000);
    expect(price.taxMinor).toBe(6_500);
  });

  it('tax what the book does not list as its first category', () => {
    const menu = withBook({
      taxes: [{ category: 'everything', name: 'Tax', ratePpm: 100_000 }],
      roundToMinor: 1,
    });
    const design = designWith({
      cake: { coating: null },
      extras: [{ extraId: 'knife', quantity: 1 }],
    });
    expect(priceOf(design, plenty, menu).taxMinor).toBe(3_962); // 10 % of 390.20 + 6.00
  });
});

describe('what is paid when', () => {
  it('is a deposit with a floor, never more than the total', () => {
    const { priceBook } = menuFixture;
    expect(depositOf(100_000, priceBook)).toBe(30_000);
    expect(depositOf(10_000, priceBook)).toBe(5_000);
    expect(depositOf(4_000, priceBook)).toBe(4_000);
    expect(depositOf(0, priceBook)).toBe(0);
  });

  it('is the balance so many days before pickup, but never before it is agreed', () => {
    expect(balanceDueOn('2027-06-19', 7, '2027-05-01')).toBe('2027-06-12');
    expect(balanceDueOn('2027-03-03', 7, '2027-02-01')).toBe('2027-02-24');
    expect(balanceDueOn('2027-06-19', 7, '2027-06-16')).toBe('2027-06-16');
    expect(balanceDueOn('2027-06-19', 0, '2027-06-19')).toBe('2027-06-19');
  });
});
