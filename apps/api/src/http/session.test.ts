import { afterAll, beforeAll, expect, it } from 'vitest';
import { addUser, setSecondFactorRequired, staffPassword } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

const origin = 'https://cakes.studio.org';
let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio, env: () => ({ PUBLIC_URL: origin }) });
  await setSecondFactorRequired(false);
  await addUser('baker', { email: 'ines@oxbowlane.example' });
});
afterAll(() => app.close());

const body = { email: 'ines@oxbowlane.example', password: staffPassword };

it.each([
  ['behind a proxy that says so', { 'X-Forwarded-Proto': 'https' }],
  ['behind one that does not', {}],
])('an https address has Secure cookies of this host alone, %s', async (_what, headers) => {
  const client = app.visitor();
  const signedIn = await client.post('/api/session/password', body, {
    headers: { Origin: origin, ...headers },
  });
  const cookie = signedIn.headers.get('Set-Cookie') ?? '';
  // The prefix makes browsers refuse one that a neighbouring host or plain http would set.
  expect(cookie).toMatch(/^__Host-tierwell=/);
  expect(cookie).toMatch(/; Secure/);
  expect(cookie).toMatch(/; Path=\//);
  expect(cookie).not.toMatch(/; Domain/);
  expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
});

it('no other origin may change anything, not even the computer’s own', async () => {
  const answer = await app.visitor().post('/api/session/password', body, {
    headers: { Origin: 'http://cakes.studio.org' },
  });
  expect(answer.body).toMatchObject({ code: 'wrong-origin' });
});
