import { describe, expect, it } from 'vitest';
import { bookOf, shelf } from '#shared/kitchen/testing/pantry-fixture.ts';
import { indexPantry } from './pantry-index.ts';
import { readFormulaLine } from './read-formula-text.ts';

const index = indexPantry(bookOf(shelf, []));
const findings = (text: string) => readFormulaLine(text, index).findings;

describe('a line that carries a measure and a weight', () => {
  // Each of these figures is common practice, no source.
  it.each([
    '12 large egg yolks (200 g)',
    '3/4 cup yolks, about 200 g',
    '1 14-oz can condensed milk, 396 g',
    '1 can (14 oz, 396 g) condensed milk',
    '1/3 cup cornstarch, about 40 g',
    '1 1/2 cups milk, about 340 g',
    '5 sticks (2 1/2 cups, 570 g) butter',
    '1 lb butter (450 g)',
  ])('passes: %s', (text) => {
    expect(findings(text)).toEqual([]);
    expect(readFormulaLine(text, index).problem).toBeNull();
  });

  it('passes three quarters of a cup of whites at 180 g, once it is said which whites', () => {
    const part = { kind: 'ingredient', ingredientId: 'whites' } as const;
    const line = readFormulaLine('3/4 cup egg whites, 180 g', index, { part });
    expect(line.amounts[0]?.grams).toBeCloseTo(182.25, 9);
    expect(line.findings).toEqual([]);
  });

  // Both have been seen written down (common practice, no source).
  it('flags a pound of butter at 480 g, and says both ways to put it right', () => {
    const [found] = findings('1 lb butter (480 g)');
    expect(found).toMatchObject({
      measure: '1 lb',
      weight: '480 g',
      writtenG: 480,
      measureFor: '1 lb 1 oz',
    });
    expect(found?.measureG).toBeCloseTo(453.59, 2);
    expect(found?.offPpm).toBe(58_219);
    expect(found?.message).toBe(
      'By its measure (1 lb) this is 454 g; 480 g is 6 % more. ' +
        'Write 454 g if the measure is right; 1 lb 1 oz if the weight is right.',
    );
  });

  it('flags a cup and a half of sugar at 250 g', () => {
    const [found] = findings('1 1/2 cups of sugar, 250 g');
    expect(found).toMatchObject({ measureG: 300, writtenG: 250, measureFor: '1¼ cups' });
    expect(found?.message).toContain('17 % less');
  });

  it.each([
    // 10 % of a volume: 200 g of sugar to the cup.
    ['1 cup granulated sugar, 220 g', 0],
    ['1 cup granulated sugar, 221 g', 1],
    ['1 cup granulated sugar, 180 g', 0],
    ['1 cup granulated sugar, 179 g', 1],
    // 2 % of a stick, a can, a weight.
    ['1 stick butter, 115 g', 0],
    ['1 stick butter, 116 g', 1],
    ['1 can condensed milk, 389 g', 1],
    ['1 oz butter, 28 g', 0],
    ['1 oz butter, 30 g', 1],
    ['1 kg butter, 2.2 lb', 0],
    ['1 kg butter, 2 lb', 1],
    // Eggs grow.
    ['3 eggs, 160 g', 0],
    ['3 eggs, 170 g', 1],
    // A range agrees where any of it does.
    ['1 to 1 1/2 cups milk, 340 g', 0],
    ['2 to 3 cups milk, 340 g', 1],
    // Two that both disagree.
    ['5 sticks (3 cups, 500 g) butter', 2],
    // Nothing to compare with.
    ['1 cup granulated sugar', 0],
    ['1 tbsp granulated sugar, 40 g', 0],
    ['1 cup marzipan, 40 g', 0],
  ])('%s: %s flagged', (text, count) => {
    expect(findings(text)).toHaveLength(count);
  });

  it('compares sticks with cups where no grams are written', () => {
    expect(findings('5 sticks (2 1/2 cups) butter')).toEqual([]);
    expect(findings('5 sticks (3 cups) butter')).toHaveLength(1);
  });
});
