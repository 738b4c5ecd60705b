import { code, codes } from 'currency-codes';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatMoney, minorDigits, splitByLargestRemainder } from './money.ts';

/** Metals, test codes and units of account have no minor unit in ISO 4217 ("N.A."). */
const withoutMinorUnit = [
  'XAG',
  'XAU',
  'XBA',
  'XBB',
  'XBC',
  'XBD',
  'XDR',
  'XPD',
  'XPT',
  'XSU',
  'XTS',
  'XUA',
  'XXX',
];

describe('minor units', () => {
  it('agree with the ISO 4217 list for every currency that has them', () => {
    const money = codes().filter((it) => !withoutMinorUnit.includes(it));
    expect(money.length).toBeGreaterThan(150);
    for (const currency of money) {
      expect([currency, minorDigits(currency)]).toEqual([currency, code(currency)?.digits]);
    }
  });

  it.each([
    ['USD', 2],
    ['JPY', 0],
    ['KWD', 3],
    ['HUF', 2],
  ])('%s has %i', (currency, digits) => {
    expect(minorDigits(currency)).toBe(digits);
  });
});

describe('an amount', () => {
  it.each([
    [41250, 'USD', 'en-US', '$412.50'],
    [41250, 'JPY', 'en-US', '¥41,250'],
    [41250, 'KWD', 'en-US', 'KWD\u00a041.250'],
    [41250, 'HUF', 'hu-HU', '412,50\u00a0Ft'],
    [-500, 'USD', 'en-US', '-$5.00'],
  ])('%i %s in %s is written %s', (amount, currency, locale, text) => {
    expect(formatMoney(amount, currency, locale)).toBe(text);
  });
});

describe('splitting', () => {
  // By hand: 100 over 1:1:1 is 33.3 each; the first gets the cent that is left.
  it('gives what is left to the largest remainders', () => {
    expect(splitByLargestRemainder(100, [1, 1, 1])).toEqual([34, 33, 33]);
    expect(splitByLargestRemainder(10, [1, 2, 4])).toEqual([1, 3, 6]);
    expect(splitByLargestRemainder(-100, [1, 1, 1])).toEqual([-34, -33, -33]);
    expect(splitByLargestRemainder(7, [0, 0])).toEqual([7, 0]);
    expect(splitByLargestRemainder(7, [])).toEqual([]);
  });

  it('adds up exactly and strays from the exact share by less than one', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -1e9, max: 1e9 }),
        fc.array(fc.integer({ min: 0, max: 1e6 }), { minLength: 1, maxLength: 8 }),
        (amount, weights) => {
          const shares = splitByLargestRemainder(amount, weights);
          expect(shares.reduce((sum, it) => sum + it, 0)).toBe(amount);
          const total = weights.reduce((sum, it) => sum + it, 0);
          if (total === 0) return;
          for (const [index, share] of shares.entries()) {
            const exact = (amount * (weights[index] ?? 0)) / total;
            expect(Math.abs(share - exact)).toBeLessThan(1);
          }
        },
      ),
    );
  });
});
