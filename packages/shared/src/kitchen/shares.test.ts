import fc from 'fast-check';
import { add, floor, fraction } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { roundToStep, shareOf } from './shares.ts';

describe('shares', () => {
  it('are exact to the minor unit, halves up', () => {
    expect(shareOf(1000, 88_750, 'USD')).toBe(89); // 88.75
    expect(shareOf(200, 88_750, 'USD')).toBe(18); // 17.75
    expect(shareOf(50, 10_000, 'KWD')).toBe(1); // 0.5
    expect(shareOf(900_000_000, 88_750, 'JPY')).toBe(79_875_000);
  });

  it('agree with fractions', () => {
    const amounts = fc.integer({ min: 0, max: 100_000_000 });
    const rates = fc.integer({ min: 0, max: 1_000_000 });
    fc.assert(
      fc.property(
        amounts,
        rates,
        fc.constantFrom('USD', 'JPY', 'KWD', 'CLF'),
        (amount, ppm, in_) => {
          const rounded = floor(add(fraction(amount * ppm, 1_000_000), fraction(1, 2)));
          expect(shareOf(amount, ppm, in_)).toBe(Number(rounded.n));
        },
      ),
    );
  });
});

describe('a rounding step', () => {
  it.each([
    [66_689, 50, 66_700],
    [66_674, 50, 66_650],
    [66_675, 50, 66_700],
    [0, 50, 0],
    [123, 1, 123],
    [123, 0, 123],
    [12_345, 10, 12_350],
  ])('takes %i by %i to %i', (amount, step, rounded) => {
    expect(roundToStep(amount, step)).toBe(rounded);
  });
});
