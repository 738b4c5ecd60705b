import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import {
  cooksEgg,
  deriveContents,
  FormulaCycle,
  type FormulaLine,
  type FormulaNode,
  type FormulaStep,
  type IngredientNode,
} from './derive-contents.ts';
import { mergeAllergens } from './merge-allergens.ts';
import { entry, egg as eggEntry, milk as milkEntry, wheat } from './testing/contents-fixture.ts';

const ingredient = (id: string, rest: Partial<IngredientNode> = {}): IngredientNode => ({
  kind: 'ingredient',
  id,
  name: id,
  madeOf: '',
  allergens: [],
  gelatine: 'no',
  alcohol: 'no',
  cochineal: 'no',
  honey: 'no',
  animalOrigin: 'no',
  egg: 'none',
  ...rest,
});

const line = (part: FormulaLine['part'], grams: number, joinsAtStep = 0): FormulaLine => ({
  part,
  weightMg: grams * 1000,
  joinsAtStep,
});

const formula = (
  id: string,
  lines: readonly FormulaLine[],
  steps: readonly FormulaStep[] = [],
): FormulaNode => ({ kind: 'formula', id, name: id, lines, steps });

const heat = (mixReachesC: number | null, holdSeconds = 0): FormulaStep => ({
  mixReachesC,
  holdSeconds,
});

const milk = ingredient('milk', { allergens: [milkEntry] });
const butter = ingredient('butter', { allergens: [milkEntry] });
const sugar = ingredient('sugar');
const rawEgg = ingredient('egg', { allergens: [eggEntry], egg: 'raw' });
const cartonWhite = ingredient('egg white', { allergens: [eggEntry], egg: 'pasteurised' });
const chocolate = ingredient('dark chocolate', {
  madeOf: 'cocoa mass, sugar, soy lecithin',
  allergens: [entry('soy'), entry('tree-nuts', ['hazelnut'], 'may-contain')],
});

describe('contents', () => {
  it('come through a formula inside a formula', () => {
    const custard = formula(
      'Custard',
      [line(milk, 1000), line(rawEgg, 420), line(sugar, 550)],
      [heat(82)],
    );
    const german = deriveContents(formula('German', [line(custard, 1900), line(butter, 1600)]));
    expect(german.allergens).toEqual([eggEntry, milkEntry]);
    expect(german.statement).toBe('custard (milk, sugar, egg), butter');
    expect(german.undercookedEgg).toBe(false);
  });

  // 21 CFR 101.4(a)(1): descending by weight; compounds in parentheses, 101.4(b)(2).
  it('are stated heaviest first, one name once, compounds in parentheses', () => {
    const { statement } = deriveContents(
      formula('Ganache', [line(butter, 60), line(chocolate, 100), line(butter, 70)]),
    );
    expect(statement).toBe('butter, dark chocolate (cocoa mass, sugar, soy lecithin)');
  });

  it('take an unknown for a yes, never for a no', () => {
    const sprinkles = ingredient('sprinkles', {
      gelatine: 'unknown',
      animalOrigin: 'unknown',
      cochineal: 'unknown',
      alcohol: 'unknown',
      honey: 'unknown',
      allergens: [entry('milk', [], 'unknown')],
    });
    const contents = deriveContents(formula('Topping', [line(sprinkles, 10)]));
    expect(contents).toMatchObject({
      gelatine: true,
      animalOrigin: true,
      cochineal: true,
      alcohol: true,
      honey: true,
      allergens: [entry('milk', [], 'unknown')],
    });
  });

  it('refuse a formula that comes back to itself', () => {
    const lines: FormulaLine[] = [];
    const outer = formula('Outer', [line(formula('Inner', lines), 1)]);
    lines.push(line(outer, 1));
    expect(() => deriveContents(outer)).toThrow(FormulaCycle);
    expect(() => deriveContents(outer)).toThrow(
      expect.objectContaining({ formulaIds: ['Outer', 'Inner', 'Outer'] }),
    );
  });

  it('never lose an allergen when an ingredient is added', () => {
    const species = fc.subarray(['almond', 'hazelnut', 'walnut']);
    const entries = fc.array(
      fc.record({
        allergen: fc.constantFrom(...allergenIds),
        species,
        state: fc.constantFrom('contains', 'may-contain', 'not-declared', 'unknown'),
      }),
      { maxLength: 5 },
    );
    const heaviest = ['not-declared', 'may-contain', 'unknown', 'contains'];
    fc.assert(
      fc.property(fc.array(entries, { maxLength: 5 }), entries, (ingredients, added) => {
        const lines = ingredients.map((it, i) => line(ingredient(`i${i}`, { allergens: it }), 10));
        const before = deriveContents(formula('Before', lines)).allergens;
        const one = line(ingredient('added', { allergens: added }), 1);
        const after = deriveContents(formula('After', [...lines, one])).allergens;
        for (const old of before) {
          const kept = after.filter(
            (it) =>
              it.allergen === old.allergen &&
              heaviest.indexOf(it.state) >= heaviest.indexOf(old.state),
          );
          expect(kept).not.toHaveLength(0);
          const named = kept.flatMap((it) => it.species);
          const any = kept.some((it) => it.species.length === 0);
          if (!any) expect(named).toEqual(expect.arrayContaining(old.species));
          if (old.species.length === 0) expect(any).toBe(true);
        }
      }),
    );
  });
});

describe('egg', () => {
  // FDA consumer guidance: egg dishes 160 °F (71 °C). Food Code 2022, 3-401.11: pooled eggs
  // 155 °F (68 °C) for 17 seconds.
  it.each([
    [71, 0, true],
    [70, 0, false],
    [68, 17, true],
    [68, 16, false],
    [null, 600, false],
  ])('at %s °C held %i s is cooked: %s', (mixReachesC, holdSeconds, cooked) => {
    expect(cooksEgg({ mixReachesC, holdSeconds })).toBe(cooked);
  });

  it('under hot syrup is not taken as cooked, since only the syrup was measured', () => {
    const italian = formula(
      'Italian',
      [line(rawEgg, 100), line(butter, 260, 1)],
      [heat(null), heat(null)],
    );
    expect(deriveContents(italian).undercookedEgg).toBe(true);
  });

  it('over hot water to its limit is', () => {
    const swiss = formula(
      'Swiss',
      [line(rawEgg, 100), line(butter, 260, 1)],
      [heat(71), heat(null)],
    );
    expect(deriveContents(swiss).undercookedEgg).toBe(false);
  });

  it('that joins after the heat stays raw', () => {
    const mousse = formula(
      'Mousse',
      [line(milk, 100), line(rawEgg, 50, 1)],
      [heat(85), heat(null)],
    );
    expect(deriveContents(mousse).undercookedEgg).toBe(true);
  });

  it('from a carton needs no heat', () => {
    expect(deriveContents(formula('Royal', [line(cartonWhite, 50)])).undercookedEgg).toBe(false);
  });

  it('raw inside a formula that is heated later is cooked with it', () => {
    const mix = formula('Mix', [line(rawEgg, 50)]);
    expect(deriveContents(formula('Baked', [line(mix, 50)], [heat(93)])).undercookedEgg).toBe(
      false,
    );
  });
});

describe('merging', () => {
  it('keeps a warning of another nut beside the one that is in it', () => {
    const hazelnut = entry('tree-nuts', ['hazelnut']);
    const warning = entry('tree-nuts', ['almond', 'hazelnut'], 'may-contain');
    expect(mergeAllergens([[warning], [hazelnut]])).toEqual([
      hazelnut,
      entry('tree-nuts', ['almond', 'hazelnut'], 'may-contain'),
    ]);
  });

  it('drops a warning of what is in it anyway, and what is not declared', () => {
    const lists = [
      [wheat, entry('milk', [], 'may-contain')],
      [milkEntry, entry('egg', [], 'not-declared')],
    ];
    expect(mergeAllergens(lists)).toEqual([wheat, milkEntry]);
  });
});
