import { describe, expect, it } from 'vitest';
import { ingredientDraft } from '#shared/contracts/pantry.ts';
import { shelf } from '#shared/kitchen/testing/pantry-fixture.ts';
import { differingFields, draftOf, formOf, joinDrafts, typedDraft } from './ingredient-form.ts';

const milk = shelf.find((it) => it.id === 'milk');
if (milk === undefined) throw new Error('The shelf has milk.');
const base = draftOf(milk);

describe('the form of an ingredient', () => {
  it('says of an untouched product exactly what is kept of it', () => {
    for (const it of shelf) {
      const draft = draftOf(it);
      expect(ingredientDraft.parse(typedDraft(formOf(draft, 'USD'), 'USD'))).toEqual(draft);
    }
  });

  it('takes an empty price for unknown and half of one for a mistake', () => {
    const form = formOf(base, 'USD');
    const parse = (packGrams: string, packPrice: string) =>
      ingredientDraft.safeParse(typedDraft({ ...form, packGrams, packPrice }, 'USD'));
    expect(parse('', '').data?.pack).toBeNull();
    expect(parse('454 g', '').error?.issues[0]).toMatchObject({
      path: ['pack', 'priceMinor'],
      message: 'Write what the pack costs.',
    });
  });
});

describe('two changes of one ingredient', () => {
  const theirs = { ...base, brand: 'Larkfield', roundingG: 5 };
  const mine = { ...base, labelContents: 'milk, vitamin D3', roundingG: 1.5 };

  it('stand together, and mine where both changed the same', () => {
    expect(joinDrafts(base, theirs, mine)).toEqual({
      ...base,
      brand: 'Larkfield',
      labelContents: 'milk, vitamin D3',
      roundingG: 1.5,
    });
  });

  it('tells which fields differ', () => {
    expect(differingFields(theirs, mine)).toEqual(['brand', 'labelContents', 'roundingG']);
  });
});
