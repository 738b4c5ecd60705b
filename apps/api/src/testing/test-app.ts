import { once } from 'node:events';
import { createServer } from 'node:http';
import { createApp, type App } from '#api/http/app.ts';
import type { Deps } from '#api/modules/deps.ts';
import { readEnv, type Env } from '#api/platform/env.ts';
import { createLogger, type Logger } from '#api/platform/logger.ts';
import { openTestDatabase, type TestDatabaseOptions } from './fresh-database.ts';
import type { TestClock } from './test-clock.ts';
import { TestClient } from './test-client.ts';

export type TestApp = {
  readonly url: string;
  readonly app: App;
  readonly deps: Deps;
  readonly env: Env;
  readonly clock: TestClock;
  /** Somebody new, with no cookies. */
  visitor(): TestClient;
  close(): Promise<void>;
};

export type TestAppOptions = TestDatabaseOptions & {
  /** More of the environment, such as where the stand-in for Google is, by the app's address. */
  readonly env?: (url: string) => Promise<Record<string, string>> | Record<string, string>;
  /** Errors are shown unless a test expects them. */
  readonly logger?: Logger;
};

/** The whole API on a free port, over a database file of its own and a clock that is set. */
export async function startTestApp(options: TestAppOptions = {}): Promise<TestApp> {
  const opened = await openTestDatabase(options);
  const server = createServer();
  // A test may be slow; a connection it comes back to is still there.
  server.keepAliveTimeout = 600_000;
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('not listening on a port');
  const url = `http://127.0.0.1:${address.port}`;
  const env = readEnv(
    {
      PORT: String(address.port),
      PUBLIC_URL: url,
      TIERWELL_DATA: opened.dataDir,
      CLIENT_DIR: `${opened.dataDir}/client`,
      LOG_LEVEL: 'silent',
      ...(await options.env?.(url)),
    },
    'test',
  );
  const { database, clock } = opened;
  const deps: Deps = { database, clock, env, logger: options.logger ?? createLogger('error') };
  const app = createApp(deps);
  server.on('request', app.handler);
  return {
    url,
    app,
    deps,
    env,
    clock,
    visitor: () => new TestClient(url),
    async close() {
      server.close();
      server.closeAllConnections();
      await opened.close();
    },
  };
}
