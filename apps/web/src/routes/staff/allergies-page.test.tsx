import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { expect, it } from 'vitest';
import { saveAllergyTable, type AllergyTable } from '#shared/contracts/allergy-table.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { Suspense } from 'react';
import { AllergiesPage } from './allergies-page.tsx';

const server = startApiServer();

const table: AllergyTable = {
  version: 'v1',
  rules: [
    { allergen: null, severity: 'allergy', answer: 'talk' },
    { allergen: 'peanut', severity: 'allergy', answer: 'refuse' },
  ],
  kitchen: [],
  fromLabels: [{ allergen: 'egg', species: [], state: 'contains' }],
  kitchenNotice: 'One kitchen.',
  homeKitchenText: '',
  eggAdvisory: 'Raw egg can make people ill.',
};

const open = () =>
  renderAt(
    '/staff/studio/allergies',
    <Suspense>
      <AllergiesPage />
    </Suspense>,
  );

it('shows the owner’s word in every cell, saves one changed, and says where words are missing', async () => {
  const saved: unknown[] = [];
  server.use(
    http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
    http.get('*/api/staff/allergy-table', () => HttpResponse.json(table)),
    http.put('*/api/staff/allergy-table', async ({ request }) => {
      const body = saveAllergyTable.parse(await request.json());
      saved.push(body);
      return HttpResponse.json({ ...table, ...body, version: 'v2' });
    }),
  );
  const { user } = open();
  const peanut = within(await screen.findByRole('group', { name: 'Peanut', hidden: true }));
  expect(peanut.getByLabelText('Allergy')).toHaveDisplayValue('Refuse');
  const egg = within(screen.getByRole('group', { name: 'Egg', hidden: true }));
  const cell = egg.getByLabelText('Allergy');
  expect(cell).toHaveDisplayValue('As for any: Talk first');
  await user.selectOptions(cell, 'Refuse');
  expect(screen.getByText(/Handled: egg, by the labels of what you buy/)).toBeVisible();

  const advisory = screen.getByLabelText(/advisory for raw/);
  await user.clear(advisory);
  await user.click(screen.getByText('Save the table'));
  expect(advisory).toHaveAccessibleDescription(/Say what your local code asks for raw egg/);
  expect(saved).toEqual([]);
  await user.type(advisory, 'County');
  await user.click(screen.getByText('Save the table'));
  expect(await screen.findByText(/Orders that wait are judged by it now/)).toBeVisible();
  expect(saved).toMatchObject([
    {
      version: 'v1',
      eggAdvisory: 'County',
      rules: [...table.rules, { allergen: 'egg', severity: 'allergy', answer: 'refuse' }],
    },
  ]);
});
