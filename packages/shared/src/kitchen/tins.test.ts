import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amountsOf } from './amounts.ts';
import { resolveDesign } from './resolve-design.ts';
import { areaMm2 } from './sizes.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture as menu } from './testing/menu-fixture.ts';
import { tinsOf } from './tins.ts';

const tins = (tier: ReturnType<typeof roundTier>) => {
  const [only] = resolveDesign(designWith({ cake: { tiers: [tier] } }), menu).tiers;
  return only === undefined ? null : tinsOf(only, menu.kitchen);
};

describe('tins', () => {
  it('bake two layers together and split them, the odd one by itself', () => {
    // 102 mm less two fillings of 6 mm is 90: 30 mm a layer, 32.6 before levelling.
    const three = tins(roundTier(8, { layers: 3 }));
    expect(three).toMatchObject({ count: 2, layersEach: 2, depthMm: 76 });
    const [first = 0, second = 0] = three?.batterG ?? [];
    expect(first).toBeCloseTo(2 * second, 6);
    expect(three?.fillMm.least).toBe(38);
    expect(three?.fillMm.most).toBeCloseTo(50.7, 1);
  });

  it('bake thick layers apart', () => {
    // 102 less 6 is 96: 48 mm a layer, 52 before levelling.
    expect(tins(roundTier(8, { layers: 2 }))).toMatchObject({ count: 2, layersEach: 1 });
  });

  it('are none for a dummy', () => {
    expect(tins(roundTier(8, { real: false, spongeId: null, fillingId: null }))).toBeNull();
  });

  it('are filled half to two thirds, give or take, by batter of 0.95 g/mL (memory)', () => {
    const usual = tins(roundTier(8, { layers: 4 }));
    const [g = 0] = usual?.batterG ?? [];
    const standsMm = g / 0.95 / (areaMm2({ shape: 'round', widthMm: 203, depthMm: 203 }) / 1000);
    expect(standsMm).toBeGreaterThan((usual?.fillMm.least ?? 0) * 0.7);
    expect(standsMm).toBeLessThan(usual?.fillMm.most ?? 0);
  });

  it('hold all the batter of a tier between them', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const resolved = resolveDesign(design, menu);
        const { perTier, perCuttingCake } = amountsOf(resolved);
        for (const [bodies, amounts] of [
          [resolved.tiers, perTier],
          [resolved.cuttingCakes, perCuttingCake],
        ] as const) {
          for (const [index, body] of bodies.entries()) {
            const sum = (tinsOf(body, menu.kitchen)?.batterG ?? []).reduce(
              (total, it) => total + it,
              0,
            );
            expect(sum).toBeCloseTo(amounts[index]?.batterG ?? 0, 3);
          }
        }
      }),
    );
  });
});
