import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { currentVersion, indexPantry } from '../formulas/pantry-index.ts';
import { partWeights } from '../part-weights.ts';
import { resolveDesign } from '../resolve-design.ts';
import { coat, designWith, roundTier } from '../testing/design-fixture.ts';
import { menuFixture } from '../testing/menu-fixture.ts';
import { datedNeeds } from './dated-needs.ts';
import { needsOf, type NeedsInput } from './kitchen-needs.ts';
import { shoppingList } from './shopping.ts';
import { smallPantry, smallParts } from './testing/small-pantry.ts';

const index = indexPantry(smallPantry);
const resolve = (changes: Parameters<typeof designWith>[0]) =>
  resolveDesign(designWith(changes), menuFixture);

const needs = (changes: Parameters<typeof designWith>[0], change: Partial<NeedsInput> = {}) =>
  needsOf({
    resolved: resolve(changes),
    index,
    parts: smallParts,
    versionOf: (id) => currentVersion(index, id)?.id ?? null,
    mixers: [{ id: 'm', name: 'Small mixer', capacityG: 3000 }],
    ...change,
  });

const oneTier = (across = 8) => ({
  cake: { tiers: [roundTier(across, { layers: 2 })], coating: coat({}) },
});
const grams = (of: ReturnType<typeof needs>, id: string) =>
  of.ingredients.find((it) => it.ingredient.id === id)?.grams ?? 0;
const formula = (of: ReturnType<typeof needs>, id: string) => {
  const found = of.formulas.find((it) => it.version.formulaId === id);
  if (found === undefined) throw new Error(`No ${id}.`);
  return found;
};

describe('what a cake takes', () => {
  it('mixes a sponge’s batter, before the oven and the knife take theirs', () => {
    const weights = partWeights(resolve(oneTier())).parts;
    const batterG = weights.find((it) => it.part === 'sponge')?.toMakeG ?? 0;
    const sponge = formula(needs(oneTier()), 'vanilla-sponge');
    expect(sponge.mixG).toBeCloseTo(batterG, 6);
    expect(sponge.outG).toBeCloseTo(batterG * 0.9, 6);
    // A quarter of the batter is flour: 300 of 1,200 g.
    expect(grams(needs(oneTier()), 'flour')).toBeCloseTo(batterG / 4, 6);
  });

  it('makes frosting with its bowl and bag, and adds what is lost', () => {
    const weights = partWeights(resolve(oneTier())).parts;
    const coatG = weights.find((it) => it.part === 'style')?.toMakeG ?? 0;
    const swiss = formula(needs(oneTier()), 'swiss');
    expect(swiss.outG).toBeCloseTo(coatG, 6);
    expect(swiss.scaled.exactInG).toBeCloseTo(coatG / 0.97, 6);
    expect(grams(needs(oneTier()), 'white')).toBeCloseTo((coatG / 0.97) * (1000 / 5650), 6);
  });

  it('lists a custard before the buttercream it goes into, with what cooking takes', () => {
    const german = needs({
      cake: { tiers: [roundTier(8)], coating: coat({ style: 'german' }) },
    });
    const names = german.formulas.map((it) => it.name);
    expect(names.indexOf('custard')).toBeLessThan(names.indexOf('german'));
    const custard = formula(german, 'custard');
    expect(custard.for).toEqual(['german']);
    const line = formula(german, 'german').scaled.lines[0];
    expect(custard.outG).toBeCloseTo(line?.exactG ?? 0, 6);
    expect(custard.scaled.exactInG).toBeCloseTo((line?.exactG ?? 0) / 0.95, 6);
  });

  it('splits what one mixer cannot take into equal bowls', () => {
    const three = needs({});
    const { mixG, bowls } = formula(three, 'vanilla-sponge');
    expect(bowls?.bowls).toBe(Math.ceil(mixG / 3000));
    expect((bowls?.eachG ?? 0) * (bowls?.bowls ?? 0)).toBeCloseTo(mixG, 6);
  });

  it('names what no formula tells of, and goes on with the rest', () => {
    const parts = { ...smallParts, fillings: {} };
    const without = needs(oneTier(), { parts });
    expect(without.unknown).toMatchObject([{ name: 'Raspberry jam filling', why: 'no-formula' }]);
    expect(grams(without, 'flour')).toBeGreaterThan(0);
  });

  it('names a formula that cannot be reckoned with', () => {
    const versions = smallPantry.versions.map((it) =>
      it.formulaId === 'swiss' ? { ...it, yieldPpm: 1_200_000 } : it,
    );
    const broken = indexPantry({ ...smallPantry, versions });
    expect(needs(oneTier(), { index: broken }).unknown).toMatchObject([{ why: 'unsound' }]);
  });

  it('counts decorations by what one of them is made of', () => {
    const decorated = needs({
      ...oneTier(),
      look: {
        decorations: [
          { decorationId: 'sugar-flower', tier: 0, quantity: 5, colour: null, source: 'studio' },
        ],
      },
    });
    const paste = decorated.ingredients.find((it) => it.ingredient.id === 'gum-paste');
    expect(paste).toMatchObject({ grams: 110, forDecorationsG: 110 });
  });

  it('uses the version an order was made with', () => {
    const plain = smallPantry.versions.filter((it) => it.formulaId === 'swiss');
    const older = plain.map((it) => ({ ...it, id: 'swiss-0', lines: it.lines.slice(0, 2) }));
    const kept = indexPantry({ ...smallPantry, versions: [...smallPantry.versions, ...older] });
    const versionOf = (id: string) => (id === 'swiss' ? 'swiss-0' : `${id}-1`);
    const before = needs(oneTier(), { index: kept, versionOf });
    expect(formula(before, 'swiss').scaled.lines).toHaveLength(2);
  });

  it('takes more of everything for a larger cake', () => {
    fc.assert(
      fc.property(fc.integer({ min: 4, max: 11 }), (across) => {
        const [smaller, larger] = [needs(oneTier(across)), needs(oneTier(across + 1))];
        for (const { ingredient, grams: g } of smaller.ingredients) {
          expect(grams(larger, ingredient.id)).toBeGreaterThan(g);
        }
      }),
      { numRuns: 8 },
    );
  });
});

describe('needs by day', () => {
  const german = needs({ cake: { tiers: [roundTier(8)], coating: coat({ style: 'german' }) } });
  const dated = datedNeeds(
    german,
    (id) =>
      id === 'german'
        ? [
            { date: '2027-06-08', share: 0.75 },
            { date: '2027-06-09', share: 0.25 },
          ]
        : [],
    '2027-06-07',
  );
  const on = (formulaId: string) => [
    ...new Set(dated.filter((it) => it.formula?.id === formulaId).map((it) => it.date)),
  ];

  it('follow the plan, part by part', () => {
    expect(on('german')).toEqual(['2027-06-08', '2027-06-09']);
  });

  it('go with the formula they are inside, and else on the day that is told', () => {
    expect(on('custard')).toEqual(['2027-06-08', '2027-06-09']);
    expect(on('vanilla-sponge')).toEqual(['2027-06-07']);
  });

  it('come to the same weights in all', () => {
    for (const { ingredient, grams: g } of german.ingredients) {
      const sum = dated
        .filter((it) => it.ingredient.id === ingredient.id)
        .reduce((total, it) => total + it.grams, 0);
      expect(sum).toBeCloseTo(g, 6);
    }
  });
});

describe('a shopping list', () => {
  const cakes = [needs(oneTier()), needs(oneTier(10))];
  const list = shoppingList(
    cakes.flatMap((it) => it.ingredients),
    { shell: 30, cartons: new Map() },
    smallPantry.ingredients,
  );
  const line = (id: string) => list.lines.find((it) => it.ingredient.id === id);

  it('buys whole packs for all orders together', () => {
    const butter = cakes.reduce((sum, it) => sum + grams(it, 'butter'), 0);
    expect(line('butter')?.grams).toBeCloseTo(butter, 6);
    expect(line('butter')?.packs).toBe(Math.ceil(butter / 454));
    expect(line('butter')?.buyMinor).toBe(Math.ceil(butter / 454) * 545);
  });

  it('buys eggs by the dozen, whatever part of them is used', () => {
    expect(line('white')).toBeUndefined();
    expect(line('egg')).toMatchObject({ eggs: 30, packs: 3, buyMinor: 1575 });
  });

  it('names what it has no pack for and leaves it out of the sum', () => {
    expect(list.unpriced).toEqual(['jam']);
    expect(line('jam')).toMatchObject({ packs: null, buyMinor: null });
    expect(list.buyMinor).toBe(list.lines.reduce((sum, it) => sum + (it.buyMinor ?? 0), 0));
  });
});
