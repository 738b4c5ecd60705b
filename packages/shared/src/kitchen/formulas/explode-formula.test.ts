import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bookOf, shelf, version, type LineRow } from '#shared/kitchen/testing/pantry-fixture.ts';
import { explodeFormula } from './explode-formula.ts';
import { FormulaFault } from './formula-problem.ts';
import { indexPantry } from './pantry-index.ts';

const custard = version(
  'custard',
  [
    ['milk', 1000],
    ['sugar', 550],
    ['eggs', 420],
    ['cornstarch', 110],
    ['salt', 6],
  ],
  { yieldPpm: 950_000 },
);
const german = version(
  'german',
  [
    ['@custard-1', 1981.7],
    ['butter', 1600],
    ['vanilla', 30],
  ],
  { yieldPpm: 980_000 },
);
const index = indexPantry(bookOf(shelf, [custard, german]));

describe('what is bought', () => {
  /*
   * 2,000 g of German buttercream by hand. Goes in: 2,000 / 0.98 = 2,040.816 g of 3,611.7 g.
   * Custard: 1,981.7 / 3,611.7 x 2,040.816 = 1,119.776 g, for which 1,119.776 / 0.95 = 1,178.711 g
   * go in of 2,086 g. Milk: 1,000 / 2,086 x 1,178.711 = 565.058 g. Sugar: 0.55 x that = 310.782 g.
   * Butter: 1,600 / 3,611.7 x 2,040.816 = 904.093 g.
   */
  it('is a custard inside a buttercream, worked by hand', () => {
    const { ingredients, formulas } = explodeFormula(german, index, 2000);
    expect(formulas).toHaveLength(1);
    expect(formulas[0]?.version).toBe(custard);
    expect(formulas[0]?.outG).toBeCloseTo(1119.776, 2);
    expect(ingredients.get('milk')).toBeCloseTo(565.058, 2);
    expect(ingredients.get('sugar')).toBeCloseTo(310.782, 2);
    expect(ingredients.get('butter')).toBeCloseTo(904.093, 2);
    expect(ingredients.get('vanilla')).toBeCloseTo((904.093 * 30) / 1600, 2);
  });

  it('is nothing for nothing, and refuses what is no weight', () => {
    expect([...explodeFormula(german, index, 0).ingredients.values()]).toEqual([
      0, 0, 0, 0, 0, 0, 0,
    ]);
    expect(() => explodeFormula(german, index, -1)).toThrow(FormulaFault);
    expect(() => explodeFormula(german, index, Number.NaN)).toThrow(FormulaFault);
  });

  it('weighs as much as comes out where nothing is lost on the way', () => {
    const level = fc.record({
      inner: fc.integer({ min: 1, max: 500 }),
      again: fc.integer({ min: 1, max: 500 }),
      butter: fc.integer({ min: 1, max: 500 }),
    });
    fc.assert(
      fc.property(fc.array(level, { minLength: 1, maxLength: 40 }), (levels) => {
        // Each level holds the one below on two lines: without memory, 2^40 ways down.
        const versions = levels.map(({ inner, again, butter }, n) => {
          const below: LineRow[] =
            n === 0
              ? [['milk', inner]]
              : [
                  [`@l${n - 1}-1`, inner],
                  [`@l${n - 1}-1`, again],
                ];
          return version(`l${n}`, [...below, ['butter', butter]]);
        });
        const pantry = indexPantry(bookOf(shelf, versions));
        const top = versions.at(-1);
        if (top === undefined) return;
        const { ingredients, formulas } = explodeFormula(top, pantry, 1000);
        const total = [...ingredients.values()].reduce((sum, it) => sum + it, 0);
        expect(total).toBeCloseTo(1000, 6);
        expect(formulas).toHaveLength(levels.length - 1);
      }),
    );
  });
});
