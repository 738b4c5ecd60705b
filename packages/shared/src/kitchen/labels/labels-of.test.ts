import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import type { FormulaNode } from '../derive-contents.ts';
import { amountsOf } from '../amounts.ts';
import { resolveDesign } from '../resolve-design.ts';
import { entry } from '../testing/contents-fixture.ts';
import { designFixture, roundTier, swissCoat } from '../testing/design-fixture.ts';
import { menuFixture } from '../testing/menu-fixture.ts';
import { textOf } from './allergen-words.ts';
import { labelsOf, type LabelInput, type PartRef } from './labels-of.ts';
import {
  bought,
  buttercream,
  eggs,
  flour,
  formulaOfLines,
  lineOf,
  sponge,
  sugar,
} from './testing/label-pantry.ts';

const raspberry = formulaOfLines('Raspberry', [lineOf(bought('raspberries'), 3), lineOf(sugar, 1)]);
const byPart: Partial<Record<PartRef['part'], FormulaNode>> = {
  sponge,
  filling: raspberry,
  style: buttercream,
};

const madeAt = new Date('2027-06-17T14:00:00Z');

function input(design: Design, change: Partial<LabelInput> = {}, menu: Menu = menuFixture) {
  const made: LabelInput = {
    resolved: resolveDesign(design, menu),
    formulaOf: ({ part }) => byPart[part] ?? null,
    keepingOf: ({ part, id }) =>
      part === 'decoration'
        ? null
        : {
            name: id,
            madeAt,
            keepsChilledHours: part === 'style' ? 120 : 96,
            refrigerate: true,
            formulaId: id,
          },
    assessed: new Set<AllergenId>(),
    number: 2421,
    occasion: 'Wedding',
    madeOn: '2027-06-18',
    pickupAt: new Date('2027-06-19T14:00:00Z'),
    ...change,
  };
  return made;
}

const twoTiers: Design = {
  ...designFixture,
  cake: {
    kind: 'tiered',
    tiers: [roundTier(8), roundTier(6)],
    sheet: null,
    coating: swissCoat,
    cuttingCakes: [],
  },
  look: null,
};

describe('the label of an order', () => {
  it('says what the law wants of the whole cake', () => {
    const { labels, reasons } = labelsOf(input(twoTiers));
    expect(reasons).toEqual([]);
    expect(labels).toHaveLength(1);
    const label = labels[0];
    expect(label).toMatchObject({
      id: 'cake',
      product: 'Cake: vanilla sponge, raspberry jam filling, Swiss meringue buttercream',
      about: 'Wedding, No. 2421',
      contains: 'Contains: Milk, Egg, Wheat.',
      madeOn: '2027-06-18',
      // 96 h after it was made at 10:00 in New York on the 17th.
      useBy: '2027-06-21',
    });
    expect(textOf(label?.ingredients ?? [])).toMatch(/^Sugar, /u);
    expect(label?.remove).toEqual([
      expect.stringMatching(/^Hidden inside: 1 board and \d dowels\./u),
    ]);
  });

  it('weighs what is eaten, without bowl and bag, boards and dummies', () => {
    const whole = resolveDesign(twoTiers, menuFixture);
    const { perTier } = amountsOf(whole);
    const eaten = perTier.map((it) => it.spongeG + it.fillingG + it.frostingOnCakeG);
    const sum = eaten.reduce((total, it) => total + it, 0);
    expect(labelsOf(input(twoTiers)).labels[0]?.net.grams).toBeCloseTo(sum);

    const dummy: Design = {
      ...twoTiers,
      cake: {
        kind: 'tiered',
        tiers: [roundTier(8), roundTier(6, { real: false, spongeId: null, fillingId: null })],
        sheet: null,
        coating: swissCoat,
        cuttingCakes: [],
      },
    };
    const [label] = labelsOf(input(dummy)).labels;
    const below = amountsOf(resolveDesign(dummy, menuFixture)).perTier[0];
    expect(label?.net.grams).toBeCloseTo(
      (below?.spongeG ?? 0) + (below?.fillingG ?? 0) + (below?.frostingOnCakeG ?? 0),
    );
    expect(label?.remove.join(' ')).toContain('Top tier: a dummy, not cake.');
  });

  it('has one more for each kind of cutting cake, with its own parts alone', () => {
    const [size] = menuFixture.sheetSizes;
    const design: Design = {
      ...twoTiers,
      cake: {
        kind: 'tiered',
        tiers: [roundTier(6)],
        sheet: null,
        coating: swissCoat,
        cuttingCakes: [
          { sizeId: size?.id ?? '', count: 3, layers: 1, spongeId: 'vanilla', fillingId: null },
        ],
      },
    };
    const { labels } = labelsOf(input(design));
    expect(labels.map((it) => [it.id, it.copies])).toEqual([
      ['cake', 1],
      ['cutting-cake-0', 3],
    ]);
    expect(labels[1]?.product).toMatch(
      /^Cutting cake: vanilla sponge, Swiss meringue buttercream$/u,
    );
    expect(textOf(labels[1]?.ingredients ?? [])).not.toContain('raspberries');
    expect(labels[1]?.remove).toEqual([]);
  });

  it('prints what is not known and cannot be printed until it is settled', () => {
    const sprinkled = formulaOfLines('Sponge', [
      lineOf(flour, 4),
      lineOf(eggs, 2),
      lineOf(bought('gold sugar', { allergens: [entry('soy', [], 'unknown')] }), 1),
    ]);
    const { labels, reasons } = labelsOf(
      input(twoTiers, {
        formulaOf: ({ part }) => (part === 'sponge' ? sprinkled : (byPart[part] ?? null)),
      }),
    );
    expect(labels[0]?.notKnown).toEqual(['Not known: whether gold sugar contains soy.']);
    expect(reasons).toEqual([
      expect.objectContaining({
        code: 'unknown-allergen',
        ingredientId: 'gold sugar',
        confirmable: true,
      }),
    ]);
  });

  it('wants a shelf life and an address', () => {
    const { reasons, labels } = labelsOf(
      input(
        twoTiers,
        {
          keepingOf: ({ id }) => ({
            name: id,
            madeAt,
            keepsChilledHours: null,
            refrigerate: true,
            formulaId: id,
          }),
        },
        {
          ...menuFixture,
          studio: { ...menuFixture.studio, street: '', town: '', region: '', postcode: '' },
        },
      ),
    );
    expect(new Set(reasons.map((it) => it.code))).toEqual(new Set(['shelf-life', 'address']));
    expect(labels[0]?.useBy).toBeNull();
  });

  it('is not printed for a part that stops keeping before the cake leaves', () => {
    const late = input(twoTiers, { pickupAt: new Date('2027-06-21T14:00:01Z') });
    expect(labelsOf(late).reasons.map((it) => it.code)).toContain('shelf-life');
    const inTime = input(twoTiers, { pickupAt: new Date('2027-06-21T14:00:00Z') });
    expect(labelsOf(inTime).reasons).toEqual([]);
  });

  it('tells what a flower that comes off is made with', () => {
    const flower = {
      decorationId: 'sugar-flower',
      tier: 0,
      quantity: 3,
      colour: null,
      source: 'studio' as const,
    };
    const look = {
      palette: [],
      words: [],
      note: '',
      decorations: [flower, { ...flower, tier: 1 }],
    };
    const [label] = labelsOf(input({ ...twoTiers, look })).labels;
    expect(label?.remove).toContain(
      '6 × Sugar flower: not for eating. Take off first, with any wires, picks and stems. Made with egg.',
    );
  });

  it('has nothing to print where there is no cake', () => {
    const { labels, reasons } = labelsOf(input({ ...twoTiers, cake: null }));
    expect(labels).toEqual([]);
    expect(reasons.map((it) => it.code)).toEqual(['no-cake']);
  });

  it('never says safe or free from, in any region', () => {
    for (const labelRegion of ['US', 'EU', 'UK'] as const) {
      const menu: Menu = { ...menuFixture, studio: { ...menuFixture.studio, labelRegion } };
      const said = JSON.stringify(labelsOf(input(designFixture, {}, menu)));
      expect(said).not.toMatch(/free[ -]from|\bsafe\b|-free\b|contains no|without /iu);
    }
  });
});
