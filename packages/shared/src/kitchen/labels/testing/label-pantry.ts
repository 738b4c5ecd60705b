import type { FormulaLine, FormulaNode, IngredientNode } from '../../derive-contents.ts';
import { egg, entry, milk, wheat } from '../../testing/contents-fixture.ts';

/** A shelf and two formulas whose sums are easy in the head. */

export function bought(name: string, rest: Partial<IngredientNode> = {}): IngredientNode {
  return {
    kind: 'ingredient',
    id: name,
    name,
    madeOf: '',
    allergens: [],
    gelatine: 'no',
    alcohol: 'no',
    cochineal: 'no',
    honey: 'no',
    animalOrigin: 'no',
    egg: 'none',
    ...rest,
  };
}

export function lineOf(part: FormulaLine['part'], grams: number): FormulaLine {
  return { part, weightMg: grams * 1000, joinsAtStep: 0 };
}

export function formulaOfLines(
  name: string,
  lines: readonly FormulaLine[],
  yieldPpm = 1_000_000,
): FormulaNode {
  return { kind: 'formula', id: name, name, lines, steps: [], yieldPpm };
}

export const flour = bought('wheat flour', { allergens: [wheat] });
export const sugar = bought('sugar');
export const butter = bought('butter', { madeOf: 'cream', allergens: [milk] });
export const eggs = bought('eggs', { allergens: [egg] });
export const salt = bought('salt');
export const vanilla = bought('vanilla extract', { madeOf: 'water, alcohol, vanilla beans' });
export const chocolate = bought('dark chocolate', {
  madeOf: 'cocoa mass, sugar, soya lecithin',
  allergens: [entry('soy'), entry('tree-nuts', ['hazelnut'], 'may-contain')],
});

/** 1,000 g in, 900 g out of the oven. */
export const sponge = formulaOfLines(
  'Vanilla sponge',
  [lineOf(flour, 400), lineOf(sugar, 300), lineOf(eggs, 200), lineOf(butter, 90), lineOf(salt, 10)],
  900_000,
);

/** 500 g in, 500 g out. */
export const buttercream = formulaOfLines('American', [
  lineOf(butter, 300),
  lineOf(sugar, 190),
  lineOf(vanilla, 10),
]);
