import { databaseFile } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';

/** `npm run db:migrate`: brings the database of TIERWELL_DATA to the newest schema. */
const dataDir = process.env.TIERWELL_DATA?.trim() || '.data';

try {
  const ran = await migrateDatabase(databaseFile(dataDir));
  for (const name of ran) console.log(`ran ${name}`);
  console.log(ran.length === 0 ? 'Nothing to migrate.' : `Migrated: ${ran.length}.`);
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
