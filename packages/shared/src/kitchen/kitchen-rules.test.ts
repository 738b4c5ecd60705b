import { describe, expect, it } from 'vitest';
import { kitchenRules, usualKitchen, type KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import { boxOf } from '#shared/dates/expand-design.ts';
import { amountsOf, carriedWeightG } from './amounts.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { fareInHeat } from './heat.ts';
import { proposeStacks } from './proposals.ts';
import { resolveDesign } from './resolve-design.ts';
import { portionsOfBlock } from './sizes.ts';
import { supportsOf } from './supports.ts';
import { designFixture, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const menuWith = (change: Partial<KitchenRules>) => ({
  ...menuFixture,
  kitchen: kitchenRules.parse(change),
});
const issuesOf = (change: object) => {
  const read = kitchenRules.safeParse(change);
  return read.success ? [] : read.error.issues.map((it) => it.path.join('.'));
};

describe('the kitchen’s figures', () => {
  it('are, where nothing is set, those of the kitchen’s definition', () => {
    // "crumb coat (2 mm) and final coat (4 mm) ... plus 10 % for bowl and bag ... over a 3 mm coat",
    // "over 130 mm a tier has an inner board", "steps between tiers at least 50 mm",
    // "at least 3 °C under", "close under 3, shifts under 10", "1 to 3 h to soften".
    expect(kitchenRules.parse({})).toMatchObject({
      crumbCoatMm: 2,
      finalCoatMm: 4,
      bowlAndBagPpm: 100_000,
      underFondantMm: 3,
      doubleHeightMm: 130,
      smallestStepMm: 50,
      heatMarginC: 3,
      closeBelow: 3,
      shiftsBelow: 10,
      softenLeastHours: 1,
      softenMostHours: 3,
    });
    expect(kitchenRules.parse({ damMm: 12 })).toEqual({ ...usualKitchen, damMm: 12 });
  });

  it('refuse what no kitchen does, and pairs that cross, at the figure', () => {
    expect(issuesOf({ crumbCoatMm: -1 })).toEqual(['crumbCoatMm']);
    expect(issuesOf({ mmPerDowel: 0 })).toEqual(['mmPerDowel']);
    expect(issuesOf({ mostTiers: 2.5 })).toEqual(['mostTiers']);
    expect(issuesOf({ boardGPerMl: Number.NaN })).toEqual(['boardGPerMl']);
    expect(issuesOf({ largestStepMm: 40 })).toEqual(['largestStepMm']);
    expect(issuesOf({ twoTierPortions: 20 })).toEqual(['twoTierPortions']);
    expect(issuesOf({ showBestPpm: 800_000 })).toEqual(['showMostPpm']);
  });

  it('carry through amounts: half the coats, half the buttercream of the coats', () => {
    const coated = (change: Partial<KitchenRules>) =>
      amountsOf(
        resolveDesign(
          designWith({ cake: { tiers: [roundTier(8)] } }),
          menuWith({ footBeadMm: 0, bowlAndBagPpm: 0, damMm: 0, letterG: 0, ...change }),
        ),
      );
    const usual = coated({});
    const thin = coated({ crumbCoatMm: 1, finalCoatMm: 2 });
    expect(thin.frostingG).toBeCloseTo(usual.frostingG / 2, 6);
    expect(thin.spongeG).toBe(usual.spongeG);
    expect(coated({ bowlAndBagPpm: 250_000 }).frostingG).toBeCloseTo(1.25 * usual.frostingG, 6);
  });

  it('carry through portions, supports, weight, heat and the fridge', () => {
    const low = menuWith({ doubleHeightMm: 100, fewestDowels: 6, mmPerDowel: 200 });
    const block = { shape: 'round', widthMm: 203, depthMm: 203, heightMm: 102 } as const;
    const portion = { widthMm: 25, depthMm: 50 };
    expect(portionsOfBlock(block, portion, low.kitchen)).toBe(
      2 * portionsOfBlock(block, portion, usualKitchen),
    );
    const cake = { tiers: [roundTier(10), roundTier(8)] };
    const resolved = resolveDesign(designWith({ cake }), low);
    // Both tiers are tall now and bear a board on six dowels; the lower bears the upper too.
    expect(supportsOf(resolved.tiers, low.kitchen)).toMatchObject({ boards: 3, dowels: 18 });
    const light = resolveDesign(designWith({ cake }), menuWith({ boardGPerMl: 0.001 }));
    const usual = resolveDesign(designWith({ cake }), menuFixture);
    expect(carriedWeightG(light, amountsOf(light))).toBeLessThan(
      carriedWeightG(usual, amountsOf(usual)),
    );
    expect(fareInHeat(26, 24, menuWith({ heatMarginC: 1 }).kitchen)).toBe('ok');
    expect(boxOf(block, menuWith({ fridgeMarginMm: 0, fridgeHeadroomMm: 0 }).kitchen)).toEqual({
      widthMm: 203,
      depthMm: 203,
      heightMm: 102,
    });
  });

  it('carry through proposals, and leave an estimate as it was where they are the usual ones', () => {
    const portion = menuFixture.portionSizes[1];
    if (portion === undefined) throw new Error('no portion');
    const tall = menuWith({ mostTiers: 2 });
    const stacks = proposeStacks(150, tall, portion);
    expect(stacks.every((it) => it.sizes.length <= 2)).toBe(true);
    const request = { design: designFixture, date: '2027-06-19', collectAt: null };
    expect(evaluateDesign(request, menuWith({}), '2027-05-03')).toEqual(
      evaluateDesign(request, menuFixture, '2027-05-03'),
    );
  });
});
