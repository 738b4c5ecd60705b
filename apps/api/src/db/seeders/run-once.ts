import { AppliedSeeder } from '#api/db/models/applied-seeder.ts';
import { inTransaction } from '#api/db/transaction.ts';

/**
 * Runs a seeder in one transaction unless it has run on this database before: what the owner has
 * changed since is never put back.
 */
export async function runOnce(name: string, work: () => Promise<void>): Promise<void> {
  await inTransaction(async () => {
    if ((await AppliedSeeder.findByPk(name)) !== null) return;
    await work();
    await AppliedSeeder.create({ name });
  });
}

/** Whether a seeder has run on this database. */
export async function hasRun(name: string): Promise<boolean> {
  return (await AppliedSeeder.findByPk(name)) !== null;
}
