import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import sharp from 'sharp';
import * as z from 'zod/mini';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { photo as photoView } from '#shared/contracts/photos.ts';
import { Closure } from '#api/db/models/closure.ts';
import { firstPriceBook } from '#api/db/seeders/catalogue/price-book.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import type { Order } from '#api/db/models/order.ts';
import { Photo } from '#api/db/models/photo.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Session } from '#api/db/models/session.ts';
import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { hashKey, newId } from '#api/platform/ids.ts';
import { createLogger } from '#api/platform/logger.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';
import { makeOrder } from '#api/testing/factories.ts';
import { formulaDraftOf, ingredientDraftOf } from '#api/testing/pantry-drafts.ts';
import { orderForm } from '#api/testing/order-form.ts';
import {
  addUser,
  setSecondFactorRequired,
  signInCustomer,
  signInStaff,
  staffPassword,
} from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

/*
 * Every route, tried by everybody. A route that is not in the table fails the test, and so does a
 * line without a route. `may` is: not refused for who asks; what it asked for may still be refused
 * (a date gone, a link spent), but nothing may break.
 */

const actors = [
  'visitor',
  'guest of another order',
  'another customer',
  'its customer',
  'counter',
  'baker',
  'owner',
] as const;
type ActorName = (typeof actors)[number];

type Cell = 'may' | 401 | 403 | 404;
type Cells = readonly [Cell, Cell, Cell, Cell, Cell, Cell, Cell];

/** Usual rows; in the order of `actors`. */
const everybody: Cells = ['may', 'may', 'may', 'may', 'may', 'may', 'may'];
const whoeverSignedIn: Cells = [401, 401, 'may', 'may', 'may', 'may', 'may'];
const customers: Cells = [401, 401, 'may', 'may', 403, 403, 403];
const staff: Cells = [401, 401, 403, 403, 'may', 'may', 'may'];
const bakers: Cells = [401, 401, 403, 403, 403, 'may', 'may'];
const owners: Cells = [401, 401, 403, 403, 403, 403, 'may'];
/** Somebody else's order is no order. */
const whoeverSeesIt: Cells = [404, 404, 404, 'may', 'may', 'may', 'may'];
const itsCustomer: Cells = [404, 404, 404, 'may', 403, 403, 403];

/** What a call may speak of; made anew for each cell. */
type Scene = {
  readonly order: Order;
  /** The key of the order's private link. */
  readonly key: string;
  readonly person: User;
  readonly invitation: Token;
  /** A session of whoever asks, if they have an account. */
  readonly session: Session;
  /** A picture of no order yet. */
  readonly photo: Photo;
  readonly allergy: DeclaredAllergy;
  readonly mail: SentMail;
  readonly closure: Closure;
};

type Call = {
  readonly method?: string;
  readonly path: string;
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
};
type Line = {
  readonly call: (scene: Scene) => Call;
  readonly cells: Cells;
  /** Changes or ends the session it is asked with, so it gets one of its own. */
  readonly ownSession?: true;
};

const line = (cells: Cells, call: Line['call'] | string): Line => ({
  cells,
  call: typeof call === 'string' ? () => ({ path: call }) : call,
});
const withOwnSession = (each: Line): Line => ({ ...each, ownSession: true });
const post = (path: string, body?: unknown): Call => ({ method: 'POST', path, body });
const put = (path: string, body?: unknown): Call => ({ method: 'PUT', path, body });
const remove = (path: string): Call => ({ method: 'DELETE', path });

/** Something done to an order by staff, which says which state of it they saw. */
const onOrder =
  (verb: string, body: object = {}): Line['call'] =>
  ({ order }) =>
    post(`/api/staff/orders/${order.number}/${verb}`, { rowVersion: order.rowVersion, ...body });

const token = 'no such key';
const password = 'plum jam on rye toast';
const code = '000000';
const claimKey = 'a key of a picture';
const day = '2027-06-12';
const form = orderForm(day);
const { date: _date, windowStart: _windowStart, ...guests } = form.day;
const { cake, setting, look } = form;
const jam = formulaDraftOf({ raspberries: 1000, 'granulated-sugar': 700 });
const plums = ingredientDraftOf({ name: 'Plums', labelName: 'plums', family: 'fruit' });
const design = { guests, cake, setting, look, extras: [] };

/** A form with a file that is no picture: refused once it has been looked at. */
function notAPicture(): FormData {
  const body = new FormData();
  body.set('photo', new Blob(['not a picture']), 'x.jpg');
  return body;
}

const table: Readonly<Record<string, Line>> = {
  // The same for everybody.
  'describe-api': line(everybody, '/api/openapi.json'),
  'read-api': line(everybody, '/api'),
  'check-health': line(everybody, '/api/health'),
  'check-readiness': line(everybody, '/api/ready'),
  'read-menu': line(everybody, '/api/menu'),
  'estimate-design': line(everybody, () => post('/api/estimates', { design, date: day })),
  'answer-dates': line(everybody, () => post('/api/dates', { design, from: day, to: day })),

  // Coming in, and one's own sessions.
  'get-session': line(everybody, '/api/session'),
  'begin-google': line(everybody, '/api/auth/google'),
  'finish-google': line(everybody, '/api/auth/google/callback'),
  'request-sign-in-link': line(everybody, () =>
    post('/api/session/links', { email: `${newId()}@example.com` }),
  ),
  'look-at-link': line(everybody, () => post('/api/session/links/look', { token })),
  'spend-link': line(everybody, () => post('/api/session/links/use', { token })),
  'request-password-reset': line(everybody, () =>
    post('/api/session/password-resets', { email: `${newId()}@example.com` }),
  ),
  'reset-password': line(everybody, () =>
    post('/api/session/password-resets/use', { token, password }),
  ),
  'accept-invitation': line(everybody, () =>
    post('/api/session/invitations/use', { token, name: 'Somebody', password }),
  ),
  'sign-in-with-password': withOwnSession(
    line(everybody, ({ person }) =>
      post('/api/session/password', { email: person.email, password: staffPassword }),
    ),
  ),
  'sign-out': withOwnSession(line(everybody, () => remove('/api/session'))),
  'pass-second-factor': line(staff, () => post('/api/session/second-factor', { code })),
  'enrol-second-factor': line(staff, () => post('/api/session/second-factor/enrolment')),
  'confirm-second-factor': line(staff, () =>
    post('/api/session/second-factor/enrolment/confirm', { code }),
  ),
  'remove-second-factor': line(staff, () => post('/api/session/second-factor/removal', { code })),
  'change-password': line(staff, () =>
    post('/api/account/password', { password: 'not the one', newPassword: password }),
  ),
  'list-sessions': line(whoeverSignedIn, '/api/account/sessions'),
  'end-session': line(whoeverSignedIn, ({ session }) =>
    remove(`/api/account/sessions/${session.sid}`),
  ),

  // A customer's account.
  'see-account': line(customers, '/api/account'),
  'export-account': line(customers, '/api/account/export'),
  'request-erasure': line(customers, () => post('/api/account/erasure', { sure: true })),

  // Orders, as their customers have them.
  'submit-order': line(['may', 'may', 'may', 'may', 403, 'may', 'may'], () => ({
    ...post('/api/orders', form),
    headers: { [idempotencyHeader]: newId() },
  })),
  'open-private-link': withOwnSession(
    line(everybody, ({ order, key }) => post('/api/order-access', { code: order.code, key })),
  ),
  'see-order': line(whoeverSeesIt, ({ order }) => ({ path: `/api/orders/${order.code}` })),
  'withdraw-order': line(itsCustomer, ({ order }) =>
    post(`/api/orders/${order.code}/withdraw`, { rowVersion: order.rowVersion, reason: '' }),
  ),
  // Nothing was lifted on this order, which its customer alone is told.
  'accept-lifted-stop': line([404, 404, 404, 404, 403, 403, 403], ({ order }) =>
    post(`/api/orders/${order.code}/accept-lifted-stop`, {
      rowVersion: order.rowVersion,
      liftedStopId: newId(),
    }),
  ),
  'write-message': line(itsCustomer, ({ order }) =>
    post(`/api/orders/${order.code}/messages`, { body: 'With less sugar, please.' }),
  ),
  'see-calendar-file': line([404, 404, 404, 404, 404, 404, 404], ({ order }) => ({
    // Not confirmed, so there is nothing to put into a calendar for anybody.
    path: `/api/orders/${order.code}/calendar.ics`,
  })),

  // Labels and care cards. The order is not confirmed, so its care card is nobody's yet.
  'see-labels': line(staff, ({ order }) => ({ path: `/api/staff/orders/${order.number}/labels` })),
  'print-labels': line(staff, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/labels.pdf?paper=a4`,
  })),
  'confirm-unknown': line(owners, ({ order }) =>
    post(`/api/staff/orders/${order.number}/labels/confirm-unknown`, { sentences: [] }),
  ),
  'print-care-card': line(staff, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/care-card.pdf`,
  })),
  'see-care-card': line([404, 404, 404, 404, 404, 404, 404], ({ order }) => ({
    path: `/api/orders/${order.code}/care-card.pdf`,
  })),
  'see-cake-care': line([404, 404, 404, 404, 404, 404, 404], ({ order }) => ({
    path: `/api/care/${order.careCode ?? ''}`,
  })),

  // Pictures.
  'upload-photo': line(everybody, () => post('/api/photos', notAPicture())),
  'add-order-photo': line(itsCustomer, ({ order }) =>
    post(`/api/orders/${order.code}/photos`, notAPicture()),
  ),
  'add-staff-photo': line(staff, ({ order }) =>
    post(`/api/staff/orders/${order.number}/photos`, notAPicture()),
  ),
  'see-photo': line(whoeverSeesIt, () => ({ path: `/api/photos/${orderPhotoId}/400` })),
  'remove-photo': line(everybody, ({ photo }) =>
    remove(`/api/photos/${photo.id}?key=${encodeURIComponent(claimKey)}`),
  ),

  // Orders, as staff have them.
  'list-orders': line(staff, '/api/staff/orders'),
  'see-staff-order': line(staff, ({ order }) => ({ path: `/api/staff/orders/${order.number}` })),
  'look-at-confirmation': line(bakers, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/confirmation`,
  })),
  'confirm-order': line(bakers, onOrder('confirm')),
  'decline-order': line(bakers, onOrder('decline', { reason: 'We are full.', offerDates: false })),
  'move-order': line(bakers, onOrder('move', { date: day, windowStart: 600, note: '' })),
  'answer-dates-to-move': line(bakers, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/dates?from=${day}&to=${day}`,
  })),
  'start-order': line(bakers, onOrder('start')),
  'mark-order-ready': line(staff, onOrder('ready')),
  'collect-order': line(
    staff,
    onOrder('collected', { collectedBy: 'Ada Tarn', condition: '', photoId: null }),
  ),
  'mark-order-uncollected': line(staff, onOrder('uncollected')),
  'answer-allergy': line(bakers, (scene) =>
    onOrder(`allergies/${scene.allergy.id}/answer`, { text: 'We talked.' })(scene),
  ),
  // No stop stands on this order, which bakers and the owner alone are told.
  'record-talk': line(
    [401, 401, 403, 403, 403, 404, 404],
    onOrder('talks', { about: 'heat', text: 'We talked.' }),
  ),
  // No stop stands on this order, which the owner alone is told.
  'lift-stop': line(
    [401, 401, 403, 403, 403, 403, 404],
    onOrder('lift-stop', { about: 'egg', reason: 'We talked.' }),
  ),
  // Nothing has changed in this order, which the staff alone are told.
  'acknowledge-contents': line(
    [401, 401, 403, 403, 403, 404, 404],
    onOrder('contents/none/acknowledge', { note: '' }),
  ),
  'tell-contents': line(
    [401, 401, 403, 403, 404, 404, 404],
    onOrder('contents/none/told', { how: 'By phone.' }),
  ),
  'renew-link': line(staff, onOrder('link')),
  'read-messages': line(staff, ({ order }) =>
    post(`/api/staff/orders/${order.number}/messages/read`),
  ),
  'write-staff-message': line(staff, onOrder('messages', { body: 'See you on Saturday.' })),
  'see-mail': line(staff, ({ mail }) => ({ path: `/api/staff/mail/${mail.id}` })),
  'send-mail-again': line(staff, ({ mail }) => post(`/api/staff/mail/${mail.id}/send-again`)),
  'see-kitchen-sheet': line(bakers, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/kitchen`,
  })),
  'see-order-cost': line(owners, ({ order }) => ({
    path: `/api/staff/orders/${order.number}/cost`,
  })),
  'plan-eggs': line(bakers, `/api/staff/eggs?from=${day}&to=${day}`),
  'plan-shopping': line(bakers, `/api/staff/shopping?from=${day}&to=${day}`),
  'see-calendar': line(staff, `/api/staff/calendar?from=${day}&to=${day}`),
  'block-day': line(bakers, () =>
    post('/api/staff/closures', { date: '2027-12-25', reason: 'Holiday' }),
  ),
  'open-day': line(bakers, ({ closure }) => remove(`/api/staff/closures/${closure.id}`)),

  // The people of the studio.
  'list-people': line(owners, '/api/staff/people'),
  'invite-staff': line(owners, () =>
    post('/api/staff/people/invitations', {
      email: `${newId()}@example.com`,
      name: 'Somebody New',
      role: 'counter',
    }),
  ),
  'send-invitation-again': line(owners, ({ invitation }) =>
    post(`/api/staff/people/${invitation.id}/invitation`),
  ),
  'change-role': line(owners, ({ person }) =>
    put(`/api/staff/people/${person.id}/role`, { role: 'counter' }),
  ),
  'end-role': line(owners, ({ person }) => remove(`/api/staff/people/${person.id}`)),

  // What the studio takes, talks over and refuses.
  'see-allergy-table': line(owners, '/api/staff/allergy-table'),
  // Made from a table that is not the present one, which the owner alone is told.
  'save-allergy-table': line(owners, () =>
    put('/api/staff/allergy-table', {
      version: 'another',
      rules: [],
      kitchen: [],
      kitchenNotice: 'One kitchen.',
      homeKitchenText: '',
      eggAdvisory: 'Raw egg can make people ill.',
    }),
  ),

  // Every figure the kitchen goes by; made from others than the present ones, as above.
  'see-kitchen-rules': line(owners, '/api/staff/kitchen-rules'),
  'save-kitchen-rules': line(owners, () =>
    put('/api/staff/kitchen-rules', {
      version: 'another',
      rules: {},
      altitudeM: 0,
      monthlyWarmestC: Array.from({ length: 12 }, () => 20),
      dessertFactorPpm: 700_000,
      wordsPer100Mm: 13,
    }),
  ),

  // Formulas and ingredients: refused for what they ask, once it is known who asks.
  'load-pantry': line(bakers, '/api/pantry'),
  'create-formula': line(bakers, () =>
    post('/api/pantry/formulas', { kind: 'filling', name: `Jam ${newId()}`, draft: jam }),
  ),
  'save-formula': line(bakers, () =>
    post('/api/pantry/formulas/raspberry-jam/versions', {
      basedOn: 'another',
      name: 'Raspberry jam',
      draft: jam,
    }),
  ),
  'archive-formula': line(bakers, () => post('/api/pantry/formulas/raspberry-jam/archive')),
  'restore-formula': line(bakers, () => post('/api/pantry/formulas/raspberry-jam/restore')),
  'create-ingredient': line(bakers, () =>
    post('/api/pantry/ingredients', {
      basedOn: null,
      draft: { ...plums, name: `Plums ${newId()}` },
    }),
  ),
  'save-ingredient': line(bakers, () =>
    put('/api/pantry/ingredients/raspberries', { basedOn: null, draft: plums }),
  ),
  'archive-ingredient': line(bakers, () => post('/api/pantry/ingredients/raspberries/archive')),
  'restore-ingredient': line(bakers, () => post('/api/pantry/ingredients/raspberries/restore')),

  // What things cost.
  'see-prices': line(owners, '/api/staff/prices'),
  // Made from a book that is not the newest, which the owner alone is told.
  'save-prices': line(owners, () =>
    put('/api/staff/prices', { madeFrom: 0, content: firstPriceBook }),
  ),
};

const emails: Partial<Record<ActorName, string>> = {
  'another customer': 'another@example.com',
  'its customer': 'its@example.com',
};

let app: TestApp;
/** A picture of an order of its customer's. */
let orderPhotoId: string;
const users = new Map<ActorName, User>();
const browsers = new Map<ActorName, TestClient>();

async function comeIn(actor: ActorName): Promise<TestClient> {
  // Signing in many times from one place within a minute is not what is tried here.
  app.clock.advance({ minutes: 1 });
  const email = emails[actor];
  if (email !== undefined) return signInCustomer(app, email);
  const user = users.get(actor);
  if (user !== undefined) return signInStaff(app, user);
  const client = app.visitor();
  if (actor === 'guest of another order') {
    const { order, key } = await makeLinkedOrder(null);
    await client.post('/api/order-access', { code: order.code, key });
  }
  return client;
}

async function makeLinkedOrder(customerUserId: string | null) {
  const id = newId();
  const key = privateKeyOf(app.env.sessionSecret, { id, keyRenewedAt: null });
  const order = await makeOrder({ order: { id, customerUserId, privateKeyHash: hashKey(key) } });
  return { order, key };
}

async function makeScene(actor: ActorName): Promise<Scene> {
  const { order, key } = await makeLinkedOrder(users.get('its customer')?.id ?? null);
  const person = await addUser('baker', { email: `${newId()}@oxbowlane.example` });
  const later = new Date(app.clock.now().getTime() + 86_400_000);
  return inTransaction(async () => ({
    order,
    key,
    person,
    invitation: await Token.create({
      hash: newId(),
      purpose: 'invitation',
      email: `${newId()}@example.com`,
      role: 'counter',
      data: { name: 'Somebody' },
      expiresAt: later,
    }),
    session: await Session.create({
      sid: newId(),
      userId: users.get(actor)?.id ?? null,
      data: '{}',
      expires: later,
      absoluteExpiresAt: later,
    }),
    allergy: await DeclaredAllergy.create({
      revisionId: order.currentRevisionId ?? '',
      position: 0,
      allergen: 'egg',
      severity: 'allergy',
      guests: 1,
    }),
    closure: await Closure.create({
      fromDate: '2027-12-24',
      toDate: '2027-12-24',
      kind: 'blocked',
      reason: 'Holiday',
    }),
    mail: await SentMail.create({
      template: 'order-received',
      orderId: order.id,
      fromAddress: 'hello@oxbowlane.example',
      toAddress: 'ada@example.com',
      subject: 'Your order',
      html: '<p>Thank you.</p>',
      text: 'Thank you.',
      attachments: [],
      messageId: `<${newId()}@oxbowlane.example>`,
      uniqueKey: newId(),
      state: 'sent',
      nextAt: app.clock.now(),
      sentAt: app.clock.now(),
    }),
    photo: await Photo.create({
      kind: 'inspiration',
      claimKeyHash: hashKey(claimKey),
      width: 10,
      height: 10,
      palette: [],
      files: [],
      originalType: 'image/png',
      bytes: 1,
    }),
  }));
}

async function addOrderPhoto(): Promise<string> {
  const { order } = await makeLinkedOrder(users.get('its customer')?.id ?? null);
  const bytes = await sharp({
    create: { width: 40, height: 30, channels: 3, background: '#c08457' },
  })
    .png()
    .toBuffer();
  const body = new FormData();
  body.set('photo', new Blob([new Uint8Array(bytes)], { type: 'image/png' }), 'cake.png');
  const client = browsers.get('its customer') ?? app.visitor();
  const answer = await client.post(`/api/orders/${order.code}/photos`, body);
  return z.parse(photoView, answer.body).id;
}

beforeAll(async () => {
  app = await startTestApp({
    clock: new TestClock('2027-05-03T12:00:00Z'),
    seeded: seededStudio,
    env: () => ({ GOOGLE_CLIENT_ID: 'studio', GOOGLE_CLIENT_SECRET: 'a secret' }),
    logger: createLogger('error'),
  });
  await setSecondFactorRequired(false);
  for (const role of ['counter', 'baker', 'owner'] as const) users.set(role, await addUser(role));
  for (const actor of actors) browsers.set(actor, await comeIn(actor));
  for (const [actor, email] of [
    ['another customer', 'another@example.com'],
    ['its customer', 'its@example.com'],
  ] as const) {
    users.set(actor, await User.findOne({ where: { email }, rejectOnEmpty: true }));
  }
  orderPhotoId = await addOrderPhoto();
});
afterAll(() => app.close());

describe('roles and routes', () => {
  it('has every route in the table, and no line without a route', () => {
    const names = app.app.declared.map(({ name }) => name);
    expect(Object.keys(table).sort()).toEqual([...names].sort());
  });

  it.each(Object.keys(table))('%s', async (name) => {
    const { call, cells, ownSession } = table[name] ?? line(everybody, '/');
    const contract = app.app.declared.find((each) => each.name === name);
    const found: Record<string, number | string> = {};
    for (const actor of actors) {
      const scene = await makeScene(actor);
      const { method = 'GET', path, body, headers } = call(scene);
      const pattern = (contract?.path ?? '').replaceAll(/:\w+/g, '[^/]+');
      expect(`${method.toLowerCase()} ${path.split('?')[0]}`).toMatch(
        new RegExp(`^${contract?.method} ${pattern}$`),
      );
      const client = ownSession ? await comeIn(actor) : (browsers.get(actor) ?? app.visitor());
      const { status, text } = await client.send(method, path, { body, headers });
      found[actor] = cellOf(status) ?? `${status} ${text.slice(0, 200)}`;
    }
    expect(found).toEqual(Object.fromEntries(actors.map((actor, n) => [actor, cells[n]])));
  });
});

/** Null where something broke. */
function cellOf(status: number): Cell | null {
  if (status === 401 || status === 403 || status === 404) return status;
  // Not ready is an answer too: no worker runs here.
  return status < 500 || status === 503 ? 'may' : null;
}
