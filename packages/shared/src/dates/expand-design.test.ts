import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import { coat, declares, designWith, roundTier } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { chainBackwards } from './chain.ts';
import { expandDesign } from './expand-design.ts';
import { batchMinutes, splitMinutes } from './expansion.ts';
import type { Demand } from './model.ts';
import { typicalDesign } from './typical-design.ts';
import { defaultWorkTimes, workTimes } from './work-times.ts';

const equipment = { bowlG: 6000, decks: 2, deckMm2: 700 * 500 };

function expand(design: Design, more: Partial<typeof equipment> = {}): Demand {
  return expandDesign({
    resolved: resolveDesign(design, menuFixture),
    workTimes: defaultWorkTimes,
    equipment: { ...equipment, ...more },
    noticeDays: 4,
  });
}

const keys = (demand: Demand) => demand.work.map((it) => it.key);
const find = (demand: Demand, key: string) => {
  const work = demand.work.find((it) => it.key === key);
  if (work === undefined) throw new Error(`no ${key} in ${keys(demand).join()}`);
  return work;
};
const gap = (demand: Demand, before: string, after: string) =>
  demand.links.find((it) => it.before === before && it.after === after)?.gap;

describe('a design at the bench', () => {
  it('is one batch per formula, and fill, coat per tier, then stacked and boxed', () => {
    const demand = expand(designWith({}));
    expect(keys(demand)).toEqual([
      'bake:vanilla',
      'filling:raspberry',
      'buttercream:swiss',
      'fill:0',
      'coat:0',
      'fill:1',
      'coat:1',
      'fill:2',
      'coat:2',
      'stack',
      'box',
    ]);
    expect(find(demand, 'fill:0').label).toBe('Fill and crumb coat the bottom tier');
    expect(demand.boxes).toHaveLength(3);
    expect(demand.noticeDays).toBe(4);
  });

  it('cools, rests and sets between the steps', () => {
    const demand = expand(designWith({}));
    // 10 in is large, 8 in is not.
    expect(gap(demand, 'bake:vanilla', 'fill:0')).toBe(180);
    expect(gap(demand, 'bake:vanilla', 'fill:1')).toBe(120);
    expect(gap(demand, 'fill:1', 'coat:1')).toBe(30);
    expect(gap(demand, 'coat:1', 'stack')).toBe(120);
    expect(gap(demand, 'stack', 'box')).toBe(0);
    const german = expand(designWith({ cake: { coating: coat({ style: 'german' }) } }));
    expect(gap(german, 'custard:german', 'buttercream:german')).toBe(60);
  });

  it('takes bowls x fixed + grams x rate, and loads by the area of the tins', () => {
    expect(batchMinutes(2, 3100, { perBowl: 20, perKg: 4 })).toBe(2 * 20 + 13);
    const one = designWith({ cake: { tiers: [roundTier(8)] } });
    const bake = find(expand(one), 'bake:vanilla');
    // Two tins of 203 x 203 mm fit on a deck: one load, hands first and the oven after.
    expect(bake.batch?.bowls).toBe(1);
    expect(bake).toMatchObject({ ovenMinutes: 45, mixerMinutes: 15 });
    expect(bake.minutes).toBe(bake.benchMinutes + 45);
    // On a deck that holds one tin it is two loads, beside one another on two decks.
    const small = find(expand(one, { deckMm2: 250 * 250 }), 'bake:vanilla');
    expect(small).toMatchObject({ ovenMinutes: 90 });
    expect(small.minutes).toBe(small.benchMinutes + 45);
    // On a single deck they would take longer than the longest piece: two batches of a load each.
    const oneDeck = expand(one, { deckMm2: 250 * 250, decks: 1 });
    expect(keys(oneDeck).slice(0, 2)).toEqual(['bake:vanilla/1', 'bake:vanilla/2']);
    expect(find(oneDeck, 'bake:vanilla/1')).toMatchObject({ batch: { bowls: 1 }, ovenMinutes: 45 });
  });

  it('leaves out what a tier has not: no sponge in a dummy, no final coat when semi-naked', () => {
    const dummy = roundTier(8, { real: false, spongeId: null, fillingId: null });
    const shown = expand(designWith({ cake: { tiers: [roundTier(10), dummy] } }));
    expect(shown.links.some((it) => it.before === 'bake:vanilla' && it.after === 'fill:1')).toBe(
      false,
    );
    expect(find(shown, 'fill:1').label).toBe('Coat the dummy of the top tier');
    const naked = expand(
      designWith({ cake: { tiers: [roundTier(8)], coating: coat({ covering: 'semi-naked' }) } }),
    );
    expect(keys(naked)).not.toContain('coat:0');
    expect(gap(naked, 'fill:0', 'box')).toBe(20);
    const fondant = expand(
      designWith({ cake: { tiers: [roundTier(8)], coating: coat({ covering: 'fondant' }) } }),
    );
    expect(keys(fondant)).toContain('cover:0');
    expect(keys(fondant)).toContain('buttercream:swiss');
    const ganache = expand(
      designWith({
        cake: { tiers: [roundTier(8)], coating: coat({ covering: 'ganache', style: null }) },
      }),
    );
    expect(keys(ganache)).toContain('ganache');
    expect(keys(ganache)).not.toContain('buttercream:swiss');
  });

  it('makes some decorations ahead and puts them on, and others on the cake; fresh flowers last', () => {
    const placed = (
      decorationId: string,
      quantity: number,
      source: 'studio' | 'florist' = 'studio',
    ) => ({
      decorationId,
      tier: null,
      quantity,
      colour: null,
      source,
    });
    const menu = {
      ...menuFixture,
      decorations: menuFixture.decorations.map((it) =>
        it.id === 'sugar-flower'
          ? { ...it, minutes: 20, madeAhead: true, skill: 'sugar-flowers' }
          : it,
      ),
    };
    const design = designWith({
      cake: { tiers: [roundTier(10), roundTier(8)] },
      look: {
        decorations: [
          placed('sugar-flower', 9),
          placed('border', 1),
          placed('fresh-flowers', 1, 'florist'),
        ],
        words: [{ tier: 0, text: 'Ana and Bo' }],
      },
    });
    const demand = expandDesign({
      resolved: resolveDesign(design, menu),
      workTimes: defaultWorkTimes,
      equipment,
      noticeDays: 4,
    });
    // 180 minutes of flowers in two parts, whenever there is time in the two months before, and a
    // day to dry before they go on.
    expect([find(demand, 'decorate:0/1').minutes, find(demand, 'decorate:0/2').minutes]).toEqual([
      90, 90,
    ]);
    expect(demand.links).toContainEqual({
      before: 'decorate:0/2',
      after: 'decorate:0/on',
      gap: 24 * 60,
      keeps: 60 * 24 * 60,
    });
    expect(find(demand, 'decorate:0/1')).toMatchObject({ skill: 'sugar-flowers', within: null });
    // A border on each of two tiers.
    expect(find(demand, 'decorate:1').minutes).toBe(30);
    expect(find(demand, 'decorate:2/on').within).toBe(36 * 60);
    expect(find(demand, 'words:0')).toMatchObject({ minutes: 20, skill: 'lettering' });
    expect(gap(demand, 'words:0', 'box')).toBe(0);
    // The notice of the flowers is longer than the cake's.
    expect(demand.noticeDays).toBe(7);
  });

  it('dries what is made ahead for as long as the studio says, within what it keeps', () => {
    const linkOf = (keepsDays: number | null, dryBeforeSettingOn: number) => {
      const { links } = expandDesign({
        resolved: resolveDesign(
          designWith({
            cake: { tiers: [roundTier(8)] },
            look: {
              decorations: [
                {
                  decorationId: 'sugar-flower',
                  tier: null,
                  quantity: 2,
                  colour: null,
                  source: 'studio',
                },
              ],
            },
          }),
          {
            ...menuFixture,
            decorations: menuFixture.decorations.map((it) =>
              it.id === 'sugar-flower' ? { ...it, madeAhead: true, keepsDays } : it,
            ),
          },
        ),
        workTimes: { ...defaultWorkTimes, gaps: { ...defaultWorkTimes.gaps, dryBeforeSettingOn } },
        equipment,
        noticeDays: 4,
      });
      return links.find((it) => it.before === 'decorate:0');
    };
    expect(linkOf(null, 48 * 60)).toMatchObject({ gap: 48 * 60, keeps: 60 * 24 * 60 });
    expect(linkOf(14, 24 * 60)).toMatchObject({ gap: 24 * 60, keeps: 14 * 24 * 60 });
    // Nothing waits longer than it keeps.
    expect(linkOf(1, 24 * 60)).toMatchObject({ gap: 0, keeps: 24 * 60 });
  });

  it('bakes, fills and coats cutting cakes by themselves, and boxes each', () => {
    const cut = { sizeId: 'half', layers: 2, spongeId: 'almond', fillingId: 'raspberry' };
    const alone = expand(designWith({}));
    const one = expand(designWith({ cake: { cuttingCakes: [{ ...cut, count: 1 }] } }));
    const three = expand(designWith({ cake: { cuttingCakes: [{ ...cut, count: 3 }] } }));
    expect(keys(one).filter((it) => !keys(alone).includes(it))).toEqual([
      'bake:almond',
      'fill:cutting-0',
      'coat:cutting-0',
    ]);
    expect(find(one, 'fill:cutting-0')).toMatchObject({
      label: 'Fill and crumb coat the cutting cake',
      tier: null,
    });
    expect(gap(one, 'coat:cutting-0', 'box')).toBe(20);
    expect(one.links.some((it) => it.before === 'coat:cutting-0' && it.after === 'stack')).toBe(
      false,
    );
    const grams = (demand: Demand) => find(demand, 'bake:almond').batch?.grams ?? 0;
    const baked = three.work.filter((it) => it.batch?.source.id === 'almond');
    const together = baked.reduce((sum, it) => sum + (it.batch?.grams ?? 0), 0);
    expect(Math.abs(together - 3 * grams(one))).toBeLessThanOrEqual(3);
    expect(three.boxes).toHaveLength(3 + 3);
    expect(find(three, 'box').minutes - find(alone, 'box').minutes).toBe(3 * 4);
  });

  it('plans a dummy on show with the cake that is cut in the kitchen', () => {
    const dummy = { real: false, spongeId: null, fillingId: null };
    const demand = expand(
      designWith({
        cake: {
          tiers: [roundTier(10, dummy), roundTier(8, dummy)],
          cuttingCakes: [
            { sizeId: 'half', count: 1, layers: 2, spongeId: 'vanilla', fillingId: 'raspberry' },
          ],
        },
      }),
    );
    const waiting = demand.links.filter((it) => it.before === 'bake:vanilla').map((it) => it.after);
    expect(waiting).toEqual(['fill:cutting-0']);
  });

  it('knows what it contains and what its work is kept apart from', () => {
    const guests = {
      allergies: [
        declares({ allergen: 'egg', severity: 'anaphylaxis' }),
        declares({ allergen: 'tree-nuts', severity: 'allergy' }),
        declares({ allergen: 'peanut', severity: 'avoids' }),
      ],
    };
    const demand = expand(designWith({ guests }));
    expect(demand.contains).toContain('egg');
    // An egg cake cannot be kept apart from egg; that is the advice's to stop.
    expect(demand.apart).toEqual(['tree-nuts']);
  });

  it('refuses what is not a cake yet', () => {
    expect(() => expand(designWith({ cake: null }))).toThrow(/without a cake/);
    expect(() => expand(designWith({ cake: { coating: null } }))).toThrow(/without a coating/);
  });
});

describe('any design', () => {
  const designs = fc
    .record({
      tiers: fc.array(
        fc.record({
          across: fc.constantFrom(5, 6, 8, 10, 12, 14),
          layers: fc.integer({ min: 2, max: 5 }),
          spongeId: fc.constantFrom('vanilla', 'chocolate', 'almond'),
          fillingId: fc.constantFrom('raspberry', 'lemon-curd'),
          real: fc.boolean(),
        }),
        { minLength: 1, maxLength: 6 },
      ),
      style: fc.constantFrom('american', 'swiss', 'german', 'french'),
      covering: fc.constantFrom('buttercream', 'fondant', 'semi-naked'),
      finish: fc.constantFrom('smooth', 'textured', 'piped'),
      quantity: fc.integer({ min: 1, max: 200 }),
      text: fc.string({ maxLength: 80 }),
    })
    .map(({ tiers, style, covering, finish, quantity, text }) =>
      designWith({
        cake: {
          tiers: tiers.map(({ across, real, ...inside }, n) =>
            n === 0 || real
              ? roundTier(across, inside)
              : roundTier(across, {
                  layers: inside.layers,
                  real: false,
                  spongeId: null,
                  fillingId: null,
                }),
          ),
          coating: coat({ style, covering, finish }),
        },
        look: {
          words: [{ tier: 0, text }],
          decorations: [
            { decorationId: 'sugar-flower', tier: null, quantity, colour: null, source: 'studio' },
          ],
        },
      }),
    );

  it('comes out in whole minutes, in pieces a shift can hold, with hands inside the clock', () => {
    fc.assert(
      fc.property(designs, (design) => {
        const demand = expand(design);
        expect(new Set(keys(demand)).size).toBe(demand.work.length);
        for (const work of demand.work) {
          for (const minutes of [
            work.minutes,
            work.benchMinutes,
            work.mixerMinutes,
            work.ovenMinutes,
          ]) {
            expect(Number.isInteger(minutes)).toBe(true);
          }
          expect(work.minutes).toBeGreaterThan(0);
          expect(work.benchMinutes).toBeLessThanOrEqual(work.minutes);
          expect(work.mixerMinutes).toBeLessThanOrEqual(work.minutes);
          if (work.batch === null)
            expect(work.minutes).toBeLessThanOrEqual(defaultWorkTimes.longestPiece);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('has an order of work that ends with the box', () => {
    fc.assert(
      fc.property(designs, (design) => {
        const demand = expand(design);
        const chain = chainBackwards(demand);
        expect(chain[0]?.work.key).toBe('box');
        const at = new Map(chain.map((it, n) => [it.work.key, n]));
        for (const link of demand.links) {
          expect(at.get(link.before)).toBeGreaterThan(at.get(link.after) ?? Infinity);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('is split into parts that add up', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 5000 }),
        fc.integer({ min: 30, max: 480 }),
        (minutes, longest) => {
          const parts = splitMinutes(minutes, longest);
          expect(parts.reduce((sum, it) => sum + it, 0)).toBe(minutes);
          expect(Math.max(...parts)).toBeLessThanOrEqual(longest);
          expect(Math.max(...parts) - Math.min(...parts)).toBeLessThanOrEqual(1);
        },
      ),
    );
  });
});

describe('a design that is not complete', () => {
  it('is filled in with a cautious typical one, and says so', () => {
    const early = { ...designWith({ cake: null }), look: null, setting: null };
    const { design, likely } = typicalDesign(early, menuFixture);
    expect(likely).toBe(true);
    expect(design.cake?.tiers.length).toBeGreaterThanOrEqual(3);
    expect(expand(design).work.length).toBeGreaterThan(8);
    expect(expand(design).noticeDays).toBe(4);
    const party = typicalDesign(
      { ...early, guests: { ...early.guests, headCount: 12, occasionId: 'birthday' } },
      menuFixture,
    );
    expect(party.design.look?.decorations).toEqual([]);
    const huge = typicalDesign(
      { ...early, guests: { ...early.guests, headCount: 2000 } },
      menuFixture,
    );
    expect(huge.design.cake?.tiers.length).toBeGreaterThan(0);
  });

  it('leaves what is chosen as it is', () => {
    const whole = designWith({});
    expect(typicalDesign(whole, menuFixture)).toEqual({ design: whole, likely: false });
    const uncoated = typicalDesign(designWith({ cake: { coating: null } }), menuFixture);
    expect(uncoated.likely).toBe(true);
    expect(uncoated.design.cake?.tiers).toEqual(whole.cake?.tiers);
  });
});

describe('work times', () => {
  it('read their own defaults back', () => {
    expect(workTimes.parse(JSON.parse(JSON.stringify(defaultWorkTimes)))).toEqual(defaultWorkTimes);
  });
});
