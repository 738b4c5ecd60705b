import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { expect, test } from '../fixtures/journey.ts';
import { signInAs } from '../fixtures/staff.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

const publicPages = [
  '/',
  '/menu',
  '/care',
  '/policies',
  '/order/sent',
  '/sign-in',
  '/sign-in/staff',
  '/sign-in/forgotten-password',
  '/links/sign-in',
  '/no-such-page',
];

const staffPages = [
  '/staff/calendar?view=week&date=2027-06-17',
  '/staff/calendar?view=month&date=2027-06-17',
  '/staff/calendar?view=day&date=2027-06-18',
  '/staff/orders',
  '/staff/orders/2401',
  '/staff/studio',
  '/staff/studio/prices',
  '/staff/me',
];

test('every page a customer can open stands at any width', async ({ page }) => {
  for (const address of publicPages) {
    await test.step(address, async () => {
      await page.goto(address);
      await lookOver(page);
      await lookAtNarrow(page);
    });
  }
});

test('every page of the studio stands at any width', async ({ page, studio }) => {
  const { number } = await placeOrder(studio.visitor(), orderForm('2027-06-19'));
  expect(number).toBe(2401);
  await signInAs(page, 'owner');
  for (const address of staffPages) {
    await test.step(address, async () => {
      await page.goto(address);
      await lookOver(page);
      await lookAtNarrow(page);
    });
  }
  await page.goto('/staff/orders/2401');
  await page.getByRole('region', { name: 'E-mails' }).getByRole('link').first().click();
  await lookOver(page);
  await lookAtNarrow(page);
});
