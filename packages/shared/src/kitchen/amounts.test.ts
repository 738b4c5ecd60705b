import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Tier } from '#shared/contracts/design.ts';
import { amountsOf, batterG, carriedWeightG, heightMm } from './amounts.ts';
import { mlPerUsCup } from './measures.ts';
import { resolveDesign } from './resolve-design.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const resolve = (design: ReturnType<typeof designWith>) => resolveDesign(design, menuFixture);
const amounts = (tiers: Tier[], coating = coat({})) =>
  amountsOf(resolve(designWith({ cake: { tiers, coating } })));

describe('one round of 203 by 100 mm, worked by hand', () => {
  const tier = roundTier(8, { heightMm: 100, layers: 2 });
  // Area pi * 203^2 / 4 = 32,365.5 mm2; around pi * 203 = 637.7 mm; side and top 96,139.3 mm2.
  const areaMm2 = 32_365.47;
  const coatMm2 = 637.74 * 100 + areaMm2;

  it('has sponge and filling by volume and density', () => {
    const { spongeG, fillingG } = amounts([tier]);
    expect(fillingG).toBeCloseTo(areaMm2 * 0.006 * 1.3, 0);
    expect(spongeG).toBeCloseTo(areaMm2 * (0.1 - 0.006) * 0.48, 0);
  });

  it('has a crumb coat of 2 mm, a final one of 4, a foot bead and a tenth over', () => {
    const foot = 637.74 * Math.PI * 16;
    expect(amounts([tier]).frostingG).toBeCloseTo(((coatMm2 * 6 + foot) / 1000) * 0.72 * 1.1, 0);
  });

  it('has the crumb coat alone when semi-naked', () => {
    const { frostingG } = amounts([tier], coat({ covering: 'semi-naked' }));
    expect(frostingG).toBeCloseTo(((coatMm2 * 2) / 1000) * 0.72 * 1.1, 0);
  });

  it('has 4 mm of fondant over 3 mm of buttercream', () => {
    const { frostingG, coveringG } = amounts([tier], coat({ covering: 'fondant' }));
    expect(frostingG).toBeCloseTo(((coatMm2 * 3) / 1000) * 0.72 * 1.1, 0);
    expect(coveringG).toBeCloseTo(((coatMm2 * 4) / 1000) * 1.3, 0);
  });

  it('has ganache by its own density and no buttercream', () => {
    const { frostingG, coveringG } = amounts([tier], coat({ covering: 'ganache', style: null }));
    expect(frostingG).toBe(0);
    expect(coveringG).toBeCloseTo(((coatMm2 * 5) / 1000) * 1.15 * 1.1, 0);
  });

  it('dams a soft filling with frosting', () => {
    const plain = amounts([tier]);
    const soft = amounts([{ ...tier, fillingId: 'lemon-curd' }]);
    const damMl = (637.74 * 10 * 6) / 1000;
    expect(soft.frostingG - plain.frostingG).toBeCloseTo(damMl * 0.72 * 1.1, 0);
    expect(soft.fillingG).toBeCloseTo((areaMm2 * 0.006 - damMl) * 1.1, 0);
  });
});

it('an 8 in, two-layer, 4 in round takes about 4 to 5 US cups, filled and coated (memory)', () => {
  // Filled with its own buttercream and piped, as that rule of thumb is meant.
  const { fillingG, frostingG } = amounts([roundTier(8, { layers: 2 })], coat({ finish: 'piped' }));
  const cups = (fillingG / 1.3 + frostingG / 0.72) / mlPerUsCup;
  expect(cups).toBeGreaterThan(4);
  expect(cups).toBeLessThan(5);
});

describe('amounts', () => {
  it('grow with the size', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 100, max: 390 }),
        fc.integer({ min: 75, max: 170 }),
        fc.integer({ min: 1, max: 10 }),
        fc.constantFrom('raspberry', 'lemon-curd'),
        fc.constantFrom('buttercream' as const, 'fondant' as const, 'semi-naked' as const),
        (width, height, more, fillingId, covering) => {
          const at = (widthMm: number, heightMm: number) =>
            amounts(
              [roundTier(8, { widthMm, depthMm: widthMm, heightMm, fillingId })],
              coat({ covering }),
            );
          const small = at(width, height);
          for (const large of [at(width + more, height), at(width, height + more)]) {
            expect(large.spongeG).toBeGreaterThan(small.spongeG);
            expect(large.frostingG).toBeGreaterThan(small.frostingG);
            expect(large.fillingG).toBeGreaterThanOrEqual(small.fillingG);
            expect(large.coveringG).toBeGreaterThanOrEqual(small.coveringG);
          }
        },
      ),
    );
  });

  it('coat only the ledge of a tier that bears another', () => {
    const alone = amounts([roundTier(10)]);
    const below = amounts([roundTier(10), roundTier(8)]).perTier[0];
    expect(below?.frostingG).toBeLessThan(alone.frostingG);
    expect(below?.spongeG).toBe(alone.spongeG);
  });

  it('of a dummy are its coat alone', () => {
    const dummy = roundTier(8, { real: false, spongeId: null, fillingId: null });
    const [, second] = amounts([roundTier(10), dummy]).perTier;
    expect(second).toMatchObject({ spongeG: 0, fillingG: 0 });
    expect(second?.frostingG).toBeGreaterThan(0);
  });

  it('of batter add back what baking and levelling take', () => {
    expect(batterG(828, { bakeLossPpm: 100_000, levellingPpm: 80_000 })).toBeCloseTo(1000, 9);
  });
});

describe('the whole cake as carried', () => {
  const weigh = (design: ReturnType<typeof designWith>) => {
    const resolved = resolve(design);
    return carriedWeightG(resolved, amountsOf(resolved));
  };

  it('weighs more than what is eaten of it, and nothing before it exists', () => {
    const resolved = resolve(designWith({}));
    const { spongeG, fillingG } = amountsOf(resolved);
    expect(weigh(designWith({}))).toBeGreaterThan(spongeG + fillingG);
    expect(weigh(designWith({ cake: null }))).toBe(0);
  });

  it('weighs its decorations and stands as high as its topper', () => {
    const decorations = [
      { decorationId: 'topper', tier: null, quantity: 1, colour: null, source: 'studio' as const },
    ];
    const plain = designWith({});
    const topped = designWith({ look: { decorations } });
    expect(weigh(topped) - weigh(plain)).toBe(20);
    expect(heightMm(resolve(plain))).toBe(12 + 3 * 102);
    expect(heightMm(resolve(topped))).toBe(12 + 3 * 102 + 120);
    expect(heightMm(resolve(designWith({ cake: null })))).toBe(0);
  });
});
