import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { errorTitles } from '#shared/errors.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import { openApiPath } from './openapi.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

const layer = z.looseObject({
  route: z.optional(
    z.looseObject({ path: z.string(), methods: z.record(z.string(), z.boolean()) }),
  ),
  handle: z.optional(z.unknown()),
});

/** What Express has really mounted, routers within routers included. */
function mounted(stack: unknown): string[] {
  return z.parse(z.array(layer), stack).flatMap(({ route, handle }) => {
    if (route !== undefined)
      return Object.keys(route.methods).map((method) => `${method} ${route.path}`);
    // A router is a function that carries its own stack; other handlers carry none.
    return typeof handle === 'function' && 'stack' in handle ? mounted(handle.stack) : [];
  });
}

const operation = z.looseObject({ operationId: z.string(), summary: z.string() });
const description = z.looseObject({
  openapi: z.literal('3.1.0'),
  paths: z.record(z.string(), z.record(z.string(), operation)),
});

describe('the description of the API', () => {
  it('has every route that is mounted, and no other', async () => {
    const described = z.parse(description, (await app.visitor().get('/api/openapi.json')).body);
    const told = Object.entries(described.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    const there = mounted(app.app.handler.router.stack).map((each) => openApiPath(each));
    expect(told.sort()).toEqual([...new Set(there)].sort());
    expect(there.length).toBe(new Set(there).size);
    expect(told.length).toBeGreaterThan(20);
  });

  it('names every route once, by its verb', () => {
    const names = app.app.declared.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    for (const name of names) expect(name).toMatch(/^[a-z]+(-[a-z]+)+$/);
  });

  it('stands on its own: nothing it points at is missing', async () => {
    const { text } = await app.visitor().get('/api/openapi.json');
    const references = [...text.matchAll(/"\$ref":"([^"]+)"/g)].map(([, reference]) => reference);
    for (const reference of new Set(references))
      expect(reference).toBe('#/components/schemas/Problem');
  });

  it('can be read as a page: no script, nothing loaded, every route and refusal', async () => {
    const answer = await app.visitor().get('/api');
    expect(answer.status).toBe(200);
    expect(answer.headers.get('Content-Security-Policy')).toMatch(
      /^default-src 'none'; style-src 'sha256-/,
    );
    expect(answer.text).not.toMatch(/<script|<link|src=|https?:\/\//);
    for (const { name } of app.app.declared)
      expect(answer.text).toContain(`<details id="${name}">`);
    for (const code of Object.keys(errorTitles)) expect(answer.text).toContain(`id="${code}"`);
  });
});
