import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allergyTable, type AllergyTable } from '#shared/contracts/allergy-table.ts';
import { problem } from '#shared/contracts/common.ts';
import { Audit } from '#api/db/models/audit.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import { freshMenu } from '#api/modules/menu/menu.queries.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let owner: TestClient;
const path = '/api/staff/allergy-table';

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  owner = await signInStaff(app, await addUser('owner', { name: 'Ida Thorne' }));
});
afterAll(() => app.close());

const read = async (): Promise<AllergyTable> => allergyTable.parse((await owner.get(path)).body);
const save = (words: object) => owner.send('PUT', path, { body: words });
const wordsOf = ({ fromLabels: _fromLabels, ...words }: AllergyTable) => words;

describe('the owner’s table', () => {
  it('is read with what the labels say is handled anyway', async () => {
    const table = await read();
    expect(table.rules).toContainEqual({
      allergen: 'peanut',
      severity: 'allergy',
      answer: 'refuse',
    });
    expect(table.kitchen.find((it) => it.allergen === 'sesame')).toMatchObject({ handled: true });
    const bought = table.fromLabels.map((it) => it.allergen);
    expect(bought).toContain('egg');
    // Sesame is the owner's own addition: no label of what is bought names it.
    expect(bought).not.toContain('sesame');
    expect((await read()).version).toBe(table.version);
  });

  it('is saved whole, counts at once for the menu, and is audited without its words', async () => {
    const before = await read();
    const { catalogueVersion } = await readPlanVersions();
    const answer = await save({
      ...wordsOf(before),
      rules: [
        { allergen: null, severity: 'anaphylaxis', answer: 'talk' },
        { allergen: 'lupin', severity: 'allergy', answer: 'take' },
      ],
      kitchen: [
        { allergen: 'lupin', handled: true, assessment: '', assessedOn: null },
        {
          allergen: 'peanut',
          handled: false,
          assessment: 'None is bought.',
          assessedOn: '2027-05-01',
        },
        { allergen: 'celery', handled: false, assessment: '', assessedOn: '2027-05-01' },
      ],
      homeKitchenText: '',
    });
    expect(answer.status, answer.text).toBe(200);
    const after = allergyTable.parse(answer.body);
    expect(after.rules).toHaveLength(2);
    // A row that says nothing is none.
    expect(after.kitchen.map((it) => it.allergen)).toEqual(['peanut', 'lupin']);
    expect((await readPlanVersions()).catalogueVersion).toBe(catalogueVersion + 1);
    const menu = await freshMenu();
    expect(menu.allergyRules).toHaveLength(2);
    expect(menu.studio.handles.map((it) => it.allergen)).toContain('lupin');
    expect(menu.studio.homeKitchenText).toBe('');
    const audit = await Audit.findOne({ where: { action: 'save-allergy-table' } });
    expect(audit?.data).toEqual({ rules: 2, handled: 1 });

    const late = await save(wordsOf(before));
    expect(problem.parse(late.body).code).toBe('changed-meanwhile');
  });

  it('refuses two answers to one question, and texts that customers must be able to read', async () => {
    const words = wordsOf(await read());
    const twice = { allergen: 'egg', severity: 'allergy', answer: 'take' };
    expect((await save({ ...words, rules: [twice, { ...twice, answer: 'talk' }] })).status).toBe(
      422,
    );
    expect((await save({ ...words, kitchenNotice: ' ' })).status).toBe(422);
    expect((await save({ ...words, eggAdvisory: '' })).status).toBe(422);
  });
});
