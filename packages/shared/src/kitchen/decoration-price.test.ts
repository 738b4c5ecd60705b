import { describe, expect, it } from 'vitest';
import { decorationPrice, workedOutDecorationPrice } from './decoration-price.ts';

const book = {
  decorationPrices: { 'fresh-flowers': 2400 },
  decoratingPerHourMinor: 4200,
  materialsMarkupPpm: 333_333,
  roundToMinor: 50,
};

describe('what a decoration sells for', () => {
  it('is its minutes and its materials with their markup, to the step', () => {
    // 75 min at $42.00 an hour is $52.50; $3.40 and a third is $4.53; $57.03 is nearest to $57.00.
    const figure = { id: 'figure', minutes: 75, materialsCostMinor: 340 };
    expect(decorationPrice(figure, book)).toBe(5700);
    expect(decorationPrice(figure, { ...book, roundToMinor: 1 })).toBe(5703);
  });

  it('is the fixed price where the owner has set one, a gift included', () => {
    const flowers = { id: 'fresh-flowers', minutes: 30, materialsCostMinor: 200 };
    expect(decorationPrice(flowers, book)).toBe(2400);
    expect(workedOutDecorationPrice(flowers, book)).toBe(2350);
    expect(decorationPrice(flowers, { ...book, decorationPrices: { 'fresh-flowers': 0 } })).toBe(0);
  });

  it('rounds a half up and copes with a currency without minor units', () => {
    const yen = { ...book, decoratingPerHourMinor: 4000, materialsMarkupPpm: 0, roundToMinor: 10 };
    // 20 min at 4000 an hour is 1333 1/3, and 12 of materials is 1345 1/3.
    expect(workedOutDecorationPrice({ id: 'a', minutes: 20, materialsCostMinor: 12 }, yen)).toBe(
      1350,
    );
    expect(workedOutDecorationPrice({ id: 'b', minutes: 0, materialsCostMinor: 25 }, yen)).toBe(30);
  });
});
