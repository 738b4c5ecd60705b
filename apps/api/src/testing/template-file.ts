import { createHash, randomUUID } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { copyFile, mkdir, rename } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { databaseFile } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';
import { migrations } from '#api/db/migrations/list.ts';
import { PlainConnection } from '#api/db/plain-connection.ts';

const prefix = 'tierwell-tests-';
const seedersDir = path.join(import.meta.dirname, '../db/seeders');

/** The folder of this test run: all of its workers are children of one process. */
const runDir = path.join(os.tmpdir(), `${prefix}${process.ppid}`);

/** A new, empty folder for one database of this run. */
export async function newDataDir(): Promise<string> {
  const dir = path.join(runDir, randomUUID());
  await mkdir(dir, { recursive: true });
  return dir;
}

/**
 * The file of a prepared database, made by whichever worker needs it first and copied by the rest.
 * Two that make it at once make the same, and the last one's name stays.
 * @param name of what is in it
 * @param prepare fills a migrated database in the given folder and closes it
 */
export async function templateFile(
  name: string,
  prepare: (dataDir: string) => Promise<void>,
): Promise<string> {
  const file = path.join(runDir, `${name}-${fingerprint()}.sqlite`);
  if (existsSync(file)) return file;
  sweep();
  const dir = await newDataDir();
  await migrateDatabase(databaseFile(dir));
  await prepare(dir);
  await foldIn(databaseFile(dir));
  await rename(databaseFile(dir), file);
  rmSync(dir, { recursive: true, force: true });
  return file;
}

/**
 * Brings what is still in the write-ahead log into the file itself, which alone is kept: closing
 * does so too, but not while another connection of the process is still on its way out.
 */
async function foldIn(file: string): Promise<void> {
  const connection = await PlainConnection.open(file, 10_000);
  try {
    await connection.exec('PRAGMA wal_checkpoint(TRUNCATE)');
  } finally {
    await connection.close();
  }
}

/** Puts a copy of a template where a database of the folder belongs. */
export async function copyTemplate(file: string, dataDir: string): Promise<void> {
  await copyFile(file, databaseFile(dataDir));
}

/** Changes with the schema and the seeders, so that a process id used again finds nothing stale. */
function fingerprint(): string {
  const hash = createHash('sha256');
  for (const { name, sql } of migrations) hash.update(name).update(sql);
  const seeders = readdirSync(seedersDir, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts'))
    .sort();
  for (const name of seeders) hash.update(readFileSync(path.join(seedersDir, name)));
  return hash.digest('hex').slice(0, 16);
}

/** Removes what runs that have ended left behind. */
function sweep(): void {
  for (const name of readdirSync(os.tmpdir())) {
    if (!name.startsWith(prefix)) continue;
    const pid = Number(name.slice(prefix.length));
    if (Number.isInteger(pid) && !isRunning(pid)) {
      rmSync(path.join(os.tmpdir(), name), { recursive: true, force: true });
    }
  }
}

function isRunning(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}
