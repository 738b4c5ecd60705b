import { type ErrorCode, errorTitles } from '#shared/errors.ts';

/** One answer that needs another look, and where it is in the request's body. */
export type Issue = { readonly path: readonly (string | number)[]; readonly message: string };

export type ErrorDetails = {
  /** A sentence for a person, more particular than the code's title. */
  readonly detail?: string;
  readonly issues?: readonly Issue[];
  /** What a client may act on, by code: nearest dates, the current row. */
  readonly facts?: Readonly<Record<string, unknown>>;
  /** Seconds to wait, with `too-many-requests` and `unavailable`. */
  readonly retryAfterS?: number;
  readonly cause?: unknown;
};

/**
 * A refusal by code. Anything may throw one; only the HTTP layer knows which status it becomes.
 */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly detail: string | undefined;
  readonly issues: readonly Issue[] | undefined;
  readonly facts: Readonly<Record<string, unknown>> | undefined;
  readonly retryAfterS: number | undefined;

  constructor(code: ErrorCode, details: ErrorDetails = {}) {
    super(details.detail ?? errorTitles[code], { cause: details.cause });
    this.name = 'AppError';
    this.code = code;
    this.detail = details.detail;
    this.issues = details.issues;
    this.facts = details.facts;
    this.retryAfterS = details.retryAfterS;
  }
}

/** Somebody else's and nobody's look alike: both are this. */
export function notFound(detail?: string): AppError {
  return new AppError('not-found', { detail });
}

/** A refusal of one field, as if its schema had refused it. */
export function invalidField(path: readonly (string | number)[], message: string): AppError {
  return new AppError('invalid-input', { issues: [{ path, message }] });
}
