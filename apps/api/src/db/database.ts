import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import type { Clock } from '#api/platform/clock.ts';
import type { Logger } from '#api/platform/logger.ts';
import { connect } from './connection.ts';
import { clearCurrentDatabase, setCurrentDatabase } from './current-database.ts';
import type { Database } from './current-database.ts';
import { registerModels } from './models/register.ts';
import { writersDone } from './transaction.ts';

/** Where the database lies in the data folder. */
export function databaseFile(dataDir: string): string {
  return path.join(dataDir, 'tierwell.sqlite');
}

/**
 * Opens the database of a data folder for this process and binds the models to it. One at a time:
 * models are classes, so a second one needs the first closed. The file must be migrated already.
 * @throws when this process has one open
 */
export async function openDatabase(
  dataDir: string,
  { clock, logger }: { clock: Clock; logger: Logger },
): Promise<Database> {
  await mkdir(dataDir, { recursive: true });
  const sequelize = await connect(databaseFile(dataDir));
  const database: Database = {
    sequelize,
    dataDir,
    clock,
    logger,
    async close() {
      await writersDone();
      clearCurrentDatabase(database);
      await sequelize.close();
    },
  };
  try {
    setCurrentDatabase(database);
  } catch (error) {
    await sequelize.close();
    throw error;
  }
  registerModels(sequelize);
  return database;
}

export type { Database } from './current-database.ts';
