import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { QueryTypes } from 'sequelize';
import { Umzug } from 'umzug';
import { systemClock } from '#api/platform/clock.ts';
import { currentDatabase } from './current-database.ts';
import { migrations } from './migrations/list.ts';
import type { Migration } from './migrations/migration.ts';
import { PlainConnection } from './plain-connection.ts';

/** How long one process waits for another that is migrating, milliseconds. */
const patience = 60_000;

const bookkeeping = `CREATE TABLE IF NOT EXISTS schema_migrations (
  name TEXT NOT NULL PRIMARY KEY,
  at TEXT NOT NULL
) STRICT`;

/**
 * Brings a database file to the newest schema, making it if need be, and answers the names of the
 * migrations that ran. All of them run in one exclusive transaction with foreign keys off (a
 * rebuilt table would otherwise take its children along) and a check of every foreign key at the
 * end; so a failure leaves the file as it was, and of two processes starting at once the second
 * waits and finds nothing to do.
 * @throws when the file was made by a newer version, or a migration fails
 */
export async function migrateDatabase(
  file: string,
  list: readonly Migration[] = migrations,
): Promise<string[]> {
  await mkdir(path.dirname(file), { recursive: true });
  const connection = await PlainConnection.open(file, patience);
  try {
    await useWriteAheadLog(connection);
    await connection.exec('PRAGMA foreign_keys = OFF; BEGIN EXCLUSIVE');
    try {
      const ran = await runPending(connection, list);
      const broken = await connection.all('PRAGMA foreign_key_check');
      if (broken.length > 0) {
        throw new Error(`Foreign keys are broken after migrating: ${JSON.stringify(broken[0])}`);
      }
      await connection.exec('COMMIT');
      return ran;
    } catch (error) {
      await connection.exec('ROLLBACK');
      throw error;
    }
  } finally {
    await connection.close();
  }
}

/** Names of the migrations that the open database still lacks, for the readiness check. */
export async function pendingMigrations(): Promise<string[]> {
  const applied = await currentDatabase().sequelize.query<{ name: string }>(
    'SELECT name FROM schema_migrations',
    { type: QueryTypes.SELECT },
  );
  const names = new Set(applied.map(({ name }) => name));
  return migrations.map(({ name }) => name).filter((name) => !names.has(name));
}

async function runPending(
  connection: PlainConnection,
  list: readonly Migration[],
): Promise<string[]> {
  await connection.exec(bookkeeping);
  const known = new Set(list.map(({ name }) => name));
  const executed = async (): Promise<string[]> => {
    const rows = await connection.all('SELECT name FROM schema_migrations');
    return rows.map((row) => String(row['name']));
  };
  const newer = (await executed()).find((name) => !known.has(name));
  if (newer !== undefined) {
    throw new Error(`This database was made by a newer version (it has ${newer}).`);
  }
  const umzug = new Umzug({
    migrations: list.map(({ name, sql }) => ({ name, up: () => connection.exec(sql) })),
    storage: {
      async logMigration({ name }) {
        await connection.run('INSERT INTO schema_migrations (name, at) VALUES (?, ?)', [
          name,
          systemClock.now().toISOString(),
        ]);
      },
      async unlogMigration() {
        throw new Error('Migrations only go forward.');
      },
      executed,
    },
    logger: undefined,
  });
  return (await umzug.up()).map(({ name }) => name);
}

/** Changing the journal does not wait for locks as other statements do, so ask again. */
async function useWriteAheadLog(connection: PlainConnection): Promise<void> {
  const tries = 100;
  for (let attempt = 1; ; attempt += 1) {
    try {
      await connection.exec('PRAGMA journal_mode = WAL');
      return;
    } catch (error) {
      if (attempt === tries || !String(error).includes('SQLITE_BUSY')) throw error;
      await pause(100);
    }
  }
}
