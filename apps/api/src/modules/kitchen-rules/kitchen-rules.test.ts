import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import {
  kitchenSettings,
  usualKitchen,
  type KitchenSettings,
} from '#shared/contracts/kitchen-rules.ts';
import { Audit } from '#api/db/models/audit.ts';
import { Studio } from '#api/db/models/studio.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import { freshMenu } from '#api/modules/menu/menu.queries.ts';
import { currentPantry } from '#api/modules/pantry/load-pantry.queries.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let owner: TestClient;
const path = '/api/staff/kitchen-rules';

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  owner = await signInStaff(app, await addUser('owner', { name: 'Ida Thorne' }));
});
afterAll(() => app.close());

const read = async (): Promise<KitchenSettings> =>
  kitchenSettings.parse((await owner.get(path)).body);
const save = (settings: object) => owner.send('PUT', path, { body: settings });

describe('the kitchen’s figures', () => {
  it('are the usual ones until the owner sets others', async () => {
    const settings = await read();
    expect(settings.rules).toEqual(usualKitchen);
    expect((await freshMenu()).kitchen).toEqual(usualKitchen);
    expect((await read()).version).toBe(settings.version);
  });

  it('are saved whole, count at once for menu, pantry and plan, and are audited', async () => {
    const before = await read();
    const versions = await readPlanVersions();
    const answer = await save({
      ...before,
      rules: { ...before.rules, crumbCoatMm: 3, heatMarginC: 4 },
      altitudeM: 1600,
      monthlyWarmestC: before.monthlyWarmestC.map((it) => it + 1),
      dessertFactorPpm: 650_000,
      wordsPer100Mm: 11,
    });
    expect(answer.status, answer.text).toBe(200);
    const menu = await freshMenu();
    expect(menu.kitchen).toEqual({ ...usualKitchen, crumbCoatMm: 3, heatMarginC: 4 });
    expect(menu.studio.monthlyWarmestC[0]).toBe((before.monthlyWarmestC[0] ?? 0) + 1);
    expect([menu.studio.dessertFactorPpm, menu.wordsPer100Mm]).toEqual([650_000, 11]);
    expect((await currentPantry()).altitudeM).toBe(1600);
    const after = await readPlanVersions();
    expect(after.catalogueVersion).toBe(versions.catalogueVersion + 1);
    expect(after.settingsVersion).toBe(versions.settingsVersion + 1);
    // What is usual is not kept: it follows where the usual goes.
    const studio = await Studio.findByPk(1, { rejectOnEmpty: true });
    expect(studio.kitchen).toEqual({ crumbCoatMm: 3, heatMarginC: 4 });
    const audit = await Audit.findOne({ where: { action: 'save-kitchen-rules' } });
    expect(audit?.data).toEqual({ own: 2 });

    const late = await save(before);
    expect(problem.parse(late.body).code).toBe('changed-meanwhile');
  });

  it('are refused at the figure', async () => {
    const settings = await read();
    const refused = await save({
      ...settings,
      rules: { ...settings.rules, damMm: 400 },
      monthlyWarmestC: settings.monthlyWarmestC.slice(1),
      dessertFactorPpm: 0,
    });
    expect(refused.status).toBe(422);
    expect(problem.parse(refused.body).issues?.map((it) => it.path.join('.'))).toEqual([
      'rules.damMm',
      'monthlyWarmestC',
      'dessertFactorPpm',
    ]);
    expect((await read()).version).toBe(settings.version);
  });
});
