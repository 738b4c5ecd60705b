import type * as z from 'zod/mini';

/** Asks a fake's control API; throws with the fake's own words where it refuses. */
async function ask(url: string, method: string, body: unknown): Promise<Response> {
  const response = await fetch(url, {
    method,
    headers: body === undefined ? {} : { 'Content-Type': 'application/json' },
    body: body === undefined ? null : JSON.stringify(body),
  });
  if (!response.ok) {
    throw new Error(`${method} ${url}: ${response.status} ${await response.text()}`);
  }
  return response;
}

/** Reads from a fake's control API and checks what came back. */
export async function read<Schema extends z.ZodMiniType>(
  url: string,
  schema: Schema,
): Promise<z.output<Schema>> {
  const response = await ask(url, 'GET', undefined);
  return schema.parse(await response.json());
}

/** Reads text from a fake's control API. */
export async function readText(url: string): Promise<string> {
  const response = await ask(url, 'GET', undefined);
  return response.text();
}

/** Tells a fake's control API something. */
export async function tell(
  url: string,
  method: 'POST' | 'PUT' | 'DELETE',
  body?: unknown,
): Promise<void> {
  await ask(url, method, body);
}
