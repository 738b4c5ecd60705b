import { HttpResponse, http } from 'msw';
import { describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { startApiServer } from '#web/testing/api-server.ts';
import { ApiProblem, NetworkProblem, request } from './http.ts';

const server = startApiServer();
const answer = z.object({ number: z.int() });
const ask = (body?: unknown) =>
  request({ method: 'POST', path: 'http://localhost/api/thing', body, answer });

describe('request', () => {
  it('sends what the API asks of its own page, and returns the contract’s shape', async () => {
    let seen: Headers | undefined;
    server.use(
      http.post('http://localhost/api/thing', ({ request: { headers } }) => {
        seen = headers;
        return HttpResponse.json({ number: 7, more: 'left out' });
      }),
    );
    await expect(ask({ a: 1 })).resolves.toEqual({ number: 7 });
    expect(seen?.get('x-tierwell')).toBe('1');
    expect(seen?.get('content-type')).toBe('application/json');
  });

  it('turns problem details into a typed refusal with every issue’s path', async () => {
    server.use(
      http.post('http://localhost/api/thing', () =>
        HttpResponse.json(
          {
            type: 'about:blank',
            title: 'Some answers need another look',
            status: 422,
            code: 'invalid-input',
            issues: [{ path: ['you', 'email'], message: 'We need an e-mail address.' }],
          },
          { status: 422 },
        ),
      ),
    );
    const error = await ask().catch((it: unknown) => it);
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({
      code: 'invalid-input',
      status: 422,
      issues: [{ path: ['you', 'email'], message: 'We need an e-mail address.' }],
    });
  });

  it('says apart that nothing answered', async () => {
    server.use(http.post('http://localhost/api/thing', () => HttpResponse.error()));
    await expect(ask()).rejects.toBeInstanceOf(NetworkProblem);
  });

  it('takes a page of somebody else’s for no answer', async () => {
    server.use(
      http.post('http://localhost/api/thing', () => HttpResponse.html('<h1>Hotel Wi-Fi</h1>')),
    );
    await expect(ask()).rejects.toBeInstanceOf(NetworkProblem);
  });
});
