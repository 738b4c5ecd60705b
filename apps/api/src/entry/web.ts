import { once } from 'node:events';
import { createServer } from 'node:http';
import { createApp } from '#api/http/app.ts';
import type { Deps } from '#api/modules/deps.ts';
import type { Running } from '#api/platform/periodic.ts';

/** How long requests under way may take once the program is told to stop, milliseconds. */
const patienceMs = 10_000;

/** Listens. Rejects when the port is taken. */
export async function start(deps: Deps): Promise<Running> {
  const { env, logger } = deps;
  const server = createServer(createApp(deps).handler);
  server.listen(env.port, env.host);
  await once(server, 'listening');
  logger.info({ port: env.port, host: env.host }, 'listening');
  return {
    async stop() {
      const closed = once(server, 'close');
      server.close();
      server.closeIdleConnections();
      const tooLong = setTimeout(() => server.closeAllConnections(), patienceMs);
      await closed;
      clearTimeout(tooLong);
    },
  };
}
