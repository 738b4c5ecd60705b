import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { designWith, roundTier } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { CuttingPlan } from './cutting-plan.tsx';

describe('CuttingPlan', () => {
  it('draws each piece from the top down, and says the cuts to those who cannot see them', () => {
    const design = designWith({
      cake: {
        tiers: [roundTier(10), roundTier(6, { real: false, spongeId: null, fillingId: null })],
        cuttingCakes: [
          { sizeId: 'half', count: 2, layers: 2, spongeId: 'vanilla', fillingId: 'raspberry' },
        ],
      },
    });
    render(<CuttingPlan design={design} menu={menuFixture} />);
    expect(screen.getAllByRole('heading').map((it) => it.textContent)).toEqual([
      'Top tier for show only',
      'Bottom tier 39 portions',
      'Cutting cake: Half sheet, 13 x 18 in 2 × 54 portions',
    ]);
    const bottom = screen.getByRole('img', { name: 'Bottom tier, cut from above: 39 portions' });
    expect(bottom).toHaveAccessibleDescription(/slice that ring into 25 pieces/);
    // Two circles between rings, 25 and 13 slices, and the outline.
    expect(bottom.querySelectorAll('line')).toHaveLength(38);
    expect(screen.getByText('a dowel: take it out before cutting')).toBeInTheDocument();
  });

  it('says so where the studio no longer bakes the size', () => {
    const sheet = { sizeId: 'gone', layers: 1, spongeId: 'vanilla', fillingId: null };
    const design = designWith({ cake: { kind: 'sheet', tiers: [], sheet } });
    render(<CuttingPlan design={design} menu={menuFixture} />);
    expect(screen.getByText('The studio no longer bakes this size.')).toBeInTheDocument();
  });
});
