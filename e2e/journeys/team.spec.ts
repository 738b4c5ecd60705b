import { TOTP } from 'otpauth';
import { setSecondFactorRequired } from '#api/testing/people.ts';
import { expect, test } from '../fixtures/journey.ts';
import { linkIn } from '../fixtures/mail.ts';
import { signInAs, typePassword } from '../fixtures/staff.ts';
import { lookAtNarrow, lookOver } from '../fixtures/watch.ts';

const password = 'a spoon of quince and two of honey';

test(
  'the owner invites a baker by e-mail, who sets up a second factor',
  { tag: '@phone' },
  async ({ page, newVisitor, mailbox, studio }) => {
    const invited = 'noor@oxbowlane.example';
    await signInAs(page, 'owner', '/staff/studio');
    await page.getByLabel('Name').fill('Noor Vale');
    await page.getByLabel('E-mail address').fill(invited);
    await page.getByRole('group', { name: 'Role' }).getByText('Baker', { exact: true }).click();
    await lookOver(page);
    await page.getByRole('button', { name: 'Send the invitation' }).click();
    await expect(page.getByText(`An invitation is on its way to ${invited}.`)).toBeVisible();

    await setSecondFactorRequired(true);
    const mail = await mailbox.waitForMessage({ to: invited, subject: 'Come and work with' });
    const baker = await newVisitor();
    const secret = await test.step('the invited makes an account and enrols', async () => {
      await baker.goto(linkIn(mail, '/links/invitation'));
      await lookOver(baker);
      await baker.getByLabel('Your name').fill('Noor Vale');
      await baker.getByLabel('A password').fill('short');
      await baker.getByRole('button', { name: 'Make my account' }).click();
      await expect(baker.getByRole('alert')).toBeVisible();
      await baker.getByLabel('A password').fill(password);
      await baker.getByRole('button', { name: 'Make my account' }).click();
      await baker.getByRole('button', { name: 'Set it up now' }).click();
      const shown = baker.getByText(/^Or type the secret/).getByRole('strong');
      await lookOver(baker);
      await lookAtNarrow(baker);
      return (await shown.textContent()) ?? '';
    });
    const code = () => new TOTP({ secret }).generate({ timestamp: studio.clock.now().getTime() });

    await test.step('keeps the recovery codes and is let in', async () => {
      await baker.getByLabel('The code it shows now').fill(code());
      await baker.getByRole('button', { name: 'Confirm' }).click();
      await expect(baker.getByText('Your second factor is set up')).toBeVisible();
      await expect(baker.getByRole('listitem').filter({ hasText: /^[\w-]+$/ })).toHaveCount(10);
      await lookOver(baker);
      await baker.getByRole('button', { name: 'I have kept them' }).click();
      await expect(baker).toHaveURL((url) => url.pathname.startsWith('/staff'));
    });

    await test.step('signs in again with password and code', async () => {
      await baker.goto('/staff/me');
      await lookOver(baker);
      await baker.getByRole('button', { name: 'Sign out' }).click();
      await expect(baker.getByRole('heading', { level: 1, name: 'Studio sign-in' })).toBeVisible();
      await typePassword(baker, invited, password);
      studio.clock.advance({ minutes: 1 });
      await baker.getByLabel('Code').fill(code());
      await lookOver(baker);
      await baker.getByRole('button', { name: 'Go on' }).click();
      await expect(baker).toHaveURL((url) => url.pathname.startsWith('/staff'));
    });
  },
);
