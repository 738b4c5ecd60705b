import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { runBeside } from '#api/testing/run-beside.ts';
import { PlanState } from './models/plan-state.ts';
import { Skill } from './models/skill.ts';
import {
  afterCommit,
  inTransaction,
  isInTransaction,
  StrayWriteError,
  transactionNamespace,
} from './transaction.ts';

let test: TestDatabase;
beforeAll(async () => {
  test = await openTestDatabase();
});
afterAll(() => test.close());
beforeEach(() =>
  inTransaction(async () => {
    await Skill.destroy({ where: {} });
    await PlanState.update({ planVersion: 0 }, { where: { id: 1 } });
  }),
);

const planVersion = async (): Promise<number> =>
  (await PlanState.findByPk(1, { rejectOnEmpty: true })).planVersion;

const addOne = (): Promise<void> =>
  inTransaction(async () => {
    const read = await planVersion();
    await PlanState.update({ planVersion: read + 1 }, { where: { id: 1 } });
  });

const lettering = { id: 'lettering', name: 'Lettering' };
const sculpting = { id: 'sculpting', name: 'Sculpting' };

describe('inTransaction', () => {
  it('commits 200 writers that read before they write, none lost', async () => {
    await Promise.all(Array.from({ length: 200 }, addOne));
    expect(await planVersion()).toBe(200);
  });

  it('loses none of the writes of two processes either', async () => {
    const module = path.join(import.meta.dirname, '../testing/add-one-many-times.process.ts');
    const beside = runBeside(module, [test.dataDir, '40']);
    for (let round = 0; round < 40; round += 1) await addOne();
    expect(await beside).toEqual({ code: 0, output: '' });
    expect(await planVersion()).toBe(80);
  });

  it('answers what the work answers', async () => {
    expect(await inTransaction(async () => 'done')).toBe('done');
  });

  it('sees its own writes, which others do not see before the commit', async () => {
    let seenOutside: number | undefined;
    await inTransaction(async () => {
      await Skill.create(lettering);
      expect(await Skill.count()).toBe(1);
      seenOutside = await Skill.count({ transaction: null });
    });
    expect(seenOutside).toBe(0);
    expect(await Skill.count()).toBe(1);
  });

  it('writes nothing when the work fails, and passes the error on', async () => {
    const fail = inTransaction(async () => {
      await Skill.create(lettering);
      throw new Error('the oven is cold');
    });
    await expect(fail).rejects.toThrow('the oven is cold');
    expect(await Skill.count()).toBe(0);
  });

  it('goes on with the next writer after one that failed', async () => {
    const failed = inTransaction(async () => {
      throw new Error('first');
    });
    const next = inTransaction(() => Skill.create(lettering));
    await expect(failed).rejects.toThrow('first');
    await next;
    expect(await Skill.count()).toBe(1);
  });

  it('joins the transaction around it', async () => {
    const fail = inTransaction(async () => {
      await inTransaction(() => Skill.create(lettering));
      expect(await Skill.count()).toBe(1);
      throw new Error('later');
    });
    await expect(fail).rejects.toThrow('later');
    expect(await Skill.count()).toBe(0);
  });

  it('writes nothing when a nested piece failed, even if its error was caught', async () => {
    const careless = inTransaction(async () => {
      await Skill.create(lettering);
      await inTransaction(async () => {
        await Skill.create(sculpting);
        throw new Error('half done');
      }).catch(() => undefined);
    });
    await expect(careless).rejects.toThrow('half done');
    expect(await Skill.count()).toBe(0);
  });

  it('lets nobody else open a transaction', async () => {
    vi.spyOn(console, 'warn').mockReturnValue(undefined);
    const own = Skill.findOrCreate({ where: { id: 'lettering' }, defaults: lettering });
    await expect(own).rejects.toThrow(StrayWriteError);
    expect(await Skill.count()).toBe(0);
    const open = (): void => transactionNamespace.run(() => undefined);
    expect(open).toThrow('Only inTransaction');
    await expect(inTransaction(async () => open())).rejects.toThrow('Only inTransaction');
  });
});

describe('a write outside a transaction', () => {
  it('is refused when a model makes it', async () => {
    await expect(Skill.create(lettering)).rejects.toThrow(StrayWriteError);
    await expect(Skill.update({ name: 'x' }, { where: {} })).rejects.toThrow(StrayWriteError);
    await expect(Skill.destroy({ where: {} })).rejects.toThrow(StrayWriteError);
    await expect(Skill.bulkCreate([lettering])).rejects.toThrow(StrayWriteError);
  });

  it('is refused by SQLite itself when written by hand', async () => {
    const { sequelize } = test.database;
    await expect(sequelize.query('DELETE FROM skills')).rejects.toThrow('readonly');
  });

  it('is refused when it outlives the transaction it began in', async () => {
    let late: Promise<unknown> = Promise.resolve();
    let committed: () => void = () => undefined;
    const afterwards = new Promise<void>((resolve) => {
      committed = resolve;
    });
    await inTransaction(async () => {
      await Skill.create(lettering);
      late = afterwards.then(() => Skill.create(sculpting));
      late.catch(() => undefined);
    });
    committed();
    await expect(late).rejects.toThrow(StrayWriteError);
    expect(await Skill.count()).toBe(1);
  });
});

describe('afterCommit', () => {
  it('runs once everything is committed, outside the transaction', async () => {
    const seen: (boolean | string)[] = [];
    await inTransaction(async () => {
      await inTransaction(async () => afterCommit(() => seen.push(isInTransaction())));
      seen.push('still inside');
    });
    expect(seen).toEqual(['still inside', false]);
  });

  it('does not run after a rollback', async () => {
    let ran = false;
    const fail = inTransaction(async () => {
      afterCommit(() => {
        ran = true;
      });
      throw new Error('no');
    });
    await expect(fail).rejects.toThrow('no');
    expect(ran).toBe(false);
  });

  it('fails nobody when it fails itself', async () => {
    const write = inTransaction(async () => {
      afterCommit(() => {
        throw new Error('nobody listens');
      });
      return 'written';
    });
    expect(await write).toBe('written');
  });

  it('needs a transaction', () => {
    expect(() => afterCommit(() => undefined)).toThrow('needs a transaction');
  });
});
