import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Cake, Look } from '#shared/contracts/design.ts';
import { designFixture, roundTier, swissCoat } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { CakeDrawing } from './cake-drawing.tsx';
import { layOutTiers } from './layout.ts';

const plain: Look = { palette: [], words: [], decorations: [], note: '' };
const room = { x: 80, y: 40, width: 260, height: 300 };

function tiered(...tiers: Cake['tiers']): Cake {
  return { kind: 'tiered', tiers, sheet: null, coating: swissCoat, cuttingCakes: [] };
}

describe('CakeDrawing', () => {
  it('tells those who cannot see it what it shows, from the board up', () => {
    const cake = tiered(
      roundTier(10),
      roundTier(8, { real: false, spongeId: null, fillingId: null }),
      roundTier(6, { keepsake: true }),
    );
    render(
      <CakeDrawing
        cake={cake}
        look={{ ...plain, words: [{ tier: 0, text: 'Ada and Tomás' }] }}
        menu={menuFixture}
      />,
    );
    const drawing = screen.getByRole('img', { name: /^Three tiers .*drawn to scale$/ });
    const words = drawing.querySelector('desc')?.textContent ?? '';
    expect(words).toMatch(
      /Tier 1 from the board: round, 10 in \/ 25 cm across, 4 in \/ 10 cm high/,
    );
    expect(words).toMatch(/Tier 2 from the board: .*a dummy without cake/);
    expect(words).toMatch(/Tier 3 from the board: .*kept back as a keepsake/);
    expect(words).toContain('Words on tier 1 from the board: “Ada and Tomás”.');
    expect(drawing).toHaveTextContent('dummy');
    expect(drawing).toHaveTextContent('keepsake');
  });

  it('shows cutting cakes small beside the cake on show', () => {
    const cut = {
      sizeId: 'half',
      count: 3,
      layers: 2,
      spongeId: 'vanilla',
      fillingId: 'raspberry',
    };
    render(
      <CakeDrawing
        cake={{ ...tiered(roundTier(10)), cuttingCakes: [cut] }}
        look={null}
        menu={menuFixture}
      />,
    );
    const drawing = screen.getByRole('img', { name: /with three cutting cakes, drawn to scale$/ });
    expect(drawing).toHaveTextContent('in the kitchen, to cut3 ×');
    expect(drawing).toHaveAccessibleDescription(/In the kitchen: 3 × Half sheet.*to cut: Vanilla/);
  });

  it('says that there is no cake yet', () => {
    render(<CakeDrawing cake={null} look={null} menu={menuFixture} />);
    expect(screen.getByRole('img', { name: 'An empty board' })).toBeInTheDocument();
  });

  it('draws sheets, and leaves out parts it does not know', () => {
    const size = menuFixture.sheetSizes[0];
    render(
      <CakeDrawing
        cake={{
          kind: 'sheet',
          tiers: [],
          sheet: { sizeId: size?.id ?? '', layers: 2, spongeId: 'gone', fillingId: null },
          coating: null,
          cuttingCakes: [],
        }}
        look={{
          ...plain,
          decorations: [
            { decorationId: 'gone', tier: null, quantity: 3, colour: null, source: 'studio' },
          ],
        }}
        menu={menuFixture}
      />,
    );
    expect(screen.getByRole('img', { name: /^Quarter sheet/ })).toHaveTextContent('from above');
  });

  it('leads with the studio’s unit', () => {
    const menu = { ...menuFixture, studio: { ...menuFixture.studio, lengthLead: 'cm' as const } };
    render(<CakeDrawing cake={designFixture.cake} look={null} menu={menu} />);
    expect(screen.getByRole('img')).toHaveTextContent('25 cm / 10 in');
  });
});

describe('layOutTiers', () => {
  it('keeps one scale across and up, every tier on the one below, all inside the room', () => {
    const cake = tiered(roundTier(12), roundTier(8), roundTier(4));
    const { tiers, board, scale, top } = layOutTiers(cake, menuFixture, room);
    for (const { tier, width, height } of tiers) {
      expect(width / tier.widthMm).toBeCloseTo(scale);
      expect(height / tier.heightMm).toBeCloseTo(scale);
    }
    let floor = board.y;
    for (const { y, height } of tiers) {
      expect(y + height).toBeCloseTo(floor);
      floor = y;
    }
    expect(top).toBeGreaterThanOrEqual(room.y);
    expect(board.x).toBeGreaterThanOrEqual(room.x);
    expect(board.x + board.width).toBeLessThanOrEqual(room.x + room.width + 1e-9);
  });
});
