import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { orderView } from '#shared/contracts/orders.ts';
import type { OrderView } from '#shared/contracts/orders.ts';
import { pantry as pantryView, savedFormula, savedIngredient } from '#shared/contracts/pantry.ts';
import type { IngredientDraft, Pantry, SavedFormula } from '#shared/contracts/pantry.ts';
import { staffOrder } from '#shared/contracts/staff.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { RevisionFormulaVersion } from '#api/db/models/revision-formula-version.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Studio } from '#api/db/models/studio.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { createMailHandlers } from '#api/modules/mail/mail-handlers.ts';
import { createMailSender } from '#api/modules/mail/mail-sender.ts';
import type { SmtpClient } from '#api/clients/smtp.ts';
import { createDispatcher } from '#api/outbox/dispatcher.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm, placeOrder, roundTier } from '#api/testing/order-form.ts';
import type { FormChanges } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let counter: TestClient;
let baker: TestClient;
let weeks = 0;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  counter = await signInStaff(app, await addUser('counter', { name: 'Pia Lund' }));
  baker = await signInStaff(app, await addUser('baker', { name: 'Noor Haddad' }));
  // Every order here is sent from the same computer.
  await inTransaction(() => Studio.update({ holdsPerAddress: 1000 }, { where: { id: 1 } }));
});
afterAll(() => app.close());

type Asked = { readonly number: number; readonly code: string; readonly guest: TestClient };

/** Vanilla and raspberry under Swiss meringue, on a Friday of its own. */
async function ask(changes: FormChanges = {}): Promise<Asked> {
  weeks += 1;
  const friday = new Date(Date.UTC(2027, 6, 9 + 7 * weeks)).toISOString().slice(0, 10);
  const guest = app.visitor();
  const you = { email: `${newId()}@example.com` };
  const { number, code } = await placeOrder(guest, orderForm(friday, { ...changes, you }));
  return { number, code, guest };
}

async function confirmed(changes: FormChanges = {}): Promise<Asked> {
  const asked = await ask(changes);
  const answer = await move(asked, 'confirm', {});
  expect(answer.status, answer.text).toBe(200);
  return asked;
}

const look = async ({ number }: Asked): Promise<StaffOrder> =>
  staffOrder.parse((await baker.get(`/api/staff/orders/${number}`)).body);
const seen = async ({ guest, code }: Asked): Promise<OrderView> =>
  orderView.parse((await guest.get(`/api/orders/${code}`)).body);
const move = async (
  asked: Asked,
  verb: string,
  body: object,
  by: TestClient = baker,
): Promise<Answer> => {
  const { rowVersion } = await look(asked);
  return by.post(`/api/staff/orders/${asked.number}/${verb}`, { rowVersion, ...body });
};
const codeOf = (answer: Answer): string => problem.parse(answer.body).code;
const idOf = async ({ code }: Asked): Promise<string> =>
  (await Order.findOne({ where: { code }, rejectOnEmpty: true })).id;
const kindsOf = async (asked: Asked): Promise<string[]> => {
  const where = { orderId: await idOf(asked) };
  return (await OrderEvent.findAll({ where, order: [['seq', 'ASC']] })).map(({ kind }) => kind);
};

const load = async (): Promise<Pantry> => pantryView.parse((await baker.get('/api/pantry')).body);

async function draftOf(id: string): Promise<IngredientDraft> {
  const found = (await load()).ingredients.find((it) => it.id === id);
  if (found === undefined) throw new Error(`no ingredient ${id}`);
  const { id: _, archivedAt: __, ...draft } = found;
  return draft;
}

/** Changes a label, and answers which orders that touched. */
async function relabel(id: string, changes: Partial<IngredientDraft>): Promise<number[]> {
  const basedOn = await draftOf(id);
  const answer = await baker.put(`/api/pantry/ingredients/${id}`, {
    basedOn,
    draft: { ...basedOn, ...changes },
  });
  expect(answer.status, answer.text).toBe(200);
  return savedIngredient.parse(answer.body).touched;
}

const sesame: AllergenEntry = { allergen: 'sesame', species: [], state: 'contains' };

/** The worker, and a mail server that takes everything. */
async function deliver(): Promise<void> {
  const { clock, logger } = app.deps;
  const worker = 'test';
  const dispatcher = createDispatcher({
    handlers: createMailHandlers(app.deps),
    clock,
    logger,
    worker,
  });
  const smtp: SmtpClient = {
    send: () => Promise.resolve({ outcome: 'sent', response: '250 OK' }),
  };
  const sender = createMailSender({ smtp, clock, logger, worker });
  while ((await dispatcher.runOnce()) + (await sender.runOnce()) > 0);
}

const mailsOf = async (asked: Asked, template = 'ingredient-changed'): Promise<SentMail[]> =>
  SentMail.findAll({ where: { orderId: await idOf(asked), template } });

describe('a changed label', () => {
  it('touches the open orders with the product in them, and no other', async () => {
    const touched = await confirmed();
    const asked = await ask();
    const other = await ask({
      cake: { tiers: [roundTier(8, { spongeId: 'cocoa', fillingId: 'passion-fruit' })] },
    });
    const numbers = await relabel('raspberries', {
      allergens: [sesame],
    });
    expect(numbers).toContain(touched.number);
    expect(numbers).toContain(asked.number);
    expect(numbers).not.toContain(other.number);

    const page = await look(touched);
    expect(page.contentChanges).toMatchObject([
      {
        changes: ['It contains sesame now: in Raspberry jam filling.'],
        cause: 'The label of Frozen raspberries',
        by: 'Noor Haddad',
        clashes: [],
        acknowledged: null,
        told: null,
      },
    ]);
    expect(page.estimate.allergens.map(({ allergen }) => allergen)).toContain('sesame');
    expect(page.estimate.price).toEqual(page.agreedPrice);
    const view = await seen(touched);
    expect(view.contentChanges[0]?.changes).toEqual(page.contentChanges[0]?.changes);
    expect(view.offer.allergens.map(({ allergen }) => allergen)).toContain('sesame');
    expect(await kindsOf(touched)).toEqual(['submitted', 'confirmed', 'contents-changed']);

    // Put right before the customers' mail has gone: nobody outside hears of it.
    expect(await relabel('raspberries', { allergens: [] })).toEqual([]);
    expect((await look(touched)).contentChanges).toEqual([]);
    expect((await kindsOf(touched)).at(-1)).toBe('contents-put-right');
    app.clock.advance({ minutes: 30 });
    await deliver();
    expect(await mailsOf(touched)).toEqual([]);
  });

  it('reaches an order that is being sent meanwhile', async () => {
    for (const state of ['contains', 'may-contain', 'contains'] as const) {
      const [asked] = await Promise.all([
        ask(),
        relabel('raspberries', { allergens: [{ ...sesame, state }] }),
      ]);
      const { estimate } = await look(asked);
      expect(estimate.allergens.find(({ allergen }) => allergen === 'sesame')?.state).toBe(state);
    }
    await relabel('raspberries', { allergens: [] });
  });

  it('does not touch what is not on labels: a price', async () => {
    await ask();
    expect(await relabel('raspberries', { pack: { grams: 500, priceMinor: 499 } })).toEqual([]);
  });

  it('is told to the studio at once and to the customer a little later; nothing leaves before', async () => {
    const asked = await confirmed();
    await move(asked, 'start', {});
    await relabel('pectin', { allergens: [sesame] });
    await deliver();
    const notice = await SentMail.findOne({
      where: { template: 'ingredient-changed-notice' },
      order: [['id', 'DESC']],
      rejectOnEmpty: true,
    });
    expect(notice.text).toContain('The label of Apple pectin');
    expect(notice.text).toContain(`No. ${asked.number}`);
    expect(await mailsOf(asked)).toEqual([]);

    const early = await move(asked, 'ready', {}, counter);
    expect([early.status, codeOf(early)]).toEqual([409, 'advice-stop']);
    expect((await look(asked)).status).toBe('making');

    app.clock.advance({ minutes: 11 });
    await deliver();
    const [mail] = await mailsOf(asked);
    expect(mail).toMatchObject({ state: 'sent' });
    expect(mail?.text).toContain('It contains sesame now: in Raspberry jam filling.');
    expect(mail?.text).toMatch(/\/orders\/\S+key=/);
    expect((await look(asked)).contentChanges.at(-1)?.told?.how).toBe('By e-mail');
    const ready = await move(asked, 'ready', {}, counter);
    expect(ready.status, ready.text).toBe(200);

    // A cake that is ready is not handed over either while something new is untold.
    await relabel('pectin', { allergens: [{ ...sesame, allergen: 'lupin' }] });
    const hand = { collectedBy: 'Mara', condition: '', photoId: null };
    expect(codeOf(await move(asked, 'collected', hand, counter))).toBe('advice-stop');
    const change = (await look(asked)).contentChanges.at(-1);
    expect(change?.changes).toEqual([
      'It contains lupin now: in Raspberry jam filling.',
      'Sesame is not on its labels any more.',
    ]);
    const told = await move(
      asked,
      `contents/${change?.id ?? ''}/told`,
      { how: 'Rang her.' },
      counter,
    );
    expect(staffOrder.parse(told.body).contentChanges.at(-1)?.told).toMatchObject({
      by: 'Pia Lund',
      how: 'Rang her.',
    });
    const again = await move(asked, `contents/${change?.id ?? ''}/told`, { how: 'x' }, counter);
    expect(codeOf(again)).toBe('wrong-state');
    expect((await move(asked, 'collected', hand, counter)).status).toBe(200);
    await relabel('pectin', { allergens: [] });
  });

  it('against what guests told waits for a baker’s words, and stops what is not confirmed', async () => {
    const allergic: FormChanges = {
      day: {
        allergies: [{ allergen: 'sesame', species: null, text: '', severity: 'avoids', guests: 1 }],
      },
      consents: { allergyData: true },
    };
    const making = await confirmed(allergic);
    const waiting = await ask(allergic);
    await relabel('vanilla', { allergens: [sesame] });
    const page = await look(making);
    const change = page.contentChanges.at(-1);
    expect(change?.clashes.join(' ')).toMatch(/sesame/i);
    expect((await look(waiting)).blockers.map(({ about }) => about)).toContain('allergen:sesame');
    expect(codeOf(await move(waiting, 'confirm', {}))).toBe('advice-stop');

    await deliver();
    const [notice] = await SentMail.findAll({
      where: { template: 'ingredient-changed-notice' },
      order: [['id', 'DESC']],
      limit: 1,
    });
    expect(notice?.text).toContain('It is against something guests told');
    expect(notice?.text).not.toMatch(/guest avoids/i);
    app.clock.advance({ minutes: 11 });
    await deliver();
    const [mail] = await mailsOf(making);
    expect(mail?.text).not.toMatch(/guests? avoids?|allergic to it/i);

    // The customer knows; a baker has still to say what is done about it.
    expect(codeOf(await move(making, 'ready', {}))).toBe('advice-stop');
    const path = `contents/${change?.id ?? ''}/acknowledge`;
    expect((await move(making, path, { note: '' })).status).toBe(422);
    expect((await move(making, path, { note: 'x' }, counter)).status).toBe(403);
    const words = 'Made with the vanilla from before; the bottle is kept apart.';
    const answered = await move(making, path, { note: words });
    expect(staffOrder.parse(answered.body)).toMatchObject({
      can: { acknowledgeContents: false },
      contentChanges: [{ acknowledged: { by: 'Noor Haddad', note: words } }],
    });
    expect((await move(making, 'ready', {})).status).toBe(200);
    await relabel('vanilla', { allergens: [] });
  });

  it('is nobody’s to see to any more once the order has ended', async () => {
    const asked = await confirmed();
    await relabel('vanilla', { allergens: [sesame] });
    const change = (await look(asked)).contentChanges.at(-1);
    await inTransaction(() =>
      Order.update({ status: 'cancelled' }, { where: { code: asked.code } }),
    );
    const path = `contents/${change?.id ?? ''}`;
    expect(codeOf(await move(asked, `${path}/acknowledge`, { note: 'x' }))).toBe('wrong-state');
    expect(codeOf(await move(asked, `${path}/told`, { how: 'By telephone.' }))).toBe('wrong-state');
    await relabel('vanilla', { allergens: [] });
  });

  it('that nobody has read makes everything it does not name unknown in every open order', async () => {
    const asked = await confirmed();
    const numbers = await relabel('salt', { labelCheckedOn: null });
    expect(numbers).toContain(asked.number);
    const change = (await look(asked)).contentChanges.at(-1);
    expect(change?.changes).toContain(
      'Nobody knows yet whether there is lupin in Vanilla sponge and Swiss meringue buttercream.',
    );
    await relabel('salt', { labelCheckedOn: '2027-05-01' });
  });

  it('handled nearby touches only orders whose guests told of it', async () => {
    const allergic = await confirmed({
      day: {
        allergies: [
          { allergen: 'celery', species: null, text: '', severity: 'intolerance', guests: 1 },
        ],
      },
      consents: { allergyData: true },
    });
    const plain = await confirmed();
    // Carrots are in the carrot sponge alone, which neither has.
    const numbers = await relabel('carrots', { allergens: [{ ...sesame, allergen: 'celery' }] });
    expect(numbers).toContain(allergic.number);
    expect(numbers).not.toContain(plain.number);
    expect((await look(allergic)).contentChanges.at(-1)?.changes).toEqual([
      'Celery is handled in our kitchen now.',
    ]);
    await relabel('carrots', { allergens: [] });
  });
});

describe('a changed formula', () => {
  const jam = async (change: 'add-nuts' | 'back', more: object): Promise<SavedFormula> => {
    const pantry = await load();
    const { currentVersionId } = pantry.formulas.find(({ id }) => id === 'raspberry-jam') ?? {};
    const version = pantry.versions.find(({ id }) => id === currentVersionId);
    if (version === undefined) throw new Error('no jam');
    const { id, formulaId: _, n: __, createdAt: _at, createdBy: _by, ...draft } = version;
    const isNut = (line: (typeof draft.lines)[number]) =>
      line.part.kind === 'ingredient' && line.part.ingredientId === 'almond-flour';
    const lines = draft.lines.filter((line) => !isNut(line));
    if (change === 'add-nuts') {
      const part = { kind: 'ingredient', ingredientId: 'almond-flour' } as const;
      lines.push({ part, grams: 50, asTyped: null, step: 0 });
    }
    const answer = await baker.post('/api/pantry/formulas/raspberry-jam/versions', {
      basedOn: id,
      name: 'Raspberry jam',
      draft: { ...draft, lines },
      ...more,
    });
    expect(answer.status, answer.text).toBe(201);
    return savedFormula.parse(answer.body);
  };

  it('leaves open orders the version they were ordered with', async () => {
    const asked = await confirmed();
    const before = await RevisionFormulaVersion.count();
    const { touched } = await jam('add-nuts', {});
    expect(touched).not.toContain(asked.number);
    expect((await look(asked)).contentChanges).toEqual([]);
    expect(await RevisionFormulaVersion.count()).toBe(before);
    const later = await ask();
    expect((await seen(later)).offer.allergens.map(({ allergen }) => allergen)).toContain(
      'tree-nuts',
    );
    await jam('back', {});
  });

  it('takes its place in open orders where the baker says so: a substitution', async () => {
    const asked = await confirmed();
    const { touched, version } = await jam('add-nuts', { inOpenOrders: true });
    expect(touched).toContain(asked.number);
    const { currentRevisionId } = await Order.findOne({
      where: { code: asked.code },
      rejectOnEmpty: true,
    });
    const kept = await RevisionFormulaVersion.findAll({
      where: { revisionId: currentRevisionId ?? '' },
    });
    expect(kept.map(({ formulaVersionId }) => formulaVersionId)).toContain(version.id);
    const change = (await look(asked)).contentChanges.at(-1);
    expect(change).toMatchObject({
      cause: `Raspberry jam, version ${String(version.n)}`,
      changes: ['It contains tree nuts (almond) now: in Raspberry jam filling.'],
    });
    await jam('back', { inOpenOrders: true });
    expect((await look(asked)).contentChanges).toEqual([]);
    expect(await OutboxRow.count({ where: { kind: 'contents-to-tell', state: 'given-up' } })).toBe(
      0,
    );
  });
});
