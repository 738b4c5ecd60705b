import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { countPortions } from '../portions.ts';
import { areaMm2, portionsOfBlock, type Block } from '../sizes.ts';
import { arbitraryDesign } from '../testing/arbitraries.ts';
import { designWith, roundTier } from '../testing/design-fixture.ts';
import { menuFixture as menu } from '../testing/menu-fixture.ts';
import { cutBlock, type Cut } from './cut-block.ts';
import { cuttingPlanOf, portionsSentence } from './cutting-plan.ts';

const dessert = { widthMm: 25, depthMm: 50 };

const blocks: fc.Arbitrary<Block> = fc
  .record({
    shape: fc.constantFrom('round' as const, 'square' as const, 'rectangle' as const),
    widthMm: fc.integer({ min: 100, max: 400 }),
    depthMm: fc.integer({ min: 100, max: 400 }),
    heightMm: fc.integer({ min: 75, max: 180 }),
  })
  .map((it) => (it.shape === 'rectangle' ? it : { ...it, depthMm: it.widthMm }));

/** Points at which a cut begins or ends, or touches the box round the block. */
function reach(cut: Cut): number[] {
  return cut.kind === 'line'
    ? [cut.x1, cut.y1, cut.x2, cut.y2]
    : [cut.cx - cut.r, cut.cy - cut.r, cut.cx + cut.r, cut.cy + cut.r];
}

describe('cutting a block', () => {
  it('gives exactly the portions that are counted, and stays inside the cake', () => {
    fc.assert(
      fc.property(blocks, fc.constantFrom(...menu.portionSizes), (block, portion) => {
        const cut = cutBlock(block, portion, menu.kitchen);
        expect(cut.portions).toBe(portionsOfBlock(block, portion, menu.kitchen));
        const hair = 1e-6;
        for (const at of cut.cuts.flatMap(reach)) {
          expect(at).toBeGreaterThanOrEqual(-hair);
          expect(at).toBeLessThanOrEqual(Math.max(block.widthMm, block.depthMm) + hair);
        }
      }),
    );
  });

  it('makes no piece smaller than the portion', () => {
    fc.assert(
      fc.property(blocks, fc.constantFrom(...menu.portionSizes), (block, portion) => {
        const { rings, grid, perDeck } = cutBlock(block, portion, menu.kitchen);
        const wanted = portion.widthMm * portion.depthMm;
        for (const { outerMm, innerMm, pieces } of rings) {
          if (pieces === 0) continue;
          const each = (Math.PI * (outerMm ** 2 - innerMm ** 2)) / pieces;
          expect(each).toBeGreaterThanOrEqual(wanted - 1e-3);
        }
        if (grid !== null && perDeck > 0) {
          expect(grid.pieceWidthMm * grid.pieceDepthMm).toBeGreaterThanOrEqual(wanted - 1e-3);
          const all = grid.pieceWidthMm * grid.pieceDepthMm * perDeck;
          expect(all).toBeCloseTo(areaMm2(block), 3);
        }
      }),
    );
  });

  it('has as many slices as pieces in each ring, and a circle between rings', () => {
    const block = { shape: 'round', widthMm: 254, depthMm: 254, heightMm: 102 } as const;
    const { cuts, rings } = cutBlock(block, dessert, menu.kitchen);
    // 25 + 13 slices; the core of one piece is not cut.
    expect(rings.map((it) => it.pieces)).toEqual([25, 13, 1]);
    expect(cuts.filter((it) => it.kind === 'line')).toHaveLength(38);
    expect(cuts.filter((it) => it.kind === 'circle').map((it) => it.r)).toEqual([77, 27]);
  });

  it('cuts the ring round a crumb of a core to the middle', () => {
    // 305 mm: rings of 50 mm leave 5 mm in the middle.
    const block = { shape: 'round', widthMm: 305, depthMm: 305, heightMm: 102 } as const;
    const { rings, portions } = cutBlock(block, dessert, menu.kitchen);
    expect(rings.map(({ innerMm, pieces }) => [innerMm, pieces])).toEqual([
      [102.5, 32],
      [52.5, 19],
      [0, 6],
    ]);
    expect(portions).toBe(portionsOfBlock(block, dessert, menu.kitchen));
  });

  it('divides a square evenly, an inner board dividing a tall one', () => {
    const block = { shape: 'square', widthMm: 203, depthMm: 203, heightMm: 152 } as const;
    const cut = cutBlock(block, dessert, menu.kitchen);
    expect(cut).toMatchObject({ decks: 2, perDeck: 32, portions: 64 });
    expect(cut.grid).toMatchObject({ columns: 8, rows: 4, pieceWidthMm: 25.375 });
    expect(cut.cuts).toHaveLength(7 + 3);
  });
});

describe('the cutting plan', () => {
  it('serves what the estimate counts, whatever the design', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const plan = cuttingPlanOf(design, menu);
        expect(plan?.portions ?? 0).toBe(countPortions(design, menu).fed);
      }),
    );
  });

  it('goes from the top down, and says what is not cut', () => {
    const tiers = [
      roundTier(10),
      roundTier(8, { real: false, spongeId: null, fillingId: null }),
      roundTier(6, { keepsake: true }),
    ];
    const cuttingCakes = [
      { sizeId: 'half', count: 2, layers: 2, spongeId: 'vanilla', fillingId: 'raspberry' },
    ];
    const plan = cuttingPlanOf(designWith({ cake: { tiers, cuttingCakes } }), menu);
    expect(plan?.pieces.map(({ name, left, count }) => [name, left, count])).toEqual([
      ['Top tier', 'keepsake', 1],
      ['Middle tier', 'dummy', 1],
      ['Bottom tier', null, 1],
      ['Cutting cake: Half sheet, 13 x 18 in', null, 2],
    ]);
    // 457 / 50 = 9 by 330 / 50 = 6.
    expect(plan?.portions).toBe(39 + 2 * 54);
  });

  it('says each cut in words a waiter can follow', () => {
    const steps = (changes: Parameters<typeof roundTier>[1]) =>
      cuttingPlanOf(designWith({ cake: { tiers: [roundTier(10, changes)] } }), menu)?.pieces[0]
        ?.steps;
    expect(steps({})).toEqual([
      'Cut a circle 2 in / 5 cm in from the edge and slice that ring into 25 pieces, each about 1¼ in / 3 cm wide outside.',
      'Cut a circle 2 in / 5 cm further in and slice that ring into 13 pieces, each about 1½ in / 3.5 cm wide outside.',
      'The core, 2¼ in / 5.5 cm across, is one piece.',
    ]);
    expect(steps({ heightMm: 152 })?.[0]).toBe(
      'There is a board inside, 3 in / 7.5 cm up. Cut down to it first; lift it out, then cut the lower half the same way.',
    );
    expect(steps({ shape: 'square' })).toEqual([
      'Cut 5 strips from side to side, each 2 in / 5 cm deep, and each strip into 10 pieces of 1 in / 2.5 cm: 50 pieces (10 by 5).',
    ]);
  });

  it('says the guests’ portion of tiers, and of sheets none that they are not cut by', () => {
    const said = (cake: Parameters<typeof designWith>[0]['cake']) => {
      const plan = cuttingPlanOf(designWith({ cake }), menu);
      return plan === null ? null : portionsSentence(plan, 'in');
    };
    expect(said({ tiers: [roundTier(10)] })).toBe(
      '39 portions of the dessert size, 1 in / 2.5 cm by 2 in / 5 cm at full height.',
    );
    const size = menu.sheetSizes[0]?.id ?? '';
    const cuttingCakes = [
      { sizeId: size, count: 2, layers: 1, spongeId: 'vanilla', fillingId: null },
    ];
    expect(said({ tiers: [roundTier(10)], cuttingCakes })).toMatch(
      /^\d+ portions; from tiers, of the dessert size, /u,
    );
  });

  it('is none before there is a cake', () => {
    expect(cuttingPlanOf(designWith({ cake: null }), menu)).toBeNull();
  });
});
