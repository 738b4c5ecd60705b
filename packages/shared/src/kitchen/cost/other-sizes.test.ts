import { describe, expect, it } from 'vitest';
import { designFixture, designWith, roundTier } from '../testing/design-fixture.ts';
import { menuFixture } from '../testing/menu-fixture.ts';
import { otherSizes } from './other-sizes.ts';

describe('another size', () => {
  it('is the next one that still stacks', () => {
    // Of 10, 8 and 6 in: the fixture bakes 9 and 12, 7 and 9, 5 and 7; a step is 50 mm.
    const labels = otherSizes(
      { ...designFixture, guests: { ...designFixture.guests, headCount: 10 } },
      menuFixture,
    ).map((it) => it.label);
    expect(labels).toEqual([
      'Bottom tier 12 in / 30 cm instead of 10 in / 25 cm',
      'Top tier 5 in / 13 cm instead of 6 in / 15 cm',
    ]);
  });

  it('feeds everybody there is', () => {
    const one = designWith({ guests: { headCount: 70 }, cake: { tiers: [roundTier(10)] } });
    expect(otherSizes(one, menuFixture).map((it) => it.label)).toEqual([]);
    const larger = otherSizes(
      designWith({ guests: { headCount: 40 }, cake: { tiers: [roundTier(10)] } }),
      menuFixture,
    );
    expect(larger.map((it) => it.label)).toEqual([
      'The tier 12 in / 30 cm instead of 10 in / 25 cm',
    ]);
  });
});
