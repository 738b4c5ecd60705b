import { createHash } from 'node:crypto';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import type { GoogleControl } from './control.ts';
import { googleControl } from './control.ts';
import type { GoogleFake } from './start.ts';
import { start } from './start.ts';

const client = {
  id: 'studio',
  secret: 'a secret',
  redirectUris: ['http://127.0.0.1:4100/api/google/back'],
};
const redirectUri = client.redirectUris[0] ?? '';

/** The verifier and challenge of RFC 7636, appendix B. */
const verifier = 'dBjftJeZ4CVP-mB92K27uhbUJU1p1r_wW1gFWFOEjXk';
const challenge = 'E9Melhoa2OwvFrEMTJguCHaoeK1t8URWbuGJSstw-cM';

let folder: string;
let clock: Date;
let fake: GoogleFake;
let control: GoogleControl;

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'google-'));
  clock = new Date('2031-03-04T15:00:00Z');
  fake = await start({
    port: 0,
    clients: [client],
    dataDir: folder,
    now: () => clock,
  });
  control = googleControl(fake.url);
});

afterEach(async () => {
  await fake.stop();
  await rm(folder, { recursive: true });
});

function authorize(changed: Record<string, string | undefined> = {}): Promise<Response> {
  const fields: Record<string, string | undefined> = {
    client_id: client.id,
    redirect_uri: redirectUri,
    response_type: 'code',
    scope: 'openid email profile',
    state: 'kept & given back',
    code_challenge: challenge,
    code_challenge_method: 'S256',
    ...changed,
  };
  const address = new URL(fake.authorizationUrl);
  for (const [name, value] of Object.entries(fields)) {
    if (value !== undefined) address.searchParams.set(name, value);
  }
  return fetch(address, { redirect: 'manual' });
}

function backWith(response: Response): URLSearchParams {
  const location = response.headers.get('location') ?? '';
  expect(location.startsWith(`${redirectUri}?`)).toBe(true);
  return new URL(location).searchParams;
}

/** Opens the chooser and presses a button on it. */
async function choose(
  pressed: Record<string, string>,
  changed?: Record<string, string | undefined>,
): Promise<URLSearchParams> {
  const opened = await authorize(changed);
  expect(opened.status).toBe(200);
  const key = /name="key" value="([^"]+)"/.exec(await opened.text())?.[1] ?? '';
  return backWith(
    await fetch(`${fake.url}/o/oauth2/v2/auth/choose`, {
      method: 'POST',
      redirect: 'manual',
      body: new URLSearchParams({ key, ...pressed }),
    }),
  );
}

async function redeem(
  code: string | null,
  changed: Record<string, string | undefined> = {},
): Promise<{ status: number; body: Record<string, unknown> }> {
  const fields: Record<string, string | undefined> = {
    grant_type: 'authorization_code',
    code: code ?? '',
    redirect_uri: redirectUri,
    client_id: client.id,
    client_secret: client.secret,
    code_verifier: verifier,
    ...changed,
  };
  const form = new URLSearchParams();
  for (const [name, value] of Object.entries(fields))
    if (value !== undefined) form.set(name, value);
  const response = await fetch(fake.tokenUrl, { method: 'POST', body: form });
  return {
    status: response.status,
    body: z.record(z.string(), z.unknown()).parse(await response.json()),
  };
}

const profileOf = async (token: unknown): Promise<unknown> => {
  const response = await fetch(fake.userinfoUrl, {
    headers: { Authorization: `Bearer ${String(token)}` },
  });
  return response.json();
};

const rosa = { email: 'rosa.whitlock@example.com' };

describe('signing in', () => {
  it('goes from the chooser to a profile, with the state untouched', async () => {
    expect(createHash('sha256').update(verifier).digest('base64url')).toBe(challenge);
    const back = await choose(rosa);
    expect(back.get('state')).toBe('kept & given back');

    const token = await redeem(back.get('code'));
    expect(token.status).toBe(200);
    expect(token.body).toMatchObject({
      token_type: 'Bearer',
      scope: 'openid email profile',
    });
    expect(await profileOf(token.body.access_token)).toEqual({
      sub: expect.stringMatching(/^\d{21}$/),
      name: 'Rosa Whitlock',
      given_name: 'Rosa',
      family_name: 'Whitlock',
      email: 'rosa.whitlock@example.com',
      email_verified: true,
    });
  });

  it('keeps the same identifier for the same address', async () => {
    const subs = [];
    for (const otherEmail of ['new@example.com', 'NEW@example.com', 'else@example.com']) {
      const back = await choose({
        other: 'yes',
        otherEmail,
        otherName: 'Nia Okafor Lund',
      });
      const { body } = await redeem(back.get('code'));
      subs.push(z.object({ sub: z.string() }).parse(await profileOf(body.access_token)).sub);
    }
    expect(subs[0]).toBe(subs[1]);
    expect(subs[0]).not.toBe(subs[2]);
  });

  it('works without PKCE, and with the secret in the header', async () => {
    const back = await choose(rosa, { code_challenge: undefined });
    const response = await fetch(fake.tokenUrl, {
      method: 'POST',
      headers: {
        Authorization: `Basic ${btoa(`studio:${encodeURIComponent('a secret')}`)}`,
      },
      body: new URLSearchParams({
        grant_type: 'authorization_code',
        code: back.get('code') ?? '',
        redirect_uri: redirectUri,
      }),
    });
    expect(response.status).toBe(200);
  });
});

describe('refusing the request', () => {
  it.each([
    ['an unknown client', { client_id: 'nobody' }],
    ['a redirect address that only begins right', { redirect_uri: `${redirectUri}/more` }],
    ['no redirect address', { redirect_uri: undefined }],
  ])('stops at a page of its own for %s', async (_name, changed) => {
    const response = await authorize(changed);
    expect(response.status).toBe(400);
    expect(response.headers.get('location')).toBeNull();
  });

  it.each([
    [{ response_type: 'token' }, 'unsupported_response_type'],
    [{ scope: undefined }, 'invalid_scope'],
    [{ code_challenge_method: 'plain' }, 'invalid_request'],
  ])('sends the browser back with the error for %j', async (changed, error) => {
    const back = backWith(await authorize(changed));
    expect(back.get('error')).toBe(error);
    expect(back.get('state')).toBe('kept & given back');
  });

  it('takes a choice once', async () => {
    const opened = await authorize();
    const key = /name="key" value="([^"]+)"/.exec(await opened.text())?.[1] ?? '';
    const press = () =>
      fetch(`${fake.url}/o/oauth2/v2/auth/choose`, {
        method: 'POST',
        redirect: 'manual',
        body: new URLSearchParams({ key, ...rosa }),
      });
    expect((await press()).status).toBe(303);
    expect((await press()).status).toBe(400);
  });

  it('answers only when addressed as this computer', async () => {
    const { request } = await import('node:http');
    const status = await new Promise((resolve, reject) => {
      request(fake.url, { headers: { Host: 'elsewhere.example' } }, (response) => {
        response.resume();
        resolve(response.statusCode);
      })
        .on('error', reject)
        .end();
    });
    expect(status).toBe(421);
  });
});

describe('refusing the code', () => {
  it.each([
    ['a wrong secret', { client_secret: 'guess' }, 401, 'invalid_client'],
    ['an unknown client', { client_id: 'nobody' }, 401, 'invalid_client'],
    ['another redirect address', { redirect_uri: `${redirectUri}/more` }, 400, 'invalid_grant'],
    ['another verifier', { code_verifier: `${verifier}x` }, 400, 'invalid_grant'],
    ['no verifier', { code_verifier: undefined }, 400, 'invalid_grant'],
    ['an invented code', { code: '4/invented' }, 400, 'invalid_grant'],
    ['no code', { code: undefined }, 400, 'invalid_request'],
    ['another grant', { grant_type: 'password' }, 400, 'unsupported_grant_type'],
  ])('for %s', async (_name, changed, status, error) => {
    const back = await choose(rosa);
    expect(await redeem(back.get('code'), changed)).toMatchObject({
      status,
      body: { error },
    });
  });

  it('when it was used before, and takes back the first token', async () => {
    const code = (await choose(rosa)).get('code');
    const first = await redeem(code);
    expect(first.status).toBe(200);
    expect((await redeem(code)).body.error).toBe('invalid_grant');
    expect(await profileOf(first.body.access_token)).toMatchObject({
      error: 'invalid_request',
    });
  });

  it('after ten minutes, and the token after an hour', async () => {
    const code = (await choose(rosa)).get('code');
    const good = await redeem((await choose(rosa)).get('code'));
    clock = new Date('2031-03-04T15:10:00Z');
    expect((await redeem(code)).body.error).toBe('invalid_grant');
    expect(await profileOf(good.body.access_token)).toMatchObject({
      name: 'Rosa Whitlock',
    });
    clock = new Date('2031-03-04T16:00:00Z');
    expect(await profileOf(good.body.access_token)).toMatchObject({
      error: 'invalid_request',
    });
  });
});

describe('failing on request', () => {
  it('on the page: denied, bad code, unverified address', async () => {
    expect((await choose({ deny: 'yes' })).get('error')).toBe('access_denied');

    const bad = await choose({ ...rosa, outcome: 'bad-code' });
    expect((await redeem(bad.get('code'))).body.error).toBe('invalid_grant');

    const unverified = await choose({ ...rosa, outcome: 'unverified-email' });
    const token = await redeem(unverified.get('code'));
    expect(await profileOf(token.body.access_token)).toMatchObject({
      email_verified: false,
    });
  });

  it('through the control client, as often as asked', async () => {
    await control.failNext({ kind: 'denied' }, 2);
    expect(backWith(await authorize()).get('error')).toBe('access_denied');
    expect(backWith(await authorize()).get('error')).toBe('access_denied');
    await control.failNext({ kind: 'slow-token', ms: 1 });
    await control.failNext({ kind: 'token-error' });
    await control.failNext({ kind: 'userinfo-error' });
    const code = (await choose(rosa)).get('code');
    expect((await redeem(code)).status).toBe(503);
    const { status, body } = await redeem(code);
    expect(status).toBe(200);
    expect(await profileOf(body.access_token)).toMatchObject({
      error: 'temporarily_unavailable',
    });
    expect(await profileOf(body.access_token)).toMatchObject({
      name: 'Rosa Whitlock',
    });

    await control.failNext({ kind: 'denied' });
    await control.clearFailures();
    expect((await authorize()).status).toBe(200);
  });

  it('refuses to plan what it does not know', async () => {
    const response = await fetch(`${fake.url}/api/failures`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ failure: { kind: 'explode' }, times: 1 }),
    });
    expect(response.status).toBe(400);
  });
});

it('lists and stores its calls without any secret', async () => {
  const back = await choose(rosa);
  const { body } = await redeem(back.get('code'));
  await profileOf(body.access_token);
  const outcomes = (await control.calls()).map((call) => [call.endpoint, call.outcome]);
  expect(outcomes).toEqual([
    ['authorize', 'chooser'],
    ['choose', 'code'],
    ['token', 'token'],
    ['userinfo', 'profile'],
  ]);
  const stored = await readFile(path.join(folder, 'calls.jsonl'), 'utf8');
  expect(stored.trim().split('\n')).toHaveLength(4);
  for (const secret of [
    client.secret,
    verifier,
    back.get('code') ?? '',
    String(body.access_token),
  ]) {
    expect(stored).not.toContain(secret);
  }
  const overview = await (await fetch(fake.url)).text();
  expect(overview).toContain('rosa.whitlock@example.com');
});

it('registers an application while it runs', async () => {
  await control.register({
    ...client,
    redirectUris: ['http://127.0.0.1:9/other'],
  });
  expect((await authorize()).status).toBe(400);
  expect((await authorize({ redirect_uri: 'http://127.0.0.1:9/other' })).status).toBe(200);
});
