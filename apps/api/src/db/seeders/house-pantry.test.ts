import { describe, expect, it } from 'vitest';
import type { HouseholdMeasure } from '#shared/contracts/pantry.ts';
import type { SeedFormula, SeedIngredient } from './catalogue/catalogue-types.ts';
import { buttercreamFormulas } from './catalogue/formulas-buttercream.ts';
import { fillingFormulas } from './catalogue/formulas-filling.ts';
import { spongeFormulas } from './catalogue/formulas-sponge.ts';
import { dairyAndEggs } from './catalogue/ingredients-dairy.ts';
import { dryGoods } from './catalogue/ingredients-dry.ts';
import { finishingGoods } from './catalogue/ingredients-finishes.ts';
import { fruitAndFlavours } from './catalogue/ingredients-flavours.ts';

const ingredients = [...dairyAndEggs, ...dryGoods, ...fruitAndFlavours, ...finishingGoods];
const formulas = [...spongeFormulas, ...fillingFormulas, ...buttercreamFormulas];
const formula = (id: string): SeedFormula => {
  const found = formulas.find((it) => it.id === id);
  if (found === undefined) throw new Error(`no formula ${id}`);
  return found;
};
const bought = (id: string): SeedIngredient => {
  const found = ingredients.find((it) => it.id === id);
  if (found === undefined) throw new Error(`no ingredient ${id}`);
  return found;
};

/** Parts by weight of the first ingredient; a formula inside counts as its own lines. */
const partsOf = (id: string): Record<string, number> => {
  const [first] = formula(id).lines;
  return Object.fromEntries(
    formula(id).lines.map((line) => [
      'ingredient' in line ? line.ingredient : line.formula,
      line.grams / (first?.grams ?? 1),
    ]),
  );
};

describe('the house buttercreams', () => {
  // The studio's own ratios by weight, per part of the first ingredient.
  it.each([
    [
      'american-buttercream',
      { butter: 1, 'powdered-sugar': 1.65, 'heavy-cream': 0.1, vanilla: 0.02, salt: 0.004 },
    ],
    [
      'swiss-buttercream',
      { 'egg-white': 1, 'granulated-sugar': 1.95, butter: 2.7, vanilla: 0.06, salt: 0.015 },
    ],
    [
      'italian-buttercream',
      {
        'egg-white-carton': 1,
        'granulated-sugar': 2.05,
        water: 0.62,
        butter: 2.6,
        vanilla: 0.06,
        salt: 0.015,
      },
    ],
    [
      'french-buttercream',
      {
        'egg-yolk-carton': 1,
        'granulated-sugar': 1.2,
        water: 0.45,
        butter: 2.4,
        vanilla: 0.05,
        salt: 0.012,
      },
    ],
    [
      'german-custard',
      {
        'whole-milk': 1,
        'granulated-sugar': 0.55,
        'egg-whole': 0.42,
        cornstarch: 0.11,
        salt: 0.006,
      },
    ],
    ['russian-buttercream', { butter: 1, 'condensed-milk': 1.6, vanilla: 0.02, salt: 0.006 }],
  ])('%s keeps its ratios', (id, expected) => {
    expect(partsOf(id)).toEqual(expected);
  });

  it('puts all of the custard into the German one: per part of milk, butter 1.6 and vanilla 0.03', () => {
    const custard = formula('german-custard');
    const milk = custard.lines[0]?.grams ?? 0;
    const made =
      (custard.lines.reduce((sum, { grams }) => sum + grams, 0) * custard.yieldPpm) / 1_000_000;
    const lines = formula('german-buttercream').lines;
    expect(lines[0]?.grams).toBeCloseTo(made, 1);
    expect((lines[1]?.grams ?? 0) / milk).toBe(1.6);
    expect((lines[2]?.grams ?? 0) / milk).toBe(0.03);
  });
});

describe('critical limits', () => {
  const limits = (id: string) =>
    formula(id).steps.flatMap(({ critical, syrupTargetC }) => [
      ...(syrupTargetC === undefined ? [] : [`syrup ${String(syrupTargetC)}`]),
      ...(critical === undefined
        ? []
        : [
            `${String(critical.limitC)}${critical.seconds === undefined ? '' : ` ${String(critical.seconds)}s`}`,
          ]),
    ]);

  it('warm meringue over water to 71 °C, and cool every bowl under 27 °C before butter', () => {
    expect(limits('swiss-buttercream')).toEqual(['71', '27']);
    expect(limits('italian-buttercream')).toEqual(['syrup 115', '27']);
    expect(limits('french-buttercream')).toEqual(['syrup 115', '27']);
  });

  // Food Code 2022, 3-501.14: 57 to 21 °C in 2 h, to 5 °C in 6 h in all.
  it.each(['german-custard', 'lemon-curd', 'vanilla-cream'])('cool %s in two stages', (id) => {
    expect(limits(id).slice(-2)).toEqual(['21 7200s', '5 21600s']);
  });

  // Food Code 2022, 3-401.11: pooled eggs 68 °C for 17 s.
  it('hold pooled eggs on the hob', () => {
    expect(limits('lemon-curd')[0]).toBe('68 17s');
  });

  it('use pasteurised egg where syrup is poured', () => {
    for (const id of ['italian-buttercream', 'french-buttercream']) {
      const eggs = formula(id).lines.flatMap((line) =>
        'ingredient' in line ? (bought(line.ingredient).egg ?? []) : [],
      );
      expect(eggs.map(({ pasteurised }) => pasteurised)).toEqual([true]);
    }
  });
});

describe('the shelf', () => {
  // USDA SR28 household weights, grams.
  it.each<[string, HouseholdMeasure, string | undefined, number]>([
    ['butter', 'cup', undefined, 227],
    ['butter', 'stick', undefined, 113],
    ['butter', 'tablespoon', undefined, 14.2],
    ['granulated-sugar', 'cup', undefined, 200],
    ['powdered-sugar', 'cup', 'unsifted', 120],
    ['powdered-sugar', 'cup', 'sifted', 100],
    ['brown-sugar', 'cup', 'packed', 220],
    ['whole-milk', 'cup', undefined, 244],
    ['heavy-cream', 'cup', undefined, 238],
    ['condensed-milk', 'cup', undefined, 306],
    ['cornstarch', 'cup', undefined, 128],
    ['cake-flour', 'cup', undefined, 125],
    ['cocoa', 'cup', undefined, 86],
    ['honey', 'cup', undefined, 339],
    ['corn-syrup', 'cup', undefined, 341],
    ['salt', 'teaspoon', undefined, 6],
    ['vanilla', 'teaspoon', undefined, 4.2],
    ['vanilla', 'tablespoon', undefined, 13],
    ['baking-powder', 'teaspoon', undefined, 4.6],
    ['cream-cheese', 'cup', undefined, 232],
    ['egg-whole', 'piece', undefined, 50],
    ['egg-white', 'piece', undefined, 33],
    ['egg-yolk', 'piece', undefined, 17],
  ])('%s: a %s (%s) weighs %s g', (id, measure, qualifier, grams) => {
    const found = bought(id).measures?.find(
      (it) => it.measure === measure && it.qualifier === qualifier,
    );
    expect(found?.grams).toBe(grams);
    expect(bought(id).ndb).toMatch(/^\d{5}$/);
  });

  it('has a price for everything, and says what kind of nut or cereal', () => {
    for (const { id, packG, packPriceMinor, allergens } of ingredients) {
      expect([id, packG > 0, packPriceMinor >= 0]).toEqual([id, true, true]);
      for (const { allergen, species } of allergens) {
        if (allergen === 'tree-nuts' || allergen === 'gluten-cereals') {
          expect([id, species?.length]).toEqual([id, 1]);
        }
      }
    }
  });

  it('is where every line of every version comes from', () => {
    const known = new Set([...ingredients, ...formulas].map(({ id }) => id));
    const lines = formulas.flatMap((it) => [
      ...it.lines,
      ...(it.earlier ?? []).flatMap((older) => older.lines ?? []),
    ]);
    for (const line of lines) {
      expect(known).toContain('ingredient' in line ? line.ingredient : line.formula);
    }
  });
});
