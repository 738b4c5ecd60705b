import { screen, waitFor, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { version } from '#shared/kitchen/testing/pantry-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { pantryFixture } from '#web/testing/pantry.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { FormulaEditPage } from './formula-edit-page.tsx';
import { FormulaPage } from './formula-page.tsx';
import { FormulasPage } from './formulas-page.tsx';
import { IngredientPage } from './ingredient-page.tsx';

const server = startApiServer();
let sent: unknown[] = [];

beforeEach(() => {
  sent = [];
  window.localStorage.clear();
  server.use(http.get('*/api/menu', () => HttpResponse.json(menuFixture)));
});

/** Opens a page; without a pantry it is as whoever may not see one. */
function open(address: string, pantry: Pantry | null = pantryFixture()) {
  server.use(
    http.get('*/api/pantry', () =>
      pantry === null ? refusal('not-allowed', 403) : HttpResponse.json(pantry),
    ),
  );
  return renderAt(
    address,
    <Routes>
      <Route path="/staff/pantry/formulas" element={<FormulasPage />} />
      <Route path="/staff/pantry/formulas/:id" element={<FormulaPage />} />
      <Route path="/staff/pantry/formulas/:id/edit" element={<FormulaEditPage />} />
      <Route path="/staff/pantry/ingredients/:id" element={<IngredientPage />} />
    </Routes>,
  );
}

const refusal = (code: string, status: number, more: Record<string, unknown> = {}) =>
  HttpResponse.json({ type: 'x', title: 'x', status, code, ...more }, { status });

describe('the formulas', () => {
  it('says to the counter whose the pantry is', async () => {
    open('/staff/pantry/formulas', null);
    expect(await screen.findByText('The pantry is the bakers’')).toBeVisible();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Formulas');
  });

  it('finds a formula by what is in it, and tells what it contains and where it goes', async () => {
    const { user } = open('/staff/pantry/formulas');
    await user.type(await screen.findByRole('searchbox', { name: 'Find' }), 'cornstarch');
    await waitFor(() => expect(screen.queryByText('German buttercream, buttercream')).toBeNull());
    const row = screen.getByRole('row', { name: /Vanilla custard/ });
    expect(row).toHaveTextContent('egg and milk');
    expect(row).toHaveTextContent('German buttercream');
  });

  it('makes a weight of it, with the eggs whole and the drift told', async () => {
    const { user } = open('/staff/pantry/formulas/custard');
    await user.click(await screen.findByRole('radio', { name: 'A weight' }));
    await user.type(screen.getByRole('textbox', { name: 'Make' }), '1 kg');
    const bench = screen.getByRole('region', { name: 'At the bench' });
    // 1000 g out of 2086 g at 95 % is 0.50461 of it: 211.9 g of egg, 4 eggs of 50 g.
    expect(within(bench).getByText('505 g')).toBeVisible();
    expect(within(bench).getByText('4 eggs')).toBeVisible();
    expect(within(bench).getByText('-5.6 %')).toBeVisible();
  });
});

describe('the editor', () => {
  it('has the proofreader’s word at the line, and saves the figure that was taken', async () => {
    server.use(
      http.post('*/api/pantry/formulas/custard/versions', async ({ request }) => {
        sent.push(await request.json());
        return refusal('unavailable', 503);
      }),
    );
    const { user } = open('/staff/pantry/formulas/custard/edit');
    const line = await screen.findByRole('textbox', { name: 'Line 2' });
    await user.clear(line);
    await user.type(line, '1 1/2 cups sugar, 250 g');
    await user.click(await screen.findByRole('button', { name: /300 g$/ }));
    expect(line).toHaveValue('1 1/2 cups sugar, 300 g');
    expect(await screen.findByText(/Granulated cane sugar: 550 g/)).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Save version 2' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({
      basedOn: 'custard-1',
      carryInto: ['german'],
      draft: { lines: [{}, { grams: 300, asTyped: '1 1/2 cups sugar, 300 g' }, {}, {}, {}] },
    });
    expect(line).toHaveValue('1 1/2 cups sugar, 300 g');
  });

  it('leads to the line that is at fault and sends nothing', async () => {
    const { user } = open('/staff/pantry/formulas/custard/edit');
    await user.click(await screen.findByRole('button', { name: 'Add a line' }));
    await user.keyboard('a handful of love');
    await user.click(screen.getByRole('button', { name: 'Save version 2' }));
    const summary = await screen.findByRole('alert');
    await user.click(within(summary).getByRole('link', { name: /^Line 6/ }));
    expect(screen.getByRole('textbox', { name: 'Line 6' })).toHaveFocus();
  });

  it('offers again what a closed tab left on the device', async () => {
    const first = open('/staff/pantry/formulas/custard/edit');
    await first.user.type(await screen.findByRole('textbox', { name: 'Note' }), 'Looser');
    first.unmount();
    const { user } = open('/staff/pantry/formulas/custard/edit');
    await user.click(await screen.findByRole('button', { name: 'Go on with it' }));
    expect(screen.getByRole('textbox', { name: 'Note' })).toHaveValue('Looser');
  });

  it('shows both when somebody saved meanwhile, and goes on from theirs', async () => {
    const theirs = version('custard', [['milk', 900]], { n: 2, createdBy: 'Noor Haddad' });
    server.use(
      http.post('*/api/pantry/formulas/custard/versions', async ({ request }) => {
        sent.push(await request.json());
        return refusal('changed-meanwhile', 409, { facts: { current: theirs } });
      }),
    );
    const { user } = open('/staff/pantry/formulas/custard/edit');
    await user.type(await screen.findByRole('textbox', { name: 'Note' }), 'Looser');
    await user.click(screen.getByRole('button', { name: 'Save version 2' }));
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText('Noor Haddad saved version 2')).toBeVisible();
    await user.click(within(dialog).getByRole('button', { name: 'Go on with mine' }));
    expect(screen.getByRole('textbox', { name: 'Note' })).toHaveValue('Looser');
    await user.click(screen.getByRole('button', { name: 'Save version 3' }));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]).toMatchObject({ basedOn: 'custard-2', draft: { note: 'Looser' } });
  });
});

describe('an ingredient', () => {
  it('names the orders that now contain something else', async () => {
    const pantry = pantryFixture();
    const milk = pantry.ingredients.find((it) => it.id === 'milk');
    server.use(
      http.put('*/api/pantry/ingredients/milk', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({ ingredient: milk, touched: [2431] });
      }),
    );
    const { user } = open('/staff/pantry/ingredients/milk', pantry);
    const soy = await screen.findByRole('group', { name: 'Soy' });
    await user.click(within(soy).getByRole('radio', { name: 'may contain' }));
    expect(screen.getByText('You changed what the label says')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(await screen.findByRole('link', { name: 'Order No. 2431' })).toHaveAttribute(
      'href',
      '/staff/orders/2431',
    );
    expect(sent[0]).toMatchObject({
      basedOn: { name: 'Whole milk' },
      draft: {
        allergens: [
          { allergen: 'milk', state: 'contains' },
          { allergen: 'soy', state: 'may-contain' },
        ],
      },
    });
  });

  it('saves what was begun before somebody else saved over what it was begun from', async () => {
    const pantry = pantryFixture();
    server.use(
      http.put('*/api/pantry/ingredients/milk', async ({ request }) => {
        sent.push(await request.json());
        return refusal('unavailable', 503);
      }),
    );
    const first = open('/staff/pantry/ingredients/milk', pantry);
    await first.user.type(await screen.findByRole('textbox', { name: /Maker/ }), 'Alder Dairy');
    first.unmount();
    const soy: AllergenEntry = { allergen: 'soy', species: [], state: 'contains' };
    const ingredients = pantry.ingredients.map((it) =>
      it.id === 'milk' ? { ...it, allergens: [...it.allergens, soy] } : it,
    );
    const { user } = open('/staff/pantry/ingredients/milk', { ...pantry, ingredients });
    await user.click(await screen.findByRole('button', { name: 'Go on with it' }));
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    // The server sees that the soy is not in what this was begun from, and asks.
    expect(sent[0]).toMatchObject({
      basedOn: { allergens: [{ allergen: 'milk' }] },
      draft: { brand: expect.stringContaining('Alder Dairy') },
    });
  });
});
