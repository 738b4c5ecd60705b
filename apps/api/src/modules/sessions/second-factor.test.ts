import { Secret, TOTP } from 'otpauth';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { recoveryCodes, secondFactorEnrolment } from '#shared/contracts/accounts.ts';
import { Authenticator } from '#api/db/models/authenticator.ts';
import { RecoveryCode } from '#api/db/models/recovery-code.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { matchingStep } from './one-time-codes.ts';
import { openSecret, sealSecret } from './sealed-secret.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio });
});
afterAll(() => app.close());

let made = 0;
const newBaker = () => addUser('baker', { email: `baker-${(made += 1)}@oxbowlane.example` });

/** What an authenticator application would show now. */
const codeOf = (secret: string) =>
  new TOTP({ secret: Secret.fromBase32(secret) }).generate({
    timestamp: app.clock.now().getTime(),
  });

async function enrol(client: TestClient): Promise<{ secret: string; codes: string[] }> {
  const begun = await client.post('/api/session/second-factor/enrolment');
  const { secret } = z.parse(secondFactorEnrolment, begun.body);
  const path = '/api/session/second-factor/enrolment/confirm';
  const confirmed = await client.post(path, { code: codeOf(secret) });
  return { secret, codes: z.parse(recoveryCodes, confirmed.body).codes };
}

const whoIs = async (client: TestClient) => (await client.get('/api/session')).body;
const pass = (client: TestClient, code: string) =>
  client.post('/api/session/second-factor', { code });

describe('the second factor, where the studio requires it', () => {
  beforeAll(() => setSecondFactorRequired(true));

  it('must be enrolled before anything else may be done', async () => {
    const client = await signInStaff(app, await newBaker());
    expect(await whoIs(client)).toMatchObject({ user: { secondFactor: 'to-enrol' } });
    const refused = await client.get('/api/account/sessions');
    expect(refused.body).toMatchObject({ code: 'second-factor-needed', status: 401 });
    const { codes } = await enrol(client);
    expect(new Set(codes).size).toBe(10);
    expect(await whoIs(client)).toMatchObject({ user: { secondFactor: 'done' } });
    expect((await client.get('/api/account/sessions')).status).toBe(200);
  });

  it('cannot be taken off', async () => {
    const client = await signInStaff(app, await newBaker());
    const { codes } = await enrol(client);
    const path = '/api/session/second-factor/removal';
    expect((await client.post(path, { code: codes[0] })).body).toMatchObject({
      code: 'not-allowed',
    });
  });
});

describe('the second factor at sign-in', () => {
  beforeAll(() => setSecondFactorRequired(false));

  it('is asked for after the password, and a code of it is good once', async () => {
    const baker = await newBaker();
    const { secret } = await enrol(await signInStaff(app, baker));
    app.clock.advance({ minutes: 1 });
    const client = await signInStaff(app, baker);
    const before = client.cookie();
    expect(await whoIs(client)).toMatchObject({ user: { secondFactor: 'needed' } });
    expect((await client.get('/api/account/sessions')).status).toBe(401);
    expect((await pass(client, '000000')).status).toBe(422);
    const code = codeOf(secret);
    expect((await pass(client, `${code.slice(0, 3)} ${code.slice(3)}`)).status).toBe(200);
    expect(client.cookie()).not.toBe(before);
    expect((await client.get('/api/account/sessions')).status).toBe(200);

    const thief = await signInStaff(app, baker);
    expect((await pass(thief, code)).status).toBe(422);
    app.clock.advance({ seconds: 30 });
    expect((await pass(thief, codeOf(secret))).status).toBe(200);
  });

  it('may be a recovery code, each good once, however it is typed', async () => {
    const baker = await newBaker();
    const { codes } = await enrol(await signInStaff(app, baker));
    const typed = (codes[3] ?? '').replaceAll('-', ' ').toUpperCase();
    expect((await pass(await signInStaff(app, baker), typed)).status).toBe(200);
    expect((await pass(await signInStaff(app, baker), typed)).status).toBe(422);
    expect((await pass(await signInStaff(app, baker), codes[4] ?? '')).status).toBe(200);
  });

  it('is given up on after ten wrong codes, by whichever session', async () => {
    const baker = await newBaker();
    const { secret } = await enrol(await signInStaff(app, baker));
    app.clock.advance({ minutes: 1 });
    for (let n = 0; n < 10; n += 1) {
      expect((await pass(await signInStaff(app, baker), '000000')).status).toBe(422);
    }
    expect((await pass(await signInStaff(app, baker), codeOf(secret))).status).toBe(429);
    app.clock.advance({ minutes: 16 });
    expect((await pass(await signInStaff(app, baker), codeOf(secret))).status).toBe(200);
  });

  it('leaves ten minutes between the password and the code', async () => {
    const baker = await newBaker();
    const { secret } = await enrol(await signInStaff(app, baker));
    const client = await signInStaff(app, baker);
    app.clock.advance({ minutes: 10 });
    expect((await pass(client, codeOf(secret))).status).toBe(401);
  });

  it('is not put on by somebody who has only the password', async () => {
    const baker = await newBaker();
    await enrol(await signInStaff(app, baker));
    const thief = await signInStaff(app, baker);
    expect((await thief.post('/api/session/second-factor/enrolment')).body).toMatchObject({
      code: 'second-factor-needed',
    });
  });

  it('is taken off with a code of it', async () => {
    const baker = await newBaker();
    const client = await signInStaff(app, baker);
    const { codes } = await enrol(client);
    const path = '/api/session/second-factor/removal';
    expect((await client.post(path, { code: 'wrong-code' })).status).toBe(422);
    expect((await client.post(path, { code: codes[0] })).status).toBe(200);
    expect(await whoIs(await signInStaff(app, baker))).toMatchObject({
      user: { secondFactor: 'none' },
    });
  });

  it('is kept encrypted, its recovery codes hashed', async () => {
    const baker = await newBaker();
    const { secret, codes } = await enrol(await signInStaff(app, baker));
    const rows = JSON.stringify([await Authenticator.findAll(), await RecoveryCode.findAll()]);
    expect(rows).not.toContain(secret);
    for (const code of codes) expect(rows).not.toContain(code);
  });
});

describe('its parts', () => {
  it('make the codes of RFC 6238, appendix B (SHA-1, last six figures)', () => {
    const secret = new Secret({ buffer: new TextEncoder().encode('12345678901234567890').buffer });
    const at = (seconds: number) => new Date(seconds * 1000);
    for (const [seconds, code] of [
      [59, '287082'],
      [1111111109, '081804'],
      [1234567890, '005924'],
      [2000000000, '279037'],
    ] as const) {
      const step = Math.floor(seconds / 30);
      expect(matchingStep(secret.base32, code, at(seconds))).toBe(step);
      expect(matchingStep(secret.base32, code, at(seconds + 30))).toBe(step);
      expect(matchingStep(secret.base32, code, at(seconds + 60))).toBeNull();
    }
  });

  it('seal a secret for one account under one key', () => {
    const sealed = sealSecret('key one', 'user one', 'JBSWY3DP');
    expect(openSecret('key one', 'user one', sealed)).toBe('JBSWY3DP');
    expect(() => openSecret('key two', 'user one', sealed)).toThrow();
    expect(() => openSecret('key one', 'user two', sealed)).toThrow();
    expect(() => openSecret('key one', 'user one', `A${sealed.slice(1)}`)).toThrow();
  });
});
