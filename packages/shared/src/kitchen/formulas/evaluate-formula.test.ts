import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FormulaStep } from '#shared/contracts/pantry.ts';
import {
  bookOf,
  bought,
  shelf,
  version,
  type LineRow,
} from '#shared/kitchen/testing/pantry-fixture.ts';
import { evaluateFormula } from './evaluate-formula.ts';
import { formulaContents } from './formula-contents.ts';
import { formulaCost } from './formula-cost.ts';
import { indexPantry } from './pantry-index.ts';
import { percentsOf } from './percents.ts';
import { formulaTotals } from './totals.ts';

const step = (limitC: number | null): FormulaStep => ({
  text: 'Cook',
  activeMinutes: 5,
  waitingMinutes: 0,
  resource: 'bench',
  critical: limitC === null ? null : { limitC, seconds: null, note: '' },
  syrupTargetC: null,
});
const custard = version(
  'custard',
  [
    ['milk', 1000],
    ['sugar', 550],
    ['eggs', 420],
    ['cornstarch', 110],
  ],
  { yieldPpm: 950_000, steps: [step(71)] },
);
const unread = bought('sprinkles', 'Sprinkles', { labelCheckedOn: null });
const index = indexPantry(bookOf([...shelf, unread], [custard], { custard: 'Custard' }));

const asked = (lines: readonly LineRow[], given = {}) => ({
  draft: version('new', lines, given),
  formulaId: null,
  name: 'New',
  percentOf: null,
});

describe('a formula’s weights', () => {
  it('are what goes in, what comes out, and each line’s part', () => {
    const totals = formulaTotals({ ...custard, densityGPerMl: 1.08 });
    expect(totals.inG).toBe(2080);
    expect(totals.outG).toBe(1976);
    expect(totals.outMl).toBeCloseTo(1976 / 1.08, 9);
    expect(totals.shares[0]).toBeCloseTo(1000 / 2080, 12);
    expect(formulaTotals({ lines: [], yieldPpm: 1_000_000 })).toMatchObject({
      inG: 0,
      outMl: null,
    });
  });

  it('are percents of flour, of butter, or of any line', () => {
    const cake = version('cake', [
      ['flour', 400],
      ['sugar', 500],
      ['butter', 250],
      ['flour', 100],
    ]);
    expect(percentsOf(cake, index, { of: 'flour' })).toEqual({
      baseG: 500,
      lines: [80, 100, 50, 20],
      total: 250,
    });
    expect(percentsOf(cake, index, { of: 'butter' })?.lines).toEqual([160, 200, 100, 40]);
    expect(percentsOf(cake, index, { of: 'line', line: 1 })?.lines).toEqual([80, 100, 50, 20]);
    expect(percentsOf(custard, index, { of: 'flour' })).toBeNull();
    expect(percentsOf(custard, index, { of: 'line', line: 9 })).toBeNull();
  });
});

describe('a formula’s cost', () => {
  it('is its ingredients at pack prices, through a formula inside', () => {
    // 100 g of custard take 100 / 0.95 x (1000, 550, 420, 110) / 2080 g of what goes in.
    const perG =
      (479 / 3904) * 1000 + (1540 / 11_340) * 550 + (525 / 600) * 420 + (560 / 1814) * 110;
    const hundred = (perG / 2080 / 0.95) * 100;
    const cost = formulaCost(
      version('new', [
        ['@custard-1', 100],
        ['butter', 454],
      ]),
      index,
    );
    expect(cost.knownMinor).toBeCloseTo(hundred + 545, 9);
    expect(cost.lines[1]).toBeCloseTo(545, 9);
    expect(cost.perKgOutMinor).toBeCloseTo(((hundred + 545) / 554) * 1000, 9);
  });

  it('is unknown with an unknown price, never nothing', () => {
    const cost = formulaCost(
      version('new', [
        ['honey', 100],
        ['butter', 454],
      ]),
      index,
    );
    expect(cost.unpriced.map((it) => it.name)).toEqual(['Wildflower honey']);
    expect(cost.lines).toEqual([null, expect.closeTo(545, 9)]);
    expect(cost.perKgOutMinor).toBeNull();
    const inner = version('inner', [['honey', 1]]);
    const pantry = indexPantry(bookOf(shelf, [inner]));
    const outer = version('outer', [['@inner-1', 5]]);
    expect(formulaCost(outer, pantry)).toMatchObject({ lines: [null], perKgOutMinor: null });
  });
});

describe('what a formula contains', () => {
  it('comes through formulas, heat and all', () => {
    const contents = formulaContents(
      version('new', [
        ['@custard-1', 100],
        ['flour', 50],
      ]),
      index,
      'New',
    );
    expect(contents.allergens.map((it) => it.allergen)).toEqual(['gluten-cereals', 'egg', 'milk']);
    expect(contents.undercookedEgg).toBe(false);
    expect(contents.statement).toBe('custard (milk, sugar, egg, cornstarch), wheat flour');
  });

  it('is unknown where no label was read, never none', () => {
    const { allergens } = formulaContents(version('new', [['sprinkles', 1]]), index, 'New');
    expect(allergens).toHaveLength(14);
    expect(allergens.every((it) => it.state === 'unknown')).toBe(true);
  });

  it('loses no allergen when a line is added', () => {
    const ids = shelf.map((it) => it.id);
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom(...ids), { minLength: 1, maxLength: 8 }),
        fc.constantFrom(...ids),
        (some, another) => {
          const rows = some.map((it): LineRow => [it, 10]);
          const known = (lines: readonly LineRow[]) =>
            formulaContents(version('new', lines), index, 'New').allergens.map((it) => it.allergen);
          expect(known([...rows, [another, 1]])).toEqual(expect.arrayContaining(known(rows)));
        },
      ),
    );
  });

  it('is told of formulas a hundred deep, each held twice, in a statement that ends', () => {
    const levels = Array.from({ length: 100 }, (_, n) => {
      const [left, right] = [`@a${n - 1}-1`, `@b${n - 1}-1`];
      const lines: LineRow[] =
        n === 0
          ? [
              ['milk', 3],
              ['flour', 2],
            ]
          : [
              [left, 3],
              [right, 2],
            ];
      return [version(`a${n}`, lines), version(`b${n}`, lines)];
    }).flat();
    const pantry = indexPantry(bookOf(shelf, levels));
    const top = version('top', [['@a99-1', 5]]);
    const contents = formulaContents(top, pantry, 'Top');
    expect(contents.allergens.map((it) => it.allergen)).toEqual(['gluten-cereals', 'milk']);
    expect(contents.statement).toContain('milk');
    expect(contents.statement.length).toBeLessThan(9000);
  });
});

describe('an editor’s draft', () => {
  it('is told all at once', () => {
    const all = evaluateFormula(
      {
        ...asked([
          ['butter', 454],
          ['powdered-sugar', 750],
          ['salt', 3],
        ]),
        percentOf: { of: 'butter' },
      },
      index,
    );
    expect(all.problems).toEqual([]);
    expect(all.totals.inG).toBe(1207);
    expect(all.household).toEqual(['4 sticks', '6¼ cups', '½ tsp']);
    expect(all.percents?.lines[1]).toBeCloseTo(165.2, 1);
    expect(all.cost?.knownMinor).toBeCloseTo(545 + (1880 / 11_340) * 750 + (240 / 1360) * 3, 6);
    expect(all.contents?.allergens.map((it) => it.allergen)).toEqual(['milk']);
  });

  it('claims nothing of a line that cannot be reckoned with, and never throws', () => {
    const all = evaluateFormula(
      asked([
        ['butter', 454],
        ['gone', 5],
      ]),
      index,
    );
    expect(all.problems).toHaveLength(1);
    expect(all.cost).toBeNull();
    expect(all.contents).toBeNull();
    expect(all.household).toEqual(['4 sticks', null]);
    const own = { ...asked([['@custard-1', 5]]), formulaId: 'custard' };
    expect(evaluateFormula(own, index).problems[0]?.code).toBe('uses-itself');
    expect(evaluateFormula(asked([]), index).problems[0]?.code).toBe('no-lines');
    expect(evaluateFormula(asked([['milk', Number.NaN]]), index).problems).toHaveLength(1);
  });
});
