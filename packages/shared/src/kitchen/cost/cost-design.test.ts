import fc from 'fast-check';
import { add, divide, fraction, multiply, type Fraction } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { indexPantry } from '../formulas/pantry-index.ts';
import type { KitchenNeeds } from '../needs/kitchen-needs.ts';
import { smallPantry, smallParts } from '../needs/testing/small-pantry.ts';
import { resolveDesign } from '../resolve-design.ts';
import { designWith, roundTier } from '../testing/design-fixture.ts';
import { menuFixture } from '../testing/menu-fixture.ts';
import { atHourlyRate, atPackPrice } from './at-pack-price.ts';
import { costDesign, type CostInput } from './cost-design.ts';

const index = indexPantry(smallPantry);

/** Grams by ingredient, as a cake's needs. */
function needing(grams: Readonly<Record<string, number>>): KitchenNeeds {
  return {
    formulas: [],
    unknown: [],
    ingredients: Object.entries(grams).map(([id, g]) => {
      const ingredient = index.ingredients.get(id);
      if (ingredient === undefined) throw new Error(id);
      return { ingredient, grams: g, forDecorationsG: id === 'gum-paste' ? g : 0, asItIsG: 0 };
    }),
  };
}

const resolved = resolveDesign(
  designWith({
    cake: { tiers: [roundTier(10), roundTier(6)] },
    look: {
      decorations: [
        { decorationId: 'sugar-flower', tier: 0, quantity: 3, colour: null, source: 'studio' },
      ],
    },
    extras: [{ extraId: 'candles', quantity: 2 }],
  }),
  menuFixture,
);

const input: CostInput = {
  resolved,
  needs: needing({ flour: 515, sugar: 910.5, butter: 1320, egg: 430, white: 265, 'gum-paste': 66 }),
  work: [
    { kind: 'bake', benchMinutes: 31 },
    { kind: 'buttercream', benchMinutes: 36 },
    { kind: 'decorate', benchMinutes: 60 },
    { kind: 'decorate', benchMinutes: 10 },
  ],
  parts: smallParts,
  extraCosts: new Map([['candles', 180]]),
  rates: {
    currency: 'USD',
    labourPerHourMinor: 3200,
    overheadPpm: 180_000,
    targetMarginPpm: 250_000,
    packaging: [
      { upToMm: 160, boxMinor: 140, boardMinor: 60 },
      { upToMm: 260, boxMinor: 260, boardMinor: 110 },
    ],
  },
  price: { totalMinor: 21_500, taxMinor: 500 },
};

describe('a whole cake, worked by hand', () => {
  const cost = costDesign(input);
  const line = (kind: string) => cost.lines.find((it) => it.kind === kind);

  it('costs its ingredients by what is used at pack price', () => {
    // Flour 515 x 409 / 2270 = 92.79, sugar 910.5 x 549 / 4540 = 110.10,
    // butter 1320 x 545 / 454 = 1584.58: 93 + 110 + 1585.
    expect(line('ingredients')?.items.map((it) => it.amountMinor)).toEqual([93, 110, 1585]);
    expect(line('ingredients')?.amountMinor).toBe(1788);
  });

  it('costs its eggs apart', () => {
    // Whole 430 x 525 / 600 = 376.25; whites 265 x 347 / 396 = 232.21.
    expect(line('eggs')?.amountMinor).toBe(376 + 232);
  });

  it('packs it in one box by its widest tier, a board under each', () => {
    expect(line('packaging')?.amountMinor).toBe(260 + 110 + 60);
  });

  it('takes the owner’s figure for decorations, what they are made of in it', () => {
    expect(line('decorations')?.amountMinor).toBe(3 * 90);
    expect(line('ingredients')?.items.map((it) => it.label)).not.toContain('gum-paste');
  });

  it('pays hands by the hour, kind by kind', () => {
    // 31 x 3200 / 60 = 1653.33; 36: 1920; 70: 3733.33.
    expect(line('labour')?.items.map((it) => it.amountMinor)).toEqual([1653, 1920, 3733]);
    expect(cost.minutes).toBe(137);
  });

  it('adds overhead to all of it and compares with the price less its tax', () => {
    // 1788 + 608 + 430 + 270 + 360 + 7306 = 10762; 18 % = 1937.16; 12699 of 21000 net.
    expect(line('extras')?.amountMinor).toBe(360);
    expect(line('overhead')?.amountMinor).toBe(1937);
    expect(cost).toMatchObject({
      totalMinor: 12_699,
      netPriceMinor: 21_000,
      marginMinor: 8301,
      marginPpm: 395_286,
      unknown: [],
    });
  });

  it('comes to the same by fractions', () => {
    const share = (grams: number, price: number, pack: number) =>
      round(divide(multiply(fraction(grams), fraction(price)), fraction(pack)));
    const hours = (minutes: number) => round(multiply(fraction(minutes, 60), fraction(3200)));
    const direct = [
      share(515, 409, 2270),
      share(910.5, 549, 4540),
      share(1320, 545, 454),
      share(430, 525, 600),
      share(265, 347, 396),
      260 + 110 + 60 + 3 * 90 + 2 * 180,
      ...[31, 36, 70].map(hours),
    ].reduce((sum, it) => sum + it, 0);
    const overhead = round(multiply(fraction(direct), fraction(18, 100)));
    expect(cost.totalMinor).toBe(direct + overhead);
  });
});

/** Halves up. Asserted by name, since mathjs types its answers loosely. */
function round(value: unknown): number {
  const half = add(fraction(String(value)), fraction(1, 2));
  const shifted: Fraction = fraction(String(half));
  return Math.floor(shifted.valueOf());
}

describe('what is not known', () => {
  it('is named and never counted as nothing', () => {
    const cost = costDesign({
      ...input,
      needs: {
        ...needing({ flour: 500, jam: 300 }),
        unknown: [{ name: 'Fondant', grams: 900, why: 'no-formula', message: '' }],
      },
      rates: { ...input.rates, packaging: [] },
      extraCosts: new Map(),
    });
    expect(cost.unknown).toEqual([
      'Fondant',
      'jam',
      'Box, 10 in / 25 cm',
      'Board, 10 in / 25 cm',
      'Board, 6 in / 15 cm',
      'Candles, a box of 12',
    ]);
  });

  it('leaves no share where nothing is charged', () => {
    const cost = costDesign({ ...input, price: { totalMinor: 0, taxMinor: 0 } });
    expect(cost.marginPpm).toBeNull();
    expect(cost.marginMinor).toBe(-cost.totalMinor);
  });
});

describe('a cost', () => {
  it('adds up to the minor unit in every currency', () => {
    const amounts = fc.integer({ min: 0, max: 5_000_000 });
    fc.assert(
      fc.property(
        fc.constantFrom('USD', 'JPY', 'KWD', 'HUF'),
        fc.double({ min: 0.001, max: 90_000, noNaN: true }),
        amounts,
        amounts,
        fc.integer({ min: 0, max: 1_000_000 }),
        (currency, grams, totalMinor, labourPerHourMinor, overheadPpm) => {
          const cost = costDesign({
            ...input,
            needs: needing({ flour: grams, egg: grams, butter: grams / 3 }),
            rates: { ...input.rates, currency, labourPerHourMinor, overheadPpm },
            price: { totalMinor, taxMinor: 0 },
          });
          expect(cost.lines.reduce((sum, it) => sum + it.amountMinor, 0)).toBe(cost.totalMinor);
          for (const { items, amountMinor } of cost.lines) {
            expect(items.reduce((sum, it) => sum + (it.amountMinor ?? 0), 0)).toBe(amountMinor);
          }
          expect(cost.marginMinor + cost.totalMinor).toBe(cost.netPriceMinor);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('divides exactly, halves up', () => {
    expect(atPackPrice(1, { grams: 2, priceMinor: 1 })).toBe(1);
    expect(atPackPrice(0.999, { grams: 2, priceMinor: 1 })).toBe(0);
    expect(atHourlyRate(90, 1)).toBe(2);
    expect(atPackPrice(1_000_000, { grams: 0.1, priceMinor: 10_000_000 })).toBe(1e14);
  });
});
