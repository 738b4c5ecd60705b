import type { ErrorRequestHandler, Request, Response } from 'express';
import { type Problem } from '#shared/contracts/common.ts';
import { type ErrorCode, errorTitles } from '#shared/errors.ts';
import { AppError } from '#api/platform/app-error.ts';
import { logOf } from './request-log.ts';

/** The only place where a code becomes a status. */
export const statusOf: Readonly<Record<ErrorCode, number>> = {
  'bad-request': 400,
  'invalid-input': 422,
  'not-signed-in': 401,
  'second-factor-needed': 401,
  'fresh-proof-needed': 403,
  'not-allowed': 403,
  'wrong-origin': 403,
  'not-found': 404,
  'wrong-state': 409,
  'changed-meanwhile': 409,
  'still-used': 409,
  'date-gone': 409,
  'price-changed': 409,
  'advice-stop': 409,
  'too-many-holds': 429,
  'key-reused': 409,
  'link-spent': 410,
  'sign-in-failed': 401,
  'provider-failed': 502,
  'too-large': 413,
  'unreadable-photo': 415,
  'too-many-photos': 422,
  'too-many-requests': 429,
  unavailable: 503,
  internal: 500,
};

/** The RFC 9457 body of a refusal. */
export function problemOf(error: AppError): Problem {
  return {
    type: `/api#${error.code}`,
    title: errorTitles[error.code],
    status: statusOf[error.code],
    code: error.code,
    ...(error.detail === undefined ? {} : { detail: error.detail }),
    ...(error.issues === undefined
      ? {}
      : { issues: error.issues.map(({ path, message }) => ({ path: [...path], message })) }),
    ...(error.facts === undefined ? {} : { facts: { ...error.facts } }),
  };
}

/** Turns what Express and its parsers throw into a refusal of ours; unknown errors are `internal`. */
export function toAppError(error: unknown): AppError {
  if (error instanceof AppError) return error;
  const status = clientStatus(error);
  if (status === 413) return new AppError('too-large', { cause: error });
  if (status === 415) {
    return new AppError('bad-request', { detail: 'We read JSON in UTF-8 here.', cause: error });
  }
  if (status !== null) return new AppError('bad-request', { cause: error });
  return new AppError('internal', { cause: error });
}

/** The 4xx status an error carries when the request itself was at fault (a body cut short, a bad %). */
function clientStatus(error: unknown): number | null {
  if (typeof error !== 'object' || error === null || !('status' in error)) return null;
  const { status } = error;
  return typeof status === 'number' && status >= 400 && status < 500 ? status : null;
}

export function sendProblem(response: Response, error: AppError): void {
  if (error.retryAfterS !== undefined) {
    response.set('Retry-After', String(Math.max(1, Math.ceil(error.retryAfterS))));
  }
  response
    .status(statusOf[error.code])
    .set('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify(problemOf(error)));
}

/** For whatever no route took. */
export function noSuchRoute(request: Request): never {
  throw new AppError('not-found', {
    detail: `${request.method} ${request.baseUrl}${request.path} is not part of this API.`,
  });
}

/** The last handler: refusals by code, unknown errors logged and answered 500; the process stays up. */
export const handleError: ErrorRequestHandler = (error: unknown, request, response, next) => {
  const refusal = toAppError(error);
  if (refusal.code === 'internal') logOf(request).error({ err: error }, 'request failed');
  if (response.headersSent) {
    // The answer is half out: nothing can be said any more, so the connection is cut.
    next(error);
    return;
  }
  sendProblem(response, refusal);
};
