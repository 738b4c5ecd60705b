import { describe, expect, it } from 'vitest';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { emptyOrder } from '../draft/empty-order.ts';
import { startWith } from './start-with.ts';

const begin = (asked: Record<string, string>, values = emptyOrder()) =>
  startWith(`#${new URLSearchParams(asked).toString()}`, values, menuFixture);
const cake = { sponge: 'chocolate', filling: 'raspberry', covering: 'buttercream' };

describe('an order begun with a cake from the menu', () => {
  it('has that sponge, filling and coat, and the table it was looked up for', () => {
    const begun = begin({ ...cake, style: 'italian', allergen: 'egg', warmest: '30' });
    expect(begun?.cake.tiers).toEqual([
      expect.objectContaining({ spongeId: 'chocolate', fillingId: 'raspberry' }),
    ]);
    expect(begun?.cake.coating).toMatchObject({ covering: 'buttercream', style: 'italian' });
    expect(begun?.setting.warmestC).toBe(30);
    expect(begun?.day.allergies).toEqual([
      { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 },
    ]);
  });

  it('declares nothing twice', () => {
    const first = begin({ ...cake, style: 'italian', allergen: 'egg' });
    const again = begin({ ...cake, style: 'swiss', allergen: 'egg' }, first ?? emptyOrder());
    expect(again?.day.allergies).toHaveLength(1);
  });

  it('is begun as ever where the link says nothing, or something the menu does not have', () => {
    expect(begin({})).toBeNull();
    expect(begin({ ...cake, style: 'italian', sponge: 'sawdust' })).toBeNull();
    expect(begin({ ...cake, covering: 'ganache', style: 'italian' })).toBeNull();
    expect(begin(cake)).toBeNull();
  });
});
