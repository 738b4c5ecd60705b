import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { menu as menuContract } from '#shared/contracts/menu.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { seedAll } from '#api/db/seeders/seed-all.ts';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { preparedMenu } from './menu.queries.ts';

const clock = new TestClock('2027-05-03T12:00:00Z');
let database: TestDatabase;
let menu: Menu;

beforeAll(async () => {
  database = await openTestDatabase({ clock });
  await seedAll(database.database, { clock, demo: false });
  menu = (await preparedMenu()).menu;
});
afterAll(() => database.close());

const holding = (part: { contents: Menu['sponges'][number]['contents'] } | undefined) =>
  (part?.contents.allergens ?? []).filter((it) => it.state === 'contains').map((it) => it.allergen);
const style = (id: string) => menu.styles.find((it) => it.id === id);
const sponge = (id: string) => menu.sponges.find((it) => it.id === id);

describe('the seeded menu', () => {
  it('fits its contract', () => {
    expect(z.parse(menuContract, menu)).toEqual(menu);
  });

  // Common practice, no source: of the six, American and Russian have no egg.
  it('derives what the six buttercreams contain through their formulas', () => {
    expect(Object.fromEntries(menu.styles.map((it) => [it.id, holding(it)]))).toEqual({
      american: ['milk'],
      swiss: ['egg', 'milk'],
      italian: ['egg', 'milk'],
      french: ['egg', 'milk'],
      german: ['egg', 'milk'],
      russian: ['milk'],
    });
  });

  it('finds the egg of the German one inside its custard, and knows that it is cooked', () => {
    expect(style('german')?.contents.statement).toMatch(
      /^custard for german buttercream \(milk, /i,
    );
    expect(style('german')?.contents.undercookedEgg).toBe(false);
  });

  it('has no undercooked egg where whites are heated or egg is pasteurised', () => {
    const raw = [...menu.styles, ...menu.sponges, ...menu.fillings, ...menu.decorations]
      .filter((it) => it.contents.undercookedEgg)
      .map((it) => it.id);
    expect(raw).toEqual([]);
  });

  it('has a sponge without egg, one without wheat and one without milk', () => {
    expect(holding(sponge('cocoa'))).not.toContain('egg');
    expect(holding(sponge('cocoa'))).not.toContain('milk');
    expect(holding(sponge('almond'))).not.toContain('gluten-cereals');
    expect(holding(sponge('orange-chiffon'))).not.toContain('milk');
  });

  it('never calls an unknown label none', () => {
    const figure = menu.decorations.find((it) => it.id === 'figure');
    expect(figure?.contents.allergens).toContainEqual({
      allergen: 'sulphites',
      species: [],
      state: 'unknown',
    });
    expect(figure?.contents.gelatine).toBe(true);
  });

  it('says what the kitchen handles: everything bought, and what the owner adds', () => {
    const handled = menu.studio.handles.map((it) => it.allergen);
    expect(handled).toEqual(['gluten-cereals', 'egg', 'soy', 'milk', 'tree-nuts', 'sesame']);
    const nuts = menu.studio.handles.find((it) => it.allergen === 'tree-nuts');
    expect(nuts?.species).toEqual(['almond', 'hazelnut', 'pistachio', 'walnut']);
  });

  it('keeps what only the owner sees to itself', () => {
    expect(JSON.stringify(menu)).not.toMatch(/labour|overhead|packPrice|costMinor/i);
  });

  it('is seeded once: a second run changes nothing', async () => {
    const before = menu.version;
    await seedAll(database.database, { clock, demo: false });
    expect((await preparedMenu()).menu.version).toBe(before);
  });
});
