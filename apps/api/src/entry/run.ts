import { databaseFile, openDatabase } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';
import type { Deps } from '#api/modules/deps.ts';
import { systemClock } from '#api/platform/clock.ts';
import { EnvError, readEnv, type EnvKind } from '#api/platform/env.ts';
import { createLogger } from '#api/platform/logger.ts';
import type { Running } from '#api/platform/periodic.ts';
import { start as startWeb } from './web.ts';
import { start as startWorker } from './worker.ts';

/**
 * The whole program in one process: reads the environment, brings the database up to date, runs
 * web and worker, and on SIGTERM or SIGINT finishes what is under way and ends.
 * @param prepare what an entry does before people come in
 * @param fill what it does even before the database is opened by the clock on the wall
 */
export async function run(
  kind: EnvKind,
  prepare: (deps: Deps) => Promise<void>,
  fill: (parts: Pick<Deps, 'env' | 'logger'>) => Promise<void> = async () => {},
): Promise<void> {
  const stopped = untilStopped();
  try {
    const env = readEnv(process.env, kind);
    const logger = createLogger(env.logLevel);
    await migrateDatabase(databaseFile(env.dataDir));
    await fill({ env, logger });
    const database = await openDatabase(env.dataDir, { clock: systemClock, logger });
    const deps: Deps = { database, clock: systemClock, env, logger };
    const running: Running[] = [];
    try {
      await prepare(deps);
      running.push(await startWorker(deps));
      running.push(await startWeb(deps));
      await stopped;
      logger.info('stopping');
    } finally {
      // People first, then the work nobody waits for, then the file.
      for (const part of running.toReversed()) await part.stop();
      await database.close();
    }
  } catch (error) {
    for (const line of explain(error)) console.error(line);
    process.exitCode = 1;
  }
  process.exit();
}

/** Resolves on the first signal to stop; the second ends the process at once. */
function untilStopped(): Promise<void> {
  return new Promise((resolve) => {
    for (const signal of ['SIGTERM', 'SIGINT'] as const) {
      process.once(signal, () => {
        process.once(signal, () => process.exit(1));
        resolve();
      });
    }
  });
}

function explain(error: unknown): readonly string[] {
  if (error instanceof EnvError) return error.lines;
  return [error instanceof Error ? (error.stack ?? error.message) : String(error)];
}
