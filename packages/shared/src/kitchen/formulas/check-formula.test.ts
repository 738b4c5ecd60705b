import { describe, expect, it } from 'vitest';
import {
  bookOf,
  bought,
  shelf,
  version,
  type LineRow,
} from '#shared/kitchen/testing/pantry-fixture.ts';
import { checkFormula, innermostFirst, requireSound } from './check-formula.ts';
import { FormulaFault } from './formula-problem.ts';
import { currentVersion, indexPantry, resolvePart } from './pantry-index.ts';

const custard = version('custard', [
  ['milk', 1000],
  ['sugar', 550],
]);
const german = version('german', [
  ['@custard-1', 1500],
  ['butter', 1600],
]);
const index = indexPantry(
  bookOf(shelf, [custard, german], { custard: 'Custard', german: 'German' }),
);

describe('an index of the pantry', () => {
  it('is made once for a pantry', () => {
    const book = bookOf(shelf, []);
    expect(indexPantry(book)).toBe(indexPantry(book));
  });

  it('finds parts, names them, and says what is missing', () => {
    expect(resolvePart(index, { kind: 'ingredient', ingredientId: 'milk' }).name).toBe(
      'Whole milk',
    );
    expect(resolvePart(index, { kind: 'formula', formulaVersionId: 'custard-1' }).name).toBe(
      'Custard',
    );
    expect(resolvePart(index, { kind: 'ingredient', ingredientId: 'gone' }).kind).toBe('missing');
    expect(resolvePart(index, { kind: 'formula', formulaVersionId: 'gone' }).kind).toBe('missing');
    expect(currentVersion(index, 'custard')).toBe(custard);
    expect(currentVersion(index, 'gone')).toBeNull();
  });
});

describe('a formula', () => {
  it('is sound with everything there', () => {
    expect(checkFormula(german, index)).toEqual([]);
    expect(innermostFirst(german.lines, index)).toEqual([custard]);
  });

  it.each([
    [0, 'not-a-weight'],
    [-5, 'not-a-weight'],
    [Number.NaN, 'not-a-weight'],
    [Number.POSITIVE_INFINITY, 'not-a-weight'],
    [1_000_001, 'too-heavy'],
  ])('with %s g on a line is refused at that line', (grams, code) => {
    const draft = version('new', [
      ['milk', 100],
      ['butter', grams],
    ]);
    expect(checkFormula(draft, index)).toEqual([expect.objectContaining({ code, line: 1 })]);
    expect(checkFormula(draft, index)[0]?.message).toMatch(/^Line 2, Unsalted butter, 82 % fat: /);
  });

  it.each([
    [1_000_001, 'yield-over-100'],
    [0, 'no-yield'],
    [-1, 'no-yield'],
    [Number.NaN, 'no-yield'],
  ])('of which %s ppm are left is refused', (yieldPpm, code) => {
    const draft = version('new', [['milk', 100]], { yieldPpm });
    expect(checkFormula(draft, index)).toEqual([expect.objectContaining({ code, line: null })]);
  });

  it('without lines is refused', () => {
    expect(checkFormula(version('new', []), index)[0]?.code).toBe('no-lines');
  });

  it('names the line whose part is not in the pantry, at any depth', () => {
    const broken = version('broken', [
      ['milk', 1],
      ['gone', 5],
    ]);
    const outer = version('outer', [['@broken-1', 5]]);
    const pantry = indexPantry(
      bookOf(shelf, [broken, outer], { broken: 'Broken', outer: 'Outer' }),
    );
    expect(checkFormula(broken, pantry)[0]).toMatchObject({
      code: 'missing-part',
      line: 1,
      path: [],
    });
    expect(checkFormula(version('top', [['@outer-1', 1]]), pantry)).toEqual([
      {
        code: 'missing-part',
        line: 0,
        path: ['Outer', 'Broken'],
        message: 'Line 1, Outer: inside Outer > Broken, line 2 is not in the pantry.',
      },
    ]);
  });
});

describe('a formula that uses itself', () => {
  it('is refused with the way that leads back, in whatever version', () => {
    // The draft is of the custard; German holds its first version.
    const draft = {
      ...version('custard', [
        ['@german-1', 10],
        ['milk', 5],
      ]),
      n: 2,
    };
    expect(checkFormula(draft, index)).toEqual([
      expect.objectContaining({
        code: 'uses-itself',
        line: 0,
        path: ['Custard', 'German', 'Custard'],
      }),
    ]);
    expect(() => requireSound(draft, index)).toThrow(FormulaFault);
    expect(() => requireSound(draft, index)).toThrow('Custard > German > Custard');
  });

  it('is refused where kept versions are already in a circle', () => {
    const a = version('a', [['@b-1', 1]]);
    const b = version('b', [['@a-1', 1]]);
    const pantry = indexPantry(bookOf(shelf, [a, b]));
    for (const it of [a, b, version('c', [['@a-1', 1]])]) {
      expect(checkFormula(it, pantry)[0]?.code).toBe('uses-itself');
    }
  });

  it('is told apart from one that uses another twice', () => {
    const twice = version('twice', [
      ['@custard-1', 10],
      ['@german-1', 10],
    ]);
    expect(checkFormula(twice, index)).toEqual([]);
    expect(innermostFirst(twice.lines, index)).toEqual([custard, german]);
  });
});

describe('formulas in formulas', () => {
  const depth = 100;
  /** Each level holds the one below on two lines and a little salt: 2^100 ways down. */
  const levels = Array.from({ length: depth }, (_, n) => {
    const lines: LineRow[] =
      n === 0
        ? [['milk', 10]]
        : [
            [`@level${n - 1}-1`, 6],
            [`@level${n - 1}-1`, 3],
            ['salt', 1],
          ];
    return version(`level${n}`, lines);
  });

  it('may be a hundred levels deep, each held twice', () => {
    const pantry = indexPantry(bookOf(shelf, levels));
    const top = version('top', [[`@level${depth - 1}-1`, 1]]);
    expect(checkFormula(top, pantry)).toEqual([]);
    expect(innermostFirst(top.lines, pantry)).toEqual(levels);
  });

  it('may be ten thousand levels deep without running out of stack', () => {
    const deep = Array.from({ length: 10_000 }, (_, n) =>
      version(`d${n}`, [n === 0 ? ['milk', 1] : [`@d${n - 1}-1`, 1]]),
    );
    const pantry = indexPantry(bookOf([bought('milk', 'Milk')], deep));
    expect(
      innermostFirst(
        [
          {
            part: { kind: 'formula', formulaVersionId: 'd9999-1' },
            grams: 1,
            asTyped: null,
            step: 0,
          },
        ],
        pantry,
      ),
    ).toHaveLength(10_000);
  });
});
