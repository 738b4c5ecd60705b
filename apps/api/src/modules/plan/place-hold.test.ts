import { literal } from 'sequelize';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { submittedOrder } from '#shared/contracts/orders.ts';
import type { SubmitOrder } from '#shared/contracts/orders.ts';
import { checkPlan } from '#shared/dates/check-plan.ts';
import { addDays, weekdayOf } from '#shared/dates/local-time.ts';
import { Assignment } from '#api/db/models/assignment.ts';
import { BatchShare } from '#api/db/models/batch-share.ts';
import { Hold } from '#api/db/models/hold.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { PlanState } from '#api/db/models/plan-state.ts';
import { Task } from '#api/db/models/task.ts';
import { noteSettingsChange, readPlanVersions } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { designOf, loadRevision } from '#api/modules/orders/order-design.queries.ts';
import { newId } from '#api/platform/ids.ts';
import { leaveOneHandover } from '#api/testing/one-handover.ts';
import { orderForm, roundTier } from '#api/testing/order-form.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { Answer } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { expireHolds } from './expire-holds.command.ts';
import { finishWork, keepPlace, lengthenGuestHold, releasePlace } from './keep-place.command.ts';
import { currentBook } from './kept-book.ts';
import { activeHoldsOf, fitOf, hasPlace } from './plan.queries.ts';
import { replanOrder } from './replan-order.command.ts';

let app: TestApp;
/** A new day with pickups for each test; the studio's closures are left out. */
let date = '2027-05-17';

beforeAll(async () => {
  app = await startTestApp({
    clock: new TestClock('2027-05-03T12:00:00Z'),
    seeded: seededStudio,
    // So that every customer can come from a network of their own.
    env: () => ({ TRUST_PROXY: '127.0.0.1' }),
  });
});
afterAll(() => app.close());
beforeEach(() => {
  date = nextDay(date);
});

function nextDay(from: string): string {
  const next = addDays(from, 1);
  const noPickups =
    [1, 7].includes(weekdayOf(next)) || (next >= '2027-06-28' && next <= '2027-07-05');
  return noPickups ? nextDay(next) : next;
}

const form = (day: string, changes: Parameters<typeof orderForm>[1] = {}) =>
  orderForm(day, { you: { email: `${newId()}@example.com` }, ...changes });

let networks = 0;

/** Sends a form from a network and an address that have sent nothing before. */
function sendForm(sent: SubmitOrder): Promise<Answer> {
  networks += 1;
  const from = `10.1.${Math.floor(networks / 250)}.${(networks % 250) + 1}`;
  const headers = { [idempotencyHeader]: newId(), 'X-Forwarded-For': from };
  return app.visitor().post('/api/orders', sent, { headers });
}

async function send(sent: SubmitOrder): Promise<Order> {
  const answer = await sendForm(sent);
  expect([answer.status, answer.text]).toEqual([201, answer.text]);
  const { code } = submittedOrder.parse(answer.body);
  return Order.findOne({ where: { code }, rejectOnEmpty: true });
}

async function wishFor(order: Order, day: string, windowStart = 600) {
  const revision = await loadRevision(order.currentRevisionId ?? '');
  return {
    orderId: order.id,
    revisionId: revision.id,
    itemId: null,
    design: designOf(revision),
    pickup: { date: day, windowStart },
  };
}

describe('placing an order', () => {
  it('stores a plan that, read back with all that stand, passes the checker', async () => {
    const cake = {
      tiers: [roundTier(10), roundTier(8, { fillingId: 'lemon-curd' }), roundTier(6)],
    };
    const look = {
      words: [{ tier: 0, text: 'Ana and Bo' }],
      decorations: [
        {
          decorationId: 'sugar-flower',
          tier: 1,
          quantity: 9,
          colour: null,
          source: 'studio' as const,
        },
        {
          decorationId: 'fresh-flowers',
          tier: null,
          quantity: 1,
          colour: null,
          source: 'florist' as const,
        },
      ],
    };
    const order = await send(form(date, { cake, look }));
    await send(
      form(date, {
        cake: {
          coating: { covering: 'buttercream', style: 'german', finish: 'piped', colour: null },
        },
      }),
    );
    const { open } = await currentBook(date);
    const standing = open.standing.orders;
    expect(standing).toHaveLength(2);
    expect(checkPlan(open.supply, standing)).toEqual([]);
    const mine = standing.find((it) => it.orderId === order.id);
    // Two sponges' worth of one batter, three fillings and crumb coats, three final coats.
    const kinds = mine?.demand.work.map((it) => it.kind) ?? [];
    expect(kinds.filter((it) => it === 'fill-and-crumb-coat')).toHaveLength(3);
    expect(kinds.filter((it) => it === 'final-coat')).toHaveLength(3);
    expect(kinds).toEqual(
      expect.arrayContaining(['bake', 'buttercream', 'filling', 'stack', 'decorate', 'box']),
    );
    expect(mine?.demand.links.some((it) => it.keeps !== null)).toBe(true);
    expect(mine?.demand.boxes).toHaveLength(3);
    expect(await BatchShare.count({ where: { orderId: order.id } })).toBeGreaterThanOrEqual(4);
    expect(await Assignment.count({ where: { pinned: true } })).toBe(0);
  });

  it('counts every write to the plan', async () => {
    const before = await readPlanVersions();
    const order = await send(form(date));
    const after = await readPlanVersions();
    expect(after.planVersion).toBe(before.planVersion + 1);
    const [task] = await Task.findAll({ where: { orderId: order.id }, include: ['assignment'] });
    expect(task?.assignment?.planVersion).toBe(after.planVersion);
  });

  it('gives the last place to one of two who send at once, and tells the other', async () => {
    const days = Array.from({ length: 20 }).reduce<string[]>((found) => {
      found.push(nextDay(found.at(-1) ?? '2027-07-12'));
      return found;
    }, []);
    await inTransaction(async () => {
      for (const day of days) await leaveOneHandover(day);
      await noteSettingsChange();
    });
    const pairs = await Promise.all(
      days.map((day) => Promise.all([sendForm(form(day)), sendForm(form(day))])),
    );
    for (const [n, pair] of pairs.entries()) {
      const day = days[n] ?? '';
      const [won, lost] = pair.toSorted((a, b) => a.status - b.status);
      expect([won?.status, lost?.status]).toEqual([201, 409]);
      expect(submittedOrder.parse(won?.body).hold).not.toBeNull();
      const refusal = problem.parse(lost?.body);
      expect(refusal.code).toBe('date-gone');
      const nearest = refusal.facts?.['nearest'];
      expect(nearest).toEqual(expect.arrayContaining([expect.stringMatching(/^2027-/)]));
      expect(nearest).not.toContain(day);
      expect(await Order.count({ where: { pickupDate: day } })).toBe(1);
    }
    const { open } = await currentBook(days.at(-1) ?? date);
    expect(checkPlan(open.supply, open.standing.orders)).toEqual([]);
  });

  it('plans again when the book moves under it, and after five times keeps the order without a place', async () => {
    let moves = 2;
    const move = async () => {
      if (moves === 0) return;
      moves -= 1;
      // As another process would: the version is another one by the time ours is compared.
      await PlanState.update(
        { planVersion: literal('plan_version + 1') },
        { where: { id: 1 }, hooks: false },
      );
    };
    PlanState.addHook('beforeBulkUpdate', 'another writer', move);
    try {
      const twice = submittedOrder.parse((await sendForm(form(date))).body);
      expect(twice.hold).not.toBeNull();
      expect(moves).toBe(0);
      moves = 5;
      const answer = await sendForm(form(date));
      expect(answer.status).toBe(201);
      const { code, hold } = submittedOrder.parse(answer.body);
      expect(hold).toBeNull();
      const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
      expect(order).toMatchObject({ status: 'asked', dateAnswer: 'ask-us', pickupDate: date });
      expect(await hasPlace(order.id)).toBe(false);
    } finally {
      PlanState.removeHook('beforeBulkUpdate', 'another writer');
    }
  });
});

describe('a hold', () => {
  it('runs out after half an hour: the place goes, the order stays, both sides will be told', async () => {
    await inTransaction(async () => {
      await leaveOneHandover(date);
      await noteSettingsChange();
    });
    const order = await send(form(date));
    app.clock.advance({ minutes: 29 });
    await expireHolds(app.clock.now());
    expect(await hasPlace(order.id)).toBe(true);
    expect((await sendForm(form(date))).status).toBe(409);
    app.clock.advance({ minutes: 1 });
    expect((await activeHoldsOf([order.id])).size).toBe(0);
    expect(await expireHolds(app.clock.now())).toBeGreaterThanOrEqual(1);
    expect(await expireHolds(app.clock.now())).toBe(0);
    expect(await hasPlace(order.id)).toBe(false);
    expect(await BatchShare.count({ where: { orderId: order.id } })).toBe(0);
    expect((await order.reload()).status).toBe('asked');
    const hold = await Hold.findOne({ where: { orderId: order.id }, rejectOnEmpty: true });
    expect(hold.releasedReason).toBe('ran-out');
    const events = await OrderEvent.findAll({ where: { orderId: order.id, kind: 'hold-ran-out' } });
    expect(events).toHaveLength(1);
    expect(await OutboxRow.count({ where: { orderId: order.id, kind: 'hold-ran-out' } })).toBe(1);
    expect((await sendForm(form(date))).status).toBe(201);
  });

  it('lasts the answer time once the link is opened, but not after it ran out', async () => {
    const order = await send(form(date));
    expect(await inTransaction(() => lengthenGuestHold(order.id))).toBe(true);
    const [, held] = [...(await activeHoldsOf([order.id]))][0] ?? [];
    expect(held).toEqual({
      needsLink: false,
      expiresAt: new Date(app.clock.now().getTime() + 48 * 3_600_000),
    });
    const late = await send(form(date));
    app.clock.advance({ minutes: 31 });
    expect(await inTransaction(() => lengthenGuestHold(late.id))).toBe(false);
  });

  it('no longer runs out once the order is confirmed', async () => {
    const order = await send(form(date));
    await inTransaction(() => keepPlace(order.id));
    app.clock.advance({ hours: 50 });
    await expireHolds(app.clock.now());
    expect(await hasPlace(order.id)).toBe(true);
  });

  it('goes with its place when the order ends', async () => {
    const order = await send(form(date));
    await inTransaction(() => releasePlace(order.id));
    expect(await hasPlace(order.id)).toBe(false);
    expect(await Hold.count({ where: { orderId: order.id, releasedAt: null } })).toBe(0);
  });
});

describe('planning an order anew', () => {
  it('moves its work to another pickup in one transaction, or not at all', async () => {
    const order = await send(form(date));
    const other = nextDay(date);
    const before = await Task.findAll({ where: { orderId: order.id } });
    const wish = { ...(await wishFor(order, other, 930)), mustFit: true };
    await expect(replanOrder(wish, () => Promise.reject(new Error('no')))).rejects.toThrow('no');
    expect(await Task.count({ where: { id: before.map((it) => it.id) } })).toBe(before.length);
    const { outcome } = await replanOrder(wish, () => Promise.resolve(null));
    expect(outcome.window).toEqual({
      date: other,
      startMinute: 930,
      minutes: 30,
      startAt: new Date(`${other}T19:30:00Z`),
    });
    expect(await Task.count({ where: { id: before.map((it) => it.id) } })).toBe(0);
    expect(await Task.count({ where: { orderId: order.id } })).toBe(before.length);
    expect((await activeHoldsOf([order.id])).size).toBe(1);
    date = other;
  });

  it('needs no notice, but a pickup window that is there', async () => {
    const order = await send(form(date));
    const sunday = { ...(await wishFor(order, '2027-08-15')), mustFit: true };
    await expect(replanOrder(sunday, () => Promise.resolve(null))).rejects.toMatchObject({
      code: 'date-gone',
    });
    expect(await hasPlace(order.id)).toBe(true);
  });

  it('leaves work that has begun where it is, and moves only the pickup it still suits', async () => {
    const order = await send(form(date));
    await inTransaction(() => finishWork(order.id, null));
    const before = await Task.findAll({ where: { orderId: order.id }, order: ['id'] });
    expect(new Set(before.map((it) => it.state))).toEqual(new Set(['finished']));
    const wish = { ...(await wishFor(order, date, 930)), mustFit: true };
    const { outcome } = await replanOrder(wish, () => Promise.resolve(null));
    expect(outcome).toMatchObject({ answer: 'open', window: { date, startMinute: 930 } });
    const after = await Task.findAll({ where: { orderId: order.id }, order: ['id'] });
    expect(after.map((it) => it.id)).toEqual(before.map((it) => it.id));
    const sunday = { ...(await wishFor(order, '2027-08-15')), mustFit: true };
    await expect(replanOrder(sunday, () => Promise.resolve(null))).rejects.toMatchObject({
      code: 'date-gone',
    });
  });

  it('says in a sentence whether it fits', async () => {
    const order = await send(form(date));
    const { design, pickup } = await wishFor(order, date);
    const place = await fitOf({ orderId: order.id, design, pickup });
    expect(place.fits).toBe(true);
    expect(place.sentence).toMatch(/^Has its place: \d h( \d\d)? on \w+day( and \w+day)?\.$/);
    const would = await fitOf({ orderId: newId(), design, pickup });
    expect(would.sentence).toMatch(/^Fits: \d h( \d\d)? on \w+day( and \w+day)?\.$/);
    const sunday = await fitOf({
      orderId: newId(),
      design,
      pickup: { ...pickup, date: '2027-08-15' },
    });
    expect(sunday).toEqual({ fits: false, sentence: 'No pickups on Sunday 15 August.' });
  });
});
