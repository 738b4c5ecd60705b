import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolveDesign } from './resolve-design.ts';
import { supportsOf } from './supports.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture as menu } from './testing/menu-fixture.ts';

const supports = (tiers: ReturnType<typeof roundTier>[]) =>
  supportsOf(resolveDesign(designWith({ cake: { tiers } }), menu).tiers, menu.kitchen);

describe('boards and dowels', () => {
  it('are none in a cake of one usual tier', () => {
    expect(supports([roundTier(8)])).toMatchObject({ boards: 0, dowels: 0 });
  });

  it('are a board under each upper tier, on dowels as long as the tier they stand in', () => {
    const { boards, dowels, perTier } = supports([roundTier(10), roundTier(8), roundTier(6)]);
    // 203 / 40 and 152 / 40, rounded.
    expect([boards, dowels]).toEqual([2, 5 + 4]);
    expect(perTier[0]).toMatchObject({
      board: null,
      innerBoard: null,
      dowels: [{ bears: 'tier-above', count: 5, lengthMm: 102 }],
    });
    expect(perTier[2]).toMatchObject({ board: { widthMm: 152 }, dowels: [] });
  });

  it('divide a tall tier at half its height, on dowels of their own', () => {
    const { boards, perTier } = supports([roundTier(10, { heightMm: 152 }), roundTier(8)]);
    expect(boards).toBe(2);
    expect(perTier[0]?.innerBoard?.atMm).toBe(76);
    expect(perTier[0]?.dowels).toMatchObject([
      { bears: 'inner-board', count: 6, lengthMm: 76 },
      { bears: 'tier-above', count: 5, lengthMm: 76 },
    ]);
  });

  it('leave foam alone: a dummy bears what stands on it', () => {
    const dummy = { real: false, spongeId: null, fillingId: null };
    const { boards, dowels } = supports([roundTier(10, { ...dummy, heightMm: 152 }), roundTier(8)]);
    expect([boards, dowels]).toEqual([1, 0]);
  });

  it('stand under what they bear', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const { tiers } = resolveDesign(design, menu);
        for (const { tier, dowels } of supportsOf(tiers, menu.kitchen).perTier) {
          for (const set of dowels) {
            const borne = tiers[set.bears === 'tier-above' ? tier + 1 : tier]?.block;
            expect(set.at).toHaveLength(set.count);
            for (const { x, y } of set.at) {
              expect(Math.abs(x)).toBeLessThan((borne?.widthMm ?? 0) / 2);
              expect(Math.abs(y)).toBeLessThan((borne?.depthMm ?? 0) / 2);
            }
          }
        }
      }),
    );
  });
});
