import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createSmtpClient } from '#api/clients/smtp.ts';
import { MailAttempt } from '#api/db/models/mail-attempt.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Token } from '#api/db/models/token.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { maxAttempts } from '#api/outbox/retry-plan.ts';
import { readEnv } from '#api/platform/env.ts';
import { makeOrder } from '#api/testing/factories.ts';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { smtpControl } from '#fakes/smtp/control.ts';
import type { SmtpControl } from '#fakes/smtp/control.ts';
import { start } from '#fakes/smtp/start.ts';
import type { SmtpFake } from '#fakes/smtp/start.ts';
import { createMailSender } from './mail-sender.ts';
import type { MailSender } from './mail-sender.ts';
import { queueMail } from './queue-mail.command.ts';
import type { MailToQueue } from './queue-mail.command.ts';

let test: TestDatabase;
let fake: SmtpFake;
let mailbox: SmtpControl;
let order: Order;
let outboxId: number;
const env = readEnv({}, 'test');

beforeAll(async () => {
  test = await openTestDatabase();
  fake = await start({ port: 0, smtpPort: 0 });
  mailbox = smtpControl(fake.url);
  order = await makeOrder();
  const cause = { kind: 'order-asked', payload: { orderId: order.id }, uniqueKey: 'cause' };
  const row = await inTransaction(() =>
    OutboxRow.create({ ...cause, nextAt: test.clock.now(), state: 'done' }),
  );
  outboxId = row.id;
});
afterAll(async () => {
  await fake.stop();
  await test.close();
});
beforeEach(() => mailbox.clear());
afterEach(async () => {
  await mailbox.clearFailures();
  await inTransaction(async () => {
    await MailAttempt.destroy({ where: {} });
    await SentMail.destroy({ where: {} });
    await Order.update({ status: 'asked' }, { where: {} });
    await OutboxRow.destroy({ where: { kind: 'mail-given-up' } });
  });
});

function senderTo(url: string, worker = 'one'): MailSender {
  return createMailSender({
    clock: test.clock,
    logger: test.logger,
    smtp: createSmtpClient({ url, requireTls: false }),
    worker,
    random: () => 0.5,
  });
}
const sender = (): MailSender => senderTo(fake.smtpUrl);

let made = 0;
/** Keeps a mail to be sent, a message about the order unless said otherwise. */
async function keep(changes: Partial<MailToQueue> & { subject?: string } = {}): Promise<SentMail> {
  made += 1;
  const { subject = `No. ${made}`, uniqueKey = `mail ${made}`, ...rest } = changes;
  await queueMail(
    { clock: test.clock, env },
    {
      template: 'message',
      rendered: { subject, html: `<p>${subject}</p>`, text: subject },
      to: 'ada@example.com',
      replyTo: null,
      uniqueKey,
      outboxId,
      orderId: order.id,
      ...rest,
    },
  );
  return SentMail.findOne({ where: { uniqueKey }, rejectOnEmpty: true });
}

const subjects = async (): Promise<string[]> =>
  (await mailbox.messages()).map(({ subject }) => subject);

describe('a kept mail', () => {
  it('is sent once, and the attempt is noted', async () => {
    const mail = await keep();
    expect(await sender().runOnce()).toBe(1);
    expect(await sender().runOnce()).toBe(0);
    expect(await subjects()).toEqual([mail.subject]);
    await mail.reload();
    expect(mail).toMatchObject({ state: 'sent', attempts: 1, sentAt: test.clock.now() });
    expect(await MailAttempt.findAll()).toMatchObject([{ outcome: 'sent' }]);
  });

  it('is kept once under its key', async () => {
    await keep({ uniqueKey: 'the one' });
    await keep({ uniqueKey: 'the one' });
    expect(await SentMail.count()).toBe(1);
  });

  it('wakes the sender as soon as it is committed', async () => {
    const running = sender();
    running.start();
    const mail = await keep();
    await mailbox.waitForMessage({ subject: mail.subject });
    await running.stop();
    expect((await mail.reload()).state).toBe('sent');
  });

  it('answers the mails before it about the same order to the same address', async () => {
    const first = await keep();
    const elsewhere = await keep({ to: 'hello@oxbowlane.example' });
    const second = await keep();
    const third = await keep();
    expect(first).toMatchObject({ inReplyTo: null, threadReferences: '' });
    expect(elsewhere).toMatchObject({ inReplyTo: null, threadReferences: '' });
    expect(second.inReplyTo).toBe(first.messageId);
    expect(third.inReplyTo).toBe(second.messageId);
    await sender().runOnce();
    const arrived = (await mailbox.messages()).find(({ subject }) => subject === third.subject);
    expect(arrived).toMatchObject({
      messageId: third.messageId,
      inReplyTo: second.messageId,
      references: [first.messageId, second.messageId],
    });
    expect(third.messageId).toMatch(/^<[^@\s]+@oxbowlane\.example>$/);
  });

  it('names the first and the latest of a long thread', async () => {
    const mails: SentMail[] = [];
    for (let n = 0; n < 15; n += 1) mails.push(await keep());
    const named = mails.at(-1)?.threadReferences.split(' ') ?? [];
    expect(named).toHaveLength(10);
    expect(named[0]).toBe(mails[0]?.messageId);
    expect(named.at(-1)).toBe(mails.at(-2)?.messageId);
  });
});

describe('when the server will not have it', () => {
  it('tries again after growing pauses where it is put off', async () => {
    await mailbox.failNext({ kind: 'defer', code: 451 }, 2);
    const mail = await keep();
    await sender().runOnce();
    expect(await mail.reload()).toMatchObject({ state: 'queued', attempts: 1 });
    test.clock.advance({ seconds: 10 });
    await sender().runOnce();
    test.clock.advance({ seconds: 29 });
    expect(await sender().runOnce()).toBe(0);
    test.clock.advance({ seconds: 1 });
    await sender().runOnce();
    expect(await subjects()).toEqual([mail.subject]);
    expect((await MailAttempt.findAll()).map(({ outcome }) => outcome)).toEqual([
      'deferred',
      'deferred',
      'sent',
    ]);
  });

  it('gives up at once on a refusal, in plain sight and with an alert', async () => {
    await mailbox.failNext({ kind: 'refuse', code: 550 });
    const mail = await keep();
    await sender().runOnce();
    await mail.reload();
    expect(mail.state).toBe('given-up');
    expect(mail.lastError).toContain('550');
    expect(mail.lastError).not.toContain('ada@example.com');
    expect(await OutboxRow.findAll({ where: { kind: 'mail-given-up' } })).toMatchObject([
      { payload: { sentMailId: mail.id } },
    ]);
  });

  it('never alerts about an alert', async () => {
    await mailbox.failNext({ kind: 'refuse', code: 550 });
    const mail = await keep({ template: 'mail-given-up', orderId: undefined });
    await sender().runOnce();
    expect((await mail.reload()).state).toBe('given-up');
    expect(await OutboxRow.count({ where: { kind: 'mail-given-up' } })).toBe(0);
  });

  it('gives up after about two days of trying', async () => {
    const gone = await start({ port: 0, smtpPort: 0 });
    await gone.stop();
    const mail = await keep();
    const began = test.clock.now().getTime();
    for (let tries = 0; tries < maxAttempts; tries += 1) {
      await senderTo(gone.smtpUrl).runOnce();
      await mail.reload();
      if (mail.state === 'queued') test.clock.set(mail.nextAt);
    }
    expect(mail).toMatchObject({ state: 'given-up', attempts: maxAttempts });
    const hours = (test.clock.now().getTime() - began) / 3_600_000;
    expect(hours).toBeGreaterThan(40);
    expect(hours).toBeLessThan(56);
    expect(await OutboxRow.count({ where: { kind: 'mail-given-up' } })).toBe(1);
  });

  it('loses nothing while the server is away for an hour', async () => {
    const away = await start({ port: 0, smtpPort: 0 });
    const port = Number(new URL(away.smtpUrl).port);
    await away.stop();
    const mails = [await keep(), await keep(), await keep({ to: 'bo@example.com' })];
    const began = test.clock.now().getTime();
    while (test.clock.now().getTime() - began < 3_600_000) {
      await senderTo(away.smtpUrl).runOnce();
      test.clock.advance({ minutes: 5 });
    }
    const back = await start({ port: 0, smtpPort: port });
    for (let more = 0; more < 40; more += 1) {
      await senderTo(back.smtpUrl).runOnce();
      test.clock.advance({ minutes: 5 });
    }
    const arrived = (await smtpControl(back.url).messages()).map(({ subject }) => subject);
    await back.stop();
    expect(arrived.toSorted()).toEqual(mails.map(({ subject }) => subject).toSorted());
    expect(arrived.indexOf(mails[0]?.subject ?? '')).toBeLessThan(
      arrived.indexOf(mails[1]?.subject ?? ''),
    );
  });

  it('sends the same bytes again where the line was cut before the yes', async () => {
    await mailbox.failNext({ kind: 'drop-after-data' });
    const mail = await keep();
    await sender().runOnce();
    expect((await mail.reload()).state).toBe('queued');
    test.clock.advance({ minutes: 1 });
    await sender().runOnce();
    const copies = await mailbox.messages();
    expect(copies.map(({ messageId }) => messageId)).toEqual([mail.messageId, mail.messageId]);
    const [first, second] = await Promise.all(copies.map(({ id }) => mailbox.raw(id)));
    expect(second).toBe(first);
    expect((await mail.reload()).state).toBe('sent');
  });

  it('waits for a slow yes', async () => {
    await mailbox.failNext({ kind: 'slow', ms: 300 });
    const mail = await keep();
    await sender().runOnce();
    expect((await mail.reload()).state).toBe('sent');
    expect(await subjects()).toEqual([mail.subject]);
  });

  it('gives up on a mail that ends the program each time', async () => {
    const mail = await keep();
    await inTransaction(() =>
      SentMail.update({ attempts: maxAttempts }, { where: { id: mail.id } }),
    );
    await sender().runOnce();
    expect((await mail.reload()).state).toBe('given-up');
    expect(await subjects()).toEqual([]);
  });
});

describe('the order of an order', () => {
  it('is kept: a later mail waits for an earlier one to the same address, and no other does', async () => {
    await mailbox.failNext({ kind: 'defer', code: 451, recipient: 'ada@example.com' });
    const first = await keep();
    const second = await keep();
    const studio = await keep({ to: 'hello@oxbowlane.example' });
    await sender().runOnce();
    expect(await subjects()).toEqual([studio.subject]);
    test.clock.advance({ seconds: 10 });
    await sender().runOnce();
    expect(await subjects()).toEqual([studio.subject, first.subject, second.subject]);
  });

  it('goes on behind a mail that was given up', async () => {
    await mailbox.failNext({ kind: 'refuse', code: 550 });
    await keep();
    const second = await keep();
    await sender().runOnce();
    expect(await subjects()).toEqual([second.subject]);
  });
});

describe('stale mail', () => {
  const token = (values: Partial<Token>): Promise<Token> =>
    inTransaction(() =>
      Token.create({
        hash: `hash ${made}`,
        purpose: 'sign-in',
        data: {},
        expiresAt: new Date(test.clock.now().getTime() + 900_000),
        usedAt: values.usedAt ?? null,
      }),
    );
  const link = 'https://cakes.example/links/sign-in#abcdefghijklmnopqrstuv';
  const rendered = { subject: 'Sign in', html: `<a href="${link}">x</a>`, text: link };

  it('with a link that still works is sent, and its key forgotten', async () => {
    const { id } = await token({});
    const mail = await keep({
      template: 'sign-in-link',
      tokenId: id,
      orderId: undefined,
      rendered,
    });
    await sender().runOnce();
    const [arrived] = await mailbox.messages();
    expect(arrived?.text).toContain(link);
    await mail.reload();
    expect(`${mail.html}${mail.text}`).not.toContain('abcdefghijklmnopqrstuv');
  });

  it.each(['has run out', 'was used'])('with a link that %s is dropped', async (why) => {
    const { id } = await token({ usedAt: why === 'was used' ? test.clock.now() : null });
    const mail = await keep({
      template: 'sign-in-link',
      tokenId: id,
      orderId: undefined,
      rendered,
    });
    if (why === 'has run out') test.clock.advance({ minutes: 16 });
    await sender().runOnce();
    expect(await subjects()).toEqual([]);
    await mail.reload();
    expect(mail.state).toBe('dropped');
    expect(mail.html).not.toContain('abcdefghijklmnopqrstuv');
  });

  it.each([
    ['order-received', 'withdrawn', 'dropped'],
    ['order-received', 'confirmed', 'sent'],
    ['new-order', 'withdrawn', 'dropped'],
    ['confirmed', 'cancelled', 'dropped'],
    ['confirmed', 'making', 'sent'],
    ['ready', 'collected', 'dropped'],
    ['hold-ran-out', 'confirmed', 'dropped'],
    ['hold-ran-out', 'asked', 'sent'],
    ['moved', 'declined', 'dropped'],
    ['declined', 'declined', 'sent'],
    ['message', 'cancelled', 'sent'],
  ] as const)('%s, when the order is %s meanwhile, is %s', async (template, status, state) => {
    const mail = await keep({ template });
    await inTransaction(() => Order.update({ status }, { where: { id: order.id } }));
    await sender().runOnce();
    expect((await mail.reload()).state).toBe(state);
  });

  it('of a kind where the newest says all is not sent before it', async () => {
    const old = await keep({ template: 'moved' });
    const newest = await keep({ template: 'moved' });
    await sender().runOnce();
    expect((await old.reload()).state).toBe('dropped');
    expect(await subjects()).toEqual([newest.subject]);
  });

  it('that staff send again goes out all the same', async () => {
    const first = await keep({ template: 'ready' });
    await inTransaction(() => Order.update({ status: 'collected' }, { where: { id: order.id } }));
    const again = await keep({ template: 'ready', resendOfId: first.id });
    await sender().runOnce();
    expect((await first.reload()).state).toBe('dropped');
    expect((await again.reload()).state).toBe('sent');
  });

  it('that was erased is not sent', async () => {
    const mail = await keep();
    await inTransaction(() => mail.update({ erasedAt: test.clock.now() }));
    await sender().runOnce();
    expect((await mail.reload()).state).toBe('dropped');
  });
});
