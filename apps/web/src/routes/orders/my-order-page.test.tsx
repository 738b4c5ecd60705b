import { screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { OrderView } from '#shared/contracts/orders.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { designFixture } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { Suspense } from 'react';
import { MyOrderPage } from './my-order-page.tsx';

const server = startApiServer();

const order: OrderView = {
  code: 'K7Q2M9XD',
  number: 2421,
  status: 'asked',
  rowVersion: 1,
  stage: 'received',
  careCode: null,
  ending: null,
  pickup: {
    date: '2027-06-19',
    start: 600,
    minutes: 30,
    zone: 'America/New_York',
    startAt: '2027-06-19T14:00:00.000Z',
  },
  hold: { expiresAt: '2027-05-01T14:42:00.000Z', needsLink: true },
  design: designFixture,
  offer: evaluateDesign({ design: designFixture, date: '2027-06-19' }, menuFixture, '2027-05-01'),
  agreedPrice: null,
  orderedBy: { name: 'Tess Marchetti', email: 'tess@example.com', phone: '' },
  collector: null,
  contentChanges: [],
  photos: [],
  messages: [],
  lifted: [],
  createdAt: '2027-05-01T14:12:00.000Z',
  otherDates: [],
  showPhotos: false,
  can: {
    withdraw: true,
    write: true,
    addPhotos: false,
    seeCalendarFile: false,
    acceptLifted: false,
  },
};

const problem = (status: number, code: string) =>
  HttpResponse.json({ type: 'about:blank', title: 'No', status, code }, { status });

function open(address: string) {
  server.use(http.get('*/api/menu', () => HttpResponse.json(menuFixture)));
  return renderAt(
    address,
    <Suspense>
      <Routes>
        <Route path="/orders/:code" element={<MyOrderPage />} />
      </Routes>
    </Suspense>,
  );
}

describe('MyOrderPage', () => {
  it('exchanges the private link’s key before it asks for the order', async () => {
    let opened = false;
    server.use(
      http.post('*/api/order-access', async ({ request }) => {
        expect(await request.json()).toEqual({ code: 'K7Q2M9XD', key: 'secret' });
        opened = true;
        return HttpResponse.json({ done: true });
      }),
      http.get('*/api/orders/K7Q2M9XD', () =>
        opened ? HttpResponse.json(order) : problem(404, 'not-found'),
      ),
    );
    open('/orders/K7Q2M9XD#key=secret');
    expect(
      await screen.findByRole('heading', { level: 1, name: 'We have your order' }),
    ).toBeVisible();
    // New York is four hours behind UTC on the first of May.
    expect(screen.getByText('Your place is kept until Saturday 1 May, 10:42')).toBeVisible();
  });

  it('says how to get in where the order does not open', async () => {
    server.use(http.get('*/api/orders/K7Q2M9XD', () => problem(404, 'not-found')));
    open('/orders/K7Q2M9XD');
    expect(
      await screen.findByRole('heading', { name: 'We cannot open it for you here' }),
    ).toBeVisible();
    expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute(
      'href',
      '/sign-in?next=%2Forders%2FK7Q2M9XD',
    );
  });

  it('withdraws only after it was confirmed in words', async () => {
    const sent: unknown[] = [];
    server.use(
      http.get('*/api/orders/K7Q2M9XD', () => HttpResponse.json(order)),
      http.post('*/api/orders/K7Q2M9XD/withdraw', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({
          ...order,
          status: 'withdrawn',
          stage: null,
          hold: null,
          ending: 'You withdrew it.',
          can: { ...order.can, withdraw: false },
        });
      }),
    );
    const { user } = open('/orders/K7Q2M9XD');
    await user.click(await screen.findByRole('button', { name: 'Withdraw this order' }));
    expect(sent).toEqual([]);
    await user.type(screen.getByLabelText(/^Why/), 'The party is off');
    await user.click(screen.getByRole('button', { name: 'Yes, withdraw it' }));
    expect(
      await screen.findByRole('heading', { level: 1, name: 'You have withdrawn this order' }),
    ).toBeVisible();
    expect(sent).toEqual([{ rowVersion: 1, reason: 'The party is off' }]);
    expect(screen.queryByRole('button', { name: 'Withdraw this order' })).not.toBeInTheDocument();
  });

  it('keeps a message that could not be sent', async () => {
    server.use(
      http.get('*/api/orders/K7Q2M9XD', () => HttpResponse.json(order)),
      http.post('*/api/orders/K7Q2M9XD/messages', () => HttpResponse.error()),
    );
    const { user } = open('/orders/K7Q2M9XD');
    await user.type(await screen.findByLabelText('Write to the studio'), 'May we have candles?');
    await user.click(screen.getByRole('button', { name: 'Send the message' }));
    expect(await screen.findByText('We cannot reach the studio just now')).toBeVisible();
    await waitFor(() =>
      expect(screen.getByLabelText('Write to the studio')).toHaveValue('May we have candles?'),
    );
  });

  it('shows why a stop was lifted beside the stop, and takes it as accepted once it was read', async () => {
    const lifted = {
      id: 'l1',
      sentence: 'Egg is in Vanilla sponge; one guest is allergic to it.',
      reason: 'She brings her own dessert.',
      by: 'Ida Thorne',
      at: '2027-05-02T14:00:00.000Z',
      acceptedAt: null,
    };
    const waiting: OrderView = {
      ...order,
      lifted: [lifted],
      can: { ...order.can, acceptLifted: true },
    };
    const sent: unknown[] = [];
    server.use(
      http.get('*/api/orders/K7Q2M9XD', () => HttpResponse.json(waiting)),
      http.post('*/api/orders/K7Q2M9XD/accept-lifted-stop', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({
          ...order,
          rowVersion: 2,
          lifted: [{ ...lifted, acceptedAt: '2027-05-03T14:00:00.000Z' }],
        });
      }),
    );
    const { user } = open('/orders/K7Q2M9XD');
    const block = await screen.findByRole('region', { name: 'Please read this before we confirm' });
    expect(block).toHaveTextContent(`${lifted.sentence}${lifted.reason}`);
    const press = screen.getByRole('button', { name: 'I accept this' });
    await user.click(press);
    expect(screen.getByText('Tick this once you have read both.')).toBeVisible();
    await user.click(screen.getByRole('checkbox', { name: /I have read/ }));
    await user.click(press);
    expect(await screen.findByText(/You read and accepted it/)).toBeVisible();
    expect(sent).toEqual([{ rowVersion: 1, liftedStopId: 'l1' }]);
  });
});
