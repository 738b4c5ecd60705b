import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gPerOunce, gPerPound, mlPerUsCup } from '#shared/kitchen/measures.ts';
import { bought, shelf } from '#shared/kitchen/testing/pantry-fixture.ts';
import {
  formatGrams,
  formatHousehold,
  formatPounds,
  householdOf,
  inMeasure,
  mlPerMeasure,
  weightOfMeasure,
} from './household.ts';
import { gramsPerUnit, mlPerUnit } from './units-typed.ts';

const the = (id: string) => {
  const found = shelf.find((it) => it.id === id);
  if (found === undefined) throw new Error(id);
  return found;
};

describe('units', () => {
  // Values printed by GNU units 2.22 (`units -t -d 12 '1 uscup' ml` and so on).
  it('are those of an independent program', () => {
    expect(mlPerUsCup).toBe(236.5882365);
    expect(mlPerMeasure.tablespoon).toBeCloseTo(14.7867647812, 9);
    expect(mlPerMeasure.teaspoon).toBeCloseTo(4.92892159375, 10);
    expect(mlPerUnit['fluid-ounce']).toBeCloseTo(29.5735295625, 10);
    expect(mlPerUnit.pint).toBeCloseTo(473.176473, 9);
    expect(mlPerUnit.quart).toBeCloseTo(946.352946, 9);
    expect(mlPerUnit.gallon).toBeCloseTo(3785.411784, 9);
    expect(gramsPerUnit.pound).toBe(453.59237);
    expect(gramsPerUnit.ounce).toBe(28.349523125);
    expect(2.5 * gPerPound).toBeCloseTo(1133.980925, 9);
    expect(14 * gPerOunce).toBeCloseTo(396.89332375, 9);
  });

  it('of weight are said in pounds and quarters of an ounce, and in grams', () => {
    expect(formatPounds(gPerPound)).toBe('1 lb');
    expect(formatPounds(567)).toBe('1 lb 4 oz');
    expect(formatPounds(1000)).toBe('2 lb 3¼ oz');
    expect(formatPounds(7.1)).toBe('¼ oz');
    expect(formatPounds(0)).toBe('0 oz');
    expect(['0.4 g', '5.3 g', '171 g', '1.235 kg', '12.3 kg']).toEqual(
      [0.4, 5.3, 171, 1235, 12_340].map(formatGrams),
    );
  });
});

describe('household measures', () => {
  // USDA SR28 household weights: each ingredient's own, for each measure its own.
  it.each([
    ['butter', 227, '2 sticks'],
    ['butter', 570, '5 sticks'],
    ['butter', 14.2, '1 tbsp'],
    ['butter', 2700, '12 cups'],
    ['sugar', 200, '1 cup'],
    ['sugar', 1950, '9¾ cups'],
    ['powdered-sugar', 120, '1 cup'],
    ['powdered-sugar', 1650, '13¾ cups'],
    ['brown-sugar', 110, '½ cup'],
    ['milk', 366, '1½ cups'],
    ['cream', 79, '⅓ cup'],
    ['condensed', 397, '1 can'],
    ['cornstarch', 42.7, '⅓ cup'],
    ['honey', 226, '⅔ cup'],
    ['corn-syrup', 85, '¼ cup'],
    ['cocoa', 86, '1 cup'],
    ['salt', 15, '2½ tsp'],
    ['vanilla', 13, '1 tbsp'],
    ['vanilla', 60, '4 tbsp + 2 tsp'],
    ['vanilla', 20, '4¾ tsp'],
    ['baking-powder', 6.9, '1½ tsp'],
    ['whites', 99, '3 whites'],
    ['yolks', 200, '12 yolks'],
    ['eggs', 50, '1 egg'],
    ['eggs', 420, 'about 8 eggs'],
  ])('of %s, %s g are %s', (id, grams, words) => {
    expect(formatHousehold(the(id), grams)).toBe(words);
  });

  it('do not multiply through: no spoon is made of a cup, no cup of spoons', () => {
    expect(weightOfMeasure(the('powdered-sugar'), 'tablespoon')).toBeNull();
    expect(weightOfMeasure(the('salt'), 'cup')).toBeNull();
    const both = bought('x', 'X', {}, [
      ['cup', 120],
      ['tablespoon', 8],
    ]);
    expect(formatHousehold(both, 136)).toBe('1 cup + 2 tbsp');
    expect(inMeasure(both, 'tablespoon', 120)?.text).toBe('15 tbsp');
  });

  it('take the weight of the qualifier that is said', () => {
    expect(weightOfMeasure(the('powdered-sugar'), 'cup', 'sifted')?.grams).toBe(100);
    expect(weightOfMeasure(the('powdered-sugar'), 'cup', 'unsifted')?.grams).toBe(120);
    expect(weightOfMeasure(the('powdered-sugar'), 'cup')?.grams).toBe(120);
    expect(weightOfMeasure(the('brown-sugar'), 'cup', 'level')?.grams).toBe(220);
  });

  it('reckoned by a density say so', () => {
    expect(weightOfMeasure(the('water'), 'cup')).toEqual({ grams: mlPerUsCup, reckoned: true });
    expect(formatHousehold(the('water'), mlPerUsCup)).toBe('about 1 cup');
  });

  it('are not said where none is sensible', () => {
    expect(formatHousehold(the('sugar'), 15)).toBeNull();
    expect(formatHousehold(the('salt'), 100)).toBeNull();
    expect(formatHousehold(the('butter'), 0)).toBeNull();
    expect(formatHousehold(the('butter'), Number.NaN)).toBeNull();
    expect(formatHousehold(bought('x', 'X'), 100)).toBeNull();
  });

  it('are millilitres of what pours where the studio is metric', () => {
    expect(formatHousehold(the('milk'), 244, 'metric')).toBe('about 237 mL');
    expect(formatHousehold(the('eggs'), 150, 'metric')).toBe('3 eggs');
    expect(formatHousehold(the('sugar'), 200, 'metric')).toBeNull();
  });

  it('never say a weight that is more than 6 % off, but for eggs', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...shelf.filter((it) => it.eggPart === null)),
        fc.double({ min: 0.01, max: 20_000, noNaN: true }),
        (ingredient, grams) => {
          const found = householdOf(ingredient, grams);
          if (found === null) return;
          expect(Math.abs(found.grams / grams - 1)).toBeLessThan(0.0601);
          expect(found.count).toBeGreaterThan(0);
        },
      ),
    );
  });
});
