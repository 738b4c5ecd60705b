import { expect, moment, test } from '../fixtures/journey.ts';
import {
  answerAll,
  answerCake,
  answerDay,
  answerSetting,
  goOnTo,
  onStep,
  send,
  sentNumber,
  wish,
} from '../fixtures/order-a-cake.ts';
import { phonePhoto, textAsPhoto } from '../fixtures/pictures.ts';
import { bakerBehindTheScene } from '../fixtures/staff.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

const aMinuteLater = new Date(new Date(moment).getTime() + 60_000);

test(
  'reload, back and forward, two tabs and a broken upload lose nothing',
  { tag: '@phone' },
  async ({ page, watch }) => {
    await page.goto('/order');
    await page.getByRole('button', { name: 'On to the cake' }).click();
    await expect(page.getByRole('alert')).toContainText('whole number');
    await lookOver(page);
    await answerDay(page, wish);
    await goOnTo(page, 'cake');
    await answerCake(page);
    await goOnTo(page, 'setting');

    await test.step('reload, back and forward', async () => {
      await answerSetting(page);
      await page.reload();
      await onStep(page, 'setting');
      await expect(page.getByLabel('Out before cutting')).toHaveValue('1 h');
      await expect(page.getByRole('radio', { name: 'Swiss meringue', exact: true })).toBeChecked();
      await page.goBack();
      await onStep(page, 'cake');
      await page.goBack();
      await expect(page.getByLabel('Number of people')).toHaveValue(String(wish.guests));
      await page.goForward();
      await page.goForward();
      await onStep(page, 'setting');
      await goOnTo(page, 'look');
    });

    await test.step('the drawing, the estimate and the advice in their drawer', async () => {
      await page.getByRole('button', { name: /See your cake/ }).click();
      await expect(page.getByRole('dialog').getByRole('img').first()).toBeVisible();
      await lookOver(page);
      await lookAtNarrow(page);
      await page.getByRole('dialog').getByRole('button', { name: 'Close' }).click();
    });

    await test.step('a photo waits for a lost connection, a text is refused', async () => {
      watch.expect({ path: '/api/photos', status: 'lost' }, { path: '/api/photos', status: 415 });
      await page.route('**/api/photos', (route) => route.abort('connectionfailed'), { times: 1 });
      await page
        .getByLabel('Choose pictures')
        .setInputFiles(await phonePhoto('hall.jpg', '#3f5d7d'));
      await expect(page.getByText(/is waiting for the connection/)).toBeVisible();
      await page.getByRole('button', { name: 'Try them again now' }).click();
      const arrived = page.getByRole('list', { name: 'Pictures that have arrived' });
      await expect(arrived.getByRole('listitem')).toHaveCount(1);
      await page.getByLabel('Choose more').setInputFiles(textAsPhoto);
      await expect(page.getByRole('alert')).toContainText('recipe.jpg');
      await lookOver(page);
      await page.getByRole('button', { name: 'Take recipe.jpg out' }).click();
    });

    await test.step('another tab is ahead', async () => {
      const other = await page.context().newPage();
      // Whichever was kept later is newer, and the journey's clock stands still.
      await page.context().clock.setFixedTime(aMinuteLater);
      await other.goto('/order/day');
      await other.getByLabel('Number of people').fill('24');
      await other.getByLabel('Number of people').blur();
      await expect(page.getByText(/This order was changed in another tab/)).toBeVisible();
      await lookOver(page);
      await page.getByRole('button', { name: 'Take the newer one' }).click();
      await other.close();
      await page.goto('/order/day');
      await expect(page.getByLabel('Number of people')).toHaveValue('24');
    });
  },
);

test(
  'a day that went, an answer that was lost and two presses make one order',
  {
    tag: '@desktop',
  },
  async ({ page, studio, mailbox, watch }) => {
    const baker = await bakerBehindTheScene(studio);
    await answerAll(page);

    await test.step('the day has gone: the nearest are offered, the rest is kept', async () => {
      await baker.blockDay(wish.date);
      watch.expect({ path: '/api/orders', status: 409 });
      await page.getByRole('button', { name: 'Send my order' }).click();
      await expect(page.getByText('Saturday 19 June has just gone')).toBeVisible();
      await lookOver(page);
      await page.getByRole('button', { name: 'Friday 18 June' }).click();
      await expect(page.getByText(/^Now Friday 18 June/)).toBeVisible();
      await expect(page.getByText(wish.email)).toBeVisible();
    });

    await test.step('the answer is lost, and Send is pressed twice', async () => {
      watch.expect({ path: '/api/orders', status: 'lost' });
      await page.route(
        '**/api/orders',
        async (route) => {
          // It arrives, and nobody hears so.
          await route.fetch();
          await route.abort('connectionfailed');
        },
        { times: 1 },
      );
      await page.getByRole('button', { name: 'Send my order' }).click();
      await expect(page.getByText('We could not tell whether it arrived')).toBeVisible();
      await page.reload();
      await onStep(page, 'check');
      await page.getByRole('button', { name: 'Send my order' }).dblclick();
      const number = await sentNumber(page);
      expect(await baker.countOrders()).toBe(1);
      await mailbox.waitForMessage({ to: wish.email, subject: `Order No. ${number}` });
      expect(await mailbox.messages({ to: wish.email })).toHaveLength(1);
    });
  },
);

test(
  'an egg allergy shows at every choice, and a way out is one press',
  { tag: '@desktop' },
  async ({ page, studio }) => {
    await page.goto('/order');
    await page.getByRole('button', { name: 'Add an allergy' }).click();
    await page.getByLabel('What is it?').selectOption({ label: 'Egg' });
    await page.getByLabel('How serious is it?').selectOption({ index: 3 });
    await answerDay(page, wish);
    await lookOver(page);
    await goOnTo(page, 'cake');
    await answerCake(page);
    await goOnTo(page, 'setting');
    await answerSetting(page);

    const beside = page.getByRole('region', { name: 'Your cake so far' });
    // The words stand twice, once for screen readers alone: this is the paragraph that is seen.
    const conflict = beside
      .getByRole('paragraph')
      .filter({ hasText: /^Egg is in Swiss meringue buttercream/ });
    await expect(conflict).toBeVisible();
    await lookOver(page);
    await beside
      .getByRole('button', { name: /^American/ })
      .first()
      .click();
    await expect(page.getByRole('radio', { name: 'American', exact: true })).toBeChecked();
    await expect(conflict).toBeHidden();
    await goOnTo(page, 'look');
    await goOnTo(page, 'you');
    await page.getByLabel('Your name').fill(wish.name);
    await page.getByRole('textbox', { name: 'E-mail' }).fill(wish.email);
    await page.getByLabel('I have read and agree to the studio’s policies').check();
    await page.getByRole('button', { name: 'On to the check' }).click();
    await expect(page.getByRole('alert')).toContainText('allerg');
    await page.getByLabel('You may keep what I told you about allergies, for this order').check();
    await goOnTo(page, 'check');
    await lookOver(page);
    await send(page);
    expect(await (await bakerBehindTheScene(studio)).countOrders()).toBe(1);
  },
);

test('the first step by keyboard alone', { tag: '@desktop' }, async ({ page }) => {
  await page.goto('/order/day');
  await onStep(page, 'day');
  await page.getByLabel('Number of people').focus();
  await page.keyboard.type('20');
  await page.keyboard.press('Tab');
  await page.keyboard.press('Space');
  await page.keyboard.press('ArrowRight');
  await expect(page.getByRole('radio', { name: 'Birthday', exact: true })).toBeChecked();
  const day = page.getByRole('button', { name: /^Saturday 19 June\./ });
  await expect(day).toBeEnabled();
  // On through everything in between to the calendar's one stop.
  const focused = page.locator(':focus');
  const inCalendar = page.getByRole('grid').locator(':focus');
  for (let press = 0; press < 30 && (await inCalendar.count()) === 0; press += 1) {
    await page.keyboard.press('Tab');
  }
  await expect(inCalendar).toHaveCount(1);
  for (
    let press = 0;
    press < 31 && !(await day.evaluate((it) => it === document.activeElement));
    press += 1
  ) {
    await page.keyboard.press('ArrowRight');
  }
  await expect(day).toBeFocused();
  await page.keyboard.press('Enter');
  const windows = page.getByRole('group', { name: 'Collect on Saturday 19 June' });
  for (let press = 0; press < 10 && (await windows.locator(':focus').count()) === 0; press += 1) {
    await page.keyboard.press('Tab');
  }
  await page.keyboard.press('Space');
  await expect(windows.locator(':checked')).toHaveCount(1);
  await page.keyboard.press('Tab');
  await expect(focused).toHaveText('On to the cake');
  await page.keyboard.press('Enter');
  await onStep(page, 'cake');
});
