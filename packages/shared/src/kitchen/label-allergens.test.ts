import { describe, expect, it } from 'vitest';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import { labelAllergens } from './label-allergens.ts';

const milk = { allergen: 'milk', species: [], state: 'contains' } as const;
const entries = [{ ...milk, species: [] }];

describe('a label', () => {
  it('that was read says what it says: what it does not name is not declared', () => {
    expect(labelAllergens({ allergens: entries, labelCheckedOn: '2027-05-01' })).toEqual(entries);
    expect(labelAllergens({ allergens: [], labelCheckedOn: '2027-05-01' })).toEqual([]);
  });

  it('that nobody has read leaves everything it does not name unknown, never none', () => {
    const found = labelAllergens({ allergens: entries, labelCheckedOn: null });
    expect(found.map(({ allergen }) => allergen)).toEqual(allergenIds);
    expect(found.filter(({ state }) => state === 'unknown')).toHaveLength(allergenIds.length - 1);
    expect(found.find(({ allergen }) => allergen === 'milk')?.state).toBe('contains');
  });
});
