import type * as z from 'zod/mini';
import { problem } from '#shared/contracts/common.ts';
import { guardHeader } from '#shared/contracts/headers.ts';
import { type ErrorCode, errorTitles } from '#shared/errors.ts';

export type ProblemIssue = {
  readonly path: readonly (string | number)[];
  readonly message: string;
};

/** A refusal the API explained (RFC 9457 problem details). */
export class ApiProblem extends Error {
  override readonly name = 'ApiProblem';
  readonly status: number;
  readonly code: ErrorCode;
  readonly detail: string;
  readonly issues: readonly ProblemIssue[];
  readonly facts: Readonly<Record<string, unknown>>;

  constructor(answer: z.infer<typeof problem>) {
    super(answer.title);
    this.status = answer.status;
    this.code = isErrorCode(answer.code) ? answer.code : 'internal';
    this.detail = answer.detail ?? '';
    this.issues = answer.issues ?? [];
    this.facts = answer.facts ?? {};
  }
}

/** No answer at all: offline, the server down, or the connection cut. */
export class NetworkProblem extends Error {
  override readonly name = 'NetworkProblem';

  constructor(cause: unknown) {
    super('We cannot reach the studio just now.', { cause });
  }
}

function isErrorCode(code: string): code is ErrorCode {
  return code in errorTitles;
}

/** What tells the API that a request came from this application's own script. */
export const ownScriptHeader = { [guardHeader]: '1' } as const;

export type Request<S extends z.ZodMiniType> = {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly path: string;
  readonly query?: Readonly<
    Record<string, string | number | boolean | readonly string[] | undefined>
  >;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
  readonly signal?: AbortSignal;
  /** The contract of the answer; anything else is a fault of ours, not the customer's. */
  readonly answer: S;
};

/**
 * Sends one request and returns the answer in its contract's shape. Throws `ApiProblem` for a
 * refusal, `NetworkProblem` when nothing answered, the abort's own error when cancelled.
 */
export async function request<S extends z.ZodMiniType>(options: Request<S>): Promise<z.output<S>> {
  const response = await send(options);
  const json = await readJson(response);
  if (!response.ok) throw refusal(response.status, json);
  return options.answer.parse(json);
}

async function send(options: Request<z.ZodMiniType>): Promise<Response> {
  const headers: Record<string, string> = {
    accept: 'application/json',
    ...ownScriptHeader,
    ...options.headers,
  };
  const init: RequestInit = {
    method: options.method ?? 'GET',
    credentials: 'same-origin',
    headers,
  };
  if (options.signal) init.signal = options.signal;
  if (options.body !== undefined) {
    headers['content-type'] = 'application/json';
    init.body = JSON.stringify(options.body);
  }
  try {
    return await fetch(options.path + searchOf(options.query), init);
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new NetworkProblem(error);
  }
}

function searchOf(query: Request<z.ZodMiniType>['query']): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query ?? {})) {
    if (value === undefined) continue;
    if (typeof value === 'object') for (const each of value) search.append(name, each);
    else search.append(name, String(value));
  }
  return search.size === 0 ? '' : `?${search}`;
}

async function readJson(response: Response): Promise<unknown> {
  try {
    return await response.json();
  } catch (error) {
    // A cut connection or a proxy's own page: either way the API did not answer.
    throw new NetworkProblem(error);
  }
}

/** Makes the refusal out of an answer; also for uploads, which do not go through `request`. */
export function refusal(status: number, json: unknown): ApiProblem {
  const parsed = problem.safeParse(json);
  if (parsed.success) return new ApiProblem(parsed.data);
  const code: ErrorCode =
    status === 429 ? 'too-many-requests' : status === 404 ? 'not-found' : 'internal';
  return new ApiProblem({ type: 'about:blank', title: errorTitles[code], status, code });
}
