import { pendingMigrations } from '#api/db/migrate.ts';
import type { Deps } from '#api/modules/deps.ts';
import { isWorkerAlive } from '#api/outbox/beat.ts';
import type { Readiness } from '#shared/contracts/health.ts';

/** Whether the database answers, has every migration, and some worker goes round. */
export async function checkReadiness({
  clock,
  logger,
}: Pick<Deps, 'clock' | 'logger'>): Promise<Readiness> {
  try {
    const pending = await pendingMigrations();
    const worker = await isWorkerAlive(clock);
    return { database: true, migrations: pending.length === 0, worker };
  } catch (error) {
    logger.error({ err: error }, 'the database does not answer');
    return { database: false, migrations: false, worker: false };
  }
}
