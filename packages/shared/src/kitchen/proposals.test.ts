import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tier as tierContract } from '#shared/contracts/design.ts';
import { portionsWanted } from './portions.ts';
import { priceDesign } from './price.ts';
import { proposeCakes } from './propose-cakes.ts';
import { proposeStacks, tiersOf, usualLayers } from './proposals.ts';
import { resolveDesign } from './resolve-design.ts';
import { portionsPerTier, smallestStepMm } from './sizes.ts';
import { declares, designWith } from './testing/design-fixture.ts';
import { menuFixture as menu } from './testing/menu-fixture.ts';

const anySize = fc.constantFrom(...menu.portionSizes);
const terms = { date: null, today: '2027-05-01' };
const propose = (design: ReturnType<typeof designWith>) =>
  proposeCakes(resolveDesign(design, menu), terms);

describe('proposed stacks', () => {
  it('feed everybody, from tins there are, in steps that stand', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 250 }), anySize, (wanted, portion) => {
        const stacks = proposeStacks(wanted, menu, portion);
        for (const stack of stacks) {
          const tiers = tiersOf(stack, { spongeId: 'vanilla', fillingId: 'raspberry' });
          const fed = portionsPerTier(tiers, portion).reduce((sum, it) => sum + it, 0);
          expect(fed).toBe(stack.portions);
          expect(fed).toBeGreaterThanOrEqual(wanted);
          for (const [index, tier] of tiers.entries()) {
            expect(tierContract.safeParse(tier).success).toBe(true);
            const size = menu.tierSizes.find(
              (it) => it.shape === tier.shape && it.widthMm === tier.widthMm,
            );
            expect(size?.heightsMm).toContain(tier.heightMm);
            const above = tiers[index + 1];
            if (above === undefined) continue;
            // Tins kept in whole millimetres lose up to one in a step of two inches.
            expect(tier.widthMm - above.widthMm).toBeGreaterThanOrEqual(smallestStepMm - 1);
          }
        }
      }),
    );
  });

  it('are two or three, least waste first, one of them with some over', () => {
    for (const wanted of [8, 20, 40, 70, 90, 120, 150]) {
      const stacks = proposeStacks(wanted, menu, menu.portionSizes[1] ?? fail());
      expect([2, 3]).toContain(stacks.length);
      const portions = stacks.map((it) => it.portions);
      expect(portions).toEqual(portions.toSorted((a, b) => a - b));
      expect(stacks[0]?.blurb).toBe('Just enough');
      expect((portions[0] ?? 0) - wanted).toBeLessThanOrEqual(Math.max(5, wanted * 0.1));
      const over = stacks.find((it) => it.blurb === 'Some over');
      expect(over?.portions).toBeGreaterThanOrEqual(wanted * 1.1);
    }
  });

  it('answer the same each time', () => {
    const portion = menu.portionSizes[2] ?? fail();
    expect(proposeStacks(85, menu, portion)).toEqual(proposeStacks(85, { ...menu }, portion));
  });

  it('are none where the tins are too small', () => {
    const portion = menu.portionSizes[2] ?? fail();
    expect(proposeStacks(2000, menu, portion)).toEqual([]);
  });

  it('have layers that go with their height', () => {
    expect([75, 102, 127, 152].map(usualLayers)).toEqual([2, 3, 3, 4]);
  });
});

describe('proposed cakes', () => {
  it('cost what they would cost if chosen', () => {
    const design = designWith({ cake: null });
    for (const { tiers, priceMinor } of propose(design)) {
      const chosen = { kind: 'tiered' as const, tiers, sheet: null, coating: null, cuttingCakes: [] };
      const resolved = resolveDesign({ ...design, cake: chosen }, menu);
      expect(priceMinor).toBe(priceDesign(resolved, terms).totalMinor);
    }
  });

  it('start with a sponge that no guest’s allergy speaks against', () => {
    const design = designWith({ cake: null, guests: { allergies: [declares({})] } });
    expect(propose(design)[0]?.tiers[0]?.spongeId).toBe('cocoa-oil');
  });

  it('keep what was already chosen', () => {
    expect(propose(designWith({}))[0]?.tiers[0]).toMatchObject({
      spongeId: 'vanilla',
      fillingId: 'raspberry',
    });
  });

  it('are smaller where there are other desserts', () => {
    const guests = { headCount: 100, otherDesserts: true };
    expect(portionsWanted(guests, menu)).toBe(70);
    expect(portionsWanted({ ...guests, headCount: 1 }, menu)).toBe(1);
    expect(propose(designWith({ cake: null, guests }))[0]?.portions).toBe(70);
  });
});

function fail(): never {
  throw new Error('The fixture has three portion sizes.');
}
