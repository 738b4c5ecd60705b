import { rm } from 'node:fs/promises';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { newDataDir } from '#api/testing/template-file.ts';
import { runBeside } from '#api/testing/run-beside.ts';
import { databaseFile } from './database.ts';
import { migrateDatabase } from './migrate.ts';
import { migrations } from './migrations/list.ts';
import { PlainConnection } from './plain-connection.ts';

let dataDir: string;
beforeEach(async () => {
  dataDir = await newDataDir();
});
afterEach(() => rm(dataDir, { recursive: true, force: true }));

async function select(sql: string): Promise<Record<string, unknown>[]> {
  const connection = await PlainConnection.open(databaseFile(dataDir), 1000);
  try {
    return await connection.all(sql);
  } finally {
    await connection.close();
  }
}

const names = migrations.map(({ name }) => name);
const tree = { name: 'tree', sql: 'CREATE TABLE tree (id INTEGER PRIMARY KEY) STRICT' };
const leaves = {
  name: 'leaves',
  sql: `CREATE TABLE leaves (
    id INTEGER PRIMARY KEY,
    tree_id INTEGER NOT NULL REFERENCES tree (id) ON DELETE CASCADE
  ) STRICT; INSERT INTO tree VALUES (1); INSERT INTO leaves VALUES (1, 1), (2, 1)`,
};

describe('migrateDatabase', () => {
  it('makes a database from nothing, once', async () => {
    expect(await migrateDatabase(databaseFile(dataDir))).toEqual(names);
    expect(await migrateDatabase(databaseFile(dataDir))).toEqual([]);
    expect(await select('PRAGMA journal_mode')).toEqual([{ journal_mode: 'wal' }]);
  });

  it('runs each once when two processes start at the same time', async () => {
    const entry = path.join(import.meta.dirname, '../entry/migrate.ts');
    const env = { TIERWELL_DATA: dataDir };
    const ended = await Promise.all([runBeside(entry, [], env), runBeside(entry, [], env)]);
    expect(ended.map(({ code }) => code)).toEqual([0, 0]);
    expect(
      ended
        .map(({ output }) => output)
        .join('')
        .match(/ran 0001/g),
    ).toHaveLength(1);
    const applied = await select('SELECT name FROM schema_migrations ORDER BY name');
    expect(applied.map((row) => row['name'])).toEqual(names);
  });

  it('keeps the children of a table that is rebuilt', async () => {
    const rebuild = {
      name: 'rebuild',
      sql: `CREATE TABLE tree_new (id INTEGER PRIMARY KEY, kind TEXT) STRICT;
        INSERT INTO tree_new (id) SELECT id FROM tree;
        DROP TABLE tree; ALTER TABLE tree_new RENAME TO tree`,
    };
    await migrateDatabase(databaseFile(dataDir), [tree, leaves, rebuild]);
    expect(await select('SELECT count(*) AS n FROM leaves')).toEqual([{ n: 2 }]);
  });

  it('leaves the file as it was when a migration fails', async () => {
    await migrateDatabase(databaseFile(dataDir), [tree]);
    const broken = { name: 'broken', sql: 'DROP TABLE tree; CREATE TABEL oops' };
    await expect(migrateDatabase(databaseFile(dataDir), [tree, leaves, broken])).rejects.toThrow(
      'syntax error',
    );
    expect(await select('SELECT name FROM schema_migrations')).toEqual([{ name: 'tree' }]);
    expect(await select('SELECT count(*) AS n FROM tree')).toEqual([{ n: 0 }]);
  });

  it('refuses to leave a foreign key broken', async () => {
    const orphan = { name: 'orphan', sql: 'DELETE FROM tree' };
    await expect(migrateDatabase(databaseFile(dataDir), [tree, leaves, orphan])).rejects.toThrow(
      'Foreign keys are broken',
    );
  });

  it('refuses a database that a newer version made', async () => {
    await migrateDatabase(databaseFile(dataDir), [tree, leaves]);
    await expect(migrateDatabase(databaseFile(dataDir), [tree])).rejects.toThrow('newer version');
  });
});
