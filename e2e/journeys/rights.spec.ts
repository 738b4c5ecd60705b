import { guardHeader } from '#shared/contracts/headers.ts';
import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { expect, test } from '../fixtures/journey.ts';
import { answerAll, onStep, send } from '../fixtures/order-a-cake.ts';
import { signInAs } from '../fixtures/staff.ts';
import { lookOver } from '../fixtures/watch.ts';

test(
  'rights are refused in words, and nothing is lost',
  { tag: '@desktop' },
  async ({ page, studio, newVisitor, watch }) => {
    const { number, code } = await placeOrder(studio.visitor(), orderForm('2027-06-19'));

    await test.step('a visitor is sent to sign in', async () => {
      await page.goto(`/staff/orders/${number}`);
      await expect(page.getByRole('heading', { level: 1, name: 'Studio sign-in' })).toBeVisible();
    });

    await test.step('somebody else’s order does not exist', async () => {
      watch.expect({ path: `/api/orders/${code}`, status: 404 });
      await page.goto(`/orders/${code}`);
      await expect(page.getByText('We cannot open it for you here')).toBeVisible();
      await lookOver(page);
    });

    await test.step('a session that ends in the middle of the wizard leaves the draft', async () => {
      await answerAll(page);
      await page.context().clearCookies();
      await page.reload();
      await onStep(page, 'check');
      await send(page);
    });

    await test.step('the counter sees orders and may not confirm', async () => {
      const counter = await newVisitor();
      await signInAs(counter, 'counter');
      const waiting = counter.getByRole('region', { name: 'Waiting for you' });
      await expect(waiting.getByRole('link', { name: `Open No. ${number}` })).toBeVisible();
      await expect(waiting.getByRole('button')).toHaveCount(0);
      await counter.goto(`/staff/orders/${number}`);
      await expect(counter.getByRole('heading', { level: 1 })).toContainText(`No. ${number}`);
      await expect(counter.getByRole('button', { name: 'Confirm' })).toHaveCount(0);
      const refusal = await counter.request.post(`/api/staff/orders/${number}/confirm`, {
        data: { rowVersion: 1 },
        headers: { [guardHeader]: '1', Origin: studio.url },
      });
      expect(refusal.status()).toBe(403);
      await counter.goto('/staff/studio');
      watch.expect({ path: '/api/staff/people', status: 403 });
      await expect(counter.getByText('People are the owner’s to look after')).toBeVisible();
      await lookOver(counter);
    });
  },
);
