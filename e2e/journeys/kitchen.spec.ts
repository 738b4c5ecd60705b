import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { expect, test } from '../fixtures/journey.ts';
import { linkIn, studioAddress } from '../fixtures/mail.ts';
import { dialogOf, signInAs } from '../fixtures/staff.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

const customer = 'mara@example.com';

test(
  'a baker reads a recipe into a formula, is told of the bad line, and sees what changed',
  { tag: '@desktop' },
  async ({ page, newVisitor, watch }) => {
    await signInAs(page, 'baker', '/staff/pantry');

    await test.step('finds the formula and scales it for the bench', async () => {
      await lookOver(page);
      await lookAtNarrow(page);
      await page.getByRole('link', { name: /^German buttercream/ }).click();
      await expect(page.getByRole('heading', { level: 1, name: /German/ })).toBeVisible();
      await lookOver(page);
      await lookAtNarrow(page);
      await page.getByText('A weight', { exact: true }).click();
      await page.getByLabel('Make', { exact: true }).fill('1,850 g');
      await expect(page.getByText('1,850 g').first()).toBeVisible();
    });

    await test.step('writes the next version and takes the weight that is right', async () => {
      await page.getByRole('link', { name: 'Change it' }).click();
      const butter = page.getByRole('textbox', { name: 'Line 2', exact: true });
      await expect(butter).toHaveValue(/butter/i);
      await butter.fill('1 lb butter, 480 g');
      await expect(page.getByText(/454 g/).first()).toBeVisible();
      await lookOver(page);
      await lookAtNarrow(page);
      await page.getByRole('button', { name: /^Take .*: 454 g/ }).click();
      await page.getByRole('button', { name: /^Save version/ }).click();
      await expect(page.getByRole('heading', { name: 'What changed' })).toBeVisible();
      await lookOver(page);
    });

    await test.step('and the counter sees that the pantry is the bakers’', async () => {
      watch.expect({ path: '/api/pantry', status: 403 });
      const counter = await newVisitor();
      await signInAs(counter, 'counter', '/staff/pantry');
      await expect(counter.getByText('The pantry is the bakers’')).toBeVisible();
      await lookOver(counter);
    });
  },
);

test(
  'a label that changes reaches an open order, and nobody hands it over untold',
  { tag: '@desktop' },
  async ({ page, studio, mailbox }) => {
    const { number } = await placeOrder(studio.visitor(), orderForm('2027-06-19'));
    await signInAs(page, 'baker', '/staff/pantry/ingredients');
    await lookOver(page);
    await lookAtNarrow(page);
    await page.getByLabel('Find').fill('sugar');
    await page.getByRole('link', { name: /^Granulated cane sugar/ }).click();
    await lookOver(page);
    await lookAtNarrow(page);
    await page
      .getByRole('group', { name: 'Sesame' })
      .getByText('contains', { exact: true })
      .click();
    await page.getByRole('button', { name: 'Save', exact: true }).click();
    await page.getByRole('link', { name: `Order No. ${number}` }).click();
    await expect(page.getByRole('heading', { name: 'What is in it has changed' })).toBeVisible();
    await expect(page.getByText('The customer does not know yet')).toBeVisible();
    await lookOver(page);
    await mailbox.waitForMessage({ to: studioAddress, subject: 'has changed' });
    await page.getByRole('button', { name: 'I have told them' }).click();
    await page.getByLabel('How they were told').fill('Rang Mara: nobody minds sesame.');
    await page.getByRole('button', { name: 'Note it' }).click();
    await expect(page.getByText('The customer knows.')).toBeVisible();
  },
);

test('an owner takes an order against an allergy, the customer accepts why, and the cake has its own page', async ({
  page,
  studio,
  mailbox,
  newVisitor,
}) => {
  const { number } = await placeOrder(
    studio.visitor(),
    orderForm('2027-06-19', {
      day: {
        allergies: [{ allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 }],
      },
      consents: { allergyData: true },
    }),
  );
  const received = await mailbox.waitForMessage({ to: customer, subject: 'we have it' });
  await signInAs(page, 'owner', `/staff/orders/${number}`);

  await test.step('records the talk, then writes why', async () => {
    await expect(page.getByRole('button', { name: 'Take it all the same' })).toBeHidden();
    await lookOver(page);
    await page.getByRole('button', { name: 'Record the talk' }).click();
    await page.getByLabel('What was said and settled').fill('Rang Mara: the guest brings his own.');
    await page.getByRole('button', { name: 'Note it' }).click();
    // News comes one at a time: what comes next must not be read over by what was before.
    await expect(page.getByText('The talk is noted with the order.')).toBeVisible();
    await page.getByRole('button', { name: 'Take it all the same' }).click();
    await page.getByLabel('Why you take it all the same').fill('The guest will not eat of it.');
    await page.getByRole('button', { name: 'Take it, for this reason' }).click();
    await expect(page.getByText('Your reason is noted.')).toBeVisible();
    await lookOver(page);
  });

  const guest = await newVisitor();
  await test.step('the customer reads and accepts it', async () => {
    await mailbox.waitForMessage({ to: customer, subject: 'read' });
    await guest.goto(linkIn(received, '/orders/'));
    await expect(guest.getByText('The guest will not eat of it.')).toBeVisible();
    await lookOver(guest);
    await lookAtNarrow(guest);
    await guest.getByLabel('I have read what is in the cake and why you take the order').check();
    await guest.getByRole('button', { name: 'I accept this' }).click();
    await expect(guest.getByText('What you read and accepted')).toBeVisible();
  });

  await test.step('it is confirmed, with what it costs beside it', async () => {
    await page.reload();
    await expect(page.getByRole('heading', { name: 'Cost and margin' })).toBeVisible();
    await page.getByRole('button', { name: 'Confirm', exact: true }).click();
    const dialog = dialogOf(page, `Confirm No. ${number}`);
    await dialog.getByRole('button', { name: 'Confirm and send it' }).click();
    await expect(page.getByText(`No. ${number} is confirmed.`)).toBeVisible();
  });

  await test.step('labels and a care card are printed, and the card’s code opens the cake', async () => {
    const cards = page.getByRole('region', { name: 'Labels and care card' });
    const label = await cards
      .getByRole('link', { name: 'Open the labels to print' })
      .getAttribute('href');
    const printed = await page.request.get(label ?? '');
    expect(printed.headers()['content-type']).toBe('application/pdf');
    await guest.reload();
    await guest.getByRole('link', { name: 'The page about this cake' }).click();
    await expect(guest).toHaveURL(/\/cake\//);
    await expect(guest.getByText('Mara')).toBeHidden();
    await lookOver(guest);
    await lookAtNarrow(guest);
  });

  await test.step('and the kitchen has its sheet', async () => {
    await page.goto(`/staff/orders/${number}/kitchen`);
    await lookOver(page);
    await lookAtNarrow(page);
    await page.goto('/staff/pantry/eggs');
    await lookOver(page);
    await lookAtNarrow(page);
    await page.goto('/staff/pantry/shopping');
    await lookOver(page);
    await lookAtNarrow(page);
  });
});

test(
  'the owner writes the next price book and the allergy table',
  { tag: '@desktop' },
  async ({ page }) => {
    await signInAs(page, 'owner', '/staff/studio/prices');
    await lookOver(page);
    await lookAtNarrow(page);
    await page.getByLabel('No cake is sold for less than').fill('80');
    await lookOver(page);
    await page.getByRole('button', { name: 'Save the prices' }).click();
    await expect(page.getByText(/version 2/i).first()).toBeVisible();
    await page.goto('/staff/studio/allergies');
    await lookOver(page);
    await lookAtNarrow(page);
  },
);
