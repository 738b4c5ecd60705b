import fc from 'fast-check';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { orderView, submitOrder, submittedOrder } from '#shared/contracts/orders.ts';
import { validate } from '#api/http/validate.ts';
import { Consent } from '#api/db/models/consent.ts';
import { DeclaredAllergy } from '#api/db/models/declared-allergy.ts';
import { Hold } from '#api/db/models/hold.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { OrderItem } from '#api/db/models/order-item.ts';
import { Order } from '#api/db/models/order.ts';
import { Task } from '#api/db/models/task.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';
import { AppError } from '#api/platform/app-error.ts';
import { newId } from '#api/platform/ids.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';
import { orderForm, placeOrder, roundTier, sendOrder } from '#api/testing/order-form.ts';
import { signInCustomer } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import { TestClock } from '#api/testing/test-clock.ts';

// A Monday, early enough that any day of the month after has notice.
const monday = '2027-05-03T12:00:00Z';
let app: TestApp;
/** Saturdays from 22 May 2027, a new one for each test that sends. */
let date: string;
let week = 0;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock(monday), seeded: seededStudio });
});
afterAll(() => app.close());
beforeEach(() => {
  app.clock.advance({ days: 0, hours: 1 });
  week += 1;
  date = new Date(Date.UTC(2027, 4, 18 + week)).toISOString().slice(0, 10);
  // Pickups are from Tuesday to Saturday.
  while ([0, 1].includes(new Date(date).getUTCDay())) {
    week += 1;
    date = new Date(Date.UTC(2027, 4, 18 + week)).toISOString().slice(0, 10);
  }
});

const fromNewAddress = () => ({ you: { email: `${newId()}@example.com` } });
const refused = (body: unknown) => problem.parse(body);
const paths = (body: unknown) => refused(body).issues?.map(({ path }) => path.join('.'));

describe('sending an order', () => {
  it('writes it whole: rows, place, hold, event, e-mails, and shows it to its sender', async () => {
    const guest = app.visitor();
    const form = orderForm(date, {
      day: {
        allergies: [
          {
            allergen: 'tree-nuts',
            species: 'almond',
            text: '',
            severity: 'intolerance',
            guests: 1,
          },
          { allergen: null, species: null, text: 'kiwi', severity: 'allergy', guests: 2 },
        ],
        diets: ['no-alcohol'],
        infants: true,
      },
      cake: {
        tiers: [
          roundTier(10, { spongeId: 'lemon', fillingId: 'lemon-curd' }),
          roundTier(8, {
            coating: {
              covering: 'fondant',
              style: 'italian',
              finish: 'textured',
              colour: '#cfe3f5',
            },
          }),
          roundTier(6, { real: false, spongeId: null, fillingId: null }),
        ],
      },
      look: {
        palette: ['#cfe3f5', '#ffffff'],
        words: [
          { tier: 0, text: 'Ana' },
          { tier: 0, text: 'and Bo' },
        ],
        decorations: [
          {
            decorationId: 'sugar-flower',
            tier: 1,
            quantity: 5,
            colour: '#f2b632',
            source: 'studio',
          },
          {
            decorationId: 'fresh-flowers',
            tier: null,
            quantity: 1,
            colour: null,
            source: 'florist',
          },
        ],
        note: 'Like the dress.\nNot too sweet.',
      },
      extras: [{ extraId: 'candles', quantity: 2 }],
      you: {
        email: 'ana@example.com',
        name: '🎂 עלמה',
        otherCollects: true,
        collectorName: 'Bo',
        collectorPhone: '+1 607 555 0190',
      },
      consents: { allergyData: true },
    });
    const answer = await sendOrder(guest, form);
    expect(answer.status).toBe(201);
    const sent = submittedOrder.parse(answer.body);
    expect(sent.hold).toEqual({
      expiresAt: new Date(app.clock.now().getTime() + 30 * 60_000).toISOString(),
      needsLink: true,
    });
    const order = await Order.findOne({ where: { code: sent.code }, rejectOnEmpty: true });
    expect(order).toMatchObject({ status: 'asked', pickupDate: date, dateAnswer: 'open' });
    expect(await hasPlace(order.id)).toBe(true);
    expect(await Hold.count({ where: { orderId: order.id, releasedAt: null } })).toBe(1);
    const events = await OrderEvent.findAll({ where: { orderId: order.id } });
    expect(events.map(({ kind, toStatus }) => [kind, toStatus])).toEqual([['submitted', 'asked']]);
    const outbox = await OutboxRow.findAll({ where: { orderId: order.id } });
    expect(outbox.map(({ kind }) => kind)).toEqual(['order-asked']);
    const consents = await Consent.findAll({ where: { orderId: order.id } });
    expect(consents.filter((it) => it.kind === 'show-photos').map((it) => it.given)).toEqual([
      false,
    ]);
    expect(consents.some((it) => it.kind === 'allergy-data' && it.given)).toBe(true);

    const seen = await guest.get(`/api/orders/${sent.code}`);
    expect(seen.status).toBe(200);
    const view = orderView.parse(seen.body);
    const { date: _date, windowStart: _start, ...guests } = form.day;
    expect(view.design).toEqual({
      guests,
      cake: form.cake,
      setting: form.setting,
      look: form.look,
      extras: form.extras,
    });
    expect(view).toMatchObject({
      stage: 'received',
      orderedBy: { name: '🎂 עלמה', email: 'ana@example.com' },
      collector: { name: 'Bo', phone: '+1 607 555 0190' },
      pickup: { date, start: 600, minutes: 30, zone: 'America/New_York' },
      can: { withdraw: true, write: true, addPhotos: true, seeCalendarFile: false },
    });
    expect(view.pickup.startAt).toBe(`${date}T14:00:00.000Z`);
  });

  it('keeps cutting cakes as items of their own, and plans and prices them', async () => {
    const cut = { sizeId: 'quarter', layers: 2, spongeId: 'lemon', fillingId: 'lemon-curd' };
    const form = orderForm(date, {
      day: { headCount: 60 },
      cake: { tiers: [roundTier(8)], cuttingCakes: [{ ...cut, count: 2 }] },
      extras: [{ extraId: 'candles', quantity: 1 }],
      ...fromNewAddress(),
    });
    const guest = app.visitor();
    const { code } = await placeOrder(guest, form);
    const { design, offer } = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    expect(design.cake).toEqual(form.cake);
    expect(design.extras).toEqual(form.extras);
    // A quarter sheet of 330 by 229 mm gives 6 by 4.
    expect(offer.portions).toMatchObject({ fed: 25 + 48, perCuttingCake: [48] });
    expect(offer.price.lines.filter((it) => it.kind === 'cutting-cake')).toHaveLength(1);
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    const items = await OrderItem.findAll({
      where: { revisionId: order.currentRevisionId ?? '' },
      order: [['position', 'ASC']],
    });
    expect(items.map(({ kind, quantity, sheetSizeId }) => [kind, quantity, sheetSizeId])).toEqual([
      ['tiered', 1, null],
      ['cutting', 2, 'quarter'],
      ['extra', 1, null],
    ]);
    const tasks = await Task.findAll({ where: { orderId: order.id } });
    expect(tasks.map(({ label }) => label)).toContain('Fill and crumb coat 2 cutting cakes');
  });

  it('takes a form of before there were cutting cakes, and refuses a sheet it does not bake', async () => {
    const form = orderForm(date, fromNewAddress());
    const { cuttingCakes: _none, ...cake } = form.cake;
    const answer = await sendOrder(app.visitor(), { ...form, cake });
    expect(answer.status).toBe(201);
    const unknown = orderForm(date, {
      cake: {
        cuttingCakes: [
          { sizeId: 'cartwheel', count: 1, layers: 2, spongeId: 'lemon', fillingId: null },
        ],
      },
      ...fromNewAddress(),
    });
    const refusal = await sendOrder(app.visitor(), unknown);
    expect(refusal.status).toBe(422);
    expect(paths(refusal.body)).toContain('cake.cuttingCakes.0.sizeId');
  });

  it('keeps no key, and none in the outbox; the e-mailed one can be worked out again', async () => {
    const { code, key } = await placeOrder(app.visitor(), orderForm(date, fromNewAddress()));
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    const rows = JSON.stringify([order, await OutboxRow.findAll({ where: { orderId: order.id } })]);
    const linkKey = privateKeyOf(app.env.sessionSecret, order);
    for (const secret of [key, linkKey]) expect(rows).not.toContain(secret);
    expect(linkKey).not.toBe(key);

    const other = app.visitor();
    expect((await other.get(`/api/orders/${code}`)).status).toBe(404);
    expect((await other.post('/api/order-access', { code, key: 'wrong' })).status).toBe(404);
    expect((await other.post('/api/order-access', { code, key })).status).toBe(200);
    expect((await other.get(`/api/orders/${code}`)).status).toBe(200);
    expect((await order.reload()).linkOpenedAt).toBeNull();
  });

  it('keeps a guest’s place longer once the link in the e-mail is opened', async () => {
    const { code } = await placeOrder(app.visitor(), orderForm(date, fromNewAddress()));
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    const reader = app.visitor();
    const key = privateKeyOf(app.env.sessionSecret, order);
    expect((await reader.post('/api/order-access', { code, key })).status).toBe(200);
    const view = orderView.parse((await reader.get(`/api/orders/${code}`)).body);
    expect(view.hold).toEqual({
      expiresAt: new Date(app.clock.now().getTime() + 48 * 3_600_000).toISOString(),
      needsLink: false,
    });
  });

  it('is one order under one key, twice in turn and twice at once', async () => {
    const guest = app.visitor();
    const form = orderForm(date, fromNewAddress());
    const key = newId();
    const [one, two] = await Promise.all([
      sendOrder(guest, form, key),
      sendOrder(guest, form, key),
    ]);
    const three = await sendOrder(guest, form, key);
    expect([one.status, two.status, three.status]).toEqual([201, 201, 201]);
    expect(two.body).toEqual(one.body);
    expect(three.body).toEqual(one.body);
    expect(await OrderContact.count({ where: { email: form.you.email } })).toBe(1);
  });

  it('refuses the key for something else', async () => {
    const guest = app.visitor();
    const key = newId();
    const form = orderForm(date, fromNewAddress());
    await sendOrder(guest, form, key);
    const other = await sendOrder(
      guest,
      { ...form, extras: [{ extraId: 'candles', quantity: 1 }] },
      key,
    );
    expect(other.status).toBe(409);
    expect(refused(other.body).code).toBe('key-reused');
    expect((await guest.post('/api/orders', form)).status).toBe(400);
  });

  it('belongs to the account of a signed-in customer, who needs no link', async () => {
    const customer = await signInCustomer(app, 'iris@example.com');
    const sent = await placeOrder(
      customer,
      orderForm(date, { you: { email: 'iris@example.com' } }),
    );
    expect(sent).toMatchObject({ key: null, hold: { needsLink: false } });
    expect((await customer.get(`/api/orders/${sent.code}`)).status).toBe(200);
  });

  it('answers a price that has changed with the new estimate', async () => {
    const answer = await sendOrder(app.visitor(), orderForm(date, { seenTotalMinor: 1 }));
    expect(answer.status).toBe(409);
    const { code, facts } = refused(answer.body);
    expect(code).toBe('price-changed');
    expect(facts?.['estimate']).toMatchObject({ price: { currency: 'USD' } });
  });

  it.each([
    ['past', '2027-04-01'],
    ['tomorrow, too soon', '2027-05-05'],
    ['a closed Sunday', '2027-05-30'],
    ['years ahead', '2031-05-30'],
  ])('answers a day that is %s with the nearest open ones', async (_what, day) => {
    const answer = await sendOrder(app.visitor(), orderForm(day, fromNewAddress()));
    expect([answer.status, refused(answer.body).code]).toEqual([409, 'date-gone']);
    expect(paths(answer.body)).toEqual(['day.date']);
  });

  it('refuses a fourth unanswered place for one address', async () => {
    const you = { email: 'eager@example.com' };
    for (let n = 0; n < 3; n += 1) {
      await placeOrder(app.visitor(), orderForm(date, { you, day: { windowStart: 600 + 30 * n } }));
    }
    const fourth = await sendOrder(
      app.visitor(),
      orderForm(date, { you, day: { windowStart: 690 } }),
    );
    expect([fourth.status, refused(fourth.body).code]).toEqual([429, 'too-many-holds']);
  });

  it('refuses unknown ids at the field that names them', async () => {
    const answers = await Promise.all([
      sendOrder(app.visitor(), orderForm(date, { day: { occasionId: 'coronation' } })),
      sendOrder(
        app.visitor(),
        orderForm(date, { cake: { tiers: [roundTier(8, { spongeId: 'mud' })] } }),
      ),
      sendOrder(app.visitor(), orderForm(date, { extras: [{ extraId: 'pony', quantity: 1 }] })),
      sendOrder(
        app.visitor(),
        orderForm(date, { photos: [{ id: newId(), claimKey: 'x', note: '' }] }),
      ),
    ]);
    expect(answers.map(({ status }) => status)).toEqual([422, 422, 422, 422]);
    expect(answers.map(({ body }) => paths(body))).toEqual([
      ['day.occasionId'],
      ['cake.tiers.0.spongeId'],
      ['extras.0.extraId'],
      ['photos.0.id'],
    ]);
  });

  it('refuses 0 and 10,000 guests, nine photos, and what does not go together', async () => {
    const photos = Array.from({ length: 9 }, () => ({ id: newId(), claimKey: 'x', note: '' }));
    const answers = await Promise.all([
      sendOrder(app.visitor(), orderForm(date, { day: { headCount: 0 } })),
      sendOrder(app.visitor(), orderForm(date, { day: { headCount: 10_000 } })),
      sendOrder(app.visitor(), orderForm(date, { photos })),
      sendOrder(
        app.visitor(),
        orderForm(date, {
          cake: {
            coating: { covering: 'semi-naked', style: 'swiss', finish: 'piped', colour: null },
          },
        }),
      ),
      sendOrder(
        app.visitor(),
        orderForm(date, {
          look: {
            decorations: [
              { decorationId: 'figure', tier: 0, quantity: 1, colour: null, source: 'florist' },
            ],
          },
        }),
      ),
    ]);
    expect(answers.map(({ status }) => status)).toEqual([422, 422, 422, 422, 422]);
    expect(answers.map(({ body }) => paths(body))).toEqual([
      ['day.headCount'],
      ['day.headCount'],
      ['photos'],
      ['cake.coating.finish'],
      ['look.decorations.0.source'],
    ]);
  });

  it('refuses words that do not fit their tier, at the words', async () => {
    const words = [{ tier: 0, text: 'Happy ninety-ninth birthday, Wendy' }];
    const answer = await sendOrder(app.visitor(), orderForm(date, { look: { words } }));
    expect(answer.status).toBe(422);
    expect(paths(answer.body)).toEqual(['look.words.0.text']);
  });

  it('refuses every field left empty, each by its path', async () => {
    const answer = await sendOrder(app.visitor(), {});
    expect(answer.status).toBe(422);
    expect(paths(answer.body)).toEqual(
      expect.arrayContaining(['day', 'cake', 'setting', 'look', 'you', 'consents']),
    );
  });

  it('needs consent where an allergy is told', async () => {
    const answer = await sendOrder(
      app.visitor(),
      orderForm(date, {
        day: {
          allergies: [{ allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 }],
        },
      }),
    );
    expect(paths(answer.body)).toEqual(['consents.allergyData']);
    expect(await DeclaredAllergy.count({ where: { allergen: 'egg' } })).toBe(0);
  });

  it('never breaks, whatever is sent', async () => {
    const whole: unknown = orderForm(date);
    const bodies = fc.oneof(
      fc.json(),
      fc.jsonValue().map((value) => JSON.stringify(value)),
      fc
        .tuple(
          fc.constantFrom('day', 'cake', 'setting', 'look', 'you', 'photos', 'extras'),
          fc.jsonValue(),
        )
        .map(([field, value]) => JSON.stringify(Object.assign({}, whole, { [field]: value }))),
    );
    // Over HTTP a few, since each costs a request; against the same parsing all the rest.
    await fc.assert(
      fc.asyncProperty(bodies, async (body) => {
        const answer = await sendOrder(app.visitor(), body);
        expect(answer.status, answer.text).toBeLessThan(500);
      }),
      { numRuns: 25 },
    );
    fc.assert(
      fc.property(bodies, (body) => {
        try {
          validate(submitOrder, JSON.parse(body));
        } catch (error) {
          expect(error).toBeInstanceOf(AppError);
        }
      }),
      { numRuns: 2000 },
    );
  });
});
