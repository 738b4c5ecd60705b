import type {
  Formula,
  FormulaLine,
  FormulaVersion,
  HouseholdMeasure,
  Ingredient,
  IngredientMeasure,
} from '#shared/contracts/pantry.ts';
import type { FormulaBook } from '#shared/kitchen/formulas/pantry-index.ts';

/** One weight of a measure: `[measure, grams]` or `[measure, grams, qualifier]`. */
export type MeasureRow = readonly [HouseholdMeasure, number, string?];

const measuresOf = (rows: readonly MeasureRow[]): IngredientMeasure[] =>
  rows.map(([measure, grams, qualifier]) => ({
    measure,
    grams,
    qualifier: qualifier ?? null,
    source: null,
  }));

/** A bought product whose label was read and names nothing; its price is not known. */
export function bought(
  id: string,
  name: string,
  given: Partial<Omit<Ingredient, 'measures'>> = {},
  measures: readonly MeasureRow[] = [],
): Ingredient {
  return {
    id,
    name,
    brand: null,
    labelName: name.toLowerCase(),
    labelContents: null,
    labelCheckedOn: '2026-09-01',
    family: 'other',
    pack: null,
    densityGPerMl: null,
    roundingG: 1,
    eggPart: null,
    pasteurised: 'no',
    gelatine: 'no',
    alcohol: 'no',
    cochineal: 'no',
    honey: 'no',
    animalOrigin: 'no',
    allergens: [],
    archivedAt: null,
    ...given,
    measures: measuresOf(measures),
  };
}

/** `[part, grams]` or `[part, grams, step]`; a part is an ingredient's id, or `@` and a version's. */
export type LineRow = readonly [part: string, grams: number, step?: number];

export const lineOf = ([part, grams, step]: LineRow): FormulaLine => ({
  part: part.startsWith('@')
    ? { kind: 'formula', formulaVersionId: part.slice(1) }
    : { kind: 'ingredient', ingredientId: part },
  grams,
  asTyped: null,
  step: step ?? 0,
});

/** A version `<formula>-<n>`, all of what goes in left, without steps. */
export function version(
  formulaId: string,
  lines: readonly LineRow[],
  given: Partial<FormulaVersion> = {},
): FormulaVersion {
  const n = given.n ?? 1;
  return {
    id: `${formulaId}-${n}`,
    formulaId,
    n,
    lines: lines.map(lineOf),
    steps: [],
    yieldPpm: 1_000_000,
    densityGPerMl: 1,
    bakeLossPpm: 0,
    baseColour: null,
    keepsRoomHours: null,
    keepsChilledHours: null,
    keepsFrozenHours: null,
    holdsToC: null,
    refrigerate: true,
    pasteurisedByDefault: false,
    note: '',
    createdAt: '2026-09-01T08:00:00Z',
    createdBy: '',
    ...given,
  };
}

/** A pantry of these; each formula is named and its newest version is the current one. */
export function bookOf(
  ingredients: readonly Ingredient[],
  versions: readonly FormulaVersion[],
  names: Readonly<Record<string, string>> = {},
): FormulaBook {
  const newest = new Map<string, FormulaVersion>();
  for (const it of versions) {
    if ((newest.get(it.formulaId)?.n ?? 0) <= it.n) newest.set(it.formulaId, it);
  }
  return {
    ingredients: [...ingredients],
    versions: [...versions],
    formulas: [...newest.values()].map((it): Formula => ({
      id: it.formulaId,
      kind: 'other',
      name: names[it.formulaId] ?? it.formulaId,
      currentVersionId: it.id,
      archivedAt: null,
    })),
  };
}

/**
 * A cake kitchen's shelf. Household weights are USDA SR28 as the kitchen's own table gives them
 * (butter 01001, granulated sugar 19335, powdered 19336, brown 19334, whole milk 01077, heavy
 * cream 01053, condensed milk 01095, cornstarch 20027, flour 20081, cocoa 19165, honey 19296, corn
 * syrup 19350, salt 02047, vanilla extract 02050, baking powder 18369, cream cheese 01017); the
 * cup of whole egg, white or yolk (243 g) is SR28 from memory. Prices are invented.
 */
export const shelf: readonly Ingredient[] = [
  bought(
    'butter',
    'Unsalted butter, 82 % fat',
    {
      family: 'butter',
      labelName: 'butter',
      brand: 'Millbrook Creamery',
      pack: { grams: 454, priceMinor: 545 },
      allergens: [{ allergen: 'milk', species: [], state: 'contains' }],
    },
    [
      ['cup', 227],
      ['stick', 113],
      ['tablespoon', 14.2],
    ],
  ),
  bought(
    'sugar',
    'Granulated cane sugar',
    { family: 'sugar', labelName: 'sugar', pack: { grams: 11_340, priceMinor: 1540 } },
    [['cup', 200]],
  ),
  bought(
    'powdered-sugar',
    'Powdered sugar',
    {
      family: 'sugar',
      labelContents: 'sugar, cornstarch',
      pack: { grams: 11_340, priceMinor: 1880 },
    },
    [
      ['cup', 120, 'unsifted'],
      ['cup', 100, 'sifted'],
    ],
  ),
  bought('brown-sugar', 'Light brown sugar', { family: 'sugar', labelName: 'brown sugar' }, [
    ['cup', 220, 'packed'],
  ]),
  bought(
    'milk',
    'Whole milk',
    {
      family: 'dairy',
      labelName: 'milk',
      pack: { grams: 3904, priceMinor: 479 },
      allergens: [{ allergen: 'milk', species: [], state: 'contains' }],
    },
    [['cup', 244]],
  ),
  bought(
    'cream',
    'Heavy cream, 36 % fat',
    {
      family: 'dairy',
      labelName: 'cream',
      pack: { grams: 952, priceMinor: 620 },
      allergens: [{ allergen: 'milk', species: [], state: 'contains' }],
    },
    [['cup', 238]],
  ),
  bought(
    'condensed',
    'Sweetened condensed milk',
    {
      family: 'dairy',
      labelContents: 'milk, sugar',
      pack: { grams: 397, priceMinor: 315 },
      allergens: [{ allergen: 'milk', species: [], state: 'contains' }],
    },
    [
      ['cup', 306],
      ['can', 397],
    ],
  ),
  bought('cream-cheese', 'Cream cheese', { family: 'dairy' }, [['cup', 232]]),
  bought('cornstarch', 'Cornstarch', { family: 'starch', pack: { grams: 1814, priceMinor: 560 } }, [
    ['cup', 128],
  ]),
  bought(
    'flour',
    'All-purpose flour',
    {
      family: 'flour',
      labelName: 'wheat flour',
      pack: { grams: 11_340, priceMinor: 1690 },
      allergens: [{ allergen: 'gluten-cereals', species: ['wheat'], state: 'contains' }],
    },
    [['cup', 125]],
  ),
  bought('cocoa', 'Cocoa powder', { family: 'chocolate', labelName: 'cocoa' }, [['cup', 86]]),
  bought('honey', 'Wildflower honey', { family: 'sugar', labelName: 'honey', honey: 'yes' }, [
    ['cup', 339],
  ]),
  bought('corn-syrup', 'Light corn syrup', { family: 'sugar', labelName: 'corn syrup' }, [
    ['cup', 341],
  ]),
  bought(
    'salt',
    'Fine salt',
    { family: 'salt', labelName: 'salt', roundingG: 0.1, pack: { grams: 1360, priceMinor: 240 } },
    [['teaspoon', 6]],
  ),
  bought(
    'vanilla',
    'Pure vanilla extract',
    {
      family: 'flavour',
      labelName: 'vanilla extract',
      alcohol: 'yes',
      pack: { grams: 946, priceMinor: 7900 },
    },
    [
      ['teaspoon', 4.2],
      ['tablespoon', 13],
    ],
  ),
  bought('baking-powder', 'Baking powder', { family: 'raising' }, [['teaspoon', 4.6]]),
  bought('water', 'Tap water', { family: 'liquid', labelName: 'water', densityGPerMl: 1 }),
  bought(
    'eggs',
    'Large eggs, a dozen',
    {
      family: 'egg',
      labelName: 'egg',
      eggPart: 'whole',
      pack: { grams: 600, priceMinor: 525 },
      allergens: [{ allergen: 'egg', species: [], state: 'contains' }],
    },
    [
      ['piece', 50],
      ['cup', 243],
    ],
  ),
  bought(
    'whites',
    'Large eggs, the whites',
    {
      family: 'egg',
      labelName: 'egg white',
      eggPart: 'white',
      pack: { grams: 396, priceMinor: 347 },
      allergens: [{ allergen: 'egg', species: [], state: 'contains' }],
    },
    [
      ['piece', 33],
      ['cup', 243],
    ],
  ),
  bought(
    'yolks',
    'Large eggs, the yolks',
    {
      family: 'egg',
      labelName: 'egg yolk',
      eggPart: 'yolk',
      allergens: [{ allergen: 'egg', species: [], state: 'contains' }],
    },
    [
      ['piece', 17],
      ['cup', 243],
    ],
  ),
  bought('carton-whites', 'Pasteurized egg whites', {
    family: 'egg',
    labelName: 'egg white',
    brand: 'Henley & Roe',
    eggPart: 'white',
    pasteurised: 'yes',
    allergens: [{ allergen: 'egg', species: [], state: 'contains' }],
  }),
];
