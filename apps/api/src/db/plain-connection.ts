import sqlite3 from 'sqlite3';

/** A bare SQLite connection in promises, for migrations and for looking at a file without models. */
export class PlainConnection {
  readonly #database: sqlite3.Database;

  private constructor(database: sqlite3.Database) {
    this.#database = database;
  }

  /** @param busyTimeout how long a statement waits for another process, milliseconds */
  static open(file: string, busyTimeout: number): Promise<PlainConnection> {
    return new Promise((resolve, reject) => {
      const database = new sqlite3.Database(file, (error) => {
        if (error) reject(error);
        else resolve(new PlainConnection(database));
      });
      database.serialize();
      database.configure('busyTimeout', busyTimeout);
    });
  }

  /** Any number of statements. */
  exec(sql: string): Promise<void> {
    return new Promise((resolve, reject) => {
      this.#database.exec(sql, (error) => (error ? reject(error) : resolve()));
    });
  }

  run(sql: string, values: readonly unknown[]): Promise<void> {
    return new Promise((resolve, reject) => {
      this.#database.run(sql, [...values], (error: Error | null) =>
        error ? reject(error) : resolve(),
      );
    });
  }

  all(sql: string): Promise<Record<string, unknown>[]> {
    return new Promise((resolve, reject) => {
      this.#database.all<Record<string, unknown>>(sql, (error, rows) =>
        error ? reject(error) : resolve(rows),
      );
    });
  }

  close(): Promise<void> {
    return new Promise((resolve, reject) => {
      this.#database.close((error) => (error ? reject(error) : resolve()));
    });
  }
}
