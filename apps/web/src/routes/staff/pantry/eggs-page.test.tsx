import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import type { EggPlanView } from '#shared/contracts/kitchen-sheet.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { EggsPage } from './eggs-page.tsx';

const server = startApiServer();
let asked: string[] = [];

const plan: EggPlanView = {
  from: '2027-06-07',
  to: '2027-06-13',
  size: 'large',
  whiteDays: 4,
  yolkDays: 2,
  eggs: 20,
  days: [
    {
      date: '2027-06-07',
      crack: 20,
      whole: 6,
      uses: [
        {
          formula: 'Swiss meringue buttercream',
          orders: [2421],
          part: 'white',
          grams: 462,
          from: [{ crackedOn: '2027-06-07', part: 'white', grams: 462 }],
        },
      ],
    },
    {
      date: '2027-06-09',
      crack: 0,
      whole: 0,
      uses: [
        {
          formula: 'Vanilla custard cream',
          orders: [2425],
          part: 'yolk',
          grams: 68,
          from: [{ crackedOn: '2027-06-07', part: 'yolk', grams: 68 }],
        },
      ],
    },
  ],
  leftovers: [
    {
      crackedOn: '2027-06-07',
      whiteG: 0,
      yolkG: 170,
      whiteUseBy: null,
      yolkUseBy: '2027-06-09',
      uses: [
        {
          formulaId: 'french-buttercream',
          name: 'French buttercream',
          part: 'yolk',
          outG: 820,
          pasteurised: true,
        },
      ],
    },
  ],
  cartons: [],
  alternatives: [
    {
      formulaId: 'swiss-buttercream',
      formula: 'Swiss meringue buttercream',
      part: 'white',
      carton: 'Pasteurised egg whites',
      grams: 462,
      cartons: 1,
      eggs: 6,
      fewer: 14,
      whipped: true,
    },
  ],
  orders: [2421, 2425],
  unplaced: [2430],
};

beforeEach(() => {
  asked = [];
  server.use(
    http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
    http.get('*/api/staff/eggs', ({ request }) => {
      asked.push(new URL(request.url).search);
      return HttpResponse.json(plan);
    }),
  );
});

const open = () =>
  renderAt(
    '/staff/pantry/eggs?from=2027-06-07&to=2027-06-13',
    <Routes>
      <Route path="/staff/pantry/eggs" element={<EggsPage />} />
    </Routes>,
  );

describe('the plan of eggs', () => {
  it('says what to crack on which day, what is left and what it could become', async () => {
    open();
    const days = await screen.findByRole('region', { name: 'Eggs to crack' });
    const [first, second] = within(days).getAllByRole('heading', { level: 2 });
    expect(first).toHaveTextContent('Monday 7 June');
    expect(within(days).getByText('6 go in whole, 14 separated.')).toBeVisible();
    expect(second).toHaveTextContent('Wednesday 9 June');
    expect(within(days).getByText('Crack none: what is left does.')).toBeVisible();
    expect(within(days).getByText('Take first 68 g of yolks from Monday.')).toBeVisible();

    const left = screen.getByRole('region', { name: 'Left over' });
    expect(within(left).getByText(/use by Wednesday 9 June/)).toBeVisible();
    expect(within(left).getByRole('link', { name: '820 g of French buttercream' })).toBeVisible();
    expect(within(left).getByText(/written for pasteurized egg/)).toBeVisible();

    const instead = screen.getByRole('region', { name: 'Cartons instead' });
    expect(instead).toHaveTextContent('6 eggs to crack in all instead of 20');
    expect(within(instead).getByText(/whip poorly/)).toBeVisible();
    expect(screen.getByText(/is to be collected on these days/)).toBeVisible();
  });

  it('asks again with another size and keeps it in the address', async () => {
    const { user } = open();
    await screen.findByRole('region', { name: 'Eggs to crack' });
    await user.selectOptions(screen.getByLabelText('Eggs'), 'medium');
    await screen.findByRole('region', { name: 'Eggs to crack' });
    expect(asked.map((it) => new URLSearchParams(it).get('size'))).toEqual(['large', 'medium']);
  });

  it('says whose page it is to whoever does not bake', async () => {
    server.use(
      http.get('*/api/staff/eggs', () =>
        HttpResponse.json(
          { type: '/api#not-allowed', title: 'No', status: 403, code: 'not-allowed', detail: '' },
          { status: 403 },
        ),
      ),
    );
    open();
    expect(await screen.findByText('This is the bakers’')).toBeVisible();
  });
});
