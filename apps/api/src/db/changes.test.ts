import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeOrder, makeUser } from '#api/testing/factories.ts';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { changeOne } from './change-one.ts';
import { isUniqueViolation } from './errors.ts';
import { Hold } from './models/hold.ts';
import { Order } from './models/order.ts';
import {
  noteCatalogueChange,
  noteSettingsChange,
  readPlanVersions,
  takeNextPlanVersion,
} from './plan-versions.ts';
import { inTransaction } from './transaction.ts';

let test: TestDatabase;
beforeAll(async () => {
  test = await openTestDatabase();
});
afterAll(() => test.close());

const failure = (work: () => Promise<unknown>): Promise<unknown> =>
  inTransaction(work).then(
    () => null,
    (error: unknown) => error,
  );

describe('changeOne', () => {
  it('lets one of two through that saw the same row', async () => {
    const { id, rowVersion } = await makeOrder();
    const confirm = (): Promise<boolean> =>
      inTransaction(() =>
        changeOne(Order, { status: 'confirmed', rowVersion: rowVersion + 1 }, { id, rowVersion }),
      );
    expect(await Promise.all([confirm(), confirm()])).toEqual([true, false]);
    expect(await Order.findByPk(id)).toMatchObject({ status: 'confirmed', rowVersion: 2 });
  });

  it('undoes a change that would have met several rows', async () => {
    await makeOrder({ order: { endedReason: 'same' } });
    await makeOrder({ order: { endedReason: 'same' } });
    const change = inTransaction(() =>
      changeOne(Order, { endedReason: 'other' }, { endedReason: 'same' }),
    );
    await expect(change).rejects.toThrow('changed 2');
    expect(await Order.count({ where: { endedReason: 'same' } })).toBe(2);
  });
});

describe('isUniqueViolation', () => {
  it('tells a row that is there from a value that may not be', async () => {
    await makeUser({ email: 'ada@example.com' });
    const twice = await failure(() => makeUser({ email: 'ada@example.com' }));
    const wrong = await failure(() => makeUser({ email: 'Upper@example.com' }));
    expect(isUniqueViolation(twice)).toBe(true);
    expect(wrong).toBeInstanceOf(Error);
    expect(isUniqueViolation(wrong)).toBe(false);
    expect(isUniqueViolation(new Error('UNIQUE constraint failed'))).toBe(false);
  });

  it('knows an order that holds a place already', async () => {
    const { id: orderId } = await makeOrder();
    const hold = (): Promise<Hold> =>
      Hold.create({ orderId, kind: 'answer', expiresAt: test.clock.now() });
    const first = await inTransaction(hold);
    expect(isUniqueViolation(await failure(hold))).toBe(true);
    await inTransaction(() =>
      first.update({ releasedAt: test.clock.now(), releasedReason: 'ran-out' }),
    );
    await inTransaction(hold);
    expect(await Hold.count({ where: { orderId } })).toBe(2);
  });
});

describe('the plan version', () => {
  it('is taken by one of two plans made at the same one', async () => {
    const { planVersion } = await readPlanVersions();
    const take = (): Promise<boolean> => inTransaction(() => takeNextPlanVersion(planVersion));
    expect(await Promise.all([take(), take()])).toEqual([true, false]);
    expect((await readPlanVersions()).planVersion).toBe(planVersion + 1);
  });

  it('moves with the settings, and the catalogue has its own', async () => {
    const before = await readPlanVersions();
    await inTransaction(noteSettingsChange);
    await inTransaction(noteCatalogueChange);
    expect(await readPlanVersions()).toEqual({
      planVersion: before.planVersion + 1,
      settingsVersion: before.settingsVersion + 1,
      catalogueVersion: before.catalogueVersion + 1,
    });
  });
});
