import { afterAll, beforeAll, expect, it, vi } from 'vitest';
import * as z from 'zod/mini';
import { createLogger } from '#api/platform/logger.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';

const lines: unknown[] = [];
let app: TestApp;

beforeAll(async () => {
  const logger = createLogger('info', {
    write: (line: string) => lines.push(JSON.parse(line)),
  });
  app = await startTestApp({ logger });
});
afterAll(() => app.close());

it('writes a line an answer, with the path alone and no cookie', async () => {
  await app.visitor().get('/api/orders/ABCD-EFGH?key=secret', {
    headers: { Cookie: 'tierwell=stolen' },
  });
  // The line follows the answer.
  await vi.waitFor(() =>
    expect(lines.at(-1)).toMatchObject({
      method: 'GET',
      path: '/api/orders/ABCD-EFGH',
      status: 404,
      msg: 'answered',
    }),
  );
  expect(JSON.stringify(lines)).not.toMatch(/secret|stolen/);
});

it('numbers its lines, so that what happened meanwhile can be told apart', async () => {
  lines.length = 0;
  await app.visitor().get('/api/health');
  await app.visitor().get('/api/health');
  await vi.waitFor(() => expect(lines).toHaveLength(2));
  const numbers = lines.map((line) => z.object({ request: z.int() }).parse(line).request);
  expect(new Set(numbers).size).toBe(2);
});
