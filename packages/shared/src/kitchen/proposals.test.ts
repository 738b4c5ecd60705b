import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cake as cakeContract, tier as tierContract } from '#shared/contracts/design.ts';
import { countPortions, portionsWanted } from './portions.ts';
import { priceDesign } from './price.ts';
import { cakeOfProposal, proposeCakes } from './propose-cakes.ts';
import { proposeStacks, tiersOf, usualLayers } from './proposals.ts';
import { resolveDesign } from './resolve-design.ts';
import { portionsPerTier } from './sizes.ts';
import { declares, designWith, roundTier, swissCoat } from './testing/design-fixture.ts';
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
          const tiers = tiersOf(
            stack,
            { spongeId: 'vanilla', fillingId: 'raspberry' },
            menu.kitchen,
          );
          const fed = portionsPerTier(tiers, portion, menu.kitchen).reduce(
            (sum, it) => sum + it,
            0,
          );
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
            expect(tier.widthMm - above.widthMm).toBeGreaterThanOrEqual(50 - 1);
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
    expect([75, 102, 127, 152].map((it) => usualLayers(it, menu.kitchen))).toEqual([2, 3, 3, 4]);
  });
});

describe('proposed cakes', () => {
  it('cost what they would cost if chosen', () => {
    const design = designWith({ cake: null });
    for (const proposal of propose(design)) {
      const chosen = cakeOfProposal(proposal, null);
      const resolved = resolveDesign({ ...design, cake: chosen }, menu);
      expect(proposal.priceMinor).toBe(priceDesign(resolved, terms).totalMinor);
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

describe('proposals with cutting cakes', () => {
  const proposed = (headCount: number, portionSizeId: 'coffee' | 'dessert' | 'party' = 'dessert') =>
    propose(designWith({ cake: null, guests: { headCount, portionSizeId } }));

  it('feed every head count the form takes, and say truly how many', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2000 }), anySize, (headCount, { id }) => {
        const proposals = proposed(headCount, id);
        expect(proposals.length).toBeGreaterThan(0);
        for (const it of proposals) {
          const cake = cakeOfProposal(it, swissCoat);
          expect(cakeContract.safeParse(cake).success).toBe(true);
          const design = designWith({ cake, guests: { headCount, portionSizeId: id } });
          expect(countPortions(design, menu).fed).toBe(it.portions);
          expect(it.portions).toBeGreaterThanOrEqual(headCount);
        }
      }),
      { numRuns: 200 },
    );
  });

  it('waste little: within a fifth of what is wanted, or the smallest tin', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2000 }), anySize, (headCount, { id }) => {
        const [first] = proposed(headCount, id).filter((it) => it.sheet === null);
        // The smallest tin feeds twelve in coffee portions.
        expect(first?.portions).toBeLessThanOrEqual(Math.max(headCount * 1.2, headCount + 12));
      }),
      { numRuns: 200 },
    );
  });

  it('ask for no fewer portions as the table grows, but for the rounding of tins', () => {
    for (const portion of menu.portionSizes) {
      let before = 0;
      for (let wanted = 1; wanted <= 280; wanted += 1) {
        const just = proposeStacks(wanted, menu, portion).find((it) => it.blurb === 'Just enough');
        expect(just?.portions).toBeGreaterThanOrEqual(before - 2);
        before = just?.portions ?? before;
      }
    }
  });

  it('show a cake of three tiers or more, and cut the rest in the kitchen', () => {
    const show = proposed(150).find((it) => it.cuttingCakes.length > 0 && it.sheet === null);
    expect(show?.tiers.length).toBeGreaterThanOrEqual(3);
    expect(show?.cuttingCakes[0]).toMatchObject({ spongeId: 'vanilla', layers: 2 });
    // Beyond what stacks: nothing else is left, in two heights.
    const [grand, small] = proposed(1200).filter((it) => it.sheet === null);
    expect([grand?.tiers.length, small?.tiers.length].toSorted()).toEqual([3, 5]);
  });

  it('offer a sheet where it is sensible, with more in the kitchen where one is too small', () => {
    const sheet = (headCount: number) => proposed(headCount).find((it) => it.sheet !== null);
    expect(sheet(6)).toBeUndefined();
    expect(sheet(50)).toMatchObject({ sheet: { sizeId: 'half' }, cuttingCakes: [], portions: 54 });
    // A full sheet feeds 117.
    expect(sheet(200)?.sheet?.sizeId).toBe('full');
    expect(sheet(200)?.cuttingCakes).toHaveLength(1);
  });

  it('stay square where the cake is', () => {
    const tiers = [roundTier(10, { shape: 'square' }), roundTier(6, { shape: 'square' })];
    for (const it of propose(designWith({ cake: { tiers } }))) {
      expect(it.tiers.every((tier) => tier.shape === 'square')).toBe(true);
      if (it.sheet === null) expect(it.name).toMatch(/square tiers?, /);
    }
  });

  it('keep the top tier back where it was kept back, and feed everybody from the others', () => {
    const tiers = [roundTier(10), roundTier(8), roundTier(6, { keepsake: true })];
    const proposals = propose(designWith({ cake: { tiers } })).filter((it) => it.sheet === null);
    for (const it of proposals) {
      expect(it.tiers.at(-1)?.keepsake).toBe(true);
      // A keepsake is small: 6 in at most.
      expect(it.tiers.at(-1)?.widthMm).toBeLessThanOrEqual(152);
      expect(it.name).toMatch(/the top one kept back/);
      expect(it.portions).toBeGreaterThanOrEqual(70);
    }
    expect(proposals.length).toBeGreaterThan(1);
  });
});
