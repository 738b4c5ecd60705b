import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { googleControl, type GoogleControl } from '#fakes/google/control.ts';
import { start, type GoogleFake } from '#fakes/google/start.ts';
import { Identity } from '#api/db/models/identity.ts';
import { User } from '#api/db/models/user.ts';
import {
  addUser,
  setSecondFactorRequired,
  signInCustomer,
  signInStaff,
} from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';

let app: TestApp;
let google: GoogleFake;
let control: GoogleControl;

beforeAll(async () => {
  app = await startTestApp({
    seeded: seededStudio,
    env: async (url) => {
      const redirectUris = [`${url}/api/auth/google/callback`];
      const client = { id: 'studio', secret: 'a secret', redirectUris };
      google = await start({ port: 0, clients: [client] });
      control = googleControl(google.url);
      return {
        GOOGLE_CLIENT_ID: client.id,
        GOOGLE_CLIENT_SECRET: client.secret,
        GOOGLE_AUTHORIZATION_URL: google.authorizationUrl,
        GOOGLE_TOKEN_URL: google.tokenUrl,
        GOOGLE_USERINFO_URL: google.userinfoUrl,
      };
    },
  });
  await setSecondFactorRequired(false);
});
afterAll(async () => {
  await app.close();
  await google.stop();
});

type Choice = { readonly email: string; readonly outcome?: string } | { readonly deny: '1' };

/** Presses a button on the stand-in's account chooser; answers where it sends the browser. */
async function choose(begun: Answer, choice: Choice): Promise<string> {
  expect(begun.status).toBe(302);
  const page = await fetch(begun.headers.get('Location') ?? '', { redirect: 'manual' });
  // Refused at once: the browser is sent straight back.
  if (page.status === 302) return page.headers.get('Location') ?? '';
  const key = /name="key" value="([^"]+)"/.exec(await page.text())?.[1] ?? '';
  const pressed = await fetch(`${google.url}/o/oauth2/v2/auth/choose`, {
    method: 'POST',
    body: new URLSearchParams({ key, ...choice }),
    redirect: 'manual',
  });
  return pressed.headers.get('Location') ?? '';
}

/** The whole way out and back; answers where our own server sends the browser at the end. */
async function signInAs(client: TestClient, choice: Choice, query = ''): Promise<string> {
  const back = await choose(await client.get(`/api/auth/google${query}`), choice);
  const answer = await client.get(back);
  expect(answer.status).toBe(303);
  return answer.headers.get('Location') ?? '';
}

const whoIs = async (client: TestClient) => (await client.get('/api/session')).body;

describe('signing in with Google', () => {
  it('opens an account for a verified address, and goes on where one was going', async () => {
    const client = app.visitor();
    const next = await signInAs(client, { email: 'rosa.whitlock@example.com' }, '?next=/order/you');
    expect(next).toBe('/order/you');
    expect(await whoIs(client)).toMatchObject({
      user: { email: 'rosa.whitlock@example.com', name: 'Rosa Whitlock', role: 'customer' },
      googleSignIn: true,
    });
  });

  it('knows an account by its sub, whatever its address is now', async () => {
    const first = app.visitor();
    await signInAs(first, { email: 'tomas.adair@example.com' });
    const user = await User.findOne({ where: { email: 'tomas.adair@example.com' } });
    const identity = await Identity.findOne({ where: { userId: user?.id ?? '' } });
    expect(identity?.subject).toMatch(/^\d{21}$/);
    const again = app.visitor();
    await signInAs(again, { email: 'tomas.adair@example.com', outcome: 'unverified-email' });
    expect(await whoIs(again)).toMatchObject({ user: { id: user?.id } });
  });

  it('joins the account whose address was proven by a link', async () => {
    await signInCustomer(app, 'priya.venkat@example.com');
    const before = await User.count();
    const client = app.visitor();
    await signInAs(client, { email: 'priya.venkat@example.com' });
    expect(await whoIs(client)).toMatchObject({ user: { email: 'priya.venkat@example.com' } });
    expect(await User.count()).toBe(before);
  });

  it('joins nothing when Google does not say the address is verified', async () => {
    await signInCustomer(app, 'joined.not@example.com');
    for (const email of ['joined.not@example.com', 'new.person@example.com']) {
      const client = app.visitor();
      const end = await signInAs(client, { email, outcome: 'unverified-email' });
      expect(end).toBe('/sign-in?problem=google-unverified');
      expect(await whoIs(client)).toMatchObject({ user: null });
    }
  });

  it('never joins staff by their address', async () => {
    await addUser('owner', { email: 'maren@oxbowlane.example' });
    const client = app.visitor();
    const end = await signInAs(client, { email: 'maren@oxbowlane.example' });
    expect(end).toBe('/sign-in?problem=google-staff');
    expect(await whoIs(client)).toMatchObject({ user: null });
  });

  it('signs staff in once they have linked it themselves, while signed in', async () => {
    const baker = await addUser('baker', { email: 'ines@oxbowlane.example' });
    const visitor = app.visitor();
    expect((await visitor.get('/api/auth/google?link=true')).status).toBe(401);

    const client = await signInStaff(app, baker);
    const end = await signInAs(client, { email: 'ines.castellan@example.com' }, '?link=true');
    expect(end).toBe('/account');
    const later = app.visitor();
    await signInAs(later, { email: 'ines.castellan@example.com' });
    expect(await whoIs(later)).toMatchObject({ user: { id: baker.id, role: 'baker' } });

    // Somebody else cannot take the same Google account over.
    const other = await signInStaff(
      app,
      await addUser('counter', { email: 'c@oxbowlane.example' }),
    );
    expect(await signInAs(other, { email: 'ines.castellan@example.com' }, '?link=true')).toBe(
      '/sign-in?problem=google-taken',
    );
  });

  it('renames the session', async () => {
    const client = app.visitor();
    await client.get('/api/auth/google');
    const before = client.cookie();
    await signInAs(client, { email: 'rosa.whitlock@example.com' });
    expect(client.cookie()).not.toBe(before);
  });
});

describe('when it does not work out', () => {
  it.each([
    ['the person says no', { deny: '1' }, 'google-denied'],
    [
      'the code is refused',
      { email: 'rosa.whitlock@example.com', outcome: 'bad-code' },
      'google-failed',
    ],
    [
      'the token endpoint fails',
      { email: 'rosa.whitlock@example.com', outcome: 'token-error' },
      'google-failed',
    ],
  ] as const)('%s: back to the sign-in page with a word for it', async (_what, choice, problem) => {
    const client = app.visitor();
    expect(await signInAs(client, choice)).toBe(`/sign-in?problem=${problem}`);
    expect(await whoIs(client)).toMatchObject({ user: null });
    // And the next try is a fresh one.
    await signInAs(client, { email: 'rosa.whitlock@example.com' });
    expect(await whoIs(client)).toMatchObject({ user: { name: 'Rosa Whitlock' } });
  });

  it('the profile cannot be read', async () => {
    await control.failNext({ kind: 'userinfo-error' });
    expect(await signInAs(app.visitor(), { email: 'rosa.whitlock@example.com' })).toBe(
      '/sign-in?problem=google-failed',
    );
  });

  it('an answer that another browser asked for is refused (state)', async () => {
    const asked = await app.visitor().get('/api/auth/google');
    const back = await choose(asked, { email: 'rosa.whitlock@example.com' });
    const other = app.visitor();
    await other.get('/api/auth/google');
    const answer = await other.get(back);
    expect(answer.headers.get('Location')).toBe('/sign-in?problem=google-failed');
    expect(await whoIs(other)).toMatchObject({ user: null });
    const nobody = await app.visitor().get(back);
    expect(nobody.headers.get('Location')).toBe('/sign-in?problem=google-failed');
  });

  it('the way back is asked for without an answer', async () => {
    for (const query of ['', '?state=x', '?error=server_error', '?code=a&code=b']) {
      const client = app.visitor();
      await client.get('/api/auth/google');
      const answer = await client.get(`/api/auth/google/callback${query}`);
      expect(answer.headers.get('Location')).toBe('/sign-in?problem=google-failed');
    }
  });

  it('an answer is good once', async () => {
    const client = app.visitor();
    const back = await choose(await client.get('/api/auth/google'), {
      email: 'rosa.whitlock@example.com',
    });
    expect((await client.get(back)).headers.get('Location')).toBe('/');
    expect((await client.get(back)).headers.get('Location')).toBe('/sign-in?problem=google-failed');
  });

  it('asks with PKCE, and goes on to no other site', async () => {
    const begun = await app.visitor().get('/api/auth/google');
    const asked = new URL(begun.headers.get('Location') ?? '').searchParams;
    expect(asked.get('code_challenge_method')).toBe('S256');
    expect(asked.get('state')?.length).toBeGreaterThanOrEqual(20);
    const end = await signInAs(
      app.visitor(),
      { email: 'rosa.whitlock@example.com' },
      '?next=//elsewhere.example',
    );
    expect(end).toBe('/');
  });
});
