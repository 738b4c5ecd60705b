import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { expect, test } from '../fixtures/journey.ts';
import { linkIn } from '../fixtures/mail.ts';
import {
  answerCake,
  answerDay,
  answerSetting,
  goOnTo,
  onStep,
  send,
  wish,
} from '../fixtures/order-a-cake.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

test(
  'a customer signs in with Google, orders and finds it under her account',
  {
    tag: '@phone',
  },
  async ({ page, studio }) => {
    const asGuest = await placeOrder(
      studio.visitor(),
      orderForm('2027-06-25', { you: { email: wish.email } }),
    );
    await page.goto('/sign-in');
    await page.getByRole('link', { name: 'Go on with Google' }).click();
    await page.getByRole('button', { name: wish.name }).click();

    await test.step('what she ordered as a guest is there', async () => {
      await expect(page.getByRole('heading', { level: 1, name: 'My account' })).toBeVisible();
      await expect(page.getByText(`No. ${asGuest.number}`)).toBeVisible();
    });

    const number = await test.step('orders under her own name', async () => {
      await page.goto('/order');
      await onStep(page, 'day');
      await answerDay(page, wish);
      await goOnTo(page, 'cake');
      await answerCake(page);
      await goOnTo(page, 'setting');
      await answerSetting(page);
      await goOnTo(page, 'look');
      await goOnTo(page, 'you');
      await expect(page.getByLabel('Your name')).toHaveValue(wish.name);
      await expect(page.getByRole('textbox', { name: 'E-mail' })).toHaveValue(wish.email);
      await page.getByLabel('I have read and agree to the studio’s policies').check();
      await goOnTo(page, 'check');
      return send(page);
    });
    // Her address is proven, so no link has to be opened.
    await expect(page.getByText(/yours until the baker has answered/)).toBeVisible();

    await test.step('finds both', async () => {
      await page.goto('/account');
      const orders = page.getByRole('region', { name: 'My orders' }).getByRole('listitem');
      await expect(orders).toHaveCount(2);
      await lookOver(page);
      await lookAtNarrow(page);
      await orders
        .filter({ hasText: `No. ${number}` })
        .getByRole('link')
        .click();
      await expect(page.getByText(/The baker looks at your order/)).toBeVisible();
    });

    await test.step('withdraws one', async () => {
      await page.getByRole('button', { name: 'Withdraw this order' }).click();
      await page.getByRole('button', { name: 'Yes, withdraw it' }).click();
      await expect(page.getByRole('link', { name: 'Start another order' })).toBeVisible();
      await lookOver(page);
    });
  },
);

test(
  'what goes wrong at Google is said, and a link by e-mail still opens the account',
  {
    tag: '@desktop',
  },
  async ({ page, google, mailbox }) => {
    await page.goto('/sign-in');
    await google.failNext({ kind: 'denied' });
    await page.getByRole('link', { name: 'Go on with Google' }).click();
    await expect(page.getByRole('alert')).toContainText('You stopped at Google’s page');
    await lookOver(page);

    await google.failNext({ kind: 'bad-code' });
    await page.getByRole('link', { name: 'Go on with Google' }).click();
    await page.getByRole('button', { name: wish.name }).click();
    await expect(page.getByRole('alert')).toContainText('Google did not answer us properly');

    await page.getByLabel('E-mail address').fill(wish.email);
    await page.getByRole('button', { name: 'Send me a link' }).click();
    await expect(page.getByText('Look in your mail')).toBeVisible();
    const mail = await mailbox.waitForMessage({ to: wish.email, subject: 'Your link to sign in' });
    await page.goto(linkIn(mail, '/links/sign-in'));
    await lookOver(page);
    await page.getByRole('button', { name: 'Sign me in' }).click();
    await expect(page.getByRole('heading', { level: 1, name: 'My account' })).toBeVisible();
    await expect(page.getByText('No orders yet')).toBeVisible();
  },
);
