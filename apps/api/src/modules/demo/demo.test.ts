import { rm } from 'node:fs/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { groupBy } from '#shared/group-by.ts';
import { openDatabase } from '#api/db/database.ts';
import type { Database } from '#api/db/database.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { Photo } from '#api/db/models/photo.ts';
import { loadCalendar } from '#api/modules/calendar/calendar.queries.ts';
import { readEnv } from '#api/platform/env.ts';
import { createLogger } from '#api/platform/logger.ts';
import { newDataDir } from '#api/testing/template-file.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { fillDemo } from './fill-demo.command.ts';

const logger = createLogger('error');
let dataDir: string;
let database: Database;
const now = new Date('2027-05-12T15:00:00Z');

beforeAll(async () => {
  dataDir = await newDataDir();
  const env = readEnv({ TIERWELL_DATA: dataDir }, 'demo');
  await fillDemo({ env, logger }, now);
  // Starting it again keeps the data.
  await fillDemo({ env, logger }, now);
  database = await openDatabase(dataDir, { clock: new TestClock(now), logger });
}, 60_000);
afterAll(async () => {
  await database.close();
  await rm(dataDir, { recursive: true });
});

describe('the demo’s studio', () => {
  it('has orders in every state a visitor should see, each made once', async () => {
    const orders = await Order.findAll({ order: [['number', 'ASC']] });
    const states = groupBy(orders, ({ status }) => status);
    expect([...states.keys()].toSorted()).toEqual([
      'asked',
      'collected',
      'confirmed',
      'declined',
      'making',
      'ready',
      'withdrawn',
    ]);
    expect(states.get('collected')?.length).toBeGreaterThanOrEqual(5);
    const promised = ['confirmed', 'making', 'ready'] as const;
    expect(promised.flatMap((it) => states.get(it) ?? []).length).toBeGreaterThanOrEqual(16);
    expect(orders[0]?.number).toBe(2401);
    expect(await Photo.count({ where: { orderId: null } })).toBe(0);
  });

  it('has four requests waiting: one in the way of an allergy, one without a promise, two simple', async () => {
    const { waiting } = await loadCalendar('2027-05-10', '2027-06-06');
    expect(waiting).toHaveLength(4);
    expect(
      waiting.some(({ advice }) => advice?.code === 'allergen' && advice.level === 'stop'),
    ).toBe(true);
    expect(waiting.filter(({ order }) => order.dateAnswer === 'ask-us')).toHaveLength(1);
    // Confirmed in one press: a place is kept and there is nothing to settle.
    expect(waiting.filter(({ advice, fits }) => advice === null && fits.fits)).toHaveLength(2);
  });

  it('is busy: on most working days of a fortnight the bench is more than a third full', async () => {
    const { days, lanes } = await loadCalendar('2027-05-10', '2027-05-22');
    const working = days.filter(({ benchMinutes }) => benchMinutes > 0);
    const busy = working.filter((it) => it.plannedMinutes > it.benchMinutes / 3);
    expect(busy.length).toBeGreaterThan(working.length * 0.75);
    expect(working.every((it) => it.plannedMinutes <= it.benchMinutes)).toBe(true);
    expect(lanes.length).toBeGreaterThanOrEqual(15);
  });

  it('sends none of the e-mails of its past', async () => {
    expect(await OutboxRow.count({ where: { state: 'queued' } })).toBe(0);
    expect(await OutboxRow.count({ where: { state: 'done' } })).toBeGreaterThan(10);
  });
});
