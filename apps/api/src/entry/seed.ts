import { databaseFile, openDatabase } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';
import { seedAll } from '#api/db/seeders/seed-all.ts';
import { fillDemo } from '#api/modules/demo/fill-demo.command.ts';
import { systemClock } from '#api/platform/clock.ts';
import { readEnv } from '#api/platform/env.ts';
import { createLogger } from '#api/platform/logger.ts';

/**
 * `npm run db:seed`: the studio with its menu and prices, into the database of TIERWELL_DATA;
 * `-- --demo` with the demo's people and orders.
 */
const dataDir = process.env.TIERWELL_DATA?.trim() || '.data';
const logger = createLogger('warn');

async function seedStudio(): Promise<void> {
  await migrateDatabase(databaseFile(dataDir));
  const database = await openDatabase(dataDir, { clock: systemClock, logger });
  try {
    await seedAll(database, { clock: systemClock, demo: false });
  } finally {
    await database.close();
  }
}

try {
  if (process.argv.includes('--demo')) {
    const env = readEnv({ ...process.env, TIERWELL_DATA: dataDir }, 'demo');
    await fillDemo({ env, logger }, systemClock.now());
  } else {
    await seedStudio();
  }
  console.log('The studio is there.');
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
