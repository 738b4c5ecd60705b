import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { same } from './same.ts';

describe('saying the same', () => {
  it('holds for a copy of anything', () => {
    fc.assert(fc.property(fc.jsonValue(), (value) => same(value, structuredClone(value))));
  });

  it.each([
    [null, Number.NaN],
    [{ a: 1 }, { a: 1, b: undefined }],
    [[1, 2], { 0: 1, 1: 2 }],
    [
      [1, 2],
      [2, 1],
    ],
    [{ a: { b: 'x' } }, { a: { b: 'y' } }],
    ['1', 1],
  ])('tells %o from %o', (a, b) => {
    expect(same(a, b)).toBe(false);
    expect(same(b, a)).toBe(false);
  });

  it('takes one unread number for another', () => {
    expect(same({ n: Number.NaN }, { n: Number.NaN })).toBe(true);
  });
});
