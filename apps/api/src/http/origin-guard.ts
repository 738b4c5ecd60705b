import type { RequestHandler } from 'express';
import { guardHeader } from '#shared/contracts/headers.ts';
import { AppError } from '#api/platform/app-error.ts';

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses every request that may change something, multipart too, unless it comes from a page of
 * this site (Origin) and was sent by its script (a header no form can set).
 */
export function guardOrigin(origins: readonly string[]): RequestHandler {
  const allowed = new Set(origins);
  return (request, _response, next) => {
    if (safeMethods.has(request.method)) return next();
    const origin = request.get('Origin');
    if (origin === undefined || !allowed.has(origin) || request.get(guardHeader) === undefined) {
      return next(new AppError('wrong-origin'));
    }
    next();
  };
}
