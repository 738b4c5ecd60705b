import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { expect, test } from '../fixtures/journey.ts';
import { studioAddress } from '../fixtures/mail.ts';
import { phonePhoto } from '../fixtures/pictures.ts';
import { dialogOf, signInAs } from '../fixtures/staff.ts';
import { lookOver } from '../fixtures/watch.ts';

const customer = 'mara@example.com';

test('a baker confirms from the calendar and follows the cake to the door', async ({
  page,
  studio,
  mailbox,
}) => {
  const { number } = await placeOrder(studio.visitor(), orderForm('2027-06-19'));
  await mailbox.waitForMessage({ to: studioAddress, subject: `New order No. ${number}` });
  await signInAs(page, 'baker');

  await test.step('confirms after a last look at price and e-mail', async () => {
    await expect(page).toHaveTitle(/^Calendar, /);
    await expect(page.getByRole('region', { name: 'Waiting for you' })).toBeVisible();
    await lookOver(page);
    await page.getByRole('button', { name: `Confirm No. ${number}` }).click();
    const dialog = dialogOf(page, `Confirm No. ${number}`);
    await expect(dialog.getByText('They pay')).toBeVisible();
    await expect(dialog.getByText(`Order No. ${number} is confirmed for`)).toBeVisible();
    await dialog.getByLabel('A word of yours in it').fill('The candles are on us.');
    await lookOver(page);
    await dialog.getByRole('button', { name: 'Confirm and send it' }).click();
    await expect(page.getByText(`No. ${number} is confirmed.`)).toBeVisible();
    await expect(page.getByText('Nobody waits for an answer.')).toBeVisible();
    const confirmed = await mailbox.waitForMessage({ to: customer, subject: 'is confirmed' });
    expect(confirmed.text).toContain('The candles are on us.');
    expect(confirmed.attachments.map(({ contentType }) => contentType)).toEqual(['text/calendar']);
  });

  await test.step('makes it and marks it ready on its own page', async () => {
    await page.goto(`/staff/orders/${number}`);
    await lookOver(page);
    await page.getByRole('button', { name: 'Start making it' }).click();
    await page.getByRole('button', { name: 'It is in the making' }).click();
    await expect(page.getByText(`No. ${number} is in the making.`)).toBeVisible();
    await page.getByRole('button', { name: 'Mark ready' }).click();
    await page.getByRole('button', { name: 'It is ready, tell them' }).click();
    await expect(page.getByText(/is told by e-mail/)).toBeVisible();
    await mailbox.waitForMessage({ to: customer, subject: 'your cake is ready' });
  });

  await test.step('hands it over with who took it and a photo', async () => {
    await page.getByRole('button', { name: 'Hand over' }).click();
    const dialog = dialogOf(page, `Hand over No. ${number}`);
    await dialog.getByLabel('Who takes it').fill('Tomas Adair');
    await dialog.getByLabel('How it looked').fill('Upright and cold');
    await dialog
      .getByLabel('A photo of it')
      .setInputFiles(await phonePhoto('handover.jpg', '#f3e2c7'));
    await expect(dialog.getByRole('img')).toBeVisible();
    await lookOver(page);
    await dialog.getByRole('button', { name: 'It is collected' }).click();
    const record = page.getByRole('region', { name: 'Handed over' });
    await expect(record.getByText('Tomas Adair')).toBeVisible();
    await expect(record.getByText('Ida Crane')).toBeVisible();
    await record.getByRole('button', { name: /^See large: At handover/ }).click();
    await expect(page.getByRole('dialog').getByRole('img')).toBeVisible();
    await lookOver(page);
    await page.keyboard.press('Escape');
    await expect(page.getByRole('dialog')).toBeHidden();
    await mailbox.waitForMessage({ to: customer, subject: 'thank you' });
    await lookOver(page);
  });
});

test(
  'a baker declines, moves a pickup and blocks a day',
  { tag: '@desktop' },
  async ({ page, studio, mailbox, newVisitor }) => {
    const refused = await placeOrder(studio.visitor(), orderForm('2027-06-19'));
    const moved = await placeOrder(studio.visitor(), orderForm('2027-06-18'));
    await signInAs(page, 'baker');

    await test.step('declines with a reason and the nearest open days', async () => {
      await page.getByRole('button', { name: `Decline No. ${refused.number}` }).click();
      const dialog = dialogOf(page, `Decline No. ${refused.number}`);
      await dialog.getByRole('button', { name: 'Decline and tell them' }).click();
      await expect(dialog.getByRole('alert')).toContainText('Tell the customer why.');
      await dialog.getByLabel('Why').fill('The oven is being mended that week.');
      await expect(dialog.getByText(/Friday 18 June/)).toBeVisible();
      await lookOver(page);
      await dialog.getByRole('button', { name: 'Decline and tell them' }).click();
      await expect(page.getByText(`No. ${refused.number} is declined`)).toBeVisible();
      const mail = await mailbox.waitForMessage({ to: customer, subject: 'we cannot take it' });
      expect(mail.text).toContain('The oven is being mended that week.');
      expect(mail.text).toContain('Friday 18 June');
    });

    await test.step('moves a pickup', async () => {
      await page.goto(`/staff/orders/${moved.number}`);
      await page.getByRole('button', { name: 'Move the pickup' }).click();
      const dialog = dialogOf(page, `Move the pickup of No. ${moved.number}`);
      await dialog.getByRole('radio', { name: /^Thursday 17 June/ }).check({ force: true });
      await dialog.getByLabel('A word to the customer').fill('As we said on the telephone.');
      await lookOver(page);
      await dialog.getByRole('button', { name: 'Move it and tell them' }).click();
      await expect(page.getByText(/is now for Thursday 17 June/)).toBeVisible();
      const mail = await mailbox.waitForMessage({ to: customer, subject: 'your pickup is now' });
      expect(mail.text).toContain('Thursday 17 June');
      expect(mail.text).toContain('As we said on the telephone.');
    });

    await test.step('finds, narrows and sorts the orders', async () => {
      await page.goto('/staff/orders');
      const rows = page.getByRole('table').getByRole('row');
      // The head is a row too.
      await expect(rows).toHaveCount(3);
      await page.getByRole('searchbox', { name: 'Find' }).fill(String(moved.number));
      await expect(rows).toHaveCount(2);
      await expect(page).toHaveURL(new RegExp(`find=${moved.number}`));
      await page.reload();
      await expect(rows).toHaveCount(2);
      await page.getByRole('searchbox', { name: 'Find' }).fill('');
      await expect(rows).toHaveCount(3);
      await page
        .getByRole('search')
        .getByText(/^declined/)
        .click();
      await expect(rows.nth(1)).toContainText(String(refused.number));
      await expect(rows).toHaveCount(2);
    });

    await test.step('blocks a day, and customers see it closed', async () => {
      await page.goto('/staff/calendar?view=day&date=2027-06-25');
      await page.getByRole('button', { name: 'Block this day' }).click();
      await page.getByLabel('Why Friday 25 June is blocked').fill('Wedding of our own');
      await page.getByRole('button', { name: 'Block it' }).click();
      await expect(page.getByText(/takes no new orders/)).toBeVisible();
      await lookOver(page);
      const visitor = await newVisitor();
      await visitor.goto('/order');
      await visitor.getByLabel('Number of people').fill('20');
      await visitor.getByText('Birthday', { exact: true }).click();
      await expect(visitor.getByRole('button', { name: /^Friday 25 June\./ })).toBeDisabled();
      await expect(visitor.getByRole('button', { name: /^Saturday 26 June\./ })).toBeEnabled();
    });
  },
);
