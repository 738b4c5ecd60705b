import { describe, expect, it } from 'vitest';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { noWish } from './judge-part.ts';
import { wholeCakesFor } from './whole-cakes-for.ts';

const holds = (contents: { allergens: readonly { allergen: string; state: string }[] }) =>
  contents.allergens.some((it) => it.allergen === 'egg' && it.state !== 'not-declared');

describe('whole cakes for a table', () => {
  it('hold what must not be there in no part, also not under the fondant', () => {
    const cakes = wholeCakesFor({ ...noWish, allergen: 'egg' }, menuFixture);
    for (const { sponge, filling, coat } of cakes) {
      expect(holds(sponge.contents)).toBe(false);
      expect(holds(filling.contents)).toBe(false);
      expect(holds(coat.covering.contents)).toBe(false);
      expect(coat.style === null || !holds(coat.style.contents)).toBe(true);
    }
    expect(new Set(cakes.map(({ coat }) => `${coat.covering.id} ${coat.style?.id}`)).size).toBe(
      cakes.length,
    );
  });

  it('stand the day: above every buttercream only what lies over it is left', () => {
    const cakes = wholeCakesFor({ ...noWish, warmestC: 30 }, menuFixture);
    expect(cakes.length).toBeGreaterThan(0);
    for (const { coat } of cakes) expect(coat.covering.holdsToC).toBeGreaterThanOrEqual(30);
    expect(cakes.every(({ coat }) => coat.covering.id !== 'buttercream')).toBe(true);
  });

  it('are filled with what stays firm that day, where the menu has such a filling', () => {
    const [first, ...others] = menuFixture.fillings;
    if (first === undefined) throw new Error('a menu has fillings');
    const menu = {
      ...menuFixture,
      fillings: [...others.map((it) => ({ ...it, holdsToC: 24 })), { ...first, holdsToC: 31 }],
    };
    const cakes = wholeCakesFor({ ...noWish, warmestC: 30 }, menu);
    expect(new Set(cakes.map(({ filling }) => filling.id))).toEqual(new Set([first.id]));
  });

  it('are none where one part cannot be had', () => {
    const menu = { ...menuFixture, sponges: [] };
    expect(wholeCakesFor(noWish, menu)).toEqual([]);
  });
});
