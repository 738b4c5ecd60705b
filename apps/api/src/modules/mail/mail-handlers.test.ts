import ICAL from 'ical.js';
import { formatDay } from '#shared/dates/format.ts';
import { addDays } from '#shared/dates/local-time.ts';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { createSmtpClient } from '#api/clients/smtp.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { Message } from '#api/db/models/message.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Studio } from '#api/db/models/studio.ts';
import type { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { offeredDatesOf } from '#api/modules/orders/orders.queries.ts';
import { askForWarmth } from '#api/modules/orders/ask-for-warmth.command.ts';
import { expireHolds } from '#api/modules/plan/expire-holds.command.ts';
import { createDispatcher } from '#api/outbox/dispatcher.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { isEventKind } from '#api/outbox/events.ts';
import type { EventKind } from '#api/outbox/events.ts';
import { AppError } from '#api/platform/app-error.ts';
import { createLogger } from '#api/platform/logger.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';
import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import type { FormChanges } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { smtpControl } from '#fakes/smtp/control.ts';
import type { SmtpControl } from '#fakes/smtp/control.ts';
import { start } from '#fakes/smtp/start.ts';
import type { SmtpFake } from '#fakes/smtp/start.ts';
import type { MailMessage } from '#fakes/smtp/wire.ts';
import { previewConfirmation } from './confirmed-mail.queries.ts';
import { createMailHandlers } from './mail-handlers.ts';
import { createMailSender } from './mail-sender.ts';
import { sendMailAgain } from './send-mail-again.command.ts';
import { findSentMail, mailOfOrder, presentSentMail } from './sent-mail.queries.ts';

/** A Monday; pickups are on Saturdays from the 29th on, a new one for each order. */
const monday = '2027-05-03T14:00:00Z';
const studioInbox = 'hello@oxbowlane.example';
let app: TestApp;
let fake: SmtpFake;
let mailbox: SmtpControl;
let owner: User;
let staff: TestClient;
let placed = 0;

beforeAll(async () => {
  const logger = createLogger('silent');
  app = await startTestApp({ clock: new TestClock(monday), seeded: seededStudio, logger });
  fake = await start({ port: 0, smtpPort: 0 });
  mailbox = smtpControl(fake.url);
  owner = await addUser('owner', { email: 'ida@oxbowlane.example', name: 'Ida Lund' });
  await setSecondFactorRequired(false);
  staff = await signInStaff(app, owner);
  // Every order here is sent from the same computer.
  await inTransaction(() => Studio.update({ holdsPerAddress: 1000 }, { where: { id: 1 } }));
});
afterAll(async () => {
  await fake.stop();
  await app.close();
});
beforeEach(() => mailbox.clear());

/** Carries out events and sends mails until nothing is left that is due. */
async function deliver(): Promise<MailMessage[]> {
  const { clock, logger } = app.deps;
  const worker = 'test';
  const handlers = createMailHandlers(app.deps);
  const smtp = createSmtpClient({ url: fake.smtpUrl, requireTls: false });
  const dispatcher = createDispatcher({ handlers, clock, logger, worker });
  const sender = createMailSender({ smtp, clock, logger, worker });
  while ((await dispatcher.runOnce()) + (await sender.runOnce()) > 0);
  const given = await OutboxRow.findAll({ where: { state: ['queued', 'given-up'] } });
  expect(given.map(({ kind, lastError }) => `${kind}: ${lastError}`)).toEqual([]);
  return mailbox.messages();
}

/** Only what was sent to an address. */
const to = (address: string, messages: readonly MailMessage[]): MailMessage => {
  const found = messages.filter((message) => message.to.includes(address));
  expect(found).toHaveLength(1);
  return found[0] ?? expect.fail('no mail');
};

const flat = (text: string): string => text.replaceAll(/\s+/g, ' ');

/** An order sent by a guest with an address of their own, its first mails still to come. */
async function ordered(changes: FormChanges = {}): Promise<{ order: Order; email: string }> {
  placed += 1;
  const email = `guest${placed}@example.com`;
  const date = new Date(Date.UTC(2027, 4, 22 + 7 * placed)).toISOString().slice(0, 10);
  const you = { name: 'Mara Ellery', email, ...changes.you };
  const { code } = await placeOrder(app.visitor(), orderForm(date, { ...changes, you }));
  return { order: await Order.findOne({ where: { code }, rejectOnEmpty: true }), email };
}

/** As `ordered`, with the first mails read and put away. */
async function known(changes: FormChanges = {}): Promise<{ order: Order; email: string }> {
  const made = await ordered(changes);
  await deliver();
  await mailbox.clear();
  return made;
}

type OfOrder = Extract<EventKind, `order-${string}`>;
let happened = 0;
const happens = (kind: OfOrder, order: Order, values: Partial<Order> = {}): Promise<void> =>
  inTransaction(async () => {
    happened += 1;
    await Order.update(values, { where: { id: order.id } });
    const uniqueKey = `${kind}:${happened}`;
    await enqueue(kind, { orderId: order.id }, { uniqueKey, orderId: order.id });
  });

/** What a member of staff does with an order, over HTTP. */
async function byStaff(order: Order, move: string, body: object): Promise<void> {
  const { rowVersion } = await order.reload();
  const url = `/api/staff/orders/${order.number}/${move}`;
  const answer = await staff.post(url, { rowVersion, ...body });
  if (answer.status !== 200) throw new Error(`${move} was refused: ${answer.text}`);
}

const linkOf = (order: Order): string =>
  `${app.env.publicUrl}/orders/${order.code}#key=${privateKeyOf(app.env.sessionSecret, order)}`;

/** The first attachment of the last mail. */
async function lastFile(): Promise<string> {
  const mail = (await mailbox.messages()).findLast(({ attachments }) => attachments.length > 0);
  return mailbox.attachment(mail?.id ?? '', 0);
}

/** The one event of a calendar file. */
function eventOf(file: string): ICAL.Event {
  const event = ICAL.Component.fromString(file).getFirstSubcomponent('vevent');
  return event === null ? expect.fail('there is no event') : new ICAL.Event(event);
}

describe('a new order', () => {
  it('tells the customer, with the link that keeps the hold and until when', async () => {
    const { order, email } = await ordered();
    const mail = to(email, await deliver());
    expect(mail.subject).toBe(`Order No. ${order.number}: we have it`);
    expect(mail.from).toContain(studioInbox);
    for (const form of [mail.text, mail.html ?? '']) {
      expect(form).toContain(linkOf(order));
      expect(form).toContain('14 Oxbow Lane, Alder Falls, NY 13999');
    }
    // 30 minutes after ten in New York.
    expect(flat(mail.text)).toContain('Monday 3 May, 10:30 (EDT)');
    expect(flat(mail.text)).toContain('at most 48 hours');
    expect(mail.text).toMatch(/Estimate\s+\$\d+\.\d\d/);
    expect(mail.text).toMatch(/Contains:.*[Ee]gg/);
  });

  it('tells the studio, with advice on top and nothing of what guests cannot eat', async () => {
    const { order } = await ordered({
      day: {
        allergies: [
          { allergen: 'sesame', species: null, text: '', severity: 'anaphylaxis', guests: 3 },
          { allergen: null, species: null, text: 'kiwifruit', severity: 'allergy', guests: 1 },
        ],
        diets: ['halal'],
        dietNote: 'observant uncle',
      },
      setting: { place: 'sun', warmestC: 33, minutesOut: 180 },
      consents: { allergyData: true },
    });
    const messages = await deliver();
    const mail = to(studioInbox, messages);
    expect(mail.subject).toContain(`New order No. ${order.number}`);
    expect(mail.subject).toContain('Mara Ellery');
    expect(mail.text).toContain(`${app.env.publicUrl}/staff/orders/${order.number}`);
    expect(mail.text).toContain('An allergy was told');
    expect(mail.text).toMatch(/\d+ °F \/ \d+ °C/);
    expect(mail.text.indexOf('* Stop')).toBeGreaterThan(0);
    expect(mail.text.indexOf('* Stop')).toBeLessThan(mail.text.indexOf('Pickup:'));
    for (const { text, html, subject } of messages) {
      const all = `${subject} ${text} ${html}`.replaceAll(
        /Also handled here[^]*?(?:Worked|<\/tr>|---)/g,
        '',
      );
      expect(all).not.toMatch(/kiwifruit|halal|anaphyla|observant|3 guests/i);
    }
  });

  it('sends nothing twice however often its event is carried out', async () => {
    const { order } = await ordered();
    await deliver();
    const row = await OutboxRow.findOne({
      where: { kind: 'order-asked', orderId: order.id },
      rejectOnEmpty: true,
    });
    await createMailHandlers(app.deps)['order-asked'](
      { orderId: order.id },
      { outboxId: row.id, uniqueKey: row.uniqueKey },
    );
    expect(await SentMail.count({ where: { orderId: order.id } })).toBe(2);
  });

  it('sends nothing to somebody who left no address', async () => {
    const { order } = await known();
    await inTransaction(() =>
      OrderContact.update({ email: null }, { where: { orderId: order.id } }),
    );
    await happens('order-ready', order, { status: 'ready' });
    expect(await deliver()).toEqual([]);
  });
});

describe('a confirmed order', () => {
  it('comes with a calendar file that a calendar can read (RFC 5545, by ical.js)', async () => {
    const { order, email } = await known();
    await byStaff(order, 'confirm', { note: 'Darker peonies, as you said.' });
    const mail = to(email, await deliver());
    expect(mail.subject).toContain('is confirmed for Saturday');
    expect(mail.text).toContain('> Darker peonies, as you said.');
    expect(mail.text).toMatch(/Agreed price +\$\d+\.\d\d/);
    const [attached] = mail.attachments;
    expect(attached).toMatchObject({
      filename: `pickup-${order.number}.ics`,
      contentType: 'text/calendar',
    });
    const file = await mailbox.attachment(mail.id, 0);
    const event = eventOf(file);
    expect(event.startDate.toJSDate()).toEqual(order.pickupAt);
    expect(event.uid).toContain(order.code);
    expect(event.location).toContain('14 Oxbow Lane');
    // Calendars are shared: the key of the link stays out of it.
    expect(file).not.toContain('key=');
    expect(mail.text).toContain(linkOf(order));
  });

  it('answers the first mail of the order', async () => {
    const { order, email } = await ordered();
    const first = to(email, await deliver());
    await mailbox.clear();
    await byStaff(order, 'confirm', {});
    const second = to(email, await deliver());
    expect(second.inReplyTo).toBe(first.messageId);
    expect(second.references).toEqual([first.messageId]);
  });

  it('can be looked at before, without the key of the customer’s link', async () => {
    const { order, email } = await known();
    const preview = await previewConfirmation(app.deps, order.id, 'Darker peonies, as you said.');
    expect(preview.to).toBe(email);
    expect(preview.text).toContain('> Darker peonies, as you said.');
    expect(preview.html).toContain('Darker peonies');
    const key = privateKeyOf(app.env.sessionSecret, order);
    expect(`${preview.html}${preview.text}`).not.toContain(key);
  });
});

describe('what becomes of an order', () => {
  it('declined: the reason, and the days offered with it', async () => {
    const { order, email } = await known();
    const reason = 'Two weddings leave us that day already.';
    await byStaff(order, 'decline', { reason, offerDates: true });
    const mail = to(email, await deliver());
    expect(mail.text).toContain(`> ${reason}`);
    const offered = await offeredDatesOf(order.id);
    expect(offered).toHaveLength(3);
    for (const date of offered) {
      expect(mail.text).toContain(formatDay(date, { year: true }));
      expect(mail.text).toContain(`${app.env.publicUrl}/order/day?date=${date}`);
    }
  });

  it('withdrawn: both sides are told', async () => {
    const { order, email } = await known();
    await happens('order-withdrawn', order, { status: 'withdrawn', endedReason: 'Found another.' });
    const messages = await deliver();
    expect(to(email, messages).text).toContain('nothing is owed');
    expect(to(studioInbox, messages).text).toContain('> Found another.');
  });

  it('moved: the new day and the old one, and the calendar moves too', async () => {
    const { order, email } = await known();
    const before = order.pickupDate ?? '';
    const date = addDays(before, -1);
    await byStaff(order, 'confirm', {});
    await deliver();
    const sequence = eventOf(await lastFile()).sequence;
    await mailbox.clear();
    await byStaff(order, 'move', { date, windowStart: 600, note: 'As we said.' });
    const mail = to(email, await deliver());
    expect(mail.text).toContain(`${formatDay(date, { year: true })}, 10:00 to`);
    expect(mail.text).toMatch(
      new RegExp(`Before: +${formatDay(before, { year: true })}, 10:00 to`),
    );
    expect(mail.text).toContain('> As we said.');
    const event = eventOf(await lastFile());
    expect(event.startDate.toJSDate()).toEqual(new Date(`${date}T14:00:00Z`));
    expect(event.uid).toContain(order.code);
    expect(event.sequence).toBeGreaterThan(sequence);
  });

  it('moved before it is confirmed: nobody’s calendar is touched', async () => {
    const { order, email } = await known();
    const date = addDays(order.pickupDate ?? '', -1);
    await byStaff(order, 'move', { date, windowStart: 600, note: '' });
    expect(to(email, await deliver()).attachments).toEqual([]);
  });

  it('ready: when to come and how to carry it', async () => {
    const { order, email } = await known({
      you: { otherCollects: true, collectorName: 'Tom Ellery', collectorPhone: '607 555 0134' },
    });
    await happens('order-ready', order, { status: 'ready' });
    const { text } = to(email, await deliver());
    expect(text).toMatch(/Open for pickups: .*Tuesday/);
    expect(text).toContain('Collected by:');
    expect(text).toContain('Carry it level');
    expect(text).toMatch(/\d+ °F \/ \d+ °C/);
  });

  it('collected: thanks, in the words the studio has written itself', async () => {
    const { order, email } = await known();
    await happens('order-collected', order, { status: 'collected' });
    const mail = to(email, await deliver());
    expect(mail.subject).toBe(`Order No. ${order.number}: thank you from the lane`);
    expect(flat(mail.text)).toContain('the best ones hang by the oven');
  });

  it('a hold that ran out: both sides are told', async () => {
    const { order, email } = await known();
    app.clock.advance({ hours: 1 });
    await expireHolds(app.clock.now());
    const messages = await deliver();
    const ours = messages.filter(({ subject }) => subject.includes(`No. ${order.number}`));
    expect(flat(to(email, ours).text)).toContain('is still with us');
    expect(to(studioInbox, ours).subject).toContain('has lost its place');
  });

  it('an unknown warmth: asked once, three days before, by day and never at night', async () => {
    const fondant = {
      covering: 'fondant',
      style: 'swiss',
      finish: 'smooth',
      colour: null,
    } as const;
    const { order, email } = await known({
      setting: { warmestC: null },
      cake: { coating: fondant },
    });
    const sure = await known();
    for (const each of [order, sure.order]) await byStaff(each, 'confirm', {});
    await deliver();
    await mailbox.clear();
    const daysBefore = (days: number, time: string) =>
      new Date(Date.parse(`${order.pickupDate ?? ''}T${time}Z`) - days * 86_400_000);
    // New York keeps summer time then: 13:00 UTC is nine in the morning.
    expect(await askForWarmth(daysBefore(4, '15:00:00'))).toBe(0);
    expect(await askForWarmth(daysBefore(3, '12:59:00'))).toBe(0);
    expect(await askForWarmth(daysBefore(3, '22:00:00'))).toBe(0);
    expect(await askForWarmth(daysBefore(3, '13:00:00'))).toBe(1);
    expect(await askForWarmth(daysBefore(2, '15:00:00'))).toBe(0);
    const messages = await deliver();
    const { text, subject } = to(email, messages);
    expect(subject).toContain('how warm will it be');
    expect(flat(text)).toContain('in the shade');
    expect(text).toContain(linkOf(order));
    expect(messages.some((it) => it.to.some((one) => one.includes(sure.email)))).toBe(false);
  });

  it('a stop that was lifted: that there is something to read, and nothing of what it is', async () => {
    const { order, email } = await known();
    await inTransaction(async () => {
      const { id: liftedStopId } = await LiftedStop.create({
        orderId: order.id,
        revisionId: order.currentRevisionId ?? '',
        code: 'allergen',
        about: 'egg',
        reason: 'We talked: the guest brings a dessert along.',
        liftedByUserId: owner.id,
      });
      const uniqueKey = `stop-lifted:${liftedStopId}`;
      await enqueue(
        'stop-lifted',
        { orderId: order.id, liftedStopId },
        { uniqueKey, orderId: order.id },
      );
    });
    const { text, subject } = to(email, await deliver());
    expect(text).toContain(linkOf(order));
    expect(flat(text)).toContain('Nothing is confirmed before you have read and accepted it');
    expect(`${subject} ${text}`).not.toMatch(/brings a dessert|egg|allerg/i);
  });

  it('a renewed link: the new one, and not the old one', async () => {
    const { order, email } = await known();
    const old = linkOf(order);
    await byStaff(order, 'link', {});
    await order.reload();
    const { text } = to(email, await deliver());
    expect(text).toContain(linkOf(order));
    expect(text).not.toContain(old);
  });
});

describe('messages', () => {
  const write = (order: Order, sender: 'customer' | 'studio', body: string): Promise<void> =>
    inTransaction(async () => {
      const authorName = sender === 'studio' ? 'Ida' : 'Mara Ellery';
      const { id } = await Message.create({ orderId: order.id, sender, authorName, body });
      const uniqueKey = `message-written:${id}`;
      const payload = { orderId: order.id, messageId: id };
      await enqueue('message-written', payload, { uniqueKey, orderId: order.id });
    });

  it('go both ways, each to the other side alone', async () => {
    const { order, email } = await known();
    await write(order, 'customer', 'Could it be a little bluer? 🎂');
    const [question, ...more] = await deliver();
    expect(more).toEqual([]);
    expect(question?.to).toEqual([studioInbox]);
    expect(question?.text).toContain('> Could it be a little bluer? 🎂');
    await mailbox.clear();
    await write(order, 'studio', 'Of course.\n\nIda');
    const [answer, ...others] = await deliver();
    expect(others).toEqual([]);
    expect(answer?.to).toEqual([email]);
    expect(answer?.text).toContain('> Of course.\n>\n> Ida');
    const replyTo = answer?.headers.find(({ name }) => name === 'Reply-To');
    expect(replyTo?.value).toBe(studioInbox);
  });

  it('that were erased meanwhile are not sent', async () => {
    const { order } = await known();
    await write(order, 'customer', 'secret');
    await inTransaction(() =>
      Message.update(
        { body: '', authorName: '', erasedAt: app.clock.now() },
        { where: { orderId: order.id } },
      ),
    );
    expect(await deliver()).toEqual([]);
  });
});

describe('accounts', () => {
  it('a link to sign in works, until the time the mail says', async () => {
    await app.visitor().post('/api/session/links', { email: 'mara@example.com' });
    const { text } = to('mara@example.com', await deliver());
    const [, token] = /\/links\/sign-in#([\w-]+)/.exec(text) ?? [];
    expect(text).toContain('works once, until');
    const used = await app.visitor().post('/api/session/links/use', { token });
    expect(used.status).toBe(200);
  });

  it('staff are told that they sign in with a password', async () => {
    await app.visitor().post('/api/session/links', { email: owner.email });
    const { text } = to('ida@oxbowlane.example', await deliver());
    expect(text).toContain(`${app.env.publicUrl}/sign-in/staff`);
    expect(text).not.toContain('/links/');
  });

  it('a forgotten password and an invitation lead to their pages', async () => {
    await app.visitor().post('/api/session/password-resets', { email: owner.email });
    const invitation = { email: 'noor@oxbowlane.example', name: 'Noor', role: 'baker' };
    await staff.post('/api/staff/people/invitations', invitation);
    const messages = await deliver();
    expect(to(owner.email ?? '', messages).text).toContain('/links/password-reset#');
    const invited = to('noor@oxbowlane.example', messages).text;
    expect(invited).toContain('/links/invitation#');
    expect(flat(invited)).toContain('as a baker');
    expect(invited).toContain('Ida Lund has invited you.');
  });
});

describe('mail about mail', () => {
  it('tells the owners at their own addresses when a mail was given up', async () => {
    const { order, email } = await known();
    await mailbox.failNext({ kind: 'refuse', code: 550, recipient: email });
    await happens('order-ready', order, { status: 'ready' });
    const mail = to('ida@oxbowlane.example', await deliver());
    expect(mail.subject).toBe('An e-mail could not be delivered');
    expect(mail.text).toContain(email);
    expect(mail.text).toContain(`No. ${order.number}`);
    expect(mail.text).toContain('550');
    const lost = await SentMail.findOne({ where: { state: 'given-up' }, rejectOnEmpty: true });
    expect(mail.text).toContain(`${app.env.publicUrl}/staff/mail/${lost.id}`);
  });

  it('is listed, read without keys, and sent again as it was, once per press', async () => {
    const { order, email } = await ordered();
    await deliver();
    const [first] = await mailOfOrder(order.id);
    expect(first).toMatchObject({ template: 'order-received', to: email, state: 'sent' });
    const mail = await findSentMail(first?.id ?? '');
    const view = presentSentMail(mail);
    const key = privateKeyOf(app.env.sessionSecret, order);
    expect(mail.text).toContain(key);
    expect(`${view.html}${view.text}`).not.toContain(key);
    expect(view.text).toContain(`/orders/${order.code}#key=…`);

    await mailbox.clear();
    await sendMailAgain(mail, owner.id);
    await expect(sendMailAgain(mail, owner.id)).rejects.toMatchObject({ code: 'wrong-state' });
    const again = to(email, await deliver());
    expect(again.text.trim()).toBe(mail.text.trim());
    expect(again.messageId).not.toBe(mail.messageId);
    expect(again.references).toContain(mail.messageId);

    await mailbox.clear();
    await sendMailAgain(mail, owner.id);
    to(email, await deliver());
  });

  it('is not sent again while it is on its way, once erased, or with a link that is spent', async () => {
    const { order } = await ordered();
    await deliver();
    const [row] = await mailOfOrder(order.id);
    const mail = await findSentMail(row?.id ?? '');
    const refusals = [
      { state: 'queued' as const },
      { erasedAt: app.clock.now() },
      { tokenId: 'some' },
    ];
    for (const refusal of refusals) {
      const changed = SentMail.build({ ...mail.get(), ...refusal });
      await expect(sendMailAgain(changed, owner.id)).rejects.toBeInstanceOf(AppError);
    }
    await expect(findSentMail('no-such-mail')).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('the handlers', () => {
  it('are there for every event', () => {
    const kinds = Object.keys(createMailHandlers(app.deps));
    expect(kinds.every(isEventKind)).toBe(true);
    expect(kinds.length).toBeGreaterThan(0);
  });
});
