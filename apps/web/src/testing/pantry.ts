import type { FormulaVersion, Ingredient, Pantry } from '#shared/contracts/pantry.ts';
import { bookOf, shelf, version } from '#shared/kitchen/testing/pantry-fixture.ts';

const custard = version(
  'custard',
  [
    ['milk', 1000],
    ['sugar', 550],
    ['eggs', 420],
    ['cornstarch', 110],
    ['salt', 6, 1],
  ],
  {
    yieldPpm: 950_000,
    densityGPerMl: 1.08,
    keepsChilledHours: 72,
    steps: [
      {
        text: 'Cook, whisking, until it bubbles.',
        activeMinutes: 6,
        waitingMinutes: 0,
        resource: 'bench',
        critical: { limitC: 71, seconds: null, note: 'All through.' },
        syrupTargetC: null,
      },
      {
        text: 'Into the fridge.',
        activeMinutes: 4,
        waitingMinutes: 120,
        resource: 'cold',
        critical: { limitC: 5, seconds: 21_600, note: '' },
        syrupTargetC: null,
      },
    ],
  },
);
const german = version('german', [
  ['@custard-1', 1980],
  ['butter', 1600],
]);

type Changes = {
  readonly ingredients?: readonly Ingredient[];
  readonly versions?: readonly FormulaVersion[];
};

/** A small pantry: a custard, the buttercream that holds it, and the shelf they are made from. */
export function pantryFixture({ ingredients = [], versions = [] }: Changes = {}): Pantry {
  return {
    version: '1',
    currency: 'USD',
    altitudeM: 260,
    ...bookOf([...shelf, ...ingredients], [custard, german, ...versions], {
      custard: 'Vanilla custard',
      german: 'German buttercream',
    }),
    parts: {
      sponges: {},
      fillings: {},
      styles: { german: 'german' },
      coverings: {},
      decorations: {},
    },
    mixers: [{ id: 'floor', name: 'Floor mixer', capacityG: 6000 }],
    can: { save: true, seeCost: true },
  };
}
