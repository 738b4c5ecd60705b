import { describe, expect, it } from 'vitest';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { AllergenId, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { egg, entry, milk, soy, wheat } from '../testing/contents-fixture.ts';
import { allergenLines, labelGaps, type KitchenWord } from './allergen-lines.ts';
import { bought, formulaOfLines, lineOf } from './testing/label-pantry.ts';
import { weighIngredients } from './weigh-ingredients.ts';

const quiet: KitchenWord = { handles: [], assessed: new Set() };

function weighed(...allergens: readonly (readonly AllergenEntry[])[]) {
  const lines = allergens.map((it, at) => lineOf(bought(`thing ${at}`, { allergens: it }), 10));
  return weighIngredients([{ name: 'Mix', node: formulaOfLines('Mix', lines), finishedG: 10 }]);
}

const linesOf = (
  allergens: readonly AllergenEntry[],
  region: LabelRegion,
  kitchen: KitchenWord = quiet,
  declared: readonly AllergenId[] = [],
) => allergenLines(weighed(allergens), kitchen, region, declared);

describe('the Contains line', () => {
  // 21 USC 343(w)(1)(A): the name of the food source; (2): tree nuts by their kind.
  it('names the nine sources, nuts by kind, spelt as wheat', () => {
    const spelt = entry('gluten-cereals', ['spelt']);
    const nuts = entry('tree-nuts', ['hazelnut', 'almond']);
    expect(linesOf([milk, egg, spelt, nuts, soy], 'US').contains).toBe(
      'Contains: Milk, Egg, Tree Nuts (Almond, Hazelnut), Wheat, Soy.',
    );
  });

  it('leaves out what the nine do not name, and says nothing where none is in it', () => {
    const others = [entry('gluten-cereals', ['rye']), entry('celery'), entry('sulphites')];
    expect(linesOf([...others, milk], 'US').contains).toBe('Contains: Milk.');
    expect(linesOf(others, 'US').contains).toBeNull();
    // Coconut is none of FDA's twelve tree nuts (guidance of January 2025).
    expect(linesOf([entry('tree-nuts', ['coconut'])], 'US').contains).toBeNull();
  });

  it('names what lies against the cake and is taken off before eating', () => {
    const lines = allergenLines(weighed([milk]), quiet, 'US', [], [egg]);
    expect(lines.contains).toBe('Contains: Milk, Egg.');
  });

  it('is not printed in the EU and the UK, where the list says it', () => {
    for (const region of ['EU', 'UK'] as const) {
      expect(linesOf([milk], region)).toMatchObject({
        contains: null,
        signpost: 'For allergens, see the ingredients in bold.',
      });
    }
  });
});

describe('what is unknown', () => {
  it('is printed as not known and is a gap, by the product it is about', () => {
    const unknown = [entry('soy', [], 'unknown'), entry('milk', [], 'unknown')];
    expect(linesOf(unknown, 'US').notKnown).toEqual([
      'Not known: whether thing 0 contains soy and milk.',
    ]);
    expect(labelGaps(weighed(unknown), 'US', [])).toEqual([
      { kind: 'unknown', ingredientId: 'thing 0', name: 'thing 0', allergens: ['soy', 'milk'] },
    ]);
  });

  it('counts beyond the region’s list where a guest must keep from it', () => {
    const sulphites = [entry('sulphites', [], 'unknown')];
    expect(labelGaps(weighed(sulphites), 'US', [])).toEqual([]);
    expect(labelGaps(weighed(sulphites), 'US', ['sulphites'])).toHaveLength(1);
    expect(labelGaps(weighed(sulphites), 'EU', [])).toHaveLength(1);
    expect(linesOf(sulphites, 'US', quiet, ['sulphites']).notKnown).toHaveLength(1);
  });

  it('includes the kind of a nut, a cereal and, in the US, a fish', () => {
    const kindless = weighed([entry('tree-nuts'), entry('fish'), wheat, milk]);
    expect(labelGaps(kindless, 'US', [])).toEqual([
      expect.objectContaining({ kind: 'species', allergens: ['tree-nuts', 'fish'] }),
    ]);
    expect(labelGaps(kindless, 'EU', [])).toEqual([
      expect.objectContaining({ kind: 'species', allergens: ['tree-nuts'] }),
    ]);
  });
});

describe('may contain', () => {
  const handles = [
    entry('tree-nuts', ['almond', 'hazelnut']),
    entry('sesame'),
    entry('peanut'),
    milk,
  ];

  // FSA guidance on precautionary labelling (2023): only after a risk assessment.
  it('is said only where the owner’s assessment is noted; the rest is what the kitchen handles', () => {
    const lines = linesOf([milk], 'UK', { handles, assessed: new Set<AllergenId>(['tree-nuts']) });
    expect(lines.mayContain).toBe('May contain nuts (almond, hazelnut).');
    expect(lines.kitchen).toBe('Made in a kitchen that also handles peanut and sesame.');
  });

  it('speaks of the other kinds of a nut that is in it', () => {
    const hazelnut = entry('tree-nuts', ['hazelnut']);
    const lines = linesOf([hazelnut], 'UK', {
      handles,
      assessed: new Set<AllergenId>(['tree-nuts', 'peanut']),
    });
    expect(lines.mayContain).toBe('May contain peanut and nuts (almond).');
  });

  it('passes on the makers’ warnings as theirs', () => {
    const warned = [milk, entry('peanut', [], 'may-contain'), entry('milk', [], 'may-contain')];
    expect(linesOf(warned, 'US').makersWarn).toBe('Makers of our ingredients warn of peanut.');
    expect(linesOf([milk], 'US').makersWarn).toBeNull();
  });
});
