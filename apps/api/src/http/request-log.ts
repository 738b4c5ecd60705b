import type { Request, RequestHandler } from 'express';
import type { Logger } from '#api/platform/logger.ts';

const logs = new WeakMap<Request, { readonly logger: Logger; readonly id: number }>();

/**
 * A line for every answer: method, path, status and milliseconds. Paths only: queries hold names
 * people search for, headers hold cookies. So the line has nothing in it to take out, and is
 * written by a logger that does not look for it, which would cost more than most answers.
 */
export function logRequests(logger: Logger): RequestHandler {
  const lines = logger.child({}, { redact: [] });
  let last = 0;
  return (request, response, next) => {
    last += 1;
    const id = last;
    const started = performance.now();
    logs.set(request, { logger, id });
    response.once('close', () => {
      const { method, originalUrl } = request;
      const line = {
        request: id,
        method,
        path: originalUrl.split('?', 1)[0],
        status: response.statusCode,
        ms: Math.round(performance.now() - started),
      };
      if (!response.writableFinished) lines.info(line, 'left before the answer');
      // The error itself was logged where it was caught.
      else if (response.statusCode >= 500) lines.warn(line, 'failed');
      else lines.info(line, 'answered');
    });
    next();
  };
}

/** Where what happens during a request is logged, with the number of its line. */
export function logOf(request: Request): Logger {
  const known = logs.get(request);
  if (known === undefined) throw new Error('The request came past its log.');
  return known.logger.child({ request: known.id });
}
