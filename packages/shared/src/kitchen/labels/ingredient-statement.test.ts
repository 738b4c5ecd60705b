import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { FormulaCycle, type FormulaLine, type FormulaNode } from '../derive-contents.ts';
import { entry, milk } from '../testing/contents-fixture.ts';
import { textOf } from './allergen-words.ts';
import { ingredientStatement } from './ingredient-statement.ts';
import {
  bought,
  butter,
  buttercream,
  chocolate,
  eggs,
  flour,
  formulaOfLines,
  lineOf,
  salt,
  sponge,
  sugar,
} from './testing/label-pantry.ts';
import { weighIngredients, type LabelledPart } from './weigh-ingredients.ts';

const part = (node: FormulaNode, finishedG: number): LabelledPart => ({
  name: node.name,
  node,
  finishedG,
});

/*
 * Worked by hand. 900 g of baked sponge took 1,000 g of batter (900 / 0.9): flour 400, sugar 300,
 * eggs 200, butter 90, salt 10. 500 g of buttercream: butter 300, sugar 190, vanilla 10.
 * The whole cake: sugar 300 + 190 = 490, flour 400, butter 90 + 300 = 390, eggs 200, salt 10,
 * vanilla 10: 1,500 g. Two percent of that are 30 g, so salt and vanilla go last.
 */
const wholeCake = [part(sponge, 900), part(buttercream, 500)];

describe('a US statement', () => {
  it('goes by weight as used over the whole cake, 21 CFR 101.4(a)(1) and (2), (b)(2)', () => {
    const weighed = weighIngredients(wholeCake);
    expect(weighed.map(({ name, usedG }) => [name, Math.round(usedG * 1000) / 1000])).toEqual([
      ['sugar', 490],
      ['wheat flour', 400],
      ['butter', 390],
      ['eggs', 200],
      ['salt', 10],
      ['vanilla extract', 10],
    ]);
    expect(textOf(ingredientStatement(weighed, 'US', 1400))).toBe(
      'Sugar, wheat flour, butter (cream), eggs. Contains 2% or less of: salt, vanilla extract (water, alcohol, vanilla beans).',
    );
  });

  it('orders a part by itself otherwise than the whole', () => {
    const alone = textOf(ingredientStatement(weighIngredients([part(sponge, 900)]), 'US', 900));
    expect(alone).toBe('Wheat flour, sugar, eggs, butter (cream). Contains 2% or less of: salt.');
  });

  it('opens a formula inside a formula, by what the outer one takes of the finished inner one', () => {
    // 100 g of custard left of 200 g that went in; the outer takes 100 g of it.
    const custard = formulaOfLines('Custard', [lineOf(eggs, 50), lineOf(sugar, 150)], 500_000);
    const outer = formulaOfLines('German', [lineOf(custard, 100), lineOf(butter, 100)]);
    const weighed = weighIngredients([part(outer, 200)]);
    expect(weighed.map(({ name, usedG }) => [name, usedG])).toEqual([
      ['sugar', 150],
      ['butter', 100],
      ['eggs', 50],
    ]);
  });

  it('names two products with the same words once, with the allergens of both', () => {
    const one = bought('vegetable oil', { id: 'a', allergens: [entry('soy')] });
    const other = bought('Vegetable oil', { id: 'b', allergens: [entry('sesame')] });
    const [line, ...more] = weighIngredients([
      part(formulaOfLines('Oils', [lineOf(one, 5), lineOf(other, 7)]), 12),
    ]);
    expect(more).toEqual([]);
    expect(line?.usedG).toBeCloseTo(12);
    expect(line?.allergens.map((it) => it.allergen)).toEqual(['soy', 'sesame']);
  });

  it('says nothing for nothing, and no group where everything is of little', () => {
    expect(ingredientStatement([], 'US', 0)).toEqual([]);
    const many = Array.from({ length: 60 }, (_, at) => lineOf(bought(`spice ${at}`), 1));
    const text = textOf(
      ingredientStatement(weighIngredients([part(formulaOfLines('Mix', many), 60)]), 'US', 60),
    );
    expect(text).not.toContain('2%');
  });

  it('refuses a formula that comes back to itself, and takes one a hundred levels deep', () => {
    const lines: FormulaLine[] = [];
    const outer = formulaOfLines('Outer', [lineOf(formulaOfLines('Inner', lines), 1)]);
    lines.push(lineOf(outer, 1));
    expect(() => weighIngredients([part(outer, 1)])).toThrow(FormulaCycle);
    let deep = formulaOfLines('0', [lineOf(sugar, 3), lineOf(salt, 1)]);
    for (let level = 1; level <= 100; level += 1) {
      // Used twice at each level: counted through, not walked through two to the hundredth times.
      deep = formulaOfLines(String(level), [lineOf(deep, 1), lineOf(deep, 1)]);
    }
    const weighed = weighIngredients([part(deep, 4)]);
    expect(weighed.map(({ name, usedG }) => [name, usedG])).toEqual([
      ['sugar', 3],
      ['salt', 1],
    ]);
  });

  it('loses no gram and no ingredient, whatever the parts', () => {
    const shelf = [flour, sugar, butter, eggs, salt];
    const formulas = fc.array(fc.tuple(fc.nat({ max: 4 }), fc.integer({ min: 1, max: 5000 })), {
      minLength: 1,
      maxLength: 8,
    });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(formulas, fc.integer({ min: 1, max: 9000 })), {
          minLength: 1,
          maxLength: 5,
        }),
        (parts) => {
          const weighed = weighIngredients(
            parts.map(([lines, grams], at) =>
              part(
                formulaOfLines(
                  `F${at}`,
                  lines.map(([which, g]) => lineOf(shelf[which] ?? salt, g)),
                ),
                grams,
              ),
            ),
          );
          const total = parts.reduce((sum, [, grams]) => sum + grams, 0);
          expect(weighed.reduce((sum, it) => sum + it.usedG, 0)).toBeCloseTo(total, 6);
          const used = new Set(
            parts.flatMap(([lines]) => lines.map(([which]) => shelf[which]?.name)),
          );
          expect(new Set(weighed.map((it) => it.name))).toEqual(used);
          for (const [at, it] of weighed.entries()) {
            expect(it.usedG).toBeLessThanOrEqual(weighed[at - 1]?.usedG ?? Infinity);
          }
        },
      ),
    );
  });
});

describe('an EU or UK statement', () => {
  it('emphasises allergens where they stand, and names them where the words do not (article 21)', () => {
    const ganache = formulaOfLines('Ganache', [lineOf(chocolate, 100)]);
    const statement = ingredientStatement(
      weighIngredients([...wholeCake, part(ganache, 100)]),
      'EU',
      1500,
    );
    expect(textOf(statement)).toBe(
      'Sugar, wheat flour, butter (cream; milk), eggs, dark chocolate (cocoa mass, sugar, soya lecithin), salt, vanilla extract (water, alcohol, vanilla beans).',
    );
    expect(statement.filter((it) => it.emphasised).map((it) => it.text)).toEqual([
      'wheat',
      'milk',
      'eggs',
      'soya',
    ]);
  });

  it('names each species of nut and cereal', () => {
    const praline = bought('praline', {
      madeOf: 'sugar, hazelnuts',
      allergens: [entry('tree-nuts', ['hazelnut', 'almond'])],
    });
    const mix = bought('flour mix', { allergens: [entry('gluten-cereals', ['rye', 'oats'])] });
    const text = textOf(
      ingredientStatement(
        weighIngredients([part(formulaOfLines('Mix', [lineOf(praline, 2), lineOf(mix, 1)]), 3)]),
        'UK',
        3,
      ),
    );
    expect(text).toBe('Praline (sugar, hazelnuts; almond), flour mix (oats, rye).');
  });

  it('takes no word for an allergen that only sounds like one', () => {
    const coconut = bought('coconut milk powder', {
      madeOf: 'coconut, maltodextrin',
      allergens: [milk],
    });
    const statement = ingredientStatement(
      weighIngredients([part(formulaOfLines('Mix', [lineOf(coconut, 1)]), 1)]),
      'EU',
      1,
    );
    expect(textOf(statement)).toBe('Coconut milk powder (coconut, maltodextrin; milk).');
    expect(statement.filter((it) => it.emphasised)).toHaveLength(1);
  });

  it('places added water by what is left of it in the finished food (Annex VII A.1)', () => {
    const water = bought('water');
    // 300 g of water and 200 g of sugar boil down to 250 g: 50 g of water are left.
    const syrup = formulaOfLines('Syrup', [lineOf(water, 300), lineOf(sugar, 200)], 500_000);
    const weighed = weighIngredients([part(syrup, 250)]);
    expect(textOf(ingredientStatement(weighed, 'EU', 250))).toBe('Sugar, water.');
    expect(textOf(ingredientStatement(weighed, 'US', 250))).toBe('Water, sugar.');
  });
});
