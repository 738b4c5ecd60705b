import fc from 'fast-check';
import { add, divide, fraction, isFraction, multiply, number, type Fraction } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { bookOf, shelf, version, type LineRow } from '#shared/kitchen/testing/pantry-fixture.ts';
import { FormulaFault } from './formula-problem.ts';
import { indexPantry } from './pantry-index.ts';
import { roundGrams, toStep } from './round-grams.ts';
import { scaleFormula, type ScaleTo } from './scale-formula.ts';

const swiss = version(
  'swiss',
  [
    ['whites', 1000],
    ['sugar', 1950],
    ['butter', 2700],
    ['vanilla', 60],
    ['salt', 15],
  ],
  { yieldPpm: 970_000 },
);
const index = indexPantry(bookOf(shelf, [swiss]));
const problemOf = (to: ScaleTo, body = swiss) => {
  try {
    scaleFormula(body, index, to);
  } catch (error) {
    if (error instanceof FormulaFault) return error.problems[0];
    throw error;
  }
  return undefined;
};

describe('a formula scaled', () => {
  /*
   * Swiss meringue buttercream for a two-layer 8-in round, 4 in tall, by hand.
   * Area to coat: sides pi x 203.2 x 101.6 = 64,858 mm2, top pi x 101.6^2 = 32,429 mm2; 97,287 mm2
   * under 2 + 4 mm make 583.7 mL. Border: pi x 203.2 mm long, bead of 8 mm, pi x 4^2 = 50.27 mm2
   * across: 32.1 mL. 615.8 mL x 0.72 g/mL = 443.4 g; a tenth more for bowl and bag: 487.7 g.
   * Goes in: 487.7 / 0.97 = 502.8 g. Parts: 1 + 1.95 + 2.7 + 0.06 + 0.015 = 5.725.
   * One part: 502.8 / 5.725 = 87.83 g.
   */
  it('comes to a whole formula worked by hand', () => {
    const side = Math.PI * 203.2 * 101.6;
    const top = Math.PI * 101.6 ** 2;
    const ml = ((side + top) * 6 + Math.PI * 203.2 * Math.PI * 16) / 1000;
    const toG = ml * 0.72 * 1.1;
    expect(toG).toBeCloseTo(487.7, 1);

    const scaled = scaleFormula(swiss, index, { toG });
    expect(scaled.exactInG).toBeCloseTo(502.8, 1);
    expect(scaled.exactOutG).toBeCloseTo(toG, 9);
    const exact = [87.83, 171.26, 237.13, 5.27, 1.32];
    for (const [at, grams] of exact.entries()) {
      expect(scaled.lines[at]?.exactG).toBeCloseTo(grams, 1);
    }
    // 87.83 g are 2.66 whites: three are cracked, 99 g. Vanilla at 5 g would be 5.1 % off.
    expect(scaled.lines.map((it) => it.roundedG)).toEqual([99, 171, 237, 5.3, 1.3]);
    expect(scaled.lines[0]?.eggs).toEqual({ count: 3, eachG: 33 });
    expect(scaled.lines[0]?.driftG).toBeCloseTo(11.17, 1);
    expect(scaled.roundedInG).toBeCloseTo(513.6, 9);
    expect(scaled.driftG).toBeCloseTo(513.6 - 502.8, 1);
    expect(scaled.driftPpm).toBeCloseTo(21_500, -3);
    expect(scaled.roundedOutG).toBeCloseTo(513.6 * 0.97, 9);
  });

  it('is exactly in proportion, against fractions', () => {
    const lines = fc.array(fc.integer({ min: 1, max: 500_000 }), { minLength: 1, maxLength: 12 });
    const ids = shelf.map((it) => it.id);
    fc.assert(
      fc.property(
        lines,
        fc.integer({ min: 1, max: 1_000_000 }),
        fc.integer({ min: 1, max: 90_000_000 }),
        (weights, yieldPpm, toMg) => {
          const body = version(
            'any',
            weights.map((mg, at): LineRow => [ids[at % ids.length] ?? '', mg / 1000]),
            { yieldPpm },
          );
          fc.pre((toMg / yieldPpm) * 1e3 < 90_000_000);
          const scaled = scaleFormula(body, index, { toG: toMg / 1000 });
          const sum = weights.reduce<Fraction>((all, mg) => plus(all, fraction(mg)), fraction(0));
          const factor = over(
            times(fraction(toMg), fraction(1_000_000)),
            times(sum, fraction(yieldPpm)),
          );
          for (const [at, mg] of weights.entries()) {
            const exact = number(over(times(fraction(mg), factor), fraction(1000)));
            const grams = scaled.lines[at]?.exactG ?? 0;
            expect(Math.abs(grams / exact - 1)).toBeLessThan(1e-12);
          }
          expect(Math.abs(scaled.exactOutG / (toMg / 1000) - 1)).toBeLessThan(1e-12);
        },
      ),
    );
  });

  it('can be asked for by factor, by one line, and by bowls', () => {
    expect(scaleFormula(swiss, index, { factor: 0.5 }).lines[2]?.exactG).toBe(1350);
    const byButter = scaleFormula(swiss, index, { line: 2, lineG: 454 });
    expect(byButter.lines[2]?.exactG).toBeCloseTo(454, 9);
    expect(byButter.lines[0]?.exactG).toBeCloseTo(454 / 2.7, 9);
    expect(scaleFormula(swiss, index, { bowls: 3, bowlG: 1200 }).exactOutG).toBeCloseTo(3600, 9);
    // A mixer holds batter: the oven takes a tenth of it afterwards.
    const sponge = { ...swiss, yieldPpm: 900_000, bakeLossPpm: 100_000 };
    expect(scaleFormula(sponge, index, { bowls: 2, bowlG: 1000 }).exactInG).toBeCloseTo(2000, 9);
  });

  it('sums its rounded lines and tells the drift of each and of the whole', () => {
    fc.assert(
      fc.property(fc.double({ min: 10, max: 100_000, noNaN: true }), (toG) => {
        const { lines, roundedInG, exactInG, driftG } = scaleFormula(swiss, index, { toG });
        expect(lines.reduce((sum, it) => sum + it.roundedG, 0)).toBeCloseTo(roundedInG, 6);
        expect(lines.reduce((sum, it) => sum + it.driftG, 0)).toBeCloseTo(driftG, 6);
        expect(exactInG + driftG).toBeCloseTo(roundedInG, 6);
        expect(lines.every((it) => it.roundedG > 0)).toBe(true);
        const [whites] = lines;
        expect(Number.isInteger(whites?.eggs?.count)).toBe(true);
      }),
    );
  });

  it.each<[string, ScaleTo, string]>([
    ['zero', { toG: 0 }, 'not-an-amount'],
    ['less than nothing', { toG: -1 }, 'not-an-amount'],
    ['what is no number', { factor: Number.NaN }, 'not-an-amount'],
    ['endless', { factor: Number.POSITIVE_INFINITY }, 'not-an-amount'],
    ['no bowls', { bowls: 0, bowlG: 100 }, 'not-an-amount'],
    ['absurdly much', { toG: 1e9 }, 'too-heavy'],
    ['a line that is not there', { line: 9, lineG: 1 }, 'missing-part'],
    ['a line of nothing', { line: 1, lineG: 0 }, 'not-an-amount'],
  ])('refuses %s', (_, to, code) => {
    expect(problemOf(to)?.code).toBe(code);
  });

  it('names the line that was asked for wrongly, and the one that is unsound', () => {
    expect(problemOf({ line: 1, lineG: 0 })?.line).toBe(1);
    expect(
      problemOf(
        { factor: 1 },
        version('bad', [
          ['milk', 5],
          ['gone', 5],
        ]),
      ),
    ).toMatchObject({
      code: 'missing-part',
      line: 1,
    });
    expect(problemOf({ factor: 1 }, { ...swiss, yieldPpm: 1_010_000 })?.code).toBe(
      'yield-over-100',
    );
  });
});

function exactly(value: unknown): Fraction {
  if (!isFraction(value)) throw new Error('not a fraction');
  return value;
}
const plus = (a: Fraction, b: Fraction) => exactly(add(a, b));
const times = (a: Fraction, b: Fraction) => exactly(multiply(a, b));
const over = (a: Fraction, b: Fraction) => exactly(divide(a, b));

describe('grams on the bench', () => {
  it.each([
    // Salts to 0.1 g.
    [4.13, 0.1, 4.1],
    [14.96, 0.1, 15],
    // The rest to 1 g, from 500 g up to 5 g.
    [171.26, 1, 171],
    [499.4, 1, 499],
    [501.2, 1, 500],
    [1234, 1, 1235],
    [1233, null, 1235],
    // Small lines finer than asked, so that none is far from its weight or vanishes.
    [1.4, 1, 1.4],
    [0.06, 0.1, 0.06],
    [0.004, 0.1, 0.004],
    [512, 10, 510],
  ])('%s g, weighed to %s g, are %s g', (exact, rounding, rounded) => {
    expect(roundGrams(exact, rounding)).toBe(rounded);
  });

  it('are never further off than 5 %, and whole steps have no dust', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 50_000, noNaN: true }), (grams) => {
        for (const step of [0.1, 1, 5]) {
          const off = Math.abs(roundGrams(grams, step) - grams) / grams;
          expect(off).toBeLessThanOrEqual(0.0501);
        }
      }),
    );
    expect(toStep(0.30000000000000004, 0.1)).toBe(0.3);
  });
});
