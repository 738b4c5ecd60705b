import { Router, type Request, type RequestHandler, type Response } from 'express';
import type * as z from 'zod/mini';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import type { ErrorCode } from '#shared/errors.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { actorOf } from './authenticate.ts';
import { readQuery } from './query.ts';
import { validate } from './validate.ts';

type Schema = z.ZodMiniType;
type ObjectSchema = z.ZodMiniObject;

/**
 * One route as the OpenAPI page tells it and as the code obeys it: what is declared here is what
 * is parsed, and what a handler returns must fit `response`.
 */
export type RouteContract = {
  /** The verb, the same as the command's and the contract's: `submit-order`. */
  readonly name: string;
  readonly method: 'get' | 'post' | 'put' | 'delete';
  /** As Express reads it, from the root: `/api/orders/:code`. */
  readonly path: `/api` | `/api/${string}`;
  readonly summary: string;
  readonly params?: ObjectSchema;
  readonly query?: ObjectSchema;
  readonly body?: Schema;
  /** Field of an uploaded file; the body is then `multipart/form-data`. */
  readonly upload?: string;
  /** Sent as JSON. Without one the handler answers by itself, with `produces`. */
  readonly response?: Schema;
  readonly produces?: string;
  /** 200 unless said. */
  readonly status?: 200 | 201 | 202;
  /** Needs an `Idempotency-Key`. */
  readonly idempotent?: true;
  /** Refusals particular to this route, beside the usual ones. */
  readonly refusals?: readonly ErrorCode[];
};

type Output<T> = T extends Schema ? z.output<T> : undefined;
type Field<C, Key extends string> = C extends Record<Key, infer T> ? Output<T> : undefined;

export type RouteContext<C extends RouteContract> = {
  readonly actor: Actor;
  readonly params: Field<C, 'params'>;
  readonly query: Field<C, 'query'>;
  readonly body: Field<C, 'body'>;
  readonly idempotencyKey: C extends { idempotent: true } ? string : undefined;
  readonly request: Request;
  readonly response: Response;
};

/** What a handler returns: the contract's response, or nothing where it answers by itself. */
type Answer<C> = C extends { response: infer T extends Schema } ? z.input<T> : void;

export type Handler<C extends RouteContract> = (
  context: RouteContext<C>,
) => Answer<C> | Promise<Answer<C>>;

/**
 * How much happens before a route is reached. `prepared`: nothing but the log and the headers, for
 * GETs answered from kept bytes. `anonymous`: origin, body and compression too; the same for
 * everybody, and nobody's cookie is looked at. `personal`: the session as well.
 */
export type Stage = 'prepared' | 'anonymous' | 'personal';

/** A feature's routes: mounted by the app, listed on the OpenAPI page, tried role by role. */
export type FeatureRoutes = {
  readonly router: Router;
  readonly declared: readonly RouteContract[];
  readonly stage: Stage;
};

export type RouteBuilder = FeatureRoutes & {
  add<const C extends RouteContract>(
    contract: C,
    handler: Handler<C>,
    ...before: readonly RequestHandler[]
  ): void;
};

/** Collects a feature's routes; before the `personal` stage the actor is always a visitor. */
export function createRoutes(stage: Stage = 'personal'): RouteBuilder {
  const router = Router();
  const declared: RouteContract[] = [];
  return {
    router,
    declared,
    stage,
    add(contract, handler, ...before) {
      declared.push(contract);
      router[contract.method](contract.path, ...before, async (request, response) => {
        const actor: Actor = stage === 'personal' ? await actorOf(request) : { kind: 'visitor' };
        const context = {
          actor,
          ...readRequest(contract, request),
          request,
          response,
        };
        const answer = await handler(context);
        if (contract.response === undefined) return;
        if (!response.hasHeader('Cache-Control')) response.set('Cache-Control', 'no-store');
        sendJson(response, contract.status ?? 200, JSON.stringify(answer));
      });
    },
  };
}

/** As `response.json`, without what it looks up about the app for every answer. */
function sendJson(response: Response, status: number, text: string): void {
  response.statusCode = status;
  response.setHeader('Content-Type', 'application/json; charset=utf-8');
  response.setHeader('Content-Length', Buffer.byteLength(text));
  response.end(text);
}

/** What the contract says the request holds, parsed; throws `invalid-input` with the paths. */
function readRequest<C extends RouteContract>(
  contract: C,
  request: Request,
): Pick<RouteContext<C>, 'params' | 'query' | 'body' | 'idempotencyKey'>;
function readRequest(contract: RouteContract, request: Request): object {
  const { params, query, body } = contract;
  return {
    params: params === undefined ? undefined : validate(params, request.params),
    query: query === undefined ? undefined : validate(query, readQuery(query, request)),
    body: body === undefined ? undefined : validate(body, request.body),
    idempotencyKey: contract.idempotent === true ? readIdempotencyKey(request) : undefined,
  };
}

function readIdempotencyKey(request: Request): string {
  const key = request.get(idempotencyHeader)?.trim() ?? '';
  if (key.length >= 8 && key.length <= 100) return key;
  throw new AppError('bad-request', {
    detail: `Send an ${idempotencyHeader} of 8 to 100 characters, the same for each try.`,
  });
}
