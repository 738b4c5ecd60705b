import { rm } from 'node:fs/promises';
import { openDatabase } from '#api/db/database.ts';
import type { Database } from '#api/db/database.ts';
import { createLogger } from '#api/platform/logger.ts';
import type { Logger } from '#api/platform/logger.ts';
import { copyTemplate, newDataDir, templateFile } from './template-file.ts';
import { TestClock } from './test-clock.ts';

export type TestDatabase = {
  readonly database: Database;
  readonly dataDir: string;
  readonly clock: TestClock;
  readonly logger: Logger;
  /** Closes the database and removes its folder. */
  close(): Promise<void>;
};

export type TestDatabaseOptions = {
  readonly clock?: TestClock;
  /** What the template is filled with, under a name of its own; nothing by default. */
  readonly seeded?: { readonly name: string; readonly seed: () => Promise<void> };
};

const quiet = createLogger('silent');

/**
 * A real database file of its own, migrated (and seeded, once per run and copied after). One per
 * test file: open it in `beforeAll` and close it in `afterAll`.
 */
export async function openTestDatabase({
  clock = new TestClock(),
  seeded,
}: TestDatabaseOptions = {}): Promise<TestDatabase> {
  // What is seeded is dated: a test set in May must not be given what another seeded in June.
  const name = seeded === undefined ? 'empty' : `${seeded.name}-${clock.now().getTime()}`;
  const template = await templateFile(name, async (dir) => {
    if (!seeded) return;
    const filling = await openDatabase(dir, { clock, logger: quiet });
    try {
      await seeded.seed();
    } finally {
      await filling.close();
    }
  });
  const dataDir = await newDataDir();
  await copyTemplate(template, dataDir);
  const database = await openDatabase(dataDir, { clock, logger: quiet });
  return {
    database,
    dataDir,
    clock,
    logger: quiet,
    async close() {
      await database.close();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}
