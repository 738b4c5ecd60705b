import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { paletteOf } from './palette.ts';

const band = (hex: string, count: number) =>
  Array.from({ length: count }, () =>
    [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16)),
  ).flat();

describe('the palette of a picture', () => {
  it('finds flat colours exactly, the most frequent first', () => {
    const pixels = Uint8Array.from([
      ...band('#23429a', 500),
      ...band('#f2b632', 300),
      ...band('#b3263e', 200),
      ...band('#ffffff', 150),
      ...band('#2c7a4b', 100),
    ]);
    expect(paletteOf(pixels, 5)).toEqual(['#23429a', '#f2b632', '#b3263e', '#ffffff', '#2c7a4b']);
  });

  it('has one colour for a plain picture and none for none', () => {
    expect(paletteOf(Uint8Array.from(band('#f6eeda', 64)), 5)).toEqual(['#f6eeda']);
    expect(paletteOf(new Uint8Array(), 5)).toEqual([]);
  });

  it('tells a flat colour once, however noisy it is', () => {
    const pixels = Uint8Array.from([
      ...band('#e8b4b8', 400),
      ...band('#e9b6b9', 300),
      ...band('#e6b2b7', 300),
      ...band('#9bb59a', 200),
    ]);
    const [pink, green, ...more] = paletteOf(pixels, 5);
    expect(pink).toMatch(/^#e[6-9]b[2-6]b[7-9]$/);
    expect(green).toBe('#9bb59a');
    expect(more).toEqual([]);
  });

  it('never has more than asked for, and only colours', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 900 }), (pixels) => {
        const palette = paletteOf(pixels, 5);
        expect(palette.length).toBeLessThanOrEqual(5);
        for (const hex of palette) expect(hex).toMatch(/^#[0-9a-f]{6}$/);
      }),
      { numRuns: 50 },
    );
  });
});
