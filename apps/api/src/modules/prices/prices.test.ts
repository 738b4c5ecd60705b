import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { menu as menuContract, type Menu } from '#shared/contracts/menu.ts';
import { orderView } from '#shared/contracts/orders.ts';
import { pricesView, type PriceBookContent, type PricesView } from '#shared/contracts/prices.ts';
import { Audit } from '#api/db/models/audit.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { Quote } from '#api/db/models/quote.ts';
import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import {
  addUser,
  setSecondFactorRequired,
  signInCustomer,
  signInStaff,
} from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

const day = '2027-06-12';
let app: TestApp;
let owner: TestClient;

const start = async () => {
  app = await startTestApp({
    clock: new TestClock('2027-05-03T12:00:00Z'),
    seeded: seededStudio,
  });
  await setSecondFactorRequired(false);
  owner = await signInStaff(app, await addUser('owner', { name: 'Ida Calloway' }));
};

const view = (answer: Answer): PricesView => z.parse(pricesView, answer.body);
const see = async () => view(await owner.get('/api/staff/prices'));
const save = (madeFrom: number, content: unknown) =>
  owner.put('/api/staff/prices', { madeFrom, content });
const readMenu = async (): Promise<Menu> => {
  app.clock.advance({ minutes: 1 });
  return z.parse(menuContract, (await app.visitor().get('/api/menu')).body);
};
const dearer = (content: PriceBookContent): PriceBookContent => ({
  ...content,
  tierBands: content.tierBands.map((it) => ({
    ...it,
    perPortionMinor: it.perPortionMinor + 100,
  })),
});

describe('the price book', () => {
  beforeAll(start);
  afterAll(() => app.close());

  it('is read with the names of what it prices and the books before it', async () => {
    const prices = await see();
    expect(prices).toMatchObject({ n: 1, currencyFixed: false });
    expect(prices.sponges.map(({ id }) => id)).toContain('honey');
    expect(prices.decorations.find(({ id }) => id === 'figure')).toMatchObject({
      minutes: 75,
      materialsCostMinor: 340,
      per: 'piece',
    });
    expect(prices.versions).toEqual([expect.objectContaining({ n: 1, by: null, orders: 0 })]);
  });

  it('becomes the next version when it is saved, which the menu goes by at once', async () => {
    const before = await see();
    const { content } = before;
    const changed = {
      ...dearer(content),
      spongeSurcharges: { ...content.spongeSurcharges, honey: 45 },
      decorationPrices: { figure: 6000 },
    };
    const after = view(await save(before.n, changed));
    expect(after.n).toBe(before.n + 1);
    expect(after.content).toEqual(changed);
    expect(after.versions[0]).toMatchObject({
      n: after.n,
      by: 'Ida Calloway',
      since: app.clock.now().toISOString(),
    });
    const menu = await readMenu();
    expect(menu.priceBook.versionId).toBe(after.versionId);
    expect(menu.priceBook.tierBands[0]?.perPortionMinor).toBe(640);
    expect(menu.sponges.find(({ id }) => id === 'honey')?.surchargePerPortionMinor).toBe(45);
    expect(menu.decorations.find(({ id }) => id === 'figure')?.priceMinor).toBe(6000);
    // The rest by minutes and materials: 30 min at 42.00 an hour, 2.00 and a third, to the 0.50.
    expect(menu.decorations.find(({ id }) => id === 'fresh-flowers')?.priceMinor).toBe(2350);
    const kept = await PriceBookVersion.findOne({ where: { n: before.n } });
    expect(kept?.content).toEqual(content);
    expect(
      await Audit.count({ where: { action: 'save-prices', subjectId: after.versionId } }),
    ).toBe(1);
  });

  it('stays the version it is when nothing has changed', async () => {
    const { n, content } = await see();
    expect(view(await save(n, content)).n).toBe(n);
  });

  it('is not written over somebody else’s', async () => {
    const { n, content } = await see();
    await save(n, dearer(content));
    const late = await save(n, { ...content, wordsMinor: 5 });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ code: 'changed-meanwhile', facts: { n: n + 1 } });
    expect((await see()).content.wordsMinor).not.toBe(5);
  });

  it('goes on through two saves at the same moment, one of them refused', async () => {
    const { n, content } = await see();
    const answers = await Promise.all([
      save(n, { ...content, wordsMinor: 1300 }),
      save(n, { ...content, wordsMinor: 1400 }),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect((await see()).n).toBe(n + 1);
  });
});

describe('a price book with something wrong in it', () => {
  let good: PriceBookContent;
  let n: number;
  beforeAll(async () => {
    await start();
    ({ content: good, n } = await see());
  });
  afterAll(() => app.close());

  const bands = (...upTo: readonly number[]) =>
    upTo.map((upToMm) => ({ upToMm, perPortionMinor: 500 }));

  it.each<[string, Partial<PriceBookContent>, (string | number)[]]>([
    ['an amount below nothing', { wordsMinor: -1 }, ['wordsMinor']],
    ['a fraction of a cent', { minimumMinor: 65.5 }, ['minimumMinor']],
    ['no bands', { tierBands: [] }, ['tierBands']],
    ['bands that do not rise', { tierBands: bands(160, 160) }, ['tierBands', 1, 'upToMm']],
    [
      'notice that does not rise',
      { rush: [8, 4].map((underDays) => ({ underDays, addPpm: 100_000 })) },
      ['rush', 1, 'underDays'],
    ],
    [
      'two taxes on one kind of goods',
      { taxes: ['A', 'B'].map((name) => ({ category: 'cake', name, ratePpm: 0 })) },
      ['taxes', 1, 'category'],
    ],
    [
      'two prices for one finish',
      { finishes: [1, 2].map((perPortionMinor) => ({ id: 'piped', perPortionMinor })) },
      ['finishes', 1, 'id'],
    ],
    ['a step of nothing', { roundToMinor: 0 }, ['roundToMinor']],
    ['a deposit of more than all', { depositPpm: 1_000_001 }, ['depositPpm']],
    [
      'a sponge that is not there',
      { spongeSurcharges: { stone: 1 } },
      ['spongeSurcharges', 'stone'],
    ],
    ['a currency that is none', { currency: 'QQQ' }, ['currency']],
  ])('is refused at its place: %s', async (_, change, path) => {
    const answer = await save(n, { ...good, ...change });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ issues: [{ path: ['content', ...path] }] });
    expect((await see()).n).toBe(n);
  });
});

describe('orders and the price book', () => {
  beforeEach(start);
  afterEach(() => app.close());

  it('change the currency only before the first of them', async () => {
    const { n, content } = await see();
    const euro = view(await save(n, { ...content, currency: 'EUR' }));
    expect(await readMenu()).toMatchObject({
      studio: { currency: 'EUR' },
      priceBook: { currency: 'EUR' },
    });
    await placeOrder(await signInCustomer(app, 'ada@example.com'), orderForm(day));
    expect((await see()).currencyFixed).toBe(true);
    const late = await save(euro.n, { ...content, currency: 'USD' });
    expect(late.body).toMatchObject({ issues: [{ path: ['content', 'currency'] }] });
  });

  it('keep the price they were offered and agreed at', async () => {
    const customer = await signInCustomer(app, 'ada@example.com');
    const placed = await placeOrder(customer, orderForm(day));
    const priceNow = async () =>
      z.parse(orderView, (await customer.get(`/api/orders/${placed.code}`)).body).offer.price;
    const offered = await priceNow();
    const { n, content } = await see();
    const after = view(await save(n, dearer(content)));
    expect(await priceNow()).toEqual(offered);
    expect(after.versions.map(({ orders }) => orders)).toEqual([0, 1]);

    const { number } = placed;
    const look = await owner.get(`/api/staff/orders/${number}/confirmation`);
    expect(look.body).toMatchObject({ price: { totalMinor: offered.totalMinor } });
    const { rowVersion } = z.parse(z.looseObject({ rowVersion: z.int() }), look.body);
    const confirmed = await owner.post(`/api/staff/orders/${number}/confirm`, {
      rowVersion,
      note: '',
    });
    expect(confirmed.status).toBe(200);
    const [quote] = await Quote.findAll();
    expect(quote?.totalMinor).toBe(offered.totalMinor);
    expect(await priceNow()).toEqual(offered);

    const next = await placeOrder(customer, orderForm('2027-06-19'));
    const { offer } = z.parse(orderView, (await customer.get(`/api/orders/${next.code}`)).body);
    expect(offer.price.totalMinor).toBe(offered.totalMinor + 25 * 100);
  });
});
