import { describe, expect, it } from 'vitest';
import type { Formula } from '#shared/contracts/pantry.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { version } from '#shared/kitchen/testing/pantry-fixture.ts';
import { pantryFixture } from '#web/testing/pantry.ts';
import { tierNeedG } from './tier-need.ts';

const { parts } = pantryFixture();
const size = { shape: 'round', widthMm: 203, depthMm: 203, heightsMm: [102] } as const;

function need(kind: Formula['kind'], count: number, layers: number, bakeLossPpm = 0) {
  const formula = { id: 'x', kind, name: 'X', currentVersionId: 'x-1', archivedAt: null };
  return tierNeedG(
    formula,
    version('x', [['butter', 100]], { densityGPerMl: 0.5, bakeLossPpm }),
    { count, size: { ...size, heightsMm: [...size.heightsMm] }, heightMm: 102, layers },
    menuFixture,
    parts,
  );
}

// By hand, for a round of 203 by 102 mm: top 32 365.5 mm2, side 65 049.4 mm2.
describe('what tiers take of a formula', () => {
  it('coats side and top 6 mm thick, with an 8 mm bead at the foot and a tenth for the bowl', () => {
    const ml = ((32_365.5 + 65_049.4) * 6) / 1000 + (637.74 * Math.PI * 16) / 1000;
    expect(need('buttercream', 3, 2)).toBeCloseTo(3 * ml * 0.5 * 1.1, 0);
  });

  it('asks of a sponge what leaves the oven: levelling is added back, baking is not', () => {
    const sponge = menuFixture.sponges[0];
    const filling = menuFixture.fillings[0];
    if (sponge === undefined || filling === undefined) throw new Error('The menu has both.');
    const ml = (32_365.5 * (102 - filling.thicknessMm)) / 1000;
    const baked = (ml * 0.5) / (1 - sponge.levellingPpm / 1e6);
    expect(need('sponge', 1, 2, 100_000)).toBeCloseTo(baked, 0);
  });

  it('fills nothing into a single layer, and has no tier for a custard', () => {
    expect(need('filling', 1, 1)).toBe(0);
    expect(need('custard', 1, 2)).toBeNull();
  });
});
