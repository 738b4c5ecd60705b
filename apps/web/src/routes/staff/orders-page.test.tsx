import { screen, waitFor } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes, useLocation } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import type { OrderList, OrderRow } from '#shared/contracts/staff.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { staffOrderFixture } from '#web/testing/staff-order.ts';
import { OrdersPage } from './orders-page.tsx';

const server = startApiServer();
let asked: URLSearchParams[] = [];

const row: OrderRow = {
  number: 2431,
  status: 'asked',
  customer: 'Rosa Marchetti',
  summary: 'Three tiers, 10, 8 and 6 in',
  pickup: staffOrderFixture().pickup,
  headCount: 70,
  totalMinor: 46_600,
  currency: 'USD',
  allergies: true,
  worst: 'stop',
  hold: null,
  createdAt: '2027-06-01T12:00:00.000Z',
  unread: 0,
};

function answers(list: Partial<OrderList>) {
  server.use(
    http.get('*/api/staff/orders', ({ request }) => {
      asked.push(new URL(request.url).searchParams);
      return HttpResponse.json({
        rows: [row],
        total: 60,
        page: 1,
        perPage: 25,
        counts: { asked: 3, ready: 1 },
        ...list,
      });
    }),
  );
}

function Address() {
  return <p data-testid="address">{useLocation().search}</p>;
}

function open(address: string) {
  return renderAt(
    address,
    <Routes>
      <Route
        path="/staff/orders"
        element={
          <>
            <OrdersPage />
            <Address />
          </>
        }
      />
    </Routes>,
  );
}

beforeEach(() => {
  asked = [];
  window.localStorage.clear();
  server.use(http.get('*/api/menu', () => HttpResponse.json(menuFixture)));
});

describe('the orders', () => {
  it('asks for the newest first, and for what the address says', async () => {
    answers({});
    open('/staff/orders?status=ready&find=osei&page=2');
    expect(await screen.findByRole('link', { name: '2431' })).toHaveAttribute(
      'href',
      '/staff/orders/2431',
    );
    expect(Object.fromEntries(asked[0] ?? [])).toEqual({
      status: 'ready',
      find: 'osei',
      page: '2',
      perPage: '25',
      sort: 'number',
      order: 'desc',
    });
  });

  it('keeps status, sort and page in the address', async () => {
    answers({});
    const { user } = open('/staff/orders?page=2');
    await user.click(await screen.findByRole('checkbox', { name: 'asked 3' }));
    expect(screen.getByTestId('address')).toHaveTextContent('?status=asked');
    await user.click(screen.getByRole('link', { name: 'Pickup' }));
    expect(screen.getByTestId('address')).toHaveTextContent('?sort=pickup&order=asc&status=asked');
    expect(await screen.findByRole('columnheader', { name: 'Pickup' })).toHaveAttribute(
      'aria-sort',
      'ascending',
    );
    await user.click(screen.getByRole('link', { name: 'Next page' }));
    expect(screen.getByTestId('address')).toHaveTextContent('page=2');
  });

  it('finds once typing rests, and goes on being typed into', async () => {
    answers({});
    const { user } = open('/staff/orders');
    const find = await screen.findByRole('searchbox', { name: 'Find' });
    await user.type(find, 'rosa');
    await waitFor(() => expect(screen.getByTestId('address')).toHaveTextContent('?find=rosa'));
    expect(find).toHaveFocus();
    await waitFor(() => expect(asked.at(-1)?.get('find')).toBe('rosa'));
  });

  it('says so when nothing is like that, and how to see all again', async () => {
    answers({ rows: [], total: 0 });
    open('/staff/orders?find=nobody');
    expect(await screen.findByText('No order is like that')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Show all orders' })).toHaveAttribute(
      'href',
      '/staff/orders',
    );
  });

  it('says what failed and tries again', async () => {
    server.use(
      http.get('*/api/staff/orders', () =>
        HttpResponse.json(
          {
            type: 'x',
            title: 'That part is out of reach just now',
            status: 503,
            code: 'unavailable',
          },
          { status: 503 },
        ),
      ),
    );
    const { user } = open('/staff/orders');
    expect(await screen.findByText('That part is out of reach just now')).toBeVisible();
    answers({});
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Rosa Marchetti')).toBeVisible();
  });

  it('saves a view on this device under a name', async () => {
    answers({});
    const { user } = open('/staff/orders?status=ready');
    await user.click(await screen.findByRole('button', { name: 'Save this view' }));
    await user.type(screen.getByRole('textbox', { name: 'Its name' }), 'To go');
    await user.click(screen.getByRole('button', { name: 'Save it' }));
    expect(await screen.findByRole('link', { name: 'To go' })).toHaveAttribute(
      'href',
      '/staff/orders?status=ready',
    );
  });
});
