import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { evaluateFormula } from '#shared/kitchen/formulas/evaluate-formula.ts';
import { explodeFormula } from '#shared/kitchen/formulas/explode-formula.ts';
import {
  currentVersion,
  indexPantry,
  type PantryIndex,
} from '#shared/kitchen/formulas/pantry-index.ts';
import { formatLine, readFormulaLine } from '#shared/kitchen/formulas/read-formula-text.ts';
import { openTestDatabase, type TestDatabase } from '#api/testing/fresh-database.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { currentPantry, type WholePantry } from './load-pantry.queries.ts';

let test: TestDatabase;
let pantry: WholePantry;
let index: PantryIndex;
beforeAll(async () => {
  test = await openTestDatabase({ seeded: seededStudio });
  pantry = await currentPantry();
  index = indexPantry(pantry);
});
afterAll(() => test.close());

function versionOf(formulaId: string): FormulaVersion {
  const found = currentVersion(index, formulaId);
  if (found === null) throw new Error(`no formula ${formulaId}`);
  return found;
}

describe('the house formulas', () => {
  it('are sound, priced, and say what they contain', () => {
    for (const { id, name } of pantry.formulas) {
      const draft = versionOf(id);
      const all = evaluateFormula({ draft, formulaId: id, name, percentOf: null }, index);
      expect([name, all.problems]).toEqual([name, []]);
      expect([name, all.cost?.unpriced]).toEqual([name, []]);
      expect(all.contents?.statement).not.toBe('');
      expect(all.contents?.allergens.some((it) => it.state === 'unknown')).toBe(false);
    }
  });

  // The studio's own, by weight per part of the first ingredient, as its definition gives them;
  // the German one through its custard, whose loss is added back.
  it.each([
    [
      'american',
      { butter: 1, 'powdered-sugar': 1.65, 'heavy-cream': 0.1, vanilla: 0.02, salt: 0.004 },
    ],
    [
      'swiss',
      { 'egg-white': 1, 'granulated-sugar': 1.95, butter: 2.7, vanilla: 0.06, salt: 0.015 },
    ],
    [
      'italian',
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
      'french',
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
      'german',
      {
        'whole-milk': 1,
        'granulated-sugar': 0.55,
        'egg-whole': 0.42,
        cornstarch: 0.11,
        butter: 1.6,
        vanilla: 0.03,
        salt: 0.006,
      },
    ],
    ['russian', { butter: 1, 'condensed-milk': 1.6, vanilla: 0.02, salt: 0.006 }],
  ])(
    'have the %s buttercream in its proportions',
    (style, parts: Readonly<Record<string, number>>) => {
      const { ingredients } = explodeFormula(versionOf(`${style}-buttercream`), index, 1000);
      expect([...ingredients.keys()].toSorted()).toEqual(Object.keys(parts).toSorted());
      const [first = ''] = Object.keys(parts);
      for (const [id, part] of Object.entries(parts)) {
        const share = (ingredients.get(id) ?? 0) / (ingredients.get(first) ?? 1);
        expect(share).toBeCloseTo(part, 3);
      }
    },
  );

  it('and all that is bought are read back by name', () => {
    const named = [
      ...pantry.ingredients.map((it) => ({ id: it.id, name: it.name })),
      ...pantry.formulas.map((it) => ({ id: it.currentVersionId, name: it.name })),
    ];
    for (const { id, name } of named) {
      const { match, candidates, grams } = readFormulaLine(formatLine(123.4, name), index);
      expect(grams).toBe(123.4);
      const found = match === null ? candidates : [match];
      // What is bought and made under one name is asked about.
      const ids = found.map(({ part }) =>
        part.kind === 'ingredient' ? part.ingredientId : part.formulaVersionId,
      );
      expect([name, ids]).toEqual([name, expect.arrayContaining([id])]);
      const alone = named.filter((it) => it.name === name).length === 1;
      expect([name, match !== null]).toEqual([name, alone]);
    }
  });
});
