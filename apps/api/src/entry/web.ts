import { once } from 'node:events';
import { createServer } from 'node:http';
import { createApp } from '#api/http/app.ts';
import type { Deps } from '#api/modules/deps.ts';
import type { Running } from '#api/platform/periodic.ts';

/** How long requests under way may take once the program is told to stop, milliseconds. */
const patienceMs = 10_000;
const sweepMs = 50;

/**
 * How long an idle connection is kept, milliseconds: longer than proxies usually do (a minute), so
 * that none sends a request into one that we are closing.
 */
const keepAliveMs = 65_000;

/** Listens. Rejects when the port is taken. */
export async function start(deps: Deps): Promise<Running> {
  const { env, logger } = deps;
  const server = createServer(createApp(deps).handler);
  server.keepAliveTimeout = keepAliveMs;
  server.listen(env.port, env.host);
  await once(server, 'listening');
  logger.info({ port: env.port, host: env.host }, 'listening');
  return {
    async stop() {
      const closed = once(server, 'close');
      server.close();
      const tooLong = setTimeout(() => server.closeAllConnections(), patienceMs);
      // A connection whose request ends meanwhile is idle from then on.
      const sweeping = setInterval(() => server.closeIdleConnections(), sweepMs);
      await closed;
      clearTimeout(tooLong);
      clearInterval(sweeping);
    },
  };
}
