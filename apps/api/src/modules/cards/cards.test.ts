import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cakeCare, orderLabels } from '#shared/contracts/cards.ts';
import { problem } from '#shared/contracts/common.ts';
import { orderView } from '#shared/contracts/orders.ts';
import { Audit } from '#api/db/models/audit.ts';
import { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import { Order } from '#api/db/models/order.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { readPdf } from '#api/testing/read-pdf.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let counter: TestClient;
let baker: TestClient;
let owner: TestClient;
let weeks = 0;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  counter = await signInStaff(app, await addUser('counter'));
  baker = await signInStaff(app, await addUser('baker'));
  owner = await signInStaff(app, await addUser('owner'));
});
afterAll(() => app.close());

/** An order of a guest's with a name on the cake, on a Friday of its own. */
async function ask() {
  weeks += 1;
  const date = new Date(Date.UTC(2027, 6, 9 + 7 * weeks)).toISOString().slice(0, 10);
  const guest = app.visitor();
  const form = orderForm(date, {
    look: { words: [{ tier: 0, text: 'For Mara' }], note: 'She is forty.' },
    you: { email: `${newId()}@example.com` },
  });
  return { guest, ...(await placeOrder(guest, form)) };
}

async function confirmed() {
  const asked = await ask();
  const answer = await baker.post(`/api/staff/orders/${asked.number}/confirm`, { rowVersion: 1 });
  expect(answer.status, answer.text).toBe(200);
  return asked;
}

const labelsOf = async (number: number, by = counter) =>
  orderLabels.parse((await by.get(`/api/staff/orders/${number}/labels`)).body);

/** As `get`, with the bytes as they came. */
async function download(by: TestClient, path: string) {
  const cookie = by.cookie();
  const answer = await fetch(new URL(path, app.url), {
    headers: cookie === undefined ? {} : { cookie: `tierwell=${cookie}` },
  });
  return { answer, bytes: new Uint8Array(await answer.arrayBuffer()) };
}

const freeFrom = /free[ -]from|\bsafe\b|(?:gluten|egg|milk|nut|dairy)-free/iu;

describe('labels', () => {
  it('wait until the order is confirmed', async () => {
    const { number } = await ask();
    const labels = await labelsOf(number);
    expect(labels.reasons.map((it) => it.code)).toEqual(['not-confirmed']);
    expect(labels.can).toEqual({ printLabels: false, printCareCard: false, confirmUnknown: false });
    expect(labels.careCode).toBeNull();
    const pdf = await counter.get(`/api/staff/orders/${number}/labels.pdf?paper=single`);
    expect(problem.parse(pdf.body).code).toBe('advice-stop');
  });

  it('say what is in the whole cake and print under a name of their own', async () => {
    const { number } = await confirmed();
    const { labels, reasons, can } = await labelsOf(number);
    expect(reasons).toEqual([]);
    expect(can.printLabels).toBe(true);
    expect(labels[0]).toMatchObject({
      id: 'cake',
      about: `Birthday, No. ${number}`,
      contains: 'Contains: Milk, Egg, Wheat.',
      studio: { address: '14 Oxbow Lane, Alder Falls, NY 13999' },
    });
    expect(labels[0]?.useBy).not.toBeNull();
    const { answer, bytes } = await download(
      counter,
      `/api/staff/orders/${number}/labels.pdf?paper=letter&weighedG=2500`,
    );
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe('application/pdf');
    expect(answer.headers.get('cache-control')).toBe('private, no-store');
    expect(answer.headers.get('content-disposition')).toBe(
      `inline; filename="labels-${number}.pdf"`,
    );
    const text = (await readPdf(bytes)).map((page) => page.text).join(' ');
    expect(text).toContain('Contains: Milk, Egg, Wheat.');
    // 2,500 g are 5 lb 8.18 oz, rounded down.
    expect(text).toContain('Net Wt 5 lb 8 oz');
    expect(text).not.toMatch(freeFrom);
  });

  it('refuse a label that is not there, and one weight for several', async () => {
    const { number } = await confirmed();
    const wrong = await counter.get(
      `/api/staff/orders/${number}/labels.pdf?paper=a4&label=cutting-cake-9`,
    );
    expect(problem.parse(wrong.body).code).toBe('invalid-input');
    const paper = await counter.get(`/api/staff/orders/${number}/labels.pdf?paper=a3`);
    expect(problem.parse(paper.body).code).toBe('invalid-input');
  });

  it('stop at an unknown allergen until it is read or the owner answers for it', async () => {
    const { number } = await confirmed();
    const sugar = await Ingredient.findByPk('granulated-sugar', { rejectOnEmpty: true });
    await inTransaction(async () => {
      await IngredientAllergen.create({
        ingredientId: sugar.id,
        allergen: 'soy',
        species: null,
        state: 'unknown',
      });
      await noteCatalogueChange();
    });
    const stopped = await labelsOf(number, owner);
    expect(stopped.reasons).toEqual([
      expect.objectContaining({ code: 'unknown-allergen', ingredientId: 'granulated-sugar' }),
    ]);
    expect(stopped.labels[0]?.notKnown).toEqual(['Not known: whether sugar contains soy.']);
    const pdf = await counter.get(`/api/staff/orders/${number}/labels.pdf?paper=single`);
    expect(problem.parse(pdf.body).code).toBe('advice-stop');

    const confirm = `/api/staff/orders/${number}/labels/confirm-unknown`;
    const sentences = stopped.reasons.map((it) => it.sentence);
    expect((await baker.post(confirm, { sentences })).status).toBe(403);
    const other = await owner.post(confirm, { sentences: ['Something else.'] });
    expect(problem.parse(other.body).code).toBe('changed-meanwhile');
    const answered = orderLabels.parse((await owner.post(confirm, { sentences })).body);
    expect(answered).toMatchObject({ unknownConfirmed: true, reasons: [] });
    expect(await Audit.count({ where: { action: 'confirm-unknown' } })).toBe(1);
    const { bytes } = await download(
      counter,
      `/api/staff/orders/${number}/labels.pdf?paper=letter`,
    );
    const text = (await readPdf(bytes)).map((page) => page.text).join(' ');
    expect(text).toContain('Not known: whether sugar contains soy.');

    // Another unknown is another question.
    await inTransaction(async () => {
      await IngredientAllergen.create({
        ingredientId: sugar.id,
        allergen: 'milk',
        species: null,
        state: 'unknown',
      });
      await noteCatalogueChange();
    });
    expect(await labelsOf(number)).toMatchObject({ unknownConfirmed: false });
    await inTransaction(async () => {
      await IngredientAllergen.destroy({ where: { ingredientId: sugar.id, state: 'unknown' } });
      await noteCatalogueChange();
    });
    expect((await labelsOf(number)).can.printLabels).toBe(true);
  });
});

describe('the care card', () => {
  it('goes to whoever holds the order, once it is confirmed, and tells when to take it out', async () => {
    const { number, code, guest } = await confirmed();
    const path = `/api/orders/${code}/care-card.pdf?servedAt=900`;
    const { answer, bytes } = await download(guest, path);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-disposition')).toBe(
      `inline; filename="care-card-${number}.pdf"`,
    );
    expect(answer.headers.get('cache-control')).toBe('private, no-store');
    const text = (await readPdf(bytes)).map((page) => page.text).join(' ');
    // Cut at 15:00, an hour in the room before: USDA FSIS leaves 105 of its 120 minutes.
    expect(text).toContain('Leave it in the fridge until 14:00');
    expect(text).toContain('Cutting it');
    expect(text).toContain('Contains: Milk, Egg, Wheat.');
    expect(text).not.toContain('Mara Ellery');
    expect(text).not.toMatch(freeFrom);
    expect((await app.visitor().get(path)).status).toBe(404);
    expect(
      (await download(counter, `/api/staff/orders/${number}/care-card.pdf?paper=a5`)).answer.status,
    ).toBe(200);
  });

  it('is nobody’s before that', async () => {
    const { code, guest, number } = await ask();
    expect((await guest.get(`/api/orders/${code}/care-card.pdf`)).status).toBe(404);
    const staff = await counter.get(`/api/staff/orders/${number}/care-card.pdf`);
    expect(problem.parse(staff.body).code).toBe('wrong-state');
  });
});

describe('the page about the cake', () => {
  it('opens by its code alone, however it is typed, and tells nothing of anybody', async () => {
    const { code, guest } = await confirmed();
    const view = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    const careCode = view.careCode ?? '';
    expect(careCode).toMatch(/^[0-9A-Z]{16}$/u);
    const answer = await app.visitor().get(`/api/care/${careCode.toLowerCase()}`);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('x-robots-tag')).toBe('noindex');
    const care = cakeCare.parse(answer.body);
    expect(care.look).toMatchObject({ words: [], note: '' });
    expect(care.label.contains).toBe('Contains: Milk, Egg, Wheat.');
    expect(care.portions.fed).toBeGreaterThan(0);
    expect(answer.text).not.toMatch(/Mara|Ellery|forty|607 555 0133|Minor/u);
    expect(answer.text).not.toContain(code);
    expect(answer.text).not.toMatch(freeFrom);
  });

  it('reads the same whatever guests told, and names every allergen nobody knows of', async () => {
    const { code, guest } = await confirmed();
    const { careCode } = orderView.parse((await guest.get(`/api/orders/${code}`)).body);
    const where = {
      ingredientId: 'granulated-sugar',
      allergen: 'celery',
      state: 'unknown',
    } as const;
    await inTransaction(async () => {
      await IngredientAllergen.create({ ...where, species: null });
      await noteCatalogueChange();
    });
    const answer = await app.visitor().get(`/api/care/${careCode ?? ''}`);
    expect(cakeCare.parse(answer.body).label.notKnown).toEqual([
      'Not known: whether sugar contains celery.',
    ]);
    await inTransaction(async () => {
      await IngredientAllergen.destroy({ where });
      await noteCatalogueChange();
    });
  });

  it('is not there for an order that is not confirmed, nor for a code of nothing', async () => {
    const { code } = await ask();
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    expect((await app.visitor().get(`/api/care/${order.careCode ?? ''}`)).status).toBe(404);
    expect((await app.visitor().get('/api/care/0000000000000000')).status).toBe(404);
    expect((await app.visitor().get(`/api/care/${code}`)).status).toBe(404);
  });

  it('has a code that old orders were given too', async () => {
    const orders = await Order.findAll();
    expect(new Set(orders.map((it) => it.careCode)).size).toBe(orders.length);
  });
});
