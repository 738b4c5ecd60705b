import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { accountExport } from '#shared/contracts/accounts.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { Message } from '#api/db/models/message.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { Order } from '#api/db/models/order.ts';
import { Quote } from '#api/db/models/quote.ts';
import { StopTalk } from '#api/db/models/stop-talk.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { makeOrder } from '#api/testing/factories.ts';
import { addUser, lastLinkKey, signInCustomer } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio });
});
afterAll(() => app.close());

describe('an order sent as a guest', () => {
  it('joins the account once its address is proven, and nobody else’s', async () => {
    const order = await makeOrder({ contact: { email: 'rosa@example.com' } });
    const stranger = await signInCustomer(app, 'tomas@example.com');
    expect((await stranger.get('/api/account')).body).toMatchObject({ orders: [] });
    const rosa = await signInCustomer(app, 'rosa@example.com');
    expect((await rosa.get('/api/account')).body).toMatchObject({
      email: 'rosa@example.com',
      orders: [{ code: order.code, number: order.number, status: 'asked' }],
    });
  });

  it('does not leave an account it has joined', async () => {
    const owner = await signInCustomer(app, 'first@example.com');
    const first = await User.findOne({ where: { email: 'first@example.com' } });
    await makeOrder({
      order: { customerUserId: first?.id },
      contact: { email: 'second@example.com' },
    });
    const second = await signInCustomer(app, 'second@example.com');
    expect((await second.get('/api/account')).body).toMatchObject({ orders: [] });
    expect((await owner.get('/api/account')).body).toMatchObject({ orders: [{ status: 'asked' }] });
  });
});

describe('taking one’s data out', () => {
  it('answers everything kept about oneself, as a file', async () => {
    const order = await makeOrder({
      contact: { email: 'priya@example.com', name: 'Priya Venkat' },
    });
    const where = { orderId: order.id, revisionId: order.currentRevisionId ?? '' };
    const { id: byUserId } = await addUser('baker');
    const at = app.clock.now();
    const stop = { code: 'heat', about: 'heat:cake' };
    await inTransaction(async () => {
      await Message.create({
        orderId: order.id,
        sender: 'customer',
        body: 'With a little less sugar?',
      });
      await StopTalk.create({ ...where, ...stop, text: 'Carried in at noon.', byUserId, at });
      await LiftedStop.create({
        ...where,
        ...stop,
        reason: 'It stands indoors.',
        liftedByUserId: byUserId,
        liftedAt: at,
      });
    });
    const client = await signInCustomer(app, 'priya@example.com');
    const answer = await client.get('/api/account/export');
    expect(answer.headers.get('Content-Disposition')).toContain('attachment');
    const told = z.parse(accountExport, answer.body);
    expect(told.account.email).toBe('priya@example.com');
    expect(told.orders[0]).toMatchObject({
      number: order.number,
      contacts: [{ as: 'ordered', name: 'Priya Venkat', email: 'priya@example.com' }],
      messages: [{ body: 'With a little less sugar?' }],
      notes: ['Carried in at noon.', 'It stands indoors.'],
    });
  });
});

describe('erasing', () => {
  const ask = (client: Awaited<ReturnType<typeof signInCustomer>>) =>
    client.post('/api/account/erasure', { sure: true });

  it('waits for open orders', async () => {
    const order = await makeOrder({ contact: { email: 'open@example.com' } });
    const answer = await ask(await signInCustomer(app, 'open@example.com'));
    expect(answer.body).toMatchObject({
      code: 'wrong-state',
      facts: { orders: [{ code: order.code, number: order.number }] },
    });
  });

  it('blanks who they are and what they told us, and keeps that it happened', async () => {
    const order = await makeOrder({
      order: { status: 'collected' },
      contact: { email: 'leaving@example.com', name: 'Leaving Person' },
    });
    await inTransaction(async () => {
      await Message.create({
        orderId: order.id,
        sender: 'customer',
        authorName: 'Leaving Person',
        body: 'A private word',
      });
      await OrderEvent.create({
        orderId: order.id,
        seq: 1,
        kind: 'submit-order',
        actorKind: 'guest',
        data: {},
      });
      await Quote.create({
        orderId: order.id,
        revisionId: order.currentRevisionId ?? '',
        n: 1,
        state: 'agreed',
        note: 'Strained, for Leaving’s aunt',
        totalMinor: 9000,
        currency: 'USD',
      });
      await LiftedStop.create({
        orderId: order.id,
        revisionId: order.currentRevisionId ?? '',
        code: 'allergy-text',
        about: 'allergy-text:a private word on lupin',
        reason: 'Leaving’s mother brings her own slice.',
        liftedByUserId: (await addUser('owner')).id,
        liftedAt: app.clock.now(),
      });
    });
    const client = await signInCustomer(app, 'leaving@example.com');
    const user = await User.findOne({ where: { email: 'leaving@example.com' } });
    expect((await ask(client)).status).toBe(200);
    // Nothing happens before the e-mail is answered.
    expect((await client.get('/api/account')).status).toBe(200);
    const token = await lastLinkKey(app, 'confirm-action', 'leaving@example.com');
    const confirmed = await app.visitor().post('/api/session/links/use', { token });
    expect(confirmed.body).toMatchObject({ purpose: 'confirm-action', session: { user: null } });

    expect((await client.get('/api/account')).status).toBe(401);
    await user?.reload();
    expect(user).toMatchObject({ email: null, name: '', phone: null });
    const left = JSON.stringify([
      await OrderContact.findAll({ where: { orderId: order.id } }),
      await Message.findAll({ where: { orderId: order.id } }),
      await Order.findByPk(order.id),
      await Quote.findAll({ where: { orderId: order.id } }),
      await LiftedStop.findAll({ where: { orderId: order.id } }),
    ]);
    expect(left).not.toMatch(/leaving|private word/i);
    expect(left).toContain('9000');
    expect(await OrderEvent.count({ where: { orderId: order.id } })).toBe(1);
    expect((await app.visitor().post('/api/session/links/use', { token })).status).toBe(410);
    // The address may begin anew, with nothing of before.
    const again = await signInCustomer(app, 'leaving@example.com');
    expect((await again.get('/api/account')).body).toMatchObject({ orders: [] });
  });
});
