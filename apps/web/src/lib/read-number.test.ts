import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readNumber } from './read-number.ts';

describe('readNumber', () => {
  it.each([
    ['70', 70],
    [' about 70 people ', 70],
    ['1,200', 1200],
    ['1 200', 1200],
    ['12,345,678', 12_345_678],
    ['2.5', 2.5],
    ['2,5', 2.5],
    ['\u22123', -3],
    ['a dozen', 12],
    ['twelve to fifteen', null],
    ['60 or 70', null],
    ['', null],
    ['many', null],
  ])('reads %j as %j', (text, number) => {
    expect(readNumber(text)).toBe(number);
  });

  it('reads back every whole number however its thousands are parted', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 10_000_000 }),
        fc.constantFrom('', ',', ' '),
        (number, gap) => {
          const typed = String(number).replaceAll(/\B(?=(\d{3})+(?!\d))/g, gap);
          expect(readNumber(typed)).toBe(number);
        },
      ),
    );
  });
});
