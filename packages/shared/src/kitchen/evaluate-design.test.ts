import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { design as designContract } from '#shared/contracts/design.ts';
import { estimate as estimateContract, type Estimate } from '#shared/contracts/estimates.ts';
import { menu as menuContract, type Menu } from '#shared/contracts/menu.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { summariseDesign } from './summarise-design.ts';
import { arbitraryDesign } from './testing/arbitraries.ts';
import { coat, declares, designFixture, designWith, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';
import { UnknownPart } from './unknown-part.ts';

const today = '2027-05-01';
const dates = fc.constantFrom(null, '2027-05-01', '2027-05-06', '2027-07-17', '2028-02-29');
const regions = fc
  .constantFrom('US' as const, 'EU' as const, 'UK' as const)
  .map((labelRegion): Menu => ({
    ...menuFixture,
    studio: { ...menuFixture.studio, labelRegion },
  }));

/** Everything a customer reads of an estimate. */
function sentencesOf(estimate: Estimate): string[] {
  return [
    ...estimate.advice.flatMap((it) => [it.sentence, it.instead, ...it.ways.map((w) => w.label)]),
    ...estimate.ranks.map((it) => it.sentence),
    ...estimate.proposals.flatMap((it) => [it.name, it.blurb]),
    ...estimate.price.lines.map((it) => it.label),
    estimate.keepCool,
  ];
}

describe('any design the contract lets through', () => {
  it('is evaluated, and the answer keeps its contract', () => {
    fc.assert(
      fc.property(arbitraryDesign, dates, regions, (design, date, menu) => {
        expect(designContract.safeParse(design).success).toBe(true);
        const estimate = evaluateDesign({ design, date }, menu, today);
        expect(estimateContract.parse(estimate)).toEqual(estimate);
      }),
      { numRuns: 150 },
    );
  });

  it('is never called safe, nor free from anything', () => {
    fc.assert(
      fc.property(arbitraryDesign, dates, regions, (design, date, menu) => {
        for (const text of sentencesOf(evaluateDesign({ design, date }, menu, today))) {
          expect(text).not.toMatch(/\bsafe(?:ly|ty)?\b|[- ]free\b(?! of charge)|\bfree from\b/i);
          expect(text).not.toMatch(/undefined|null|NaN|\s{2,}/);
        }
      }),
      { numRuns: 150 },
    );
  });

  it('has advice sharpest first, each about something of its own', () => {
    const order = ['stop', 'care', 'ok'];
    fc.assert(
      fc.property(arbitraryDesign, dates, (design, date) => {
        const { advice } = evaluateDesign({ design, date }, menuFixture, today);
        const levels = advice.map((it) => order.indexOf(it.level));
        expect(levels).toEqual([...levels].sort());
        const keys = advice.map((it) => it.about);
        expect(new Set(keys).size).toBe(keys.length);
      }),
    );
  });

  it('gets ways out that are themselves designs the contract lets through', () => {
    fc.assert(
      fc.property(arbitraryDesign, dates, (design, date) => {
        const { advice } = evaluateDesign({ design, date }, menuFixture, today);
        for (const { patch } of advice.flatMap((it) => it.ways)) {
          const changed = { ...design, ...patch };
          expect(designContract.safeParse(changed).success).toBe(true);
          evaluateDesign({ design: changed, date }, menuFixture, today);
        }
      }),
    );
  });

  it('leaves menu and design as they were', () => {
    const before = JSON.stringify([designFixture, menuFixture]);
    evaluateDesign({ design: designFixture, date: null }, menuFixture, today);
    expect(JSON.stringify([designFixture, menuFixture])).toBe(before);
  });
});

it('the menu for tests keeps the menu’s contract', () => {
  expect(menuContract.parse(menuFixture)).toEqual(menuFixture);
});

describe('a name the menu does not have', () => {
  it.each([
    [['guests', 'occasionId'], designWith({ guests: { occasionId: 'coronation' } })],
    [
      ['cake', 'tiers', 1, 'spongeId'],
      designWith({ cake: { tiers: [roundTier(10), roundTier(8, { spongeId: 'granite' })] } }),
    ],
    [
      ['cake', 'tiers', 0, 'fillingId'],
      designWith({ cake: { tiers: [roundTier(10, { fillingId: 'gravel' })] } }),
    ],
    [
      ['cake', 'sheet', 'sizeId'],
      designWith({
        cake: {
          kind: 'sheet',
          tiers: [],
          sheet: { sizeId: 'acre', layers: 1, spongeId: 'vanilla', fillingId: null },
        },
      }),
    ],
    [
      ['look', 'decorations', 0, 'decorationId'],
      designWith({
        look: {
          decorations: [
            { decorationId: 'comet', tier: null, quantity: 1, colour: null, source: 'studio' },
          ],
        },
      }),
    ],
    [['extras', 0, 'extraId'], designWith({ extras: [{ extraId: 'pony', quantity: 1 }] })],
  ])('is told with its path %j', (path, design) => {
    const attempt = () => evaluateDesign({ design, date: null }, menuFixture, today);
    expect(attempt).toThrow(UnknownPart);
    expect(attempt).toThrow(expect.objectContaining({ path }));
  });

  it('is told of coats and portions too, where the studio stopped making them', () => {
    const fewer: Menu = { ...menuFixture, styles: [], portionSizes: [] };
    const attempt = (menu: Menu) => () =>
      evaluateDesign({ design: designFixture, date: null }, menu, today);
    expect(attempt(fewer)).toThrow(expect.objectContaining({ path: ['guests', 'portionSizeId'] }));
    expect(attempt({ ...menuFixture, styles: [] })).toThrow(
      expect.objectContaining({ path: ['cake', 'coating', 'style'] }),
    );
  });
});

describe('the estimate of a whole cake', () => {
  const estimate = evaluateDesign({ design: designFixture, date: null }, menuFixture, today);

  it('counts its portions from the board up', () => {
    expect(estimate.portions).toEqual({
      wanted: 70,
      fed: 77,
      perTier: [39, 25, 13],
      perCuttingCake: [],
    });
  });

  it('says what is in it and in which parts, and what else is handled', () => {
    expect(estimate.allergens.map((it) => [it.allergen, it.parts])).toEqual([
      ['gluten-cereals', ['Vanilla sponge']],
      ['egg', ['Vanilla sponge', 'Swiss meringue buttercream']],
      ['milk', ['Vanilla sponge', 'Swiss meringue buttercream']],
    ]);
    expect(estimate.handled.map((it) => it.allergen)).toContain('tree-nuts');
  });

  it('ranks every coat once', () => {
    // Three coverings over six styles, and ganache over none.
    expect(estimate.ranks).toHaveLength(19);
    expect(new Set(estimate.ranks.map((it) => `${it.covering} ${it.style ?? ''}`)).size).toBe(19);
  });

  it('ranks a coat that a guest cannot eat below the others', () => {
    const design = designWith({ guests: { allergies: [declares({ allergen: 'egg' })] } });
    const { ranks } = evaluateDesign({ design, date: null }, menuFixture, today);
    const swiss = ranks.find((it) => it.covering === 'buttercream' && it.style === 'swiss');
    expect(swiss).toMatchObject({ level: 'stop' });
    expect(swiss?.sentence).toContain('It has egg, which you told us of.');
    // Common practice, no source: of the six, American and Russian have no egg.
    const eggless = ranks.filter((it) => it.covering === 'buttercream' && it.level !== 'stop');
    expect(eggless.map((it) => it.style).sort()).toEqual(['american', 'russian']);
  });

  it('ranks what only the warmth speaks against before what a guest cannot eat', () => {
    const design = designWith({
      guests: { allergies: [declares({ allergen: 'egg' })] },
      setting: { warmestC: 40, place: 'shade' },
    });
    const { ranks } = evaluateDesign({ design, date: null }, menuFixture, today);
    const buttercreams = ranks.filter((it) => it.covering === 'buttercream');
    expect(new Set(buttercreams.map((it) => it.level))).toEqual(new Set(['stop']));
    expect(buttercreams.slice(0, 2).map((it) => it.style)).toEqual(['american', 'russian']);
  });

  it('takes a dummy for no sponge, and so for none of its allergens', () => {
    const dummy = { real: false, spongeId: null, fillingId: null };
    const design = designWith({
      cake: {
        tiers: [roundTier(8, dummy), roundTier(6, { spongeId: 'rice-cocoa' })],
        coating: coat({ style: 'american' }),
      },
    });
    const { allergens } = evaluateDesign({ design, date: null }, menuFixture, today);
    expect(allergens.map((it) => it.allergen)).toEqual(['soy', 'milk']);
  });
});

describe('a design in one line', () => {
  it.each([
    ['Three tiers, 10, 8 and 6 in, 77 portions', designFixture],
    ['A cake for 70, not chosen yet', designWith({ cake: null })],
    [
      'Two square tiers (one dummy), 10 and 6 in, 50 portions',
      designWith({
        cake: {
          tiers: [
            roundTier(10, { shape: 'square', heightMm: 102 }),
            roundTier(6, { shape: 'square', real: false, spongeId: null, fillingId: null }),
          ],
        },
      }),
    ],
    [
      'Half sheet, 13 x 18 in, 54 portions',
      designWith({
        cake: {
          kind: 'sheet',
          tiers: [],
          sheet: { sizeId: 'half', layers: 1, spongeId: 'vanilla', fillingId: null },
        },
      }),
    ],
    [
      'One rectangle tier, 12 × 8 in, 48 portions',
      designWith({
        cake: { tiers: [roundTier(8, { shape: 'rectangle', widthMm: 305, depthMm: 203 })] },
      }),
    ],
  ])('%s', (text, design) => {
    expect(summariseDesign(design, menuFixture)).toBe(text);
  });

  it('follows the studio’s unit', () => {
    const metric: Menu = { ...menuFixture, studio: { ...menuFixture.studio, lengthLead: 'cm' } };
    expect(summariseDesign(designFixture, metric)).toBe(
      'Three tiers, 25, 20 and 15 cm, 77 portions',
    );
  });
});
