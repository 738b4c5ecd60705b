import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

describe('the guard against forged requests', () => {
  const body = { email: 'rosa@example.com' };
  const path = '/api/session/links';

  it.each([
    ['another site', { Origin: 'https://elsewhere.example' }],
    ['an opaque origin', { Origin: 'null' }],
    ['no origin', { Origin: '' }],
    ['a form, which cannot set the header', { 'X-Tierwell': '' }],
  ])('refuses %s', async (_from, headers) => {
    const answer = await app.visitor().post(path, body, { headers });
    expect(answer.status).toBe(403);
    expect(answer.body).toMatchObject({ code: 'wrong-origin', status: 403 });
  });

  it('lets the own page through, by either name of this computer', async () => {
    const origin = app.url.replace('127.0.0.1', 'localhost');
    expect((await app.visitor().post(path, body)).status).toBe(200);
    expect((await app.visitor().post(path, body, { headers: { Origin: origin } })).status).toBe(
      200,
    );
  });

  it('looks at every method that may change something, multipart too', async () => {
    for (const method of ['POST', 'PUT', 'PATCH', 'DELETE']) {
      const headers = { Origin: 'https://elsewhere.example' };
      expect((await app.visitor().send(method, path, { headers })).status).toBe(403);
    }
    const form = new FormData();
    form.set('photo', new Blob(['x']), 'x.jpg');
    const answer = await app.visitor().post('/api/photos', form, { headers: { Origin: '' } });
    expect(answer.status).toBe(403);
  });
});

describe('problems', () => {
  it('name every issue with its path, in words for people', async () => {
    const answer = await app
      .visitor()
      .post('/api/session/password', { email: 'rosa', password: 7 });
    expect(answer.status).toBe(422);
    expect(answer.headers.get('Content-Type')).toMatch('application/problem+json');
    expect(answer.body).toMatchObject({
      code: 'invalid-input',
      title: 'Some answers need another look',
      issues: [
        { path: ['email'], message: 'Write the address like name@example.com.' },
        { path: ['password'], message: 'Write this as text.' },
      ],
    });
  });

  it.each([
    ['no body', undefined, 422, 'invalid-input'],
    ['a body that is not JSON', '{"email":', 400, 'bad-request'],
    ['a bare word', '"rosa"', 400, 'bad-request'],
    ['a list', '[]', 422, 'invalid-input'],
    ['a body of a megabyte', JSON.stringify({ email: 'x'.repeat(1_000_000) }), 413, 'too-large'],
  ])('answer %s', async (_what, body, status, code) => {
    const answer = await app.visitor().post('/api/session/links', body);
    expect(answer.status).toBe(status);
    expect(answer.body).toMatchObject({ code, status });
  });

  it('answer an unknown address and a broken one', async () => {
    expect((await app.visitor().get('/api/nothing')).body).toMatchObject({
      code: 'not-found',
      detail: 'GET /api/nothing is not part of this API.',
    });
    expect((await app.visitor().get('/api/%E0%A4%A')).status).toBeLessThan(500);
    expect((await app.visitor().send('HEAD', '/api/nothing', {})).status).toBe(404);
    expect((await app.visitor().send('OPTIONS', '/api/nothing', {})).status).toBe(404);
  });

  it.each([
    ['lists in lists', `${'['.repeat(50_000)}${']'.repeat(50_000)}`],
    ['objects in objects', `${'{"email":'.repeat(20_000)}1${'}'.repeat(20_000)}`],
    ['a name for every object’s prototype', '{"__proto__":{"email":"rosa@example.com"}}'],
    ['U+0000 in a text', '{"email":"rosa@example.com","password":"a\\u0000b"}'],
  ])('answer %s as input that is not right', async (_what, body) => {
    const answer = await app.visitor().post('/api/session/password', body);
    expect([answer.status, answer.body]).toMatchObject([422, { code: 'invalid-input' }]);
  });

  it('answer U+0000 in an address, where it would reach the database', async () => {
    expect((await app.visitor().get('/api/orders/%00')).status).toBe(422);
  });

  it.each([
    ['text/plain', 422],
    ['application/x-www-form-urlencoded', 422],
    ['application/json; charset=utf-16', 400],
  ])('answer a body that says it is %s', async (type, status) => {
    const headers = { 'Content-Type': type };
    const answer = await app.visitor().post('/api/session/password', '{}', { headers });
    expect(answer.status).toBe(status);
  });

  it('are never kept by a cache', async () => {
    const answer = await app.visitor().get('/api/account/sessions');
    expect(answer.status).toBe(401);
    expect(answer.headers.get('Cache-Control')).toBe('no-store');
  });
});

describe('what every answer carries', () => {
  it('keeps browsers to our own scripts and to nobody’s frame', async () => {
    const { headers } = await app.visitor().get('/api/session');
    const policy = headers.get('Content-Security-Policy') ?? '';
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toContain('unsafe-eval');
    expect(headers.get('X-Content-Type-Options')).toBe('nosniff');
    expect(headers.get('X-Powered-By')).toBeNull();
  });
});
