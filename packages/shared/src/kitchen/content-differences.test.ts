import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { OrderContents } from '#shared/contracts/contents.ts';
import type { ContainedAllergen } from '#shared/contracts/estimates.ts';
import { allergenIds, allergenState } from '#shared/contracts/vocabulary.ts';
import { contentDifferences } from './content-differences.ts';

const nothing: OrderContents = {
  allergens: [],
  handled: [],
  gelatine: false,
  alcohol: false,
  cochineal: false,
  honey: false,
  animalOrigin: false,
  undercookedEgg: false,
};
const jam = ['Raspberry jam filling'];
const contained = (
  allergen: ContainedAllergen['allergen'],
  changes: Partial<ContainedAllergen> = {},
): ContainedAllergen => ({ allergen, species: [], state: 'contains', parts: jam, ...changes });
const holding = (...allergens: ContainedAllergen[]): OrderContents => ({ ...nothing, allergens });
const told = (before: OrderContents, now: OrderContents) => contentDifferences(before, now, 'US');

describe('what is new in an order', () => {
  it('is told by allergen and part, by how sure the label is', () => {
    expect(told(nothing, holding(contained('soy')))).toEqual([
      'It contains soy now: in Raspberry jam filling.',
    ]);
    expect(told(nothing, holding(contained('soy', { state: 'may-contain' })))).toEqual([
      'A maker’s label warns of soy now: in Raspberry jam filling.',
    ]);
    expect(told(nothing, holding(contained('soy', { state: 'unknown' })))).toEqual([
      'Nobody knows yet whether there is soy in Raspberry jam filling.',
    ]);
  });

  it('is told again where it is in another part or of another kind', () => {
    const almond = contained('tree-nuts', { species: ['almond'] });
    expect(
      told(holding(almond), holding({ ...almond, parts: [...jam, 'Almond sponge'] })),
    ).toHaveLength(1);
    expect(told(holding(almond), holding({ ...almond, species: ['almond', 'pecan'] }))).toEqual([
      'It contains tree nuts (almond, pecan) now: in Raspberry jam filling.',
    ]);
    expect(told(holding(almond), holding({ ...almond, species: [] }))).toHaveLength(1);
  });

  it('counts what no label rules out as there', () => {
    expect(told(nothing, { ...nothing, alcohol: true })).toEqual([
      'There is alcohol in it now, or a label that does not rule it out.',
    ]);
  });

  it('says what is handled nearby, where it is not in it anyway', () => {
    const handled = [{ allergen: 'tree-nuts', species: ['pecan'], state: 'contains' } as const];
    const kitchen = { ...nothing, handled: handled.map((it) => ({ ...it, species: ['pecan'] })) };
    expect(told(nothing, kitchen)).toEqual(['Tree nuts (pecan) are handled in our kitchen now.']);
    expect(
      told(holding(contained('tree-nuts')), { ...kitchen, ...holding(contained('tree-nuts')) }),
    ).toEqual([]);
  });
});

describe('what is not named any more', () => {
  it('is never called gone', () => {
    const [sentence] = told(holding(contained('soy')), nothing);
    expect(sentence).toBe('Soy is not on its labels any more.');
    expect(sentence).not.toMatch(/free|safe|without|no longer/i);
  });

  it('is told by kind where another kind stays', () => {
    const both = contained('tree-nuts', { species: ['almond', 'pecan'] });
    expect(told(holding(both), holding({ ...both, species: ['almond'] }))).toEqual([
      'Tree nuts (pecan) are not on its labels any more.',
    ]);
  });
});

describe('any two contents', () => {
  const entries = fc.uniqueArray(
    fc.record({
      allergen: fc.constantFrom(...allergenIds),
      species: fc.constant<string[]>([]),
      state: fc.constantFrom(...allergenState.options.filter((it) => it !== 'not-declared')),
      parts: fc.constant(jam),
    }),
    { selector: ({ allergen }) => allergen },
  );

  it('have nothing to tell where they are the same, and something for every allergen that is new', () => {
    fc.assert(
      fc.property(entries, entries, (before, now) => {
        expect(told(holding(...before), holding(...before))).toEqual([]);
        const isNew = now.filter(
          (it) => !before.some((old) => old.allergen === it.allergen && old.state === it.state),
        );
        const gone = before.filter((it) => !now.some((one) => one.allergen === it.allergen));
        expect(told(holding(...before), holding(...now))).toHaveLength(isNew.length + gone.length);
      }),
    );
  });
});
