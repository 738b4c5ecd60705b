import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Suspense } from 'react';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { CakeCare } from '#shared/contracts/cards.ts';
import { designFixture } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { labelFixture } from '#web/testing/label-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { CakePage } from './cake-page.tsx';

const server = startApiServer();

const care: CakeCare = {
  product: labelFixture.product,
  cake: designFixture.cake,
  look: null,
  portionSizeId: 'dessert',
  portions: { fed: 70, perTier: [38, 24, 8], each: '1 in / 2.5 cm by 2 in / 5 cm' },
  label: labelFixture,
  parts: [{ name: 'Vanilla sponge', statement: 'wheat flour, sugar', contains: ['wheat'] }],
  handled: [],
  alsoIn: [],
  keepCool: 'Keep it in the fridge until 1 h before you cut it.',
  pickupOn: '2027-06-19',
};

function open(code: string) {
  server.use(http.get('*/api/menu', () => HttpResponse.json(menuFixture)));
  return renderAt(
    `/cake/${code}`,
    <Suspense>
      <Routes>
        <Route path="/cake/:code" element={<CakePage />} />
      </Routes>
    </Suspense>,
  );
}

describe('CakePage', () => {
  it('tells of the cake what whoever serves it has to know, and asks to be left out of searches', async () => {
    server.use(http.get('*/api/care/7Q2M9XDK7Q2M9XDK', () => HttpResponse.json(care)));
    open('7Q2M9XDK7Q2M9XDK');
    expect(await screen.findByRole('heading', { level: 1, name: 'This cake' })).toBeVisible();
    expect(await screen.findByText('Contains: Milk, Egg, Wheat.')).toBeVisible();
    expect(screen.getByText('Not known: whether gold sugar contains soy.')).toBeVisible();
    expect(screen.getByText(care.keepCool)).toBeVisible();
    const first = screen.getByRole('region', { name: 'Before anybody eats' });
    expect(within(first).getByText(/2 boards and 9 dowels/u)).toBeVisible();
    expect(screen.getByRole('region', { name: 'Cutting it' })).toBeVisible();
    expect(document.head.querySelector('meta[name="robots"]')).toHaveAttribute(
      'content',
      'noindex',
    );
  });

  it('says so where no cake has the code', async () => {
    server.use(
      http.get('*/api/care/NOSUCHCODE', () =>
        HttpResponse.json(
          { type: 'about:blank', title: 'There is nothing here', status: 404, code: 'not-found' },
          { status: 404 },
        ),
      ),
    );
    open('NOSUCHCODE');
    expect(await screen.findByRole('heading', { name: 'No cake has this code' })).toBeVisible();
  });
});
