import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  eggPlan,
  kitchenSheet,
  orderCost,
  shopping,
  type KitchenSheet,
} from '#shared/contracts/kitchen-sheet.ts';
import { ingredientDraft, pantry, type Ingredient, type Pantry } from '#shared/contracts/pantry.ts';
import { addDays } from '#shared/dates/local-time.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm, placeOrder, roundTier } from '#api/testing/order-form.ts';
import type { FormChanges } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let baker: TestClient;
let owner: TestClient;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  baker = await signInStaff(app, await addUser('baker'));
  owner = await signInStaff(app, await addUser('owner'));
});
afterAll(() => app.close());

/** An order that is confirmed, so that it waits for no answer. */
async function order(date: string, changes: FormChanges = {}): Promise<number> {
  const you = { email: `${newId()}@example.com` };
  const { number } = await placeOrder(app.visitor(), orderForm(date, { you, ...changes }));
  const answer = await baker.post(`/api/staff/orders/${number}/confirm`, { rowVersion: 1 });
  expect(answer.status, answer.text).toBe(200);
  return number;
}

async function loadPantry(): Promise<Pantry> {
  return pantry.parse((await baker.get('/api/pantry')).body);
}

/** Saves an ingredient with another pack. */
async function price(id: string, pack: Ingredient['pack']): Promise<void> {
  const known = (await loadPantry()).ingredients.find((it) => it.id === id);
  if (known === undefined) throw new Error(id);
  const basedOn = ingredientDraft.parse(known);
  const answer = await baker.put(`/api/pantry/ingredients/${id}`, {
    basedOn,
    draft: { ...basedOn, pack },
  });
  expect(answer.status, answer.text).toBe(200);
}

const swiss = { covering: 'buttercream', style: 'swiss', finish: 'smooth', colour: null } as const;

async function sheetOf(number: number): Promise<KitchenSheet> {
  const answer = await baker.get(`/api/staff/orders/${number}/kitchen`);
  expect(answer.status, answer.text).toBe(200);
  return kitchenSheet.parse(answer.body);
}

async function costOf(number: number) {
  const answer = await owner.get(`/api/staff/orders/${number}/cost`);
  expect(answer.status, answer.text).toBe(200);
  return orderCost.parse(answer.body);
}

const sum = (numbers: readonly number[]) => numbers.reduce((total, it) => total + it, 0);

describe('what goes into an order', () => {
  it('is every formula to the gram, with its bowls and household measures', async () => {
    const sheet = await sheetOf(await order('2027-05-21'));
    expect(sheet.unknown).toEqual([]);
    expect(sheet.pieces.map((it) => it.name)).toEqual(['The tier']);
    const [sponge] = sheet.formulas.filter((it) => it.kind === 'sponge');
    const parts = sheet.pieces[0]?.parts ?? [];
    expect(sponge?.mixG).toBeCloseTo(parts.find((it) => it.part === 'sponge')?.toMakeG ?? 0, 6);
    expect(sponge?.bowls?.bowls).toBeGreaterThanOrEqual(1);
    for (const { lines, driftG, roundedInG, mixG, kind } of sheet.formulas) {
      expect(sum(lines.map((it) => it.driftG))).toBeCloseTo(driftG, 6);
      if (kind === 'sponge') expect(roundedInG - driftG).toBeCloseTo(mixG, 6);
    }
    const whites = sheet.formulas.flatMap((it) => it.lines).find((it) => it.eggs !== null);
    expect(whites?.eggs).toBeGreaterThan(0);
    expect(sheet.formulas.flatMap((it) => it.lines).some((it) => it.household !== null)).toBe(true);
    // Nothing is lost on the way from formulas to what is bought.
    const bought = sum(sheet.ingredients.map((it) => it.grams));
    const weighed = sum(
      sheet.formulas.flatMap((it) => it.lines.filter((l) => !l.formula).map((l) => l.exactG)),
    );
    expect(bought).toBeCloseTo(weighed, 6);
  });

  it('goes by the version the order keeps, and says that there is a newer one', async () => {
    const number = await order('2027-05-28');
    const before = await sheetOf(number);
    const { formulas, versions } = await loadPantry();
    const formula = formulas.find((it) => it.id === 'swiss-buttercream');
    const version = versions.find((it) => it.id === formula?.currentVersionId);
    const saved = await baker.post('/api/pantry/formulas/swiss-buttercream/versions', {
      basedOn: version?.id,
      name: formula?.name,
      draft: {
        ...version,
        lines: version?.lines.map((it) => ({ ...it, grams: it.grams * (1 + it.step) })),
      },
    });
    expect(saved.status, saved.text).toBe(201);
    const kept = await sheetOf(number);
    const swissOf = (sheet: KitchenSheet) =>
      sheet.formulas.find((it) => it.formulaId === 'swiss-buttercream');
    expect(swissOf(kept)?.lines).toEqual(swissOf(before)?.lines);
    expect(swissOf(kept)).toMatchObject({ n: 1, newer: 2 });
    expect(swissOf(await sheetOf(await order('2027-05-29')))).toMatchObject({ n: 2, newer: null });
  });

  it('counts the kitchen’s cutting cakes and the fondant with what is under it', async () => {
    const number = await order('2027-06-03', {
      cake: {
        tiers: [roundTier(6)],
        coating: { ...swiss, covering: 'fondant' },
        cuttingCakes: [
          { sizeId: 'quarter', count: 2, layers: 2, spongeId: 'vanilla', fillingId: 'raspberry' },
        ],
      },
    });
    const sheet = await sheetOf(number);
    expect(sheet.pieces.map((it) => [it.kind, it.count])).toEqual([
      ['tier', 1],
      ['cutting-cake', 2],
    ]);
    expect(sheet.formulas.map((it) => it.formulaId)).toEqual(
      expect.arrayContaining(['swiss-buttercream', 'rolled-fondant', 'vanilla-sponge']),
    );
  });
});

describe('what an order costs', () => {
  it('adds up, leaves a margin, and is for the owner alone', async () => {
    const number = await order('2027-06-04');
    const cost = await costOf(number);
    expect(cost.unknown).toEqual([]);
    expect(sum(cost.lines.map((it) => it.amountMinor))).toBe(cost.totalMinor);
    expect(cost.lines.map((it) => it.kind)).toEqual([
      'ingredients',
      'eggs',
      'packaging',
      'labour',
      'overhead',
    ]);
    expect(cost.netPriceMinor - cost.totalMinor).toBe(cost.marginMinor);
    expect(cost.minutes).toBeGreaterThan(60);
    expect(cost.agreed).toBe(true);
    expect((await baker.get(`/api/staff/orders/${number}/cost`)).status).toBe(403);
  });

  it('names what would make it pay until it does', async () => {
    const cost = await costOf(await order('2027-06-05'));
    const pays = cost.marginMinor * 1_000_000 >= cost.netPriceMinor * cost.targetMarginPpm;
    expect(cost.levers.length > 0).toBe(!pays);
    if (!pays) expect(cost.levers[0]).toMatchObject({ kind: 'price', enough: true });
  });

  it('says that it is incomplete where a price is not known', async () => {
    const number = await order('2027-06-10');
    await price('butter', null);
    const cost = await costOf(number);
    expect(cost.unknown).toEqual(['Unsalted butter, 82 % fat']);
    await price('butter', { grams: 454, priceMinor: 545 });
    expect((await costOf(number)).unknown).toEqual([]);
  });
});

describe('a span of days', () => {
  const from = '2027-08-02';
  const to = addDays(from, 6);

  it('plans its eggs together and buys for them, from the plan’s days', async () => {
    const first = await order('2027-08-06');
    const second = await order('2027-08-07', {
      cake: { coating: { ...swiss, style: 'french' } },
    });
    const eggs = eggPlan.parse((await baker.get(`/api/staff/eggs?from=${from}&to=${to}`)).body);
    expect(eggs.orders).toEqual([first, second]);
    expect(eggs.eggs).toBe(sum(eggs.days.map((it) => it.crack)));
    const uses = eggs.days.flatMap((it) => it.uses);
    expect(uses.some((it) => it.part === 'white')).toBe(true);
    for (const { grams, from: sources } of uses) {
      expect(sum(sources.map((it) => it.grams))).toBeCloseTo(grams, 2);
    }
    // French takes its yolks out of a carton.
    expect(eggs.cartons.flatMap((it) => it.formulas)).toEqual(['French buttercream']);
    expect(eggs.alternatives.map((it) => it.formula)).toEqual(['Swiss meringue buttercream']);

    const list = shopping.parse(
      (await baker.get(`/api/staff/shopping?from=${from}&to=${to}`)).body,
    );
    expect(list.orders).toEqual([first, second]);
    expect(list.lines.find((it) => it.eggs !== null)?.eggs).toBe(eggs.eggs);
    expect(sum(list.lines.map((it) => it.buyMinor ?? 0))).toBe(list.buyMinor);
    expect(list.buyMinor).toBeGreaterThanOrEqual(list.usedMinor);

    const sheets = await Promise.all([sheetOf(first), sheetOf(second)]);
    const butter = sheets.flatMap((it) => it.ingredients).filter((it) => it.id === 'butter');
    expect(list.lines.find((it) => it.id === 'butter')?.grams).toBeCloseTo(
      sum(butter.map((it) => it.grams)),
      3,
    );
  });

  it('takes another egg size, and refuses a span it cannot plan', async () => {
    const path = `/api/staff/eggs?from=${from}&to=${to}`;
    const large = eggPlan.parse((await baker.get(path)).body);
    const medium = eggPlan.parse((await baker.get(`${path}&size=medium`)).body);
    expect(medium.eggs).toBeGreaterThan(large.eggs);
    expect((await baker.get(`${path}&yolkDays=5`)).status).toBe(422);
    expect((await baker.get(`/api/staff/eggs?from=${to}&to=${from}`)).status).toBe(422);
    const nothing = eggPlan.parse(
      (await baker.get('/api/staff/eggs?from=2028-01-01&to=2028-01-02')).body,
    );
    expect(nothing).toMatchObject({ eggs: 0, days: [] });
  });
});
