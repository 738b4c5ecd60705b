import fc from 'fast-check';
import type {
  Cake,
  Coating,
  CuttingCake,
  Declaration,
  Design,
  Tier,
} from '#shared/contracts/design.ts';
import {
  allergenIds,
  coveringIds,
  dietIds,
  finishIds,
  severities,
  styleIds,
} from '#shared/contracts/vocabulary.ts';
import { menuFixture as menu } from './menu-fixture.ts';

/** Designs that pass the contract and name only what the menu fixture has. */

const idOf = (items: readonly { readonly id: string }[]) =>
  fc.constantFrom(...items.map((it) => it.id));
const mm = fc.integer({ min: 100, max: 400 });
const colour = fc.option(
  fc.integer({ min: 0, max: 0xffffff }).map((it) => `#${it.toString(16).padStart(6, '0')}`),
);

/** What people write on cakes and forms, trimmed as the contract trims it. */
const writtenText = fc.oneof(
  fc.string({ maxLength: 80 }).map((it) => it.trim()),
  fc.constantFrom('Happy birthday Zoë', '👩‍🍳🎂 x 100', 'يوم سعيد', 'Nell & Tom, 19 June'),
);

export const arbitraryCoating: fc.Arbitrary<Coating> = fc
  .record({
    covering: fc.constantFrom(...coveringIds),
    style: fc.constantFrom(...styleIds),
    finish: fc.constantFrom(...finishIds),
    colour,
  })
  .map((it) => (it.covering === 'ganache' ? { ...it, style: null } : it));

/** One tier, mostly off the sizes of the tins, as wishes are. */
export const arbitraryTier: fc.Arbitrary<Tier> = fc
  .record({
    shape: fc.constantFrom('round' as const, 'square' as const, 'rectangle' as const),
    widthMm: mm,
    depthMm: mm,
    heightMm: fc.integer({ min: 75, max: 180 }),
    layers: fc.integer({ min: 2, max: 5 }),
    real: fc.boolean(),
    keepsake: fc.boolean(),
    spongeId: idOf(menu.sponges),
    fillingId: idOf(menu.fillings),
    coating: fc.option(arbitraryCoating),
  })
  .map((it) => ({
    ...it,
    depthMm: it.shape === 'rectangle' ? it.depthMm : it.widthMm,
    spongeId: it.real ? it.spongeId : null,
    fillingId: it.real ? it.fillingId : null,
  }));

const cuttingCakes: fc.Arbitrary<CuttingCake[]> = fc.array(
  fc.record({
    sizeId: idOf(menu.sheetSizes),
    count: fc.integer({ min: 1, max: 30 }),
    layers: fc.integer({ min: 1, max: 3 }),
    spongeId: idOf(menu.sponges),
    fillingId: fc.option(idOf(menu.fillings)),
  }),
  { maxLength: 2 },
);

const tieredCake: fc.Arbitrary<Cake> = fc
  .record({
    tiers: fc.array(arbitraryTier, { minLength: 1, maxLength: 6 }),
    coating: fc.option(arbitraryCoating),
    cuttingCakes,
  })
  .filter((it) => it.tiers.some((tier) => tier.real) || it.cuttingCakes.length > 0)
  .map((it) => ({ kind: 'tiered', sheet: null, ...it }));

const sheetCake: fc.Arbitrary<Cake> = fc
  .record({
    sheet: fc.record({
      sizeId: idOf(menu.sheetSizes),
      layers: fc.integer({ min: 1, max: 3 }),
      spongeId: idOf(menu.sponges),
      fillingId: fc.option(idOf(menu.fillings)),
    }),
    coating: fc.option(arbitraryCoating),
    cuttingCakes,
  })
  .map((it) => ({ kind: 'sheet', tiers: [], ...it }));

export const arbitraryCake: fc.Arbitrary<Cake> = fc.oneof(tieredCake, sheetCake);

export const arbitraryDeclaration: fc.Arbitrary<Declaration> = fc
  .record({
    allergen: fc.option(fc.constantFrom(...allergenIds)),
    species: fc.option(fc.constantFrom('almond', 'hazelnut', 'wheat', 'barley', 'walnut')),
    text: writtenText,
    severity: fc.constantFrom(...severities),
    guests: fc.integer({ min: 1, max: 2000 }),
  })
  .map((it) =>
    it.allergen === null && it.text.trim() === '' ? { ...it, text: 'Kiwi, please' } : it,
  );

/** Any design the contract lets through, from an empty first step to a finished cake. */
export const arbitraryDesign: fc.Arbitrary<Design> = fc.record({
  guests: fc.record({
    headCount: fc.integer({ min: 1, max: 2000 }),
    occasionId: idOf(menu.occasions),
    otherDesserts: fc.boolean(),
    portionSizeId: fc.constantFrom('coffee' as const, 'dessert' as const, 'party' as const),
    allergies: fc.array(arbitraryDeclaration, { maxLength: 4 }),
    diets: fc.uniqueArray(fc.constantFrom(...dietIds), { maxLength: 6 }),
    dietNote: fc.constant(''),
    infants: fc.boolean(),
    susceptible: fc.boolean(),
  }),
  cake: fc.option(arbitraryCake, { freq: 8 }),
  setting: fc.option(
    fc.record({
      place: fc.constantFrom('indoors' as const, 'shade' as const, 'sun' as const),
      warmestC: fc.option(fc.double({ min: -10, max: 50, noNaN: true })),
      minutesOut: fc.integer({ min: 0, max: 1440 }),
      driveMinutes: fc.integer({ min: 0, max: 720 }),
      servedAt: fc.option(fc.integer({ min: 0, max: 1440 })),
    }),
    { freq: 5 },
  ),
  look: fc.option(
    fc.record({
      palette: fc.array(
        colour.map((it) => it ?? '#ffffff'),
        { maxLength: 5 },
      ),
      words: fc.array(
        fc.record({
          tier: fc.integer({ min: 0, max: 5 }),
          text: writtenText,
        }),
        { maxLength: 3 },
      ),
      decorations: fc.array(
        fc.record({
          decorationId: idOf(menu.decorations),
          tier: fc.option(fc.integer({ min: 0, max: 5 })),
          quantity: fc.integer({ min: 1, max: 200 }),
          colour,
          source: fc.constantFrom('studio' as const, 'customer' as const, 'florist' as const),
        }),
        { maxLength: 6 },
      ),
      note: fc.constant(''),
    }),
    { freq: 4 },
  ),
  extras: fc.array(
    fc.record({ extraId: idOf(menu.extras), quantity: fc.integer({ min: 1, max: 200 }) }),
    { maxLength: 3 },
  ),
});
