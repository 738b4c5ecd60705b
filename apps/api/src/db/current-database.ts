import type { Sequelize } from 'sequelize';
import type { Logger } from '#api/platform/logger.ts';
import type { Clock } from '#api/platform/clock.ts';

/** The database this process has open. */
export interface Database {
  readonly sequelize: Sequelize;
  /** The folder that holds the file, and the photos beside it. */
  readonly dataDir: string;
  readonly clock: Clock;
  readonly logger: Logger;
  /** Waits for the writers in the queue, then closes every connection. */
  close(): Promise<void>;
}

/**
 * Sequelize's models are classes with one database each, so a process has one database open at a
 * time; test files run in processes of their own. This is where it is kept.
 */
let current: Database | null = null;

/** @throws when no database is open */
export function currentDatabase(): Database {
  if (current === null) throw new Error('No database is open: call openDatabase first.');
  return current;
}

/** The clock that rows are written by. */
export function currentClock(): Clock {
  return currentDatabase().clock;
}

/** @throws when another database is open already */
export function setCurrentDatabase(database: Database): void {
  if (current !== null) throw new Error('This process has a database open already.');
  current = database;
}

export function clearCurrentDatabase(database: Database): void {
  if (current === database) current = null;
}
