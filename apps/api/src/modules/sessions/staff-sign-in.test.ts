import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { ownSessions } from '#shared/contracts/accounts.ts';
import { Session } from '#api/db/models/session.ts';
import { SignInFailure } from '#api/db/models/sign-in-failure.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import {
  addUser,
  lastLinkKey,
  setSecondFactorRequired,
  signInStaff,
  staffPassword,
} from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

let app: TestApp;
let baker: User;

beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio });
  baker = await addUser('baker', { email: 'ines@oxbowlane.example', name: 'Ines Castellan' });
  await setSecondFactorRequired(false);
});
afterAll(() => app.close());
beforeEach(() => inTransaction(() => SignInFailure.destroy({ where: {} })));

const signIn = (email: string, password: string) =>
  app.visitor().post('/api/session/password', { email, password });

describe('staff’s password', () => {
  it('opens a session under a new name that scripts cannot read', async () => {
    const client = app.visitor();
    const answer = await client.post('/api/session/password', {
      email: 'Ines@OxbowLane.example ',
      password: staffPassword,
    });
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({
      user: { email: 'ines@oxbowlane.example', role: 'baker', secondFactor: 'none' },
    });
    expect(answer.headers.get('Set-Cookie')).toMatch(/HttpOnly/);
    expect(answer.headers.get('Set-Cookie')).toMatch(/SameSite=Lax/);
    expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
  });

  it('gives one answer to a wrong password, an unknown address and a customer', async () => {
    await addUser('customer', { email: 'rosa@example.com' });
    const answers = await Promise.all([
      signIn('ines@oxbowlane.example', 'not the password at all'),
      signIn('nobody@example.com', staffPassword),
      signIn('rosa@example.com', staffPassword),
    ]);
    for (const answer of answers) {
      expect(answer.status).toBe(401);
      expect(answer.body).toEqual(answers[0].body);
    }
  });

  it('is asked for more slowly after ten wrong tries, and again after a quarter of an hour', async () => {
    for (let n = 0; n < 10; n += 1) {
      expect((await signIn('ines@oxbowlane.example', `wrong number ${n}`)).status).toBe(401);
    }
    const refused = await signIn('ines@oxbowlane.example', staffPassword);
    expect(refused.status).toBe(429);
    expect(refused.body).toMatchObject({ code: 'too-many-requests' });
    expect(Number(refused.headers.get('Retry-After'))).toBeGreaterThan(0);
    app.clock.advance({ minutes: 15, seconds: 1 });
    expect((await signIn('ines@oxbowlane.example', staffPassword)).status).toBe(200);
  });

  it('cannot be tried more often by trying at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 14 }, (_, n) => signIn('ines@oxbowlane.example', `at once ${n}`)),
    );
    expect(answers.filter(({ status }) => status === 401)).toHaveLength(10);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(4);
  });

  it('may be tried for fifty accounts from one place, no more', async () => {
    await inTransaction(() =>
      SignInFailure.bulkCreate(
        Array.from({ length: 50 }, (_, n) => ({ account: `other ${n}`, address: '127.0.0.1' })),
      ),
    );
    expect((await signIn('ines@oxbowlane.example', staffPassword)).status).toBe(429);
  });
});

describe('a session', () => {
  it('is renamed at sign-in: the name of before opens nothing', async () => {
    const client = await signInStaff(app, baker);
    const before = app.visitor();
    before.takeCookies(client);
    await client.post('/api/session/password', {
      email: baker.email,
      password: staffPassword,
    });
    expect(client.cookie()).not.toBe(before.cookie());
    expect((await before.get('/api/session')).body).toMatchObject({ user: null });
    expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
  });

  it('ends after eight hours unused; using it keeps it', async () => {
    const client = await signInStaff(app, baker);
    app.clock.advance({ hours: 7, minutes: 59 });
    expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
    app.clock.advance({ hours: 7, minutes: 59 });
    expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
    app.clock.advance({ hours: 8 });
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
  });

  it('ends after a day, however much it is used', async () => {
    const client = await signInStaff(app, baker);
    for (let hour = 0; hour < 23; hour += 1) {
      app.clock.advance({ hours: 1 });
      await client.get('/api/session');
    }
    expect((await client.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
    app.clock.advance({ hours: 1 });
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
  });

  it('is not written at every use', async () => {
    const client = await signInStaff(app, baker);
    const written = async () => {
      const [latest] = await Session.findAll({ order: [['lastSeenAt', 'DESC']] });
      return latest?.lastSeenAt.toISOString();
    };
    const first = await written();
    app.clock.advance({ minutes: 4 });
    await client.get('/api/session');
    expect(await written()).toEqual(first);
    app.clock.advance({ minutes: 1 });
    await client.get('/api/session');
    expect(await written()).not.toEqual(first);
  });

  it('is not kept for somebody who only looks', async () => {
    const before = await Session.count();
    const client = app.visitor();
    const answer = await client.get('/api/session');
    expect(answer.headers.get('Set-Cookie')).toBeNull();
    expect(await Session.count()).toBe(before);
  });

  it('holds no name that opens it in the database', async () => {
    const client = await signInStaff(app, baker);
    const sid =
      decodeURIComponent(client.cookie() ?? '')
        .replace(/^s:/, '')
        .split('.')[0] ?? '';
    expect(sid.length).toBeGreaterThan(20);
    const rows = await Session.findAll();
    expect(JSON.stringify(rows)).not.toContain(sid);
  });

  it('is listed and ended by its owner, and by nobody else', async () => {
    const other = await addUser('counter', { email: 'tomas@oxbowlane.example' });
    const [first, second, stranger] = await Promise.all([
      signInStaff(app, baker),
      signInStaff(app, baker),
      signInStaff(app, other),
    ]);
    const listed = await first.get('/api/account/sessions');
    expect(listed.status).toBe(200);
    const ids = sessionIds(listed.body, false);
    expect(sessionIds(listed.body, true)).toHaveLength(1);
    for (const id of ids) {
      expect((await stranger.delete(`/api/account/sessions/${id}`)).status).toBe(404);
    }
    for (const id of ids) await first.delete(`/api/account/sessions/${id}`);
    expect((await second.get('/api/session')).body).toMatchObject({ user: null });
    expect((await first.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
  });

  it('ends when signing out, here and in a copy of the cookie', async () => {
    const client = await signInStaff(app, baker);
    const copy = app.visitor();
    copy.takeCookies(client);
    expect((await client.delete('/api/session')).body).toMatchObject({ user: null });
    expect((await copy.get('/api/account/sessions')).status).toBe(401);
  });
});

function sessionIds(body: unknown, current: boolean): string[] {
  const { sessions } = z.parse(ownSessions, body);
  return sessions.filter((each) => each.current === current).map(({ id }) => id);
}

describe('a forgotten password', () => {
  const ask = (email: string) => app.visitor().post('/api/session/password-resets', { email });

  it('is replaced by a link, once; every session ends', async () => {
    const user = await addUser('baker', { email: 'reset@oxbowlane.example' });
    const client = await signInStaff(app, user);
    await ask('reset@oxbowlane.example');
    const token = await lastLinkKey(app, 'password-reset', 'reset@oxbowlane.example');
    const use = (password: string) =>
      app.visitor().post('/api/session/password-resets/use', { token, password });

    // A refused password leaves the link as it was.
    expect((await use('short')).status).toBe(422);
    expect((await use('to be or not to be')).status).toBe(422);
    expect((await use('plum jam on rye toast')).status).toBe(200);
    expect((await use('another one for a thief')).status).toBe(410);
    expect((await client.get('/api/account/sessions')).status).toBe(401);
    expect((await signIn('reset@oxbowlane.example', staffPassword)).status).toBe(401);
    expect((await signIn('reset@oxbowlane.example', 'plum jam on rye toast')).status).toBe(200);
  });

  it('gets the same answer for anybody, and a link for staff only', async () => {
    await addUser('customer', { email: 'priya@example.com' });
    const known = await ask('ines@oxbowlane.example');
    for (const email of ['priya@example.com', 'nobody@example.com']) {
      expect((await ask(email)).body).toEqual(known.body);
      await expect(lastLinkKey(app, 'password-reset', email)).rejects.toThrow('no password-reset');
    }
  });

  it('has a link that runs out after fifteen minutes', async () => {
    await ask('ines@oxbowlane.example');
    const token = await lastLinkKey(app, 'password-reset', 'ines@oxbowlane.example');
    app.clock.advance({ minutes: 15 });
    const answer = await app
      .visitor()
      .post('/api/session/password-resets/use', { token, password: 'plum jam on rye toast' });
    expect(answer.body).toMatchObject({ code: 'link-spent' });
  });
});

describe('one’s own password', () => {
  it('is changed by whoever knows it; the other sessions end', async () => {
    const user = await addUser('counter', { email: 'change@oxbowlane.example' });
    const here = await signInStaff(app, user);
    const elsewhere = await signInStaff(app, user);
    const change = (password: string) =>
      here.post('/api/account/password', { password, newPassword: 'plum jam on rye toast' });
    expect((await change('not the old one')).body).toMatchObject({
      issues: [{ path: ['password'] }],
    });
    expect((await change(staffPassword)).status).toBe(200);
    expect((await here.get('/api/account/sessions')).status).toBe(200);
    expect((await elsewhere.get('/api/account/sessions')).status).toBe(401);
  });
});
