import { createCallLog } from '#fakes/harness/call-log.ts';
import { createFailureQueue } from '#fakes/harness/failure-queue.ts';
import { close, createLoopbackApp, listen, portOf } from '#fakes/harness/loopback-app.ts';
import { createControlRoutes } from './control-routes.ts';
import { createGrants } from './grants.ts';
import type { GoogleState } from './oauth-routes.ts';
import { createOauthRoutes } from './oauth-routes.ts';
import type { GoogleClient, GoogleFailure } from './wire.ts';

export interface GoogleFake {
  /** Where it listens, without a slash at the end. */
  url: string;
  authorizationUrl: string;
  tokenUrl: string;
  userinfoUrl: string;
  stop(): Promise<void>;
}

/**
 * Starts the stand-in for Google's sign-in on 127.0.0.1. Port 0 takes any free one; with a
 * `dataDir` the log of calls is kept there; `now` decides when codes and tokens run out.
 * Rejects when the port is taken.
 */
export async function start(options: {
  port: number;
  clients: GoogleClient[];
  dataDir?: string;
  now?: () => Date;
}): Promise<GoogleFake> {
  const now = options.now ?? (() => new Date());
  const state: GoogleState = {
    clients: new Map(options.clients.map((client) => [client.id, client])),
    grants: createGrants(now),
    failures: createFailureQueue<GoogleFailure>(),
    calls: createCallLog({ folder: options.dataDir, now }),
  };
  const app = createLoopbackApp();
  app.use(createOauthRoutes(state));
  app.use(createControlRoutes(state));
  const server = await listen(app, options.port);
  const url = `http://127.0.0.1:${portOf(server)}`;

  return {
    url,
    authorizationUrl: `${url}/o/oauth2/v2/auth`,
    tokenUrl: `${url}/token`,
    userinfoUrl: `${url}/v3/userinfo`,
    stop: () => close(server),
  };
}
