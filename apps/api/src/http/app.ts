import { existsSync } from 'node:fs';
import path from 'node:path';
import compression from 'compression';
import express, { type Express } from 'express';
import type { Deps } from '#api/modules/deps.ts';
import { clientAssets, clientPage } from './client-files.ts';
import { featureRoutes } from './features.ts';
import { openApiRoutes } from './openapi.ts';
import { guardOrigin } from './origin-guard.ts';
import { handleError, noSuchRoute } from './problem.ts';
import { logRequests } from './request-log.ts';
import type { RouteContract } from './route.ts';
import { securityHeaders } from './security-headers.ts';
import { sessions } from './session.ts';

/** Answers from this size on are sent compressed where the browser takes it, bytes. */
const compressFrom = 2048;

/** Largest JSON body: an order with eight photos' notes is under 40 kB. */
const bodyLimit = '256kb';

export type App = {
  readonly handler: Express;
  /** Every route there is, as declared. */
  readonly declared: readonly RouteContract[];
};

/**
 * The whole HTTP side, outermost first: log, headers, what lies prepared, the client's files, guard,
 * body, what is the same for everybody, session, what is not, and at the end the page or a problem.
 */
export function createApp(deps: Deps): App {
  const { env, logger } = deps;
  const features = featureRoutes(deps);
  const declared = features.flatMap((feature) => feature.declared);
  const page = openApiRoutes(declared);
  const everyFeature = [page, ...features];

  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.set('trust proxy', env.trustedProxies);
  app.use(logRequests(logger));
  app.use(securityHeaders({ secure: env.secureCookies }));
  for (const feature of everyFeature) if (feature.stage === 'prepared') app.use(feature.router);
  const hasClient = existsSync(path.join(env.clientDir, 'index.html'));
  if (hasClient) app.use(clientAssets(env.clientDir));
  app.use(guardOrigin(env.origins));
  app.use(express.json({ limit: bodyLimit }));
  app.use(compression({ threshold: compressFrom }));
  for (const feature of everyFeature) if (feature.stage === 'anonymous') app.use(feature.router);
  app.use('/api', sessions(deps));
  for (const feature of everyFeature) if (feature.stage === 'personal') app.use(feature.router);
  app.use('/api', noSuchRoute);
  if (hasClient) app.use(clientPage(env.clientDir));
  app.use(noSuchRoute);
  app.use(handleError);
  return { handler: app, declared: [...page.declared, ...declared] };
}
