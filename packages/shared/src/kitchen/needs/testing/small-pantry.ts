import type {
  EggPart,
  Formula,
  FormulaKind,
  FormulaVersion,
  Ingredient,
  PartFormulas,
} from '#shared/contracts/pantry.ts';
import type { FormulaBook } from '../../formulas/pantry-index.ts';
import { bought as boughtAs, version } from '../../testing/pantry-fixture.ts';

/** A pantry for tests, with what the menu fixture's Swiss and German cakes take. Prices in cents. */

/** A bought thing; without a pack its price is unknown. */
export function bought(
  id: string,
  pack: Ingredient['pack'],
  change: Partial<Ingredient> = {},
): Ingredient {
  return { ...boughtAs(id, id, { pack }), ...change };
}

export function shellEgg(id: string, eggPart: EggPart, each: number, pack: Ingredient['pack']) {
  return bought(id, pack, {
    family: 'egg',
    eggPart,
    measures: [{ measure: 'piece', qualifier: null, grams: each, source: 'USDA SR28' }],
  });
}

type Lines = readonly (readonly [part: string, grams: number])[];

/** A formula's first version; parts that begin with `@` are formulas. */
export function madeBy(
  id: string,
  kind: FormulaKind,
  lines: Lines,
  change: Partial<FormulaVersion> = {},
): { readonly formula: Formula; readonly version: FormulaVersion } {
  return {
    formula: { id, kind, name: id, currentVersionId: `${id}-1`, archivedAt: null },
    version: version(
      id,
      lines.map(([part, grams]) => [part.startsWith('@') ? `${part}-1` : part, grams]),
      change,
    ),
  };
}

const made = [
  madeBy(
    'vanilla-sponge',
    'sponge',
    [
      ['flour', 300],
      ['sugar', 300],
      ['butter', 240],
      ['egg', 250],
      ['milk', 110],
    ],
    { yieldPpm: 900_000, bakeLossPpm: 100_000 },
  ),
  madeBy('jam', 'filling', [['jam', 1000]]),
  madeBy(
    'swiss',
    'buttercream',
    [
      ['white', 1000],
      ['sugar', 1950],
      ['butter', 2700],
    ],
    { yieldPpm: 970_000 },
  ),
  madeBy(
    'custard',
    'custard',
    [
      ['milk', 1000],
      ['sugar', 580],
      ['egg', 420],
    ],
    { yieldPpm: 950_000 },
  ),
  madeBy(
    'german',
    'buttercream',
    [
      ['@custard', 1900],
      ['butter', 1600],
    ],
    { yieldPpm: 980_000 },
  ),
  madeBy('french', 'buttercream', [
    ['yolk-carton', 1000],
    ['sugar', 1200],
    ['butter', 2400],
  ]),
  madeBy('yolk-curd', 'filling', [
    ['yolk', 200],
    ['sugar', 400],
    ['butter', 400],
  ]),
];

export const smallPantry: FormulaBook = {
  ingredients: [
    bought('flour', { grams: 2270, priceMinor: 409 }),
    bought('sugar', { grams: 4540, priceMinor: 549 }),
    bought('butter', { grams: 454, priceMinor: 545 }),
    bought('milk', { grams: 3904, priceMinor: 479 }),
    bought('jam', null),
    shellEgg('egg', 'whole', 50, { grams: 600, priceMinor: 525 }),
    shellEgg('white', 'white', 33, { grams: 396, priceMinor: 347 }),
    shellEgg('yolk', 'yolk', 17, { grams: 204, priceMinor: 178 }),
    bought(
      'white-carton',
      { grams: 946, priceMinor: 790 },
      { family: 'egg', eggPart: 'white', pasteurised: 'yes' },
    ),
    bought(
      'yolk-carton',
      { grams: 946, priceMinor: 1240 },
      { family: 'egg', eggPart: 'yolk', pasteurised: 'yes' },
    ),
    bought('gum-paste', { grams: 500, priceMinor: 900 }),
  ],
  formulas: made.map((it) => it.formula),
  versions: made.map((it) => it.version),
};

export const smallParts: PartFormulas = {
  sponges: { vanilla: 'vanilla-sponge' },
  fillings: { raspberry: 'jam' },
  styles: { swiss: 'swiss', german: 'german' },
  coverings: {},
  decorations: {
    'sugar-flower': {
      formulaId: null,
      ingredients: [{ ingredientId: 'gum-paste', grams: 22 }],
      materialsCostMinor: 90,
    },
  },
};
