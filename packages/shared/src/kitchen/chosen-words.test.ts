import { describe, expect, it } from 'vitest';
import { chosenRows, coatWords } from './chosen-words.ts';
import { coat, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const valueOf = (rows: ReturnType<typeof chosenRows>, label: string): string | undefined =>
  rows.find((it) => it.label === label)?.value;

describe('what was chosen, for reading over', () => {
  it('says once what all tiers share, and by tier where they differ', () => {
    const alike = designWith({ cake: { tiers: [roundTier(8), roundTier(6)] } });
    expect(valueOf(chosenRows(alike, menuFixture), 'Inside')).not.toContain('tier');
    const [first, second] = menuFixture.sponges;
    const unlike = designWith({
      cake: {
        tiers: [
          roundTier(8, { spongeId: first?.id ?? '' }),
          roundTier(6, { spongeId: second?.id ?? '' }),
        ],
      },
    });
    const inside = valueOf(chosenRows(unlike, menuFixture), 'Inside') ?? '';
    // From the top down, as the cake stands in its drawing.
    expect(inside).toMatch(
      new RegExp(`^Top tier: ${second?.name ?? ''}.*Bottom tier: ${first?.name ?? ''}`),
    );
  });

  it('names what is cut in the kitchen, each kind with its number', () => {
    const half = { sizeId: 'half', count: 2, layers: 2, spongeId: 'vanilla', fillingId: null };
    const design = designWith({ cake: { cuttingCakes: [half, { ...half, count: 1, layers: 1 }] } });
    expect(valueOf(chosenRows(design, menuFixture), 'In the kitchen')).toBe(
      '2 × Half sheet, 13 x 18 in, to cut: Vanilla, two layers; Half sheet, 13 x 18 in, to cut: Vanilla, one layer',
    );
    expect(valueOf(chosenRows(designWith({}), menuFixture), 'In the kitchen')).toBeUndefined();
  });

  it('spells the words as they will be piped, with their tier', () => {
    const design = designWith({
      cake: { tiers: [roundTier(10), roundTier(8), roundTier(6)] },
      look: { words: [{ tier: 1, text: ' Anna & Björn ' }] },
    });
    expect(valueOf(chosenRows(design, menuFixture), 'Words on it')).toBe(
      '“Anna & Björn” (middle tier)',
    );
  });

  it('leaves out what was not chosen', () => {
    const rows = chosenRows(designWith({ cake: { tiers: [roundTier(8)] } }), menuFixture);
    expect(rows.every((it) => it.value !== '')).toBe(true);
    expect(valueOf(rows, 'Words on it')).toBeUndefined();
  });

  it('names a colour that has a name and gives the figure of any', () => {
    expect(coatWords(coat({ colour: '#f5d3cf' }), menuFixture)).toContain('shell pink (#f5d3cf)');
    expect(coatWords(coat({ colour: '#123456' }), menuFixture)).toContain('tinted #123456');
  });
});
