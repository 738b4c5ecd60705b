import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Cake } from '#shared/contracts/design.ts';
import { inchesToMm, mlPerUsCup } from './measures.ts';
import {
  areaMm2,
  blocksOf,
  boardOf,
  cutGrid,
  cutRound,
  ledgesOf,
  perimeterMm,
  portionsOfBlock,
  portionsOfSheet,
  portionsPerTier,
  volumeMl,
  type Block,
} from './sizes.ts';
import { designFixture, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';
import { UnknownPart } from './unknown-part.ts';

const { kitchen } = menuFixture;

const round = (inches: number, high: number): Block => ({
  shape: 'round',
  widthMm: inchesToMm(inches),
  depthMm: inchesToMm(inches),
  heightMm: inchesToMm(high),
});

const oneByTwo = { widthMm: inchesToMm(1), depthMm: inchesToMm(2) };
const oneAndAHalfByTwo = { widthMm: inchesToMm(1.5), depthMm: inchesToMm(2) };

describe('volumes', () => {
  // Debian units 2.22: units -t 'pi*(10 inch)^2/4*4 inch' ml
  it.each([
    [6, 1853.3333],
    [10, 5148.148],
    [12, 7413.3331],
  ])('a round of %i in by 4 in holds %f mL', (inches, ml) => {
    expect(volumeMl(round(inches, 4))).toBeCloseTo(ml, 3);
  });

  // Debian units 2.22: units -t 'pi*(8 inch)^2/4*2 inch' uscup
  it('an 8 by 2 in round pan holds 6.96 US cups, level', () => {
    expect(volumeMl(round(8, 2)) / mlPerUsCup).toBeCloseTo(6.9631837, 6);
  });

  // Debian units 2.22: units -t '9 inch * 13 inch * 2 inch' ml
  it('a 9 by 13 in pan, 2 in deep, holds 3,834.573 mL', () => {
    const pan = { shape: 'rectangle', widthMm: 330.2, depthMm: 228.6, heightMm: 50.8 } as const;
    expect(volumeMl(pan)).toBeCloseTo(3834.573, 3);
    expect(perimeterMm(pan)).toBeCloseTo(1117.6, 9);
  });
});

describe('portions', () => {
  // Upper bounds: area / footprint for 6, 8, 10 and 12 in rounds, by arithmetic.
  it.each([
    [6, 14.1, 9.4],
    [8, 25.1, 16.8],
    [10, 39.3, 26.2],
    [12, 56.5, 37.7],
  ])('a %i in round gives at most %f or %f', (inches, narrow, wide) => {
    const block = round(inches, 4);
    const bound = (it: typeof oneByTwo) => areaMm2(block) / (it.widthMm * it.depthMm);
    expect(bound(oneByTwo)).toBeCloseTo(narrow, 1);
    expect(bound(oneAndAHalfByTwo)).toBeCloseTo(wide, 1);
    for (const portion of [oneByTwo, oneAndAHalfByTwo]) {
      expect(portionsOfBlock(block, portion, kitchen)).toBeLessThanOrEqual(bound(portion));
      expect(portionsOfBlock(block, portion, kitchen)).toBeGreaterThan(bound(portion) - 3);
    }
  });

  // By hand: a ring 50 mm deep from 127 mm: pi * (127^2 - 77^2) / 1250 = 25.6, and so on inwards.
  it('cuts a 10 in round in rings outside in, then the core', () => {
    expect(cutRound(254, { widthMm: 25, depthMm: 50 })).toEqual([
      { outerMm: 127, innerMm: 77, pieces: 25 },
      { outerMm: 77, innerMm: 27, pieces: 13 },
      { outerMm: 27, innerMm: 0, pieces: 1 },
    ]);
  });

  // Armed Forces Recipe Service, TM 10-412: an 18 x 26 in sheet cut 6 by 9 gives 54 pieces.
  it('cuts an 18 by 26 in sheet 6 by 9 into 54', () => {
    const piece = { widthMm: inchesToMm(26 / 9), depthMm: inchesToMm(18 / 6) };
    const { columns, rows } = cutGrid(inchesToMm(26), inchesToMm(18), piece);
    expect([columns, rows, columns * rows]).toEqual([9, 6, 54]);
  });

  it('cuts sheets 50 by 50 mm for the dessert portion', () => {
    const full = { id: 'full', name: '', widthMm: 660, depthMm: 457, heightMm: 50 };
    expect(portionsOfSheet(full, { widthMm: 25, depthMm: 50 })).toBe(13 * 9);
  });

  it('never gives more than area over footprint, per deck', () => {
    const blocks = fc.record({
      shape: fc.constantFrom('round' as const, 'square' as const, 'rectangle' as const),
      widthMm: fc.integer({ min: 100, max: 400 }),
      depthMm: fc.integer({ min: 100, max: 400 }),
      heightMm: fc.integer({ min: 75, max: 180 }),
    });
    fc.assert(
      fc.property(blocks, fc.constantFrom(...menuFixture.portionSizes), (raw, portion) => {
        const block = raw.shape === 'rectangle' ? raw : { ...raw, depthMm: raw.widthMm };
        const decks = block.heightMm > 130 ? 2 : 1;
        expect(portionsOfBlock(block, portion, kitchen)).toBeLessThanOrEqual(
          (decks * areaMm2(block)) / (portion.widthMm * portion.depthMm),
        );
      }),
    );
  });

  it('cuts a tier over 130 mm high two portions deep', () => {
    const portion = { widthMm: 25, depthMm: 50 };
    const at = (heightMm: number) =>
      portionsOfBlock({ ...round(8, 4), heightMm }, portion, kitchen);
    expect(at(131)).toBe(2 * at(130));
  });

  it('counts none for keepsakes and dummies', () => {
    const tiers = [
      roundTier(10),
      roundTier(8, { real: false, spongeId: null, fillingId: null }),
      roundTier(6, { keepsake: true }),
    ];
    expect(portionsPerTier(tiers, { widthMm: 25, depthMm: 50 }, kitchen)).toEqual([39, 0, 0]);
  });
});

describe('the whole stack', () => {
  it('stands on a board wider than its widest tier', () => {
    const { cake } = designFixture;
    expect(cake === null ? null : boardOf(cake, menuFixture)).toMatchObject({
      shape: 'round',
      widthMm: 354,
      depthMm: 354,
    });
  });

  it('shows ledges that add up to the lowest top', () => {
    const blocks = [round(10, 4), round(8, 4), round(6, 4)];
    const ledges = ledgesOf(blocks);
    const shown = ledges.reduce((sum, it) => sum + it.areaMm2, 0);
    expect(shown).toBeCloseTo(areaMm2(round(10, 4)), 6);
    expect(ledges[0]?.widthMm).toBeCloseTo(25.4, 9);
  });

  it('says where an unknown sheet was named', () => {
    const sheet = { sizeId: 'plate', layers: 1, spongeId: 'vanilla', fillingId: null };
    const cake: Cake = { kind: 'sheet', tiers: [], sheet, coating: null, cuttingCakes: [] };
    const attempt = () => blocksOf(cake, menuFixture);
    expect(attempt).toThrow(UnknownPart);
    expect(attempt).toThrow(expect.objectContaining({ path: ['cake', 'sheet', 'sizeId'] }));
  });
});
