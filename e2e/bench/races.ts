import { submittedOrder } from '#shared/contracts/orders.ts';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { Order } from '#api/db/models/order.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { releasePlace } from '#api/modules/plan/keep-place.command.ts';
import { newId } from '#api/platform/ids.ts';
import { leaveOneHandover } from '#api/testing/one-handover.ts';
import { orderForm } from '#api/testing/order-form.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { networks } from './networks.ts';
import { never, type Part } from './report.ts';

const lastPlaces = 1_000;
const doubleSends = 500;
/** The day of the last place, and a day with room. */
const fullDay = '2027-06-19';
const openDay = '2027-06-25';

const formFor = (date: string) => orderForm(date, { you: { email: `${newId()}@example.com` } });

/** Two strangers send for the one handover a day has left; how often it did not end one to one. */
async function raceForLastPlace(app: TestApp, from: () => string): Promise<number> {
  await inTransaction(async () => {
    await leaveOneHandover(fullDay);
    await noteSettingsChange();
  });
  let wrong = 0;
  for (let race = 0; race < lastPlaces; race += 1) {
    const answers = await Promise.all(
      [1, 2].map(() => sendOnce(app, from(), formFor(fullDay), newId())),
    );
    const statuses = answers.map(({ status }) => status).toSorted();
    if (statuses[0] !== 201 || statuses[1] !== 409) wrong += 1;
    await endOrdersOf(fullDay);
  }
  return wrong;
}

/** One customer's two presses arrive at once; how often they did not make one order. */
async function raceWithOneself(app: TestApp, from: () => string): Promise<number> {
  let wrong = 0;
  for (let race = 0; race < doubleSends; race += 1) {
    const [network, sent, key] = [from(), formFor(openDay), newId()];
    const answers = await Promise.all([1, 2].map(() => sendOnce(app, network, sent, key)));
    const numbers = answers.map(({ body }) => submittedOrder.safeParse(body).data?.number);
    const same = numbers[0] !== undefined && numbers[0] === numbers[1];
    if (!same || (await endOrdersOf(openDay)) !== 1) wrong += 1;
  }
  return wrong;
}

/** Gives a day's places back, so that the next race is for the same; answers how many there were. */
async function endOrdersOf(date: string): Promise<number> {
  const orders = await Order.findAll({ where: { pickupDate: date, status: 'asked' } });
  await inTransaction(async () => {
    for (const order of orders) {
      await releasePlace(order.id, 'ended');
      await order.update({ status: 'withdrawn' });
    }
  });
  return orders.length;
}

function sendOnce(app: TestApp, network: string, body: unknown, key: string): Promise<Answer> {
  const headers = { [idempotencyHeader]: key, 'X-Forwarded-For': network };
  return app.visitor().post('/api/orders', body, { headers });
}

export const races: Part = {
  name: 'races',
  about: `${lastPlaces} races for the last place, ${doubleSends} double presses`,
  async run() {
    const app = await startTestApp({
      clock: new TestClock('2027-05-03T12:00:00Z'),
      seeded: seededStudio,
      env: () => ({ TRUST_PROXY: '127.0.0.1' }),
    });
    const from = networks();
    try {
      return [
        never('the last place goes to none or two', await raceForLastPlace(app, from)),
        never('two presses make none or two orders', await raceWithOneself(app, from)),
      ];
    } finally {
      await app.close();
    }
  },
};
