import sharp from 'sharp';
import { expect, test } from '../fixtures/journey.ts';
import { eventIn, linkIn, studioAddress } from '../fixtures/mail.ts';
import {
  answerCake,
  answerDay,
  answerSetting,
  answerYou,
  goOnTo,
  onStep,
  send,
  wish,
} from '../fixtures/order-a-cake.ts';
import { phonePhoto } from '../fixtures/pictures.ts';
import { bakerBehindTheScene } from '../fixtures/staff.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

test('a guest orders with two photos, keeps the day by the link and reads both e-mails', async ({
  page,
  newVisitor,
  mailbox,
  studio,
}) => {
  const look = async () => {
    await lookOver(page);
    await lookAtNarrow(page);
  };

  await test.step('from the home page through the six steps', async () => {
    await page.goto('/');
    await look();
    await page.getByRole('link', { name: 'Order a cake' }).first().click();
    await onStep(page, 'day');
    await answerDay(page, wish);
    await look();
    await goOnTo(page, 'cake');
    await answerCake(page);
    await look();
    await goOnTo(page, 'setting');
    await answerSetting(page);
    await look();
    await goOnTo(page, 'look');
    await page
      .getByLabel('Choose pictures')
      .setInputFiles([
        await phonePhoto('dress.jpg', '#d8a7b1'),
        await phonePhoto('hall.jpg', '#3f5d7d'),
      ]);
    const arrived = page.getByRole('list', { name: 'Pictures that have arrived' });
    await expect(arrived.getByRole('listitem')).toHaveCount(2);
    await arrived.getByLabel('What do you like about it?').first().fill('The colour of the dress');
    await page.getByRole('textbox', { name: 'On the cake' }).fill('Happy 40th, Noor');
    await look();
    await goOnTo(page, 'you');
    await answerYou(page, wish);
    await look();
    await goOnTo(page, 'check');
    await expect(page.getByText('The colour of the dress')).toBeVisible();
    await look();
  });

  const number = await send(page);
  await test.step('is told what comes next', async () => {
    await expect(page.getByText(/Your day is kept for 30 minutes, until .*10:30/)).toBeVisible();
    await look();
    await page.getByRole('link', { name: 'Open your order' }).click();
    await expect(page.getByText(/Open the link in the e-mail/)).toBeVisible();
    await look();
  });

  const received = await mailbox.waitForMessage({ to: wish.email, subject: 'we have it' });
  await mailbox.waitForMessage({ to: studioAddress, subject: `New order No. ${number}` });

  const elsewhere = await newVisitor();
  await test.step('opens the link in the e-mail elsewhere: the place is kept longer', async () => {
    await elsewhere.goto(linkIn(received, '/orders/'));
    await expect(elsewhere.getByText(/The baker looks at your order/)).toBeVisible();
    await expect(elsewhere).toHaveURL((url) => url.hash === '');
    const photo = elsewhere.getByRole('img', { name: 'The colour of the dress' });
    await photo.scrollIntoViewIfNeeded();
    await expect(photo).toHaveJSProperty('complete', true);
    const source = await photo.evaluate((it: HTMLImageElement) => it.currentSrc);
    const kept = await sharp(await (await elsewhere.request.get(source)).body()).metadata();
    expect(kept).not.toHaveProperty('exif');
    expect(kept.orientation ?? 1).toBe(1);
    // It was lying on its side; now it stands.
    expect(kept.height).toBeGreaterThan(kept.width);
  });

  await test.step('writes to the studio from there', async () => {
    await elsewhere.getByLabel('Write to the studio').fill('Is there room for six candles?');
    await elsewhere.getByRole('button', { name: 'Send the message' }).click();
    await expect(elsewhere.getByText('Is there room for six candles?')).toBeVisible();
    await mailbox.waitForMessage({ to: studioAddress, subject: 'has written' });
  });

  await test.step('gets the confirmation with the pickup for the calendar', async () => {
    await (await bakerBehindTheScene(studio)).confirm(number);
    const confirmed = await mailbox.waitForMessage({ to: wish.email, subject: 'is confirmed' });
    expect(confirmed.inReplyTo).toBe(received.messageId);
    const event = await eventIn(mailbox, confirmed);
    expect(event.startDate.toJSDate().toISOString()).toBe('2027-06-19T14:00:00.000Z');
    expect(event.description).toContain(`No. ${number}`);
    await elsewhere.reload();
    await expect(elsewhere.getByRole('link', { name: 'Add to calendar' })).toBeVisible();
    await lookOver(elsewhere);
  });
});
