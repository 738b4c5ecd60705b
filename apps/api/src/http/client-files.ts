import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { Router, type RequestHandler } from 'express';
import expressStaticGzip from 'express-static-gzip';

const yearMs = 365 * 86_400_000;

/**
 * The built client's files. Hashed assets never change under their name: kept for a year and sent
 * as they were compressed at build time; other files are asked about each time.
 */
export function clientAssets(folder: string): Router {
  const router = Router();
  router.use((request, _response, next) => {
    // No call is a file: the disk is not asked.
    next(request.path.startsWith('/api') ? 'router' : undefined);
  });
  router.use(
    '/assets',
    expressStaticGzip(path.join(folder, 'assets'), {
      enableBrotli: true,
      orderPreference: ['br', 'gz'],
      index: false,
      serveStatic: { immutable: true, maxAge: yearMs, index: false, fallthrough: false },
    }),
  );
  router.use(
    expressStaticGzip(folder, {
      index: false,
      serveStatic: { maxAge: 0, index: false, redirect: false },
    }),
  );
  return router;
}

/** The page every address of the client opens with; read once, since a build does not change. */
export function clientPage(folder: string): RequestHandler {
  const page = readFileSync(path.join(folder, 'index.html'));
  const tag = `"${createHash('sha256').update(page).digest('base64url').slice(0, 27)}"`;
  return (request, response, next) => {
    const wantsPage = request.method === 'GET' || request.method === 'HEAD';
    if (!wantsPage || request.path.startsWith('/api') || path.extname(request.path) !== '') {
      return next();
    }
    response.set({ 'Cache-Control': 'no-cache', ETag: tag });
    if (request.fresh) {
      response.status(304).end();
      return;
    }
    response.type('html').send(page);
  };
}
