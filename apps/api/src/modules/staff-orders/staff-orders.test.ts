import ICAL from 'ical.js';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { datesResponse } from '#shared/contracts/dates.ts';
import { orderView, submittedOrder } from '#shared/contracts/orders.ts';
import { confirmationLook, orderList, staffOrder } from '#shared/contracts/staff.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { AllergyRule } from '#api/db/models/allergy-rule.ts';
import { DayCap } from '#api/db/models/day-cap.ts';
import { Hold } from '#api/db/models/hold.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { Quote } from '#api/db/models/quote.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { expireHolds } from '#api/modules/plan/expire-holds.command.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';
import { newId } from '#api/platform/ids.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';
import { orderForm, placeOrder, sendOrder } from '#api/testing/order-form.ts';
import type { FormChanges } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let counter: TestClient;
let baker: TestClient;
let owner: TestClient;
let weeks = 0;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  counter = await signInStaff(app, await addUser('counter', { name: 'Pia Lund' }));
  baker = await signInStaff(app, await addUser('baker', { name: 'Noor Haddad' }));
  owner = await signInStaff(app, await addUser('owner', { name: 'Ida Thorne' }));
});
afterAll(() => app.close());

/** A Friday of its own, so that tests do not fill one another's days. */
function nextFriday(): string {
  weeks += 1;
  return new Date(Date.UTC(2027, 6, 9 + 7 * weeks)).toISOString().slice(0, 10);
}

type Asked = { number: number; code: string; guest: TestClient; date: string };

async function ask(changes: FormChanges = {}, date = nextFriday()): Promise<Asked> {
  const guest = app.visitor();
  const you = { email: `${newId()}@example.com`, ...changes.you };
  const { number, code } = await placeOrder(guest, orderForm(date, { ...changes, you }));
  return { number, code, guest, date };
}

async function look(number: number, by = baker): Promise<StaffOrder> {
  return staffOrder.parse((await by.get(`/api/staff/orders/${number}`)).body);
}

const move = (by: TestClient, number: number, verb: string, body: object): Promise<Answer> =>
  by.post(`/api/staff/orders/${number}/${verb}`, body);

async function confirmed(changes: FormChanges = {}): Promise<Asked> {
  const asked = await ask(changes);
  const answer = await move(baker, asked.number, 'confirm', { rowVersion: 1 });
  expect(answer.status, answer.text).toBe(200);
  return asked;
}

const codeOf = (answer: Answer) => problem.parse(answer.body).code;
const kindsOf = async (code: string) => {
  const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
  const rows = await OutboxRow.findAll({ where: { orderId: order.id }, order: [['id', 'ASC']] });
  return rows.map(({ kind }) => kind);
};

describe('confirming', () => {
  it('makes the offer quote 1, agreed, keeps the place for good and tells the customer', async () => {
    const { number, code, guest } = await ask();
    const last = confirmationLook.parse(
      (await baker.get(`/api/staff/orders/${number}/confirmation?note=Looking%20forward!`)).body,
    );
    expect(last).toMatchObject({ rowVersion: 1, blockers: [], fits: { fits: true } });
    expect(last.email.text).toContain('Looking forward!');
    expect(last.email.html).toContain('Looking forward!');
    const answer = await move(baker, number, 'confirm', {
      rowVersion: 1,
      note: 'Looking forward!',
    });
    const shown = staffOrder.parse(answer.body);
    expect(shown).toMatchObject({ status: 'confirmed', rowVersion: 2, hold: null });
    expect(shown.agreedPrice).toEqual(last.price);
    expect(shown.tasks.length).toBeGreaterThan(3);
    expect(shown.events.map(({ kind, actor }) => [kind, actor])).toEqual([
      ['submitted', 'Mara Ellery'],
      ['confirmed', 'Noor Haddad'],
    ]);
    expect(await kindsOf(code)).toEqual(['order-asked', 'order-confirmed']);
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    expect(await Quote.findOne({ where: { orderId: order.id } })).toMatchObject({
      n: 1,
      state: 'agreed',
      note: 'Looking forward!',
      agreedBy: 'studio',
    });
    expect(order.agreedRevisionId).toBe(order.currentRevisionId);
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(view).toMatchObject({
      stage: 'agreed',
      hold: null,
      can: { withdraw: false, seeCalendarFile: true },
    });
  });

  it('gives a calendar file that iCalendar readers understand', async () => {
    const { code, guest, date } = await confirmed();
    const file = await guest.get(`/api/orders/${code}/calendar.ics`);
    expect(file.headers.get('Content-Type')).toBe('text/calendar; charset=utf-8');
    // RFC 5545 as ical.js reads it.
    const calendar = ICAL.Component.fromString(file.text);
    const event = new ICAL.Event(calendar.getFirstSubcomponent('vevent') ?? undefined);
    expect(event.startDate.toJSDate().toISOString()).toBe(`${date}T14:00:00.000Z`);
    expect(event.endDate.toJSDate().toISOString()).toBe(`${date}T14:30:00.000Z`);
    expect(event.location).toBe('14 Oxbow Lane, Alder Falls, NY 13999');
    expect(file.text).not.toContain('key=');
    expect((await app.visitor().get(`/api/orders/${code}/calendar.ics`)).status).toBe(404);
  });

  it('is done by one of two who press at once; the other is told', async () => {
    const { number, code } = await ask();
    const answers = await Promise.all([
      move(baker, number, 'confirm', { rowVersion: 1 }),
      move(owner, number, 'confirm', { rowVersion: 1 }),
    ]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409]);
    expect(codeOf(answers[answers[0].status === 200 ? 1 : 0])).toBe('changed-meanwhile');
    expect((await kindsOf(code)).filter((kind) => kind === 'order-confirmed')).toHaveLength(1);
  });

  it('waits for what must be settled first', async () => {
    const { number, code, guest } = await ask({
      day: {
        allergies: [
          { allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 },
          { allergen: null, species: null, text: 'kiwi', severity: 'allergy', guests: 1 },
        ],
      },
      consents: { allergyData: true },
    });
    const stopped = await move(baker, number, 'confirm', { rowVersion: 1 });
    expect(stopped.status).toBe(409);
    expect(codeOf(stopped)).toBe('advice-stop');
    const before = await look(number);
    expect(before.blockers.map((it) => [it.code, it.waitsFor]).toSorted()).toEqual([
      ['allergen', 'talk'],
      ['allergy-text', 'answer'],
    ]);
    expect(before.blockers.find((it) => it.code === 'allergen')?.plain).toContain(
      'The owner’s table: take after talking.',
    );

    // A baker answers what was told in words; only the owner lifts what the cake contains.
    const kiwi = before.allergies.find(({ text }) => text === 'kiwi')?.id ?? '';
    const answered = await move(baker, number, `allergies/${kiwi}/answer`, {
      rowVersion: 1,
      text: 'No kiwi in it; guest knows we handle fruit.',
    });
    expect(staffOrder.parse(answered.body).allergies.at(1)?.answer).toMatchObject({
      by: 'Noor Haddad',
    });
    const about = before.blockers.find(({ code }) => code === 'allergen')?.about ?? '';
    const reason = 'The guest brings her own dessert.';
    const lift = (by: TestClient, rowVersion: number) =>
      move(by, number, 'lift-stop', { rowVersion, about, reason });
    expect((await lift(baker, 2)).status).toBe(403);

    // Nobody takes it before the talk about it is recorded.
    const early = await lift(owner, 2);
    expect(codeOf(early)).toBe('wrong-state');
    expect(problem.parse(early.body).detail).toContain('Talk with the customer first');
    const egg = before.allergies.find(({ allergen }) => allergen === 'egg')?.id ?? '';
    await move(baker, number, `allergies/${egg}/answer`, {
      rowVersion: 2,
      text: 'Spoke with the guest: she brings her own dessert.',
    });
    const lifted = staffOrder.parse((await lift(owner, 3)).body);
    expect(lifted).toMatchObject({
      rowVersion: 4,
      blockers: [{ about, waitsFor: 'customer' }],
      lifted: [{ about, reason, by: 'Ida Thorne', acceptedAt: null }],
    });
    expect(lifted.messages).toEqual([]);
    expect(await kindsOf(code)).toEqual(['order-asked', 'stop-lifted']);

    // It stands beside the stop on the customer's page, and nothing is confirmed before they accept.
    expect(codeOf(await move(baker, number, 'confirm', { rowVersion: 4 }))).toBe('advice-stop');
    const seen = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(seen).toMatchObject({
      can: { acceptLifted: true },
      lifted: [{ reason, by: 'Ida Thorne', acceptedAt: null }],
    });
    expect(seen.lifted[0]?.sentence).toContain('Egg is in');
    const accepting = { rowVersion: 4, liftedStopId: seen.lifted[0]?.id ?? '' };
    const path = `/api/orders/${code}/accept-lifted-stop`;
    expect((await app.visitor().post(path, accepting)).status).toBe(404);
    expect((await owner.post(path, accepting)).status).toBe(403);
    const accepted = orderView.parse((await guest.post(path, accepting)).body);
    expect(accepted).toMatchObject({ rowVersion: 5, can: { acceptLifted: false } });
    expect(accepted.lifted[0]?.acceptedAt).not.toBeNull();
    // Pressed twice, it is accepted once.
    expect(orderView.parse((await guest.post(path, accepting)).body).rowVersion).toBe(5);
    expect((await look(number)).events.map(({ kind }) => kind).slice(-3)).toEqual([
      'allergy-answered',
      'stop-lifted',
      'lifted-stop-accepted',
    ]);
    expect((await move(baker, number, 'confirm', { rowVersion: 5 })).status).toBe(200);
  });

  it('keeps a talk about heat as well, and lifts that stop only after it', async () => {
    const { number, code, guest } = await ask({ setting: { place: 'sun', warmestC: 20 } });
    const [sun] = (await look(number)).blockers;
    expect(sun).toMatchObject({ code: 'sun', waitsFor: 'talk', talked: null });
    const about = sun?.about ?? '';
    const talk = { rowVersion: 1, about, text: 'They put up an awning.' };
    expect((await move(counter, number, 'talks', talk)).status).toBe(403);
    expect(
      (await move(baker, number, 'talks', { rowVersion: 1, about: 'egg', text: 'x' })).status,
    ).toBe(404);
    const talked = staffOrder.parse((await move(baker, number, 'talks', talk)).body);
    expect(talked.blockers).toMatchObject([
      { about, waitsFor: 'reason', talked: { text: talk.text, by: 'Noor Haddad' } },
    ]);
    expect(codeOf(await move(baker, number, 'talks', { ...talk, rowVersion: 2 }))).toBe(
      'wrong-state',
    );
    const reason = 'An awning stands over it.';
    await move(owner, number, 'lift-stop', { rowVersion: 2, about, reason });
    const [lifted] = orderView.parse((await guest.get(`/api/orders/${code}`)).body).lifted;
    expect(lifted).toMatchObject({ reason });
    const accept = () =>
      guest.post(`/api/orders/${code}/accept-lifted-stop`, {
        rowVersion: 3,
        liftedStopId: lifted?.id ?? '',
      });
    // Two presses at the same moment accept it once, and neither is a fault of ours.
    const answers = await Promise.all([accept(), accept()]);
    expect(answers.every(({ status }) => status < 500)).toBe(true);
    const { blockers, events, rowVersion } = await look(number);
    expect(blockers).toEqual([]);
    expect(rowVersion).toBe(4);
    expect(events.filter(({ kind }) => kind === 'lifted-stop-accepted')).toHaveLength(1);
  });

  it('never lifts what the studio’s own rules refuse', async () => {
    const { number } = await ask({
      day: {
        allergies: [
          { allergen: 'milk', species: null, text: '', severity: 'anaphylaxis', guests: 1 },
        ],
      },
      consents: { allergyData: true },
    });
    const { blockers } = await look(number);
    const about = blockers.find(({ waitsFor }) => waitsFor === 'nothing')?.about;
    expect(about).toBe('allergen:milk');
    const answer = await move(owner, number, 'lift-stop', { rowVersion: 1, about, reason: 'x' });
    expect(codeOf(answer)).toBe('not-allowed');

    // The owner's table counts as it is now: once it says talk, a talk opens the way.
    const where = { allergen: null, severity: 'anaphylaxis' };
    await inTransaction(() => AllergyRule.update({ answer: 'talk' }, { where }));
    expect((await look(number)).blockers.find((it) => it.about === about)).toMatchObject({
      waitsFor: 'talk',
      talk: true,
    });
    await inTransaction(() => AllergyRule.update({ answer: 'refuse' }, { where }));
  });

  it('finds a place first for a request whose hold has run out', async () => {
    const { number, code } = await ask();
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    await expireHolds(new Date(app.clock.now().getTime() + 3_600_000));
    expect(await hasPlace(order.id)).toBe(false);
    const answer = await move(baker, number, 'confirm', { rowVersion: 1 });
    expect(answer.status, answer.text).toBe(200);
    expect(await hasPlace(order.id)).toBe(true);
  });
});

describe('declining, withdrawing, moving', () => {
  it('declines with a reason and open days, and frees the place', async () => {
    const { number, code, guest } = await ask();
    const answer = await move(baker, number, 'decline', {
      rowVersion: 1,
      reason: 'We are at a fair that day.',
      offerDates: true,
    });
    expect(staffOrder.parse(answer.body).status).toBe('declined');
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(view.ending).toBe('We are at a fair that day.');
    expect(view.otherDates).toHaveLength(3);
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    expect(await hasPlace(order.id)).toBe(false);
    expect(await Hold.count({ where: { orderId: order.id, releasedAt: null } })).toBe(0);
    const again = await move(baker, number, 'decline', {
      rowVersion: 2,
      reason: 'x',
      offerDates: false,
    });
    expect(codeOf(again)).toBe('wrong-state');
    const empty = await move(baker, number, 'decline', {
      rowVersion: 2,
      reason: ' ',
      offerDates: false,
    });
    expect(empty.status).toBe(422);
  });

  it('lets the customer withdraw until it is confirmed', async () => {
    const { number, code, guest } = await ask();
    const stale = await guest.post(`/api/orders/${code}/withdraw`, { rowVersion: 9, reason: '' });
    expect(codeOf(stale)).toBe('changed-meanwhile');
    const answer = await guest.post(`/api/orders/${code}/withdraw`, {
      rowVersion: 1,
      reason: 'Rain',
    });
    expect(orderView.parse(answer.body)).toMatchObject({ status: 'withdrawn', stage: null });
    expect((await move(baker, number, 'confirm', { rowVersion: 2 })).status).toBe(409);
    const other = await confirmed();
    const late = await other.guest.post(`/api/orders/${other.code}/withdraw`, {
      rowVersion: 2,
      reason: '',
    });
    expect(codeOf(late)).toBe('wrong-state');
    expect(
      (await app.visitor().post(`/api/orders/${code}/withdraw`, { rowVersion: 2, reason: '' }))
        .status,
    ).toBe(404);
  });

  it('moves the pickup where the plan has room, and tells the customer', async () => {
    const { number, code, guest, date } = await confirmed();
    const closed = new Date(Date.parse(date) + 3 * 86_400_000).toISOString().slice(0, 10);
    const gone = await move(baker, number, 'move', {
      rowVersion: 2,
      date: closed,
      windowStart: 600,
      note: '',
    });
    expect(codeOf(gone)).toBe('date-gone');
    const next = new Date(Date.parse(date) + 86_400_000).toISOString().slice(0, 10);
    const answer = await move(baker, number, 'move', {
      rowVersion: 2,
      date: next,
      windowStart: 660,
      note: 'As we said.',
    });
    expect(staffOrder.parse(answer.body)).toMatchObject({
      status: 'confirmed',
      rowVersion: 3,
      pickup: { date: next, start: 660 },
    });
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(view.pickup).toMatchObject({ date: next, startAt: `${next}T15:00:00.000Z` });
    expect(await kindsOf(code)).toEqual(['order-asked', 'order-confirmed', 'order-moved']);
  });
});

describe('the days an order could move to', () => {
  const datesFor = async (number: number, date: string) => {
    const path = `/api/staff/orders/${number}/dates?from=${date}&to=${date}`;
    return datesResponse.parse((await baker.get(path)).body).days[0];
  };

  it('leaves out its own work: a day that it fills alone is open to it', async () => {
    const { number, date } = await confirmed();
    await inTransaction(async () => {
      await DayCap.create({ localDate: date, occasionId: 'birthday', maxOrders: 1 });
      await noteSettingsChange();
    });
    const design = (await look(number)).design;
    const asked = await app.visitor().post('/api/dates', { design, from: date, to: date });
    expect(datesResponse.parse(asked.body).days[0]?.answer).toBe('closed');
    expect((await datesFor(number, date))?.answer).not.toBe('closed');
  });

  it('does not hold the staff to the notice that customers give', async () => {
    const { number } = await confirmed();
    const soon = '2027-05-05';
    const design = (await look(number)).design;
    const asked = await app.visitor().post('/api/dates', { design, from: soon, to: soon });
    expect(datesResponse.parse(asked.body).days[0]?.reason?.code).toBe('too-soon');
    expect((await datesFor(number, soon))?.reason?.code).not.toBe('too-soon');
  });
});

describe('making and handing over', () => {
  it('goes from start to ready to collected, each told or kept quiet as the table says', async () => {
    const { number, code, guest } = await confirmed();
    expect((await move(counter, number, 'start', { rowVersion: 2 })).status).toBe(403);
    await move(baker, number, 'start', { rowVersion: 2 });
    const ready = staffOrder.parse((await move(counter, number, 'ready', { rowVersion: 3 })).body);
    expect(ready.tasks.every(({ state }) => state === 'finished')).toBe(true);
    const foreign = await move(counter, number, 'collected', {
      rowVersion: 4,
      collectedBy: 'Bo',
      condition: '',
      photoId: newId(),
    });
    expect(foreign.status).toBe(422);
    const collected = await move(counter, number, 'collected', {
      rowVersion: 4,
      collectedBy: 'Bo Ellery',
      condition: 'Perfect',
      photoId: null,
    });
    expect(staffOrder.parse(collected.body)).toMatchObject({
      status: 'collected',
      handover: { collectedBy: 'Bo Ellery', condition: 'Perfect', by: 'Pia Lund' },
      can: { confirm: false, ready: false, collect: false },
    });
    expect(await kindsOf(code)).toEqual([
      'order-asked',
      'order-confirmed',
      'order-ready',
      'order-collected',
    ]);
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(view.stage).toBe('collected');
  });
});

describe('messages and links', () => {
  it('carries messages both ways and counts what nobody has opened', async () => {
    const { number, code, guest } = await ask({ you: { name: 'Wendeline Quist' } });
    await guest.post(`/api/orders/${code}/messages`, { body: 'Could it be pink?' });
    const unread = async () =>
      orderList.parse((await baker.get('/api/staff/orders?find=Wendeline')).body).rows[0]?.unread;
    expect(await unread()).toBe(1);
    await look(number);
    expect(await unread()).toBe(1);
    await baker.post(`/api/staff/orders/${number}/messages/read`, {});
    expect(await unread()).toBe(0);
    await baker.post(`/api/staff/orders/${number}/messages`, { body: 'Gladly.' });
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(view.messages.map(({ from, authorName, body }) => [from, authorName, body])).toEqual([
      ['customer', 'Wendeline Quist', 'Could it be pink?'],
      ['studio', 'Noor Haddad', 'Gladly.'],
    ]);
    expect((await guest.post(`/api/orders/${code}/messages`, { body: '  ' })).status).toBe(422);
    expect((await app.visitor().post(`/api/orders/${code}/messages`, { body: 'x' })).status).toBe(
      404,
    );
  });

  it('renews the private link: the old key and who came by it see nothing any more', async () => {
    const form = orderForm(nextFriday());
    const sender = app.visitor();
    const sent = await sendOrder(sender, form, 'before-renewing');
    const { number, code } = submittedOrder.parse(sent.body);
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    const old = privateKeyOf(app.env.sessionSecret, order);
    app.clock.advance({ minutes: 1 });
    expect((await move(counter, number, 'link', { rowVersion: 1 })).status).toBe(200);
    const fresh = privateKeyOf(app.env.sessionSecret, await order.reload());
    const open = (key: string, by = app.visitor()) => by.post('/api/order-access', { code, key });
    expect((await open(old)).status).toBe(404);
    expect((await sender.get(`/api/orders/${code}`)).status).toBe(404);
    // Sending the same once more is still the same order, and no way in.
    const again = await sendOrder(sender, form, 'before-renewing');
    expect(submittedOrder.parse(again.body)).toMatchObject({ code, key: null });
    expect((await sender.get(`/api/orders/${code}`)).status).toBe(404);
    expect((await open(fresh, sender)).status).toBe(200);
    expect((await sender.get(`/api/orders/${code}`)).status).toBe(200);
    expect(await kindsOf(code)).toContain('private-link-renewed');
  });
});

describe('the orders table', () => {
  it('finds by number, name, address, words on the cake and messages', async () => {
    const { number } = await ask({
      you: { name: 'Zephyrine O’Hara', email: 'zephyrine@example.com' },
      look: { words: [{ tier: 0, text: 'Bon voyage 100%' }] },
    });
    const find = async (text: string) =>
      orderList
        .parse(
          (await counter.get(`/api/staff/orders?${new URLSearchParams({ find: text }).toString()}`))
            .body,
        )
        .rows.map((row) => row.number);
    expect(await find(String(number))).toEqual([number]);
    expect(await find(`No. ${number}`)).toEqual([number]);
    expect(await find('zephyrine')).toEqual([number]);
    expect(await find('ZEPHYRINE@example.com')).toEqual([number]);
    expect(await find('voyage 100%')).toEqual([number]);
    expect(await find('1_0%')).toEqual([]);
    expect(await find("'; DROP TABLE orders; --")).toEqual([]);
  });

  it('filters, sorts and pages on the server', async () => {
    const list = async (query: string) =>
      orderList.parse((await baker.get(`/api/staff/orders?${query}`)).body);
    const all = await list('sort=number&order=desc&perPage=5');
    expect(all.rows.map(({ number }) => number)).toEqual(
      all.rows.map(({ number }) => number).toSorted((a, b) => b - a),
    );
    expect(all.rows).toHaveLength(5);
    const second = await list('sort=number&order=desc&perPage=5&page=2');
    expect(second.rows[0]?.number).toBe((all.rows.at(-1)?.number ?? 0) - 1);
    const only = await list('status=declined&status=withdrawn');
    expect(new Set(only.rows.map(({ status }) => status))).toEqual(
      new Set(['declined', 'withdrawn']),
    );
    expect(only.total).toBe((all.counts['declined'] ?? 0) + (all.counts['withdrawn'] ?? 0));
    const told = await list('allergies=true');
    expect(told.rows.length).toBeGreaterThan(0);
    expect(told.rows.every(({ allergies }) => allergies)).toBe(true);
    expect((await baker.get('/api/staff/orders?perPage=1000')).status).toBe(422);
    expect((await baker.get('/api/staff/orders?sort=password')).status).toBe(422);
    expect((await app.visitor().get('/api/staff/orders')).status).toBe(401);
  });
});
