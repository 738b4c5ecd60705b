import { databaseFile, openDatabase } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';
import { seedAll } from '#api/db/seeders/seed-all.ts';
import { systemClock } from '#api/platform/clock.ts';
import { createLogger } from '#api/platform/logger.ts';

/**
 * `npm run db:seed`: the studio with its menu and prices, into the database of TIERWELL_DATA;
 * `-- --demo` with the demo's people and orders.
 */
const dataDir = process.env.TIERWELL_DATA?.trim() || '.data';
const demo = process.argv.includes('--demo');

try {
  await migrateDatabase(databaseFile(dataDir));
  const database = await openDatabase(dataDir, {
    clock: systemClock,
    logger: createLogger('warn'),
  });
  try {
    await seedAll(database, { clock: systemClock, demo });
    console.log('The studio is there.');
  } finally {
    await database.close();
  }
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
