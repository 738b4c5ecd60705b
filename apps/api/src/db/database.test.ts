import { readdirSync, rmSync } from 'node:fs';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { newDataDir } from '#api/testing/template-file.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { createLogger } from '#api/platform/logger.ts';
import { currentDatabase } from './current-database.ts';
import { databaseFile, openDatabase } from './database.ts';
import { migrateDatabase } from './migrate.ts';
import { PersonSkill } from './models/person-skill.ts';
import { Skill } from './models/skill.ts';
import { inTransaction } from './transaction.ts';

const parts = { clock: new TestClock(), logger: createLogger('silent') };

let dataDir: string;
beforeEach(async () => {
  dataDir = await newDataDir();
  await migrateDatabase(databaseFile(dataDir));
});
afterEach(() => rmSync(dataDir, { recursive: true, force: true }));

describe('openDatabase', () => {
  it('opens one at a time', async () => {
    const database = await openDatabase(dataDir, parts);
    await expect(openDatabase(dataDir, parts)).rejects.toThrow('open already');
    expect(currentDatabase()).toBe(database);
    await database.close();
    expect(currentDatabase).toThrow('No database is open');
  });

  it('keeps what was written in one file, for the next to open', async () => {
    const first = await openDatabase(dataDir, parts);
    await inTransaction(() => Skill.create({ id: 'lettering', name: 'Lettering' }));
    await first.close();
    expect(readdirSync(dataDir)).toEqual(['tierwell.sqlite']);

    const second = await openDatabase(dataDir, parts);
    expect(await Skill.count()).toBe(1);
    await second.close();
  });

  it('waits for writers in the queue before it closes', async () => {
    const database = await openDatabase(dataDir, parts);
    const written = inTransaction(() => Skill.create({ id: 'driving', name: 'Driving' }));
    await database.close();
    expect((await written).name).toBe('Driving');
  });

  it('holds foreign keys, in the first transaction and the next', async () => {
    const database = await openDatabase(dataDir, parts);
    for (const skillId of ['piping', 'sculpting']) {
      const orphan = inTransaction(() => PersonSkill.create({ personId: 'nobody', skillId }));
      await expect(orphan).rejects.toHaveProperty('name', 'SequelizeForeignKeyConstraintError');
    }
    await database.close();
  });
});
