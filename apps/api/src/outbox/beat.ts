import { WorkerBeat } from '#api/db/models/worker-beat.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Clock } from '#api/platform/clock.ts';

/** A worker shows itself this often, milliseconds. */
export const beatMs = 15_000;

/** Notes that a worker is going round, for the readiness check of whichever process is asked. */
export async function noteBeat(name: string, clock: Clock): Promise<void> {
  await inTransaction(async () => {
    const at = clock.now();
    const [known] = await WorkerBeat.update({ at }, { where: { name } });
    if (known === 0) await WorkerBeat.create({ name, at });
  });
}

/** Whether some worker has shown itself lately. */
export async function isWorkerAlive(clock: Clock): Promise<boolean> {
  const latest = await WorkerBeat.findOne({ order: [['at', 'DESC']] });
  return latest !== null && clock.now().getTime() - latest.at.getTime() <= 3 * beatMs;
}
