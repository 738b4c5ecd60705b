import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bookOf, shelf, version } from '#shared/kitchen/testing/pantry-fixture.ts';
import type { FormulaStep } from '#shared/contracts/pantry.ts';
import { bowlsFor, coolingMinutes } from './bowls.ts';
import { FormulaFault } from './formula-problem.ts';
import { indexPantry } from './pantry-index.ts';

const mixers = [
  { id: 'stand', name: 'Stand mixer', capacityG: 2000 },
  { id: 'floor', name: 'Floor mixer', capacityG: 6000 },
];

describe('bowls', () => {
  it.each([
    [1500, 'stand', 1, 1500],
    [2000, 'stand', 1, 2000],
    [2001, 'floor', 1, 2001],
    [6000, 'floor', 1, 6000],
    [7000, 'floor', 2, 3500],
    [20_000, 'floor', 4, 5000],
  ])('for %s g: %s, %s of %s g', (grams, mixer, bowls, eachG) => {
    expect(bowlsFor(grams, mixers)).toMatchObject({ mixer: { id: mixer }, bowls, eachG });
  });

  it('are equal, never over the brim, and one fewer would not do', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 1e6, noNaN: true }), (grams) => {
        const plan = bowlsFor(grams, mixers);
        expect(plan).not.toBeNull();
        if (plan === null) return;
        expect(plan.bowls * plan.eachG).toBeCloseTo(grams, 4);
        expect(plan.eachG).toBeLessThanOrEqual(plan.mixer.capacityG + 0.001);
        expect((plan.bowls - 1) * 6000).toBeLessThan(grams);
      }),
    );
  });

  it('are none for nothing, and need a mixer', () => {
    expect(bowlsFor(0, mixers)).toBeNull();
    expect(() => bowlsFor(5, [])).toThrow(FormulaFault);
    expect(() => bowlsFor(-5, mixers)).toThrow(FormulaFault);
    expect(() => bowlsFor(Number.NaN, mixers)).toThrow(FormulaFault);
  });
});

describe('a bowl of meringue', () => {
  const step = (resource: FormulaStep['resource'], limitC: number | null): FormulaStep => ({
    text: 'Whip',
    activeMinutes: 2,
    waitingMinutes: 10,
    resource,
    critical: limitC === null ? null : { limitC, seconds: null, note: '' },
    syrupTargetC: null,
  });
  const meringue = version(
    'meringue',
    [
      ['whites', 180],
      ['sugar', 351],
    ],
    {
      steps: [step('bench', 71), step('mixer', 27)],
    },
  );
  const index = indexPantry(bookOf(shelf, [meringue]));

  // Common practice, no source: a whipped meringue takes 8 to 10 minutes to cool.
  it('of 180 g of white cools in about ten minutes, twice as much in twice the time', () => {
    expect(coolingMinutes(meringue, index, 531)).toBeCloseTo(10, 9);
    expect(coolingMinutes(meringue, index, 1062)).toBeCloseTo(20, 9);
  });

  it('is the only one that is waited for', () => {
    const custard = { ...meringue, steps: [step('bench', 71), step('cold', 5)] };
    expect(coolingMinutes(custard, index, 531)).toBeNull();
    expect(coolingMinutes({ ...meringue, steps: [] }, index, 531)).toBeNull();
  });
});
