import { expect, it } from 'vitest';
import { supportRows } from './support-words.ts';
import { designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

it('says what stands under and in each tier, from the board up', () => {
  const tiers = [
    roundTier(10, { heightMm: 152 }),
    roundTier(8, { shape: 'square' }),
    roundTier(6, { real: false, spongeId: null, fillingId: null }),
  ];
  const { cake } = designWith({ cake: { tiers } });
  if (cake === null) throw new Error('no cake');
  expect(supportRows(cake, menuFixture)).toEqual([
    { name: 'Cake board', lines: ['Round, 14 in / 35 cm.'] },
    {
      name: 'Bottom tier',
      lines: [
        'A board inside, 3 in / 7.5 cm above its foot.',
        '6 dowels of 3 in / 7.5 cm under the board inside.',
        '5 dowels of 3 in / 7.5 cm under the tier above.',
      ],
    },
    {
      name: 'Middle tier',
      lines: [
        'On a card of its own size, square, 8 in / 20 cm.',
        '4 dowels of 4 in / 10 cm under the tier above.',
      ],
    },
    { name: 'Top tier', lines: ['On a card of its own size, round, 6 in / 15 cm.'] },
  ]);
});
