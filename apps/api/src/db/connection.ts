import sqlite3 from 'sqlite3';
import { Sequelize, Transaction } from 'sequelize';
import { keepWriter } from './kept-writer.ts';
import { isInTransaction, StrayWriteError, transactionNamespace } from './transaction.ts';

/** How long a statement waits for another process to finish its write, milliseconds. */
const busyTimeout = 5000;

/** Ends once every connection that was told to close has done so. */
let closing: Promise<void> = Promise.resolve();

/**
 * A connection as we want every one to be; there is one for reading and one for writing.
 * Statements run one after the other, so that waiting ones do not hold libuv's threads.
 */
class TunedDatabase extends sqlite3.Database {
  constructor(file: string, mode: number, opened: (error: Error | null) => void) {
    super(file, mode, opened);
    this.serialize();
    this.configure('busyTimeout', busyTimeout);
    this.run('PRAGMA synchronous = NORMAL');
  }

  /**
   * Before each SELECT Sequelize asks for the types of every table's columns to choose parsers by.
   * Ours are STRICT and parsed by the models' getters, so the answer never changes anything: give
   * it at once instead of asking the file.
   */
  override all(sql: string, ...rest: unknown[]): this {
    const done = rest.at(-1);
    if (sql.startsWith('PRAGMA table_info(') && typeof done === 'function') {
      done.call(this, null, []);
      return this;
    }
    return super.all(sql, ...rest);
  }

  /**
   * One after the other: of two that close at once each takes the other for still reading, and
   * neither puts the log back into the file.
   */
  override close(done?: (error: Error | null) => void): void {
    closing = closing.then(
      () =>
        new Promise((closed) => {
          super.close((error) => {
            done?.(error);
            closed();
          });
        }),
    );
  }
}

const writes: ReadonlySet<unknown> = new Set([
  'INSERT',
  'UPDATE',
  'BULKUPDATE',
  'DELETE',
  'BULKDELETE',
  'UPSERT',
]);

/**
 * Opens the file for the models: WAL, foreign keys on, BEGIN IMMEDIATE, and a reading connection
 * on which SQLite itself refuses to write, so that no statement escapes `inTransaction`.
 */
export async function connect(file: string): Promise<Sequelize> {
  Sequelize.useCLS(transactionNamespace);
  const sequelize = new Sequelize({
    dialect: 'sqlite',
    dialectModule: { ...sqlite3, Database: TunedDatabase },
    storage: file,
    transactionType: Transaction.TYPES.IMMEDIATE,
    logging: false,
    typeValidation: true,
    define: { underscored: true, timestamps: false, freezeTableName: true },
  });
  keepWriter(sequelize);
  sequelize.addHook('beforeQuery', (options) => {
    const strays = options.transaction ? !isInTransaction() : writes.has(options.type);
    if (strays) throw new StrayWriteError();
  });
  await sequelize.query('PRAGMA journal_mode = WAL');
  await sequelize.query('PRAGMA query_only = ON');
  return sequelize;
}
