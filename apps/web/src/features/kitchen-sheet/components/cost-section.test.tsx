import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import type { OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { CostSection } from './cost-section.tsx';

const server = startApiServer();

const item = { grams: null, minutes: null, count: null };
const cost: OrderCost = {
  currency: 'USD',
  lines: [
    {
      kind: 'ingredients',
      amountMinor: 3200,
      items: [
        { ...item, label: 'Butter', grams: 1320, amountMinor: 3200 },
        { ...item, label: 'Jam', grams: 300, amountMinor: null },
      ],
    },
    {
      kind: 'labour',
      amountMinor: 12_800,
      items: [{ ...item, label: 'Decorating', minutes: 240, amountMinor: 12_800 }],
    },
  ],
  totalMinor: 16_000,
  unknown: [],
  netPriceMinor: 20_000,
  agreed: true,
  marginMinor: 4000,
  marginPpm: 200_000,
  targetMarginPpm: 250_000,
  minutes: 240,
  levers: [
    { kind: 'rush', title: 'Short notice', sentence: 'It brings little.', enough: false },
    { kind: 'price', title: 'Charge more', sentence: 'At $213.50.', enough: true },
  ],
};

async function show(change: Partial<OrderCost> = {}) {
  server.use(
    http.get('*/api/staff/orders/2431/cost', () => HttpResponse.json({ ...cost, ...change })),
  );
  renderAt('/staff/orders/2431', <CostSection number={2431} locale="en-US" />);
  return screen.findByRole('region', { name: 'Cost and margin' });
}

describe('cost and margin', () => {
  it('says what is left, what was aimed for, and first what would be enough', async () => {
    const section = await show();
    expect(await within(section).findByText('It leaves $40.00, 20 %.')).toBeVisible();
    expect(within(section).getByText('You aim for 25 %.')).toBeVisible();
    expect(within(section).getByText('Work, 4 h')).toBeVisible();
    const levers = within(section).getByRole('heading', { name: 'What would make this pay' });
    const items = within(levers.parentElement ?? section).getAllByRole('listitem');
    expect(items.map((it) => it.textContent)).toEqual([
      'Charge moreenough by itselfAt $213.50.',
      'Short noticenot enough by itselfIt brings little.',
    ]);
  });

  it('never takes an unknown price for nothing', async () => {
    const section = await show({ unknown: ['Jam'], levers: [] });
    expect(await within(section).findByText('It leaves at most $40.00, 20 %.')).toBeVisible();
    expect(within(section).getByText('Costs at least')).toBeVisible();
    expect(within(section).getByText(/Not known: Jam/)).toBeVisible();
    expect(within(section).queryByText('What would make this pay')).toBeNull();
  });

  it('says plainly that it loses money', async () => {
    const section = await show({ marginMinor: -1500, marginPpm: -75_000, netPriceMinor: 14_500 });
    expect(await within(section).findByText('It loses $15.00.')).toBeVisible();
  });
});
