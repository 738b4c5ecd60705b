import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { makeOrder } from '#api/testing/factories.ts';
import { isWorkerAlive, noteBeat } from './beat.ts';
import { createDispatcher } from './dispatcher.ts';
import type { Dispatcher } from './dispatcher.ts';
import { enqueue } from './enqueue.ts';
import type { EventHandlers, EventKind } from './events.ts';
import { LeaseQueue } from './lease.ts';
import { maxAttempts } from './retry-plan.ts';

let test: TestDatabase;
let first: string;
let second: string;
beforeAll(async () => {
  test = await openTestDatabase();
  ({ id: first } = await makeOrder());
  ({ id: second } = await makeOrder());
});
afterAll(() => test.close());
beforeEach(() => inTransaction(() => OutboxRow.destroy({ where: {} })));

/** Handlers that only write down what they were asked, and fail where they are told to. */
function recorder(fails: (entry: string) => boolean = () => false): {
  handlers: Partial<EventHandlers>;
  log: string[];
} {
  const log: string[] = [];
  const note = (kind: EventKind) => async (payload: object) => {
    const entry = `${kind} ${Object.values(payload).join(' ')}`;
    log.push(entry);
    if (fails(entry)) throw new Error('the server at ada@example.com is away');
  };
  return {
    log,
    handlers: {
      'order-asked': note('order-asked'),
      'order-confirmed': note('order-confirmed'),
      'order-ready': note('order-ready'),
      'sign-in-link-asked': note('sign-in-link-asked'),
    },
  };
}

/** Chance in the middle: pauses are exactly what the plan says. */
const even = (): number => 0.5;

function dispatcherOf(handlers: Partial<EventHandlers>, worker = 'one'): Dispatcher {
  const { clock, logger } = test;
  return createDispatcher({ handlers, clock, logger, worker, random: even });
}

const put = (
  kind: 'order-asked' | 'order-confirmed' | 'order-ready',
  orderId: string,
  notBefore?: Date,
): Promise<boolean> =>
  inTransaction(() =>
    enqueue(kind, { orderId }, { uniqueKey: `${kind} ${orderId}`, orderId, notBefore }),
  );

const theRow = (): Promise<OutboxRow> => OutboxRow.findOne({ rejectOnEmpty: true });

describe('enqueue', () => {
  it('belongs in a transaction', async () => {
    const stray = enqueue('order-asked', { orderId: first }, { uniqueKey: 'stray' });
    await expect(stray).rejects.toThrow('transaction of its cause');
  });

  it('adds nothing under a key that is there', async () => {
    expect(await put('order-asked', first)).toBe(true);
    expect(await put('order-asked', first)).toBe(false);
    expect(await OutboxRow.count()).toBe(1);
  });

  it('leaves nothing behind when its cause is rolled back', async () => {
    const fail = inTransaction(async () => {
      await enqueue('order-asked', { orderId: first }, { uniqueKey: 'undone' });
      throw new Error('undone');
    });
    await expect(fail).rejects.toThrow('undone');
    expect(await OutboxRow.count()).toBe(0);
  });
});

describe('the dispatcher', () => {
  it('carries out what is due once, in the order it was written', async () => {
    const { handlers, log } = recorder();
    await put('order-asked', first);
    await put('order-confirmed', first);
    expect(await dispatcherOf(handlers).runOnce()).toBe(2);
    expect(await dispatcherOf(handlers).runOnce()).toBe(0);
    expect(log).toEqual([`order-asked ${first}`, `order-confirmed ${first}`]);
    const row = await theRow();
    expect(row.state).toBe('done');
    expect(row.doneAt).toEqual(test.clock.now());
  });

  it('waits until a row is due', async () => {
    const { handlers, log } = recorder();
    const inAnHour = new Date(test.clock.now().getTime() + 3_600_000);
    await put('order-asked', first, inAnHour);
    expect(await dispatcherOf(handlers).runOnce()).toBe(0);
    test.clock.advance({ hours: 1 });
    expect(await dispatcherOf(handlers).runOnce()).toBe(1);
    expect(log).toHaveLength(1);
  });

  it('does not hold an order up for a row that is set for later', async () => {
    const { handlers, log } = recorder();
    await put('order-ready', first, new Date(test.clock.now().getTime() + 86_400_000));
    await put('order-asked', first);
    await dispatcherOf(handlers).runOnce();
    expect(log).toEqual([`order-asked ${first}`]);
  });

  it('holds back the later rows of an order while one fails, and no other order', async () => {
    let away = true;
    const { handlers, log } = recorder((entry) => away && entry === `order-asked ${first}`);
    await put('order-asked', first);
    await put('order-confirmed', first);
    await put('order-asked', second);
    await dispatcherOf(handlers).runOnce();
    expect(log).toEqual([`order-asked ${first}`, `order-asked ${second}`]);
    away = false;
    test.clock.advance({ seconds: 10 });
    await dispatcherOf(handlers).runOnce();
    expect(log.slice(2)).toEqual([`order-asked ${first}`, `order-confirmed ${first}`]);
  });

  it('tries again after growing pauses', async () => {
    const { handlers, log } = recorder(() => true);
    await put('order-asked', first);
    const dispatcher = dispatcherOf(handlers);
    await dispatcher.runOnce();
    test.clock.advance({ seconds: 9 });
    expect(await dispatcher.runOnce()).toBe(0);
    test.clock.advance({ seconds: 1 });
    expect(await dispatcher.runOnce()).toBe(1);
    test.clock.advance({ seconds: 29 });
    expect(await dispatcher.runOnce()).toBe(0);
    test.clock.advance({ seconds: 1 });
    expect(await dispatcher.runOnce()).toBe(1);
    expect(log).toHaveLength(3);
    expect((await theRow()).lastError).toBe('the server at [address] is away');
  });

  it('gives up in plain sight after about two days, and goes on with the order', async () => {
    const { handlers, log } = recorder((entry) => entry.startsWith('order-asked'));
    await put('order-asked', first);
    await put('order-confirmed', first);
    const began = test.clock.now().getTime();
    const dispatcher = dispatcherOf(handlers);
    for (let tries = 0; tries < maxAttempts; tries += 1) {
      expect(await dispatcher.runOnce()).toBe(tries === maxAttempts - 1 ? 2 : 1);
      const { state, nextAt } = await theRow();
      if (state === 'queued') test.clock.set(nextAt);
    }
    const row = await theRow();
    expect(row).toMatchObject({ state: 'given-up', attempts: maxAttempts, doneAt: null });
    expect(log.at(-1)).toBe(`order-confirmed ${first}`);
    const hours = (test.clock.now().getTime() - began) / 3_600_000;
    expect(hours).toBeGreaterThan(40);
    expect(hours).toBeLessThan(56);
  });

  it('repeats a row whose worker was killed in the middle of it', async () => {
    await put('order-asked', first);
    const dead = new LeaseQueue({ table: 'outbox', clock: test.clock, worker: 'dead' });
    expect(await dead.take()).toMatchObject({ attempt: 1 });

    const { handlers, log } = recorder();
    expect(await dispatcherOf(handlers).runOnce()).toBe(0);
    test.clock.advance({ minutes: 3 });
    expect(await dispatcherOf(handlers).runOnce()).toBe(1);
    expect(log).toEqual([`order-asked ${first}`]);
    expect(await theRow()).toMatchObject({ state: 'done', attempts: 2 });
  });

  it('gives up on a row that kills every worker', async () => {
    await put('order-asked', first);
    const dying = new LeaseQueue({ table: 'outbox', clock: test.clock, worker: 'dying' });
    for (let death = 0; death < maxAttempts; death += 1) {
      expect(await dying.take()).not.toBeNull();
      test.clock.advance({ minutes: 3 });
    }
    const { handlers, log } = recorder();
    await dispatcherOf(handlers).runOnce();
    expect(log).toEqual([]);
    expect((await theRow()).state).toBe('given-up');
  });

  it('gives one row to one worker', async () => {
    const { handlers, log } = recorder();
    for (let order = 0; order < 20; order += 1) {
      await inTransaction(() =>
        enqueue('sign-in-link-asked', { tokenId: `t${order}` }, { uniqueKey: `link ${order}` }),
      );
    }
    const workers = ['one', 'two', 'three'].map((name) => dispatcherOf(handlers, name).runOnce());
    const tried = await Promise.all(workers);
    expect(tried.reduce((sum, each) => sum + each)).toBe(20);
    expect(new Set(log).size).toBe(20);
  });

  it('keeps the note of whoever took a row over, not of a worker that came back late', async () => {
    await put('order-asked', first);
    const slow = new LeaseQueue({ table: 'outbox', clock: test.clock, worker: 'slow' });
    const lease = await slow.take();
    test.clock.advance({ minutes: 3 });
    const quick = new LeaseQueue({ table: 'outbox', clock: test.clock, worker: 'quick' });
    expect(await quick.take()).not.toBeNull();
    expect(lease && (await slow.finish(lease))).toBe(false);
    expect(lease && (await slow.postpone(lease, 'late'))).toBe('lost');
    expect(await theRow()).toMatchObject({ state: 'leased', leasedBy: 'quick' });
  });

  it('fails a row that no handler knows', async () => {
    await inTransaction(() =>
      OutboxRow.create({
        kind: 'from-the-future',
        payload: {},
        uniqueKey: 'future',
        nextAt: test.clock.now(),
      }),
    );
    await dispatcherOf(recorder().handlers).runOnce();
    expect((await theRow()).lastError).toBe('Nothing here handles from-the-future.');
  });

  it('wakes as soon as a row is committed, and stops after the row under way', async () => {
    const { handlers, log } = recorder();
    let began: () => void = () => undefined;
    const handling = new Promise<void>((resolve) => {
      began = resolve;
    });
    let release: () => void = () => undefined;
    const released = new Promise<void>((resolve) => {
      release = resolve;
    });
    const dispatcher = dispatcherOf({
      ...handlers,
      'order-asked': async () => {
        began();
        await released;
        log.push('finished');
      },
    });
    dispatcher.start();
    await put('order-asked', first);
    await handling;
    await put('order-asked', second);
    const stopped = dispatcher.stop();
    release();
    await stopped;
    expect(log).toEqual(['finished']);
    expect(await OutboxRow.count({ where: { state: 'done' } })).toBe(1);
  });
});

describe('a worker', () => {
  it('counts as alive for a while after it was seen', async () => {
    expect(await isWorkerAlive(test.clock)).toBe(false);
    await noteBeat('web', test.clock);
    await noteBeat('web', test.clock);
    expect(await isWorkerAlive(test.clock)).toBe(true);
    test.clock.advance({ minutes: 1 });
    expect(await isWorkerAlive(test.clock)).toBe(false);
  });
});
