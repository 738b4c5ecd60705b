import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { estimate as estimateView } from '#shared/contracts/estimates.ts';
import {
  formula as formulaView,
  pantry as pantryView,
  savedFormula,
  savedIngredient,
  usedBy,
} from '#shared/contracts/pantry.ts';
import type {
  FormulaDraft,
  FormulaVersion,
  Ingredient,
  IngredientDraft,
  Pantry,
  SavedFormula,
} from '#shared/contracts/pantry.ts';
import * as z from 'zod/mini';
import { Audit } from '#api/db/models/audit.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { FormulaLine } from '#api/db/models/formula-line.ts';
import { Formula } from '#api/db/models/formula.ts';
import { User } from '#api/db/models/user.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm } from '#api/testing/order-form.ts';
import { formulaDraftOf, ingredientDraftOf } from '#api/testing/pantry-drafts.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { writeVersion } from './write-version.ts';

let app: TestApp;
let baker: TestClient;
let owner: TestClient;

beforeAll(async () => {
  app = await startTestApp({
    clock: new TestClock('2027-05-03T12:00:00Z'),
    seeded: seededStudio,
  });
  await setSecondFactorRequired(false);
  baker = await signInStaff(app, await addUser('baker', { name: 'Noor Haddad' }));
  owner = await signInStaff(app, await addUser('owner', { name: 'Ida Brandt' }));
});
afterAll(() => app.close());

const load = async (): Promise<Pantry> => pantryView.parse((await baker.get('/api/pantry')).body);
const current = (pantry: Pantry, id: string): FormulaVersion => {
  const { currentVersionId } = pantry.formulas.find((it) => it.id === id) ?? {};
  const version = pantry.versions.find((it) => it.id === currentVersionId);
  if (version === undefined) throw new Error(`no formula ${id}`);
  return version;
};
const bought = (pantry: Pantry, id: string): Ingredient => {
  const found = pantry.ingredients.find((it) => it.id === id);
  if (found === undefined) throw new Error(`no ingredient ${id}`);
  return found;
};
const draftOfIngredient = ({ id: _, archivedAt: __, ...draft }: Ingredient): IngredientDraft =>
  draft;
const create = (name: string, draft: FormulaDraft): Promise<Answer> =>
  baker.post('/api/pantry/formulas', { kind: 'filling', name, draft });
const created = async (name: string, draft: FormulaDraft): Promise<SavedFormula> => {
  const answer = await create(name, draft);
  expect(answer.status, answer.text).toBe(201);
  return savedFormula.parse(answer.body);
};
const save = (id: string, body: object, by = baker): Promise<Answer> =>
  by.post(`/api/pantry/formulas/${id}/versions`, body);
const saved = async (id: string, body: object): Promise<SavedFormula> => {
  const answer = await save(id, body);
  expect(answer.status, answer.text).toBe(201);
  return savedFormula.parse(answer.body);
};
const holding = (formulaVersionId: string, grams = 100): FormulaDraft['lines'][number] => ({
  part: { kind: 'formula', formulaVersionId },
  grams,
  asTyped: null,
  step: 0,
});
const issuesOf = (answer: Answer): string[] =>
  (problem.parse(answer.body).issues ?? []).map(
    ({ path, message }) => `${path.join('.')}: ${message}`,
  );
const codeOf = (answer: Answer): string => problem.parse(answer.body).code;
const syrup = formulaDraftOf({ 'granulated-sugar': 500, water: 500 });

describe('the pantry', () => {
  it('is read whole, with every formula’s lines and what a label says', async () => {
    const pantry = await load();
    expect(pantry).toMatchObject({ currency: 'USD', can: { save: true, seeCost: true } });
    expect(pantry.mixers).toEqual([{ id: 'mixer', name: 'Floor mixer', capacityG: 6000 }]);
    expect(pantry.parts.styles.german).toBe('german-buttercream');
    const german = current(pantry, 'german-buttercream');
    expect(german.lines[0]).toMatchObject({
      part: { kind: 'formula', formulaVersionId: current(pantry, 'german-custard').id },
      grams: 1981.7,
    });
    expect(german.lines.map(({ step }) => step)).toEqual([0, 1, 1]);
    expect(bought(pantry, 'butter')).toMatchObject({
      pack: { grams: 454, priceMinor: 545 },
      allergens: [{ allergen: 'milk', species: [], state: 'contains' }],
    });
  });
});

describe('a formula', () => {
  it('is made with its first version, and changed by a next one that leaves the first as it was', async () => {
    const first = await created('Plain syrup', syrup);
    expect(first).toMatchObject({ version: { n: 1, createdBy: 'Noor Haddad' }, touched: [] });
    const second = await saved(first.formula.id, {
      basedOn: first.version.id,
      name: 'Light syrup',
      draft: { ...syrup, yieldPpm: 900_000 },
    });
    expect(second).toMatchObject({ formula: { name: 'Light syrup' }, version: { n: 2 } });
    const pantry = await load();
    expect(pantry.versions.find(({ id }) => id === first.version.id)).toEqual(first.version);
    const audited = await Audit.findAll({ where: { subjectId: first.formula.id } });
    expect(audited.map(({ action }) => action).sort()).toEqual(['create-formula', 'save-formula']);
    await expect(
      inTransaction(() =>
        FormulaLine.create({
          versionId: first.version.id,
          position: 9,
          ingredientId: 'salt',
          weightMg: 1,
        }),
      ),
    ).rejects.toMatchObject({
      parent: { message: expect.stringContaining('never changed in place') },
    });
  });

  it('gets no version where nothing is changed, and a new name without one', async () => {
    const { formula, version } = await created('Rose syrup', syrup);
    const again = await saved(formula.id, {
      basedOn: version.id,
      name: 'Rosy syrup',
      draft: syrup,
    });
    expect(again.version.id).toBe(version.id);
    expect(again.formula.name).toBe('Rosy syrup');
  });

  it('is saved by one of two who press at once; the other is shown what there is now', async () => {
    const { formula, version } = await created('Mint syrup', syrup);
    const body = (grams: number) => ({
      basedOn: version.id,
      name: 'Mint syrup',
      draft: formulaDraftOf({ 'granulated-sugar': grams }),
    });
    const answers = await Promise.all([
      save(formula.id, body(300)),
      save(formula.id, body(400), owner),
    ]);
    expect(answers.map(({ status }) => status).toSorted()).toEqual([201, 409]);
    const loser = answers.find(({ status }) => status === 409) ?? answers[0];
    expect(codeOf(loser)).toBe('changed-meanwhile');
    expect(problem.parse(loser.body).facts).toMatchObject({ current: { n: 2 } });
  });

  it('never shares its name with another in use', async () => {
    await created('Honey glaze', syrup);
    expect(issuesOf(await create(' honey GLAZE ', syrup))).toEqual([
      'name: Another formula has this name already.',
    ]);
  });

  it('names the line that is not there, and the one put away', async () => {
    const missing = await create('Ghost', formulaDraftOf({ water: 10, 'no-such': 10 }));
    expect(missing.status).toBe(422);
    expect(issuesOf(missing)[0]).toMatch(/^draft\.lines\.1\.part: Line 2, no-such: /);
    const nowhere = await create('Ghost', { ...syrup, lines: [holding('no-such-version')] });
    expect(issuesOf(nowhere)[0]).toMatch(/^draft\.lines\.0\.part: /);
    const made = savedIngredient.parse(
      (await baker.post('/api/pantry/ingredients', { basedOn: null, draft: ingredientDraftOf() }))
        .body,
    ).ingredient;
    await baker.post(`/api/pantry/ingredients/${made.id}/archive`);
    const away = await create('Ghost', formulaDraftOf({ [made.id]: 10 }));
    expect(issuesOf(away)[0]).toMatch(/^draft\.lines\.0\.part: Line 1, Cane syrup: was put away/);
  });

  it('cannot use itself, directly or through others: the line is named with the way', async () => {
    const inner = await created('Inner', syrup);
    const middle = await created('Middle', { ...syrup, lines: [holding(inner.version.id)] });
    const outer = await created('Outer', { ...syrup, lines: [holding(middle.version.id)] });
    const straight = await save(inner.formula.id, {
      basedOn: inner.version.id,
      name: 'Inner',
      draft: { ...syrup, lines: [...syrup.lines, holding(inner.version.id)] },
    });
    expect(straight.status).toBe(422);
    expect(issuesOf(straight)[0]).toMatch(/^draft\.lines\.2\.part: Line 3, Inner: .*uses itself/);
    const around = await save(inner.formula.id, {
      basedOn: inner.version.id,
      name: 'Inner',
      draft: { ...syrup, lines: [...syrup.lines, holding(outer.version.id)] },
    });
    expect(issuesOf(around)[0]).toContain('Inner > Outer > Middle > Inner');
    expect(current(await load(), inner.formula.id).n).toBe(1);
  });

  it('may be a hundred formulas deep, but not tangled without end', async () => {
    const writer = await User.findOne({ where: { role: 'baker' }, rejectOnEmpty: true });
    /** Ninety-nine formulas, each in the next; the hundredth is saved as bakers do. */
    const inside = await inTransaction(async () => {
      let draft: FormulaDraft = syrup;
      let versionId = '';
      for (let depth = 1; depth < 100; depth += 1) {
        const { id } = await Formula.create({ id: newId(), kind: 'other', name: `Depth ${depth}` });
        versionId = await writeVersion(id, draft, writer.id);
        draft = { ...syrup, lines: [holding(versionId)] };
      }
      await noteCatalogueChange();
      return versionId;
    });
    const deep = await created('Depth 100', { ...syrup, lines: [holding(inside)] });
    expect((await app.visitor().get('/api/menu')).status).toBe(200);
    expect((await baker.post('/api/pantry/ingredients/water/archive')).status).toBe(409);
    expect(deep.version.n).toBe(1);

    let knot = (await created('Knot', syrup)).version.id;
    let refused: Answer | null = null;
    for (let turn = 0; turn < 20 && refused === null; turn += 1) {
      const draft = { ...syrup, lines: [holding(knot), holding(knot)] };
      const next = await create(`Knot ${String(turn)}`, draft);
      if (next.status === 201) knot = savedFormula.parse(next.body).version.id;
      else refused = next;
    }
    expect(refused === null ? [] : issuesOf(refused)).toEqual([
      'draft.lines: These formulas hold one another too many times over.',
    ]);
  });

  it('refuses absurd numbers with the path of each, and never breaks', async () => {
    const absurd: readonly [string, object][] = [
      ['draft.yieldPpm', { yieldPpm: 1_000_001 }],
      ['draft.yieldPpm', { yieldPpm: 0 }],
      ['draft.yieldPpm', { yieldPpm: -5 }],
      ['draft.yieldPpm', { yieldPpm: 0.5 }],
      ['draft.yieldPpm', { yieldPpm: null }],
      ['draft.densityGPerMl', { densityGPerMl: 0 }],
      ['draft.densityGPerMl', { densityGPerMl: 1e300 }],
      ['draft.bakeLossPpm', { bakeLossPpm: 999_999 }],
      ['draft.keepsRoomHours', { keepsRoomHours: -1 }],
      ['draft.holdsToC', { holdsToC: 1e9 }],
      ['draft.baseColour', { baseColour: 'butter' }],
      ['draft.lines', { lines: [] }],
      ['draft.lines.0.grams', { lines: [{ ...syrup.lines[0], grams: 0 }] }],
      ['draft.lines.0.grams', { lines: [{ ...syrup.lines[0], grams: -3 }] }],
      ['draft.lines.0.grams', { lines: [{ ...syrup.lines[0], grams: 1e12 }] }],
      ['draft.lines.0.grams', { lines: [{ ...syrup.lines[0], grams: '500' }] }],
      ['draft.lines.0.step', { lines: [{ ...syrup.lines[0], step: 90 }] }],
      ['draft.lines', { lines: [{ ...syrup.lines[0], step: 3 }] }],
    ];
    for (const [path, changes] of absurd) {
      const answer = await baker.post('/api/pantry/formulas', {
        kind: 'filling',
        name: 'Absurd',
        draft: { ...syrup, ...changes },
      });
      expect([JSON.stringify(changes), answer.status]).toEqual([JSON.stringify(changes), 422]);
      expect(issuesOf(answer)[0]?.startsWith(`${path}: `), issuesOf(answer)[0]).toBe(true);
    }
    const noJson = await baker.post('/api/pantry/formulas', '{"kind":');
    expect(noJson.status).toBe(400);
  });
});

describe('a formula inside others', () => {
  it('is carried into those that are named, one inside another, and into no other', async () => {
    const inner = await created('Base', syrup);
    const user = await created('User', { ...syrup, lines: [holding(inner.version.id)] });
    const outer = await created('User of the user', {
      ...syrup,
      lines: [holding(user.version.id), holding(inner.version.id, 5)],
    });
    const other = await created('Left alone', { ...syrup, lines: [holding(inner.version.id)] });
    const result = await saved(inner.formula.id, {
      basedOn: inner.version.id,
      name: 'Base',
      draft: { ...syrup, note: 'Less water.' },
      // The outer one before what is inside it: the order does not matter.
      carryInto: [outer.formula.id, user.formula.id],
    });
    const pantry = await load();
    const newUser = current(pantry, user.formula.id);
    const newOuter = current(pantry, outer.formula.id);
    expect(result.carried.map(({ id }) => id)).toEqual([newUser.id, newOuter.id]);
    expect(newUser).toMatchObject({ n: 2, lines: [holding(result.version.id)] });
    expect(newOuter.lines).toEqual([holding(newUser.id), holding(result.version.id, 5)]);
    expect(current(pantry, other.formula.id).lines).toEqual([holding(inner.version.id)]);

    // Said once more: everything named holds the newest already.
    const again = await saved(inner.formula.id, {
      basedOn: result.version.id,
      name: 'Base',
      draft: { ...syrup, note: 'Less water.' },
      carryInto: [outer.formula.id, user.formula.id],
    });
    expect(again).toMatchObject({ version: { id: result.version.id }, carried: [] });
    expect(current(await load(), outer.formula.id).id).toBe(newOuter.id);

    const wrong = await save(inner.formula.id, {
      basedOn: result.version.id,
      name: 'Base',
      draft: { ...syrup, note: 'Even less.' },
      carryInto: [user.formula.id, 'vanilla-sponge'],
    });
    expect(issuesOf(wrong)[0]).toMatch(/^carryInto\.1: /);
    // All of it is refused: no version was made on the way.
    expect(current(await load(), user.formula.id).n).toBe(2);
  });
});

describe('putting away', () => {
  it('is refused while the menu sells it or a formula holds it, naming what does', async () => {
    const used = async (path: string) => {
      const answer = await baker.post(path);
      expect([path, answer.status, codeOf(answer)]).toEqual([path, 409, 'still-used']);
      return z
        .object({ usedBy: z.array(usedBy) })
        .parse(problem.parse(answer.body).facts)
        .usedBy.map(({ kind, name }) => `${kind} ${name}`);
    };
    expect(await used('/api/pantry/formulas/raspberry-jam/archive')).toEqual([
      'filling Raspberry jam',
    ]);
    expect(await used('/api/pantry/formulas/german-custard/archive')).toEqual([
      'formula German buttercream',
    ]);
    expect(await used('/api/pantry/ingredients/raspberries/archive')).toEqual([
      'formula Raspberry jam',
    ]);
    expect(await used('/api/pantry/ingredients/marshmallow/archive')).toContain(
      'decoration Modeled figure',
    );
  });

  it('keeps a formula for the orders that have it, and can be taken back', async () => {
    const { formula } = await created('For a while', syrup);
    const away = await baker.post(`/api/pantry/formulas/${formula.id}/archive`);
    expect(formulaView.parse(away.body).archivedAt).toBe('2027-05-03T12:00:00.000Z');
    expect((await load()).formulas.find(({ id }) => id === formula.id)?.archivedAt).not.toBeNull();
    const stale = await save(formula.id, {
      basedOn: formula.currentVersionId,
      name: 'For a while',
      draft: { ...syrup, note: 'x' },
    });
    expect(codeOf(stale)).toBe('changed-meanwhile');
    const back = await baker.post(`/api/pantry/formulas/${formula.id}/restore`);
    expect(formulaView.parse(back.body).archivedAt).toBeNull();
    expect((await baker.post('/api/pantry/formulas/none/archive')).status).toBe(404);
  });
});

describe('an ingredient', () => {
  const put = (id: string, body: object, by = baker) =>
    by.put(`/api/pantry/ingredients/${id}`, body);

  it('is written, changed by one of two at once, and keeps its measures and prices', async () => {
    const draft = ingredientDraftOf({
      name: 'Maple syrup',
      measures: [{ measure: 'cup', qualifier: null, grams: 315, source: 'Our own scales' }],
      pack: null,
      densityGPerMl: null,
    });
    const answer = await baker.post('/api/pantry/ingredients', { basedOn: null, draft });
    expect(answer.status, answer.text).toBe(201);
    const { ingredient } = savedIngredient.parse(answer.body);
    expect(draftOfIngredient(ingredient)).toEqual(draft);
    const priced = { ...draft, pack: { grams: 946, priceMinor: 2100 } };
    const both = await Promise.all([
      put(ingredient.id, { basedOn: draft, draft: priced }),
      put(ingredient.id, { basedOn: draft, draft: { ...draft, brand: 'Elm' } }, owner),
    ]);
    expect(both.map(({ status }) => status).toSorted()).toEqual([200, 409]);
    const loser = both.find(({ status }) => status === 409) ?? both[0];
    expect(codeOf(loser)).toBe('changed-meanwhile');
    expect(problem.parse(loser.body).facts).toMatchObject({ current: { id: ingredient.id } });
  });

  it('is on the shelf once: a second of its name is another maker’s', async () => {
    const twice = async (changes: Partial<IngredientDraft>) =>
      baker.post('/api/pantry/ingredients', { basedOn: null, draft: ingredientDraftOf(changes) });
    const named = { name: 'fine SEA salt', labelName: 'salt' };
    expect(issuesOf(await twice({ ...named, brand: 'Fenwick' }))).toEqual([
      'draft.name: This one is on the shelf already.',
    ]);
    expect((await twice({ ...named, brand: 'Grey Dunes' })).status).toBe(201);
  });

  it('cannot say what no label says', async () => {
    const issues = async (changes: Partial<IngredientDraft>) =>
      issuesOf(
        await baker.post('/api/pantry/ingredients', {
          basedOn: null,
          draft: ingredientDraftOf(changes),
        }),
      );
    const nuts: AllergenEntry = {
      allergen: 'tree-nuts',
      species: ['almond'],
      state: 'contains',
    };
    expect(await issues({ allergens: [nuts, { ...nuts, state: 'unknown' }] })).toEqual([
      'draft.allergens.1: This one is there already.',
    ]);
    expect(await issues({ allergens: [{ ...nuts, species: ['conker'] }] })).toEqual([
      'draft.allergens.0.species: Choose a kind from the list.',
    ]);
    expect(await issues({ labelCheckedOn: '2027-05-04' })).toEqual([
      'draft.labelCheckedOn: That day is still to come.',
    ]);
    expect(await issues({ eggPart: 'yolk' })).toEqual([
      'draft.allergens: It is part of an egg: say that it contains egg.',
    ]);
    expect(
      (await issues({ pack: { grams: 0, priceMinor: -1 } })).map((it) => it.split(':')[0]),
    ).toEqual(['draft.pack.grams', 'draft.pack.priceMinor']);
  });

  it('whose label nobody has read is unknown on the menu at once, and a stop for who declared it', async () => {
    const pantry = await load();
    const before = bought(pantry, 'vanilla');
    const unread = { ...draftOfIngredient(before), labelCheckedOn: null };
    const answer = await put('vanilla', { basedOn: draftOfIngredient(before), draft: unread });
    expect(answer.status, answer.text).toBe(200);
    const { day, cake, setting, look } = orderForm('2027-06-12');
    const { date, windowStart: _, ...guests } = day;
    const egg = { species: null, text: '', severity: 'allergy', guests: 1 } as const;
    const estimated = await app.visitor().post('/api/estimates', {
      design: {
        guests: { ...guests, allergies: [{ ...egg, allergen: 'lupin' }] },
        cake,
        setting,
        look,
        extras: [],
      },
      date,
    });
    const { advice, allergens } = estimateView.parse(estimated.body);
    expect(advice.find(({ code }) => code === 'allergen-unknown')).toMatchObject({
      level: 'stop',
      about: 'allergen-unknown:lupin',
    });
    expect(allergens.find(({ allergen }) => allergen === 'lupin')?.state).toBe('unknown');
    const read = await put('vanilla', { basedOn: unread, draft: draftOfIngredient(before) });
    expect(read.status).toBe(200);
  });
});
