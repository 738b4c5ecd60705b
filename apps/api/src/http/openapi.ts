import * as z from 'zod/mini';
import { problem } from '#shared/contracts/common.ts';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { type ErrorCode, errorTitles } from '#shared/errors.ts';
import { apiPage, apiPageStyleHash } from './api-page.ts';
import { statusOf } from './problem.ts';
import { createRoutes, type FeatureRoutes, type RouteContract } from './route.ts';

type Json = Record<string, unknown>;

/** Refusals any route may give. */
const usualRefusals: readonly ErrorCode[] = [
  'bad-request',
  'invalid-input',
  'too-many-requests',
  'internal',
];

/** `/api/orders/:code` as OpenAPI writes it. */
export function openApiPath(path: string): string {
  return path.replaceAll(/:(\w+)/g, '{$1}');
}

function schemaOf(schema: z.ZodMiniType, io: 'input' | 'output'): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
}

function parametersOf(contract: RouteContract): Json[] {
  const each = (schema: z.ZodMiniObject | undefined, place: 'path' | 'query'): Json[] =>
    Object.entries(schema?.shape ?? {}).map(([name, field]) => ({
      name,
      in: place,
      required: place === 'path' || !(field instanceof z.ZodMiniOptional),
      schema: z.toJSONSchema(field, { io: 'input', unrepresentable: 'any' }),
    }));
  const header = contract.idempotent
    ? [{ name: idempotencyHeader, in: 'header', required: true, schema: { type: 'string' } }]
    : [];
  return [...each(contract.params, 'path'), ...each(contract.query, 'query'), ...header];
}

function requestBodyOf(contract: RouteContract): Json {
  if (contract.upload !== undefined) {
    const properties = { [contract.upload]: { type: 'string', format: 'binary' } };
    const schema = { type: 'object', properties, required: [contract.upload] };
    return { requestBody: { required: true, content: { 'multipart/form-data': { schema } } } };
  }
  if (contract.body === undefined) return {};
  const schema = schemaOf(contract.body, 'input');
  return { requestBody: { required: true, content: { 'application/json': { schema } } } };
}

function responsesOf(contract: RouteContract): Json {
  const content =
    contract.response !== undefined
      ? { 'application/json': { schema: schemaOf(contract.response, 'output') } }
      : { [contract.produces ?? 'application/octet-stream']: {} };
  const byStatus = new Map<number, string[]>();
  for (const code of [...usualRefusals, ...(contract.refusals ?? [])]) {
    byStatus.set(statusOf[code], [...(byStatus.get(statusOf[code]) ?? []), code]);
  }
  const responses: Record<string, Json> = {
    [String(contract.status ?? 200)]: { description: 'Done.', content },
  };
  for (const [status, codes] of byStatus) {
    responses[String(status)] = {
      description: codes.join(', '),
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    };
  }
  return responses;
}

/** The OpenAPI 3.1 description, made from the same contracts that requests are parsed by. */
export function describeApi(declared: readonly RouteContract[]): Json {
  const paths: Record<string, Json> = {};
  for (const contract of declared) {
    const path = openApiPath(contract.path);
    paths[path] = {
      ...paths[path],
      [contract.method]: {
        operationId: contract.name,
        summary: contract.summary,
        parameters: parametersOf(contract),
        ...requestBodyOf(contract),
        responses: responsesOf(contract),
      },
    };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Tierwell',
      version: '1',
      description: 'The order book of a small custom-cake studio.',
    },
    paths,
    components: { schemas: { Problem: schemaOf(problem, 'output') } },
    'x-codes': errorTitles,
  };
}

/** `GET /api/openapi.json`, and the same for reading at `GET /api`. */
export function openApiRoutes(declared: readonly RouteContract[]): FeatureRoutes {
  const routes = createRoutes('anonymous');
  // Made on first reading, and once: nothing in it changes while the program runs.
  let described: string | undefined;
  let page: string | undefined;
  routes.add(
    {
      name: 'describe-api',
      method: 'get',
      path: '/api/openapi.json',
      summary: 'This API in OpenAPI 3.1.',
      produces: 'application/json',
    },
    ({ response }) => {
      described ??= JSON.stringify(describeApi([...routes.declared, ...declared]));
      response.set('Cache-Control', 'no-cache').type('json').send(described);
    },
  );
  routes.add(
    {
      name: 'read-api',
      method: 'get',
      path: '/api',
      summary: 'This API as a page to read.',
      produces: 'text/html',
    },
    ({ response }) => {
      page ??= apiPage([...routes.declared, ...declared]);
      response
        .set('Cache-Control', 'no-cache')
        .set(
          'Content-Security-Policy',
          `default-src 'none'; style-src '${apiPageStyleHash}'; frame-ancestors 'none'`,
        )
        .type('html')
        .send(page);
    },
  );
  return routes;
}
