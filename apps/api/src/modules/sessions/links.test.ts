import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { addUser, lastLinkKey, signInCustomer } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio });
});
afterAll(() => app.close());

const ask = (email: string, next?: string) =>
  app.visitor().post('/api/session/links', { email, next });
const keyFor = (email: string) => lastLinkKey(app, 'sign-in', email);

describe('a sign-in link', () => {
  it('opens an account once its address is proven, and not before', async () => {
    await ask('Rosa.Whitlock@example.com', '/orders/ABC');
    expect(await User.findOne({ where: { email: 'rosa.whitlock@example.com' } })).toBeNull();
    const client = app.visitor();
    const token = await keyFor('rosa.whitlock@example.com');
    const answer = await client.post('/api/session/links/use', { token });
    expect(answer.body).toMatchObject({
      purpose: 'sign-in',
      next: '/orders/ABC',
      session: { user: { email: 'rosa.whitlock@example.com', role: 'customer' } },
    });
    expect((await client.get('/api/session')).body).toMatchObject({
      user: { email: 'rosa.whitlock@example.com' },
    });
  });

  it('works once', async () => {
    await ask('twice@example.com');
    const token = await keyFor('twice@example.com');
    const answers = await Promise.all(
      Array.from({ length: 5 }, () => app.visitor().post('/api/session/links/use', { token })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 410, 410, 410, 410]);
  });

  it('works for fifteen minutes', async () => {
    await ask('late@example.com');
    const token = await keyFor('late@example.com');
    app.clock.advance({ minutes: 14, seconds: 59 });
    expect((await app.visitor().post('/api/session/links/look', { token })).status).toBe(200);
    app.clock.advance({ seconds: 1 });
    const answer = await app.visitor().post('/api/session/links/use', { token });
    expect(answer.status).toBe(410);
    expect(answer.body).toMatchObject({ code: 'link-spent' });
  });

  it('is not spent by being opened or looked at, as mail scanners do', async () => {
    await ask('scanned@example.com');
    const token = await keyFor('scanned@example.com');
    expect((await app.visitor().get(`/api/session/links/use?token=${token}`)).status).toBe(404);
    const look = await app.visitor().post('/api/session/links/look', { token });
    expect(look.body).toEqual({
      purpose: 'sign-in',
      email: 'scanned@example.com',
      role: null,
      name: null,
    });
    expect((await app.visitor().post('/api/session/links/use', { token })).status).toBe(200);
  });

  it('is stored hashed: no row holds what opens it', async () => {
    await ask('hashed@example.com');
    const token = await keyFor('hashed@example.com');
    const rows = JSON.stringify([await Token.findAll(), await OutboxRow.findAll()]);
    expect(rows).not.toContain(token);
  });

  it('is asked for with the same answer whether the address is known or not', async () => {
    await addUser('customer', { email: 'known@example.com' });
    await addUser('owner', { email: 'maren@oxbowlane.example' });
    const answers = [];
    for (const email of ['known@example.com', 'unknown@example.com', 'maren@oxbowlane.example']) {
      answers.push(await ask(email));
    }
    for (const { status, body } of answers)
      expect({ status, body }).toEqual({ status: 200, body: { done: true } });
  });

  it('is never sent to staff: they are told to use their password', async () => {
    const staff = await addUser('baker', { email: 'ines@oxbowlane.example' });
    await ask('ines@oxbowlane.example');
    await expect(keyFor('ines@oxbowlane.example')).rejects.toThrow('no sign-in link');
    const told = await OutboxRow.findAll({ where: { kind: 'sign-in-link-refused' } });
    expect(told.map(({ payload }) => payload)).toContainEqual({ userId: staff.id });
  });

  it('does not open a staff session for somebody who became staff after it was sent', async () => {
    await ask('later.staff@example.com');
    const token = await keyFor('later.staff@example.com');
    await addUser('counter', { email: 'later.staff@example.com' });
    const client = app.visitor();
    const answer = await client.post('/api/session/links/use', { token });
    expect(answer.body).toMatchObject({ code: 'sign-in-failed' });
    expect((await client.get('/api/session')).body).toMatchObject({ user: null });
  });

  it('goes on to no other site', async () => {
    for (const next of [
      'https://elsewhere.example/',
      '//elsewhere.example',
      '/\\elsewhere.example',
      'javascript:alert(1)',
    ]) {
      await ask('careful@example.com', next);
      const token = await keyFor('careful@example.com');
      const answer = await app.visitor().post('/api/session/links/use', { token });
      expect(answer.body).toMatchObject({ next: null });
      app.clock.advance({ minutes: 15 });
    }
  });

  it('is sent to one address five times in a quarter of an hour', async () => {
    for (let n = 0; n < 5; n += 1) expect((await ask('often@example.com')).status).toBe(200);
    expect((await ask('Often@Example.com ')).status).toBe(429);
    app.clock.advance({ minutes: 15, seconds: 1 });
    expect((await ask('often@example.com')).status).toBe(200);
  });
});

describe('a customer’s session', () => {
  it('ends after thirty days unused', async () => {
    const client = await signInCustomer(app, 'rosa.whitlock@example.com');
    app.clock.advance({ days: 29 });
    expect((await client.get('/api/account/sessions')).status).toBe(200);
    app.clock.advance({ days: 30 });
    expect((await client.get('/api/account/sessions')).status).toBe(401);
  });

  it('lets nobody near what is for staff', async () => {
    const client = await signInCustomer(app, 'rosa.whitlock@example.com');
    expect((await client.get('/api/staff/people')).body).toMatchObject({ code: 'not-allowed' });
    expect((await client.post('/api/session/second-factor/enrolment')).status).toBe(403);
  });
});
