import { screen } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Suspense } from 'react';
import { expect, it } from 'vitest';
import {
  saveKitchenRules,
  usualKitchen,
  type KitchenSettings,
} from '#shared/contracts/kitchen-rules.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { KitchenRulesPage } from './kitchen-rules-page.tsx';

const server = startApiServer();

const settings: KitchenSettings = {
  version: 'v1',
  rules: { ...usualKitchen, bowlAndBagPpm: 150_000 },
  altitudeM: 260,
  monthlyWarmestC: menuFixture.studio.monthlyWarmestC,
  dessertFactorPpm: 700_000,
  wordsPer100Mm: 13,
};

it('takes figures in either system, goes back to the usual, and says at the field what is off', async () => {
  const saved: unknown[] = [];
  server.use(
    http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
    http.get('*/api/staff/kitchen-rules', () => HttpResponse.json(settings)),
    http.put('*/api/staff/kitchen-rules', async ({ request }) => {
      const body = saveKitchenRules.parse(await request.json());
      saved.push(body);
      return HttpResponse.json({ ...body, version: 'v2' });
    }),
  );
  const { user } = renderAt(
    '/staff/studio/kitchen',
    <Suspense>
      <KitchenRulesPage />
    </Suspense>,
  );
  const type = async (label: string, text: string) => {
    const field = await screen.findByLabelText(label);
    await user.clear(field);
    await user.paste(text);
    return field;
  };
  const height = await type('Height above the sea', '1600 m');
  await user.tab();
  expect(height).toHaveDisplayValue('5249 ft');
  await type('July', '90');
  await type('Double height', '12 cm');
  await type('Fine this far under a limit', '9 F');
  const coat = await type('Crumb coat', '40 mm');
  const bag = screen.getByLabelText('Stays in bowl and bag');
  expect(bag).toHaveDisplayValue('15 %');
  await user.click(screen.getByLabelText('Stays in bowl and bag: back to the usual 10 %'));
  expect(bag).toHaveDisplayValue('10 %');

  await user.click(screen.getByText('Save the figures'));
  expect(coat).toHaveAccessibleDescription('Usually 2 mm / 0.08 in From 0 to 15 mm, please.');
  expect(screen.getByText('Crumb coat: From 0 to 15 mm, please.')).toBeVisible();
  expect(saved).toEqual([]);
  await type('Crumb coat', '1/8 in');
  await user.click(screen.getByText('Save the figures'));
  expect(screen.queryByRole('alert')?.textContent ?? '').toBe('');
  expect(await screen.findByText(/Menu, estimates and planner go by it now/)).toBeVisible();
  expect(saved).toEqual([
    {
      ...settings,
      altitudeM: 1600,
      monthlyWarmestC: settings.monthlyWarmestC.map((it, at) => (at === 6 ? 32.22 : it)),
      rules: { ...usualKitchen, doubleHeightMm: 120, heatMarginC: 5, crumbCoatMm: 3 },
    },
  ]);
});
