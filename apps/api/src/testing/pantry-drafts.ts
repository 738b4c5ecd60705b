import type { FormulaDraft, IngredientDraft } from '#shared/contracts/pantry.ts';

/** A draft of a formula out of bought ingredients, grams by their ids. */
export function formulaDraftOf(
  grams: Readonly<Record<string, number>>,
  changes: Partial<FormulaDraft> = {},
): FormulaDraft {
  return {
    lines: Object.entries(grams).map(([ingredientId, weight]) => ({
      part: { kind: 'ingredient', ingredientId },
      grams: weight,
      asTyped: null,
      step: 0,
    })),
    steps: [],
    yieldPpm: 950_000,
    densityGPerMl: 1.1,
    bakeLossPpm: 0,
    baseColour: null,
    keepsRoomHours: null,
    keepsChilledHours: 72,
    keepsFrozenHours: null,
    holdsToC: 22,
    refrigerate: true,
    pasteurisedByDefault: false,
    note: '',
    ...changes,
  };
}

/** A draft of a product whose label somebody has read and which names nothing. */
export function ingredientDraftOf(changes: Partial<IngredientDraft> = {}): IngredientDraft {
  return {
    name: 'Cane syrup',
    brand: null,
    labelName: 'cane syrup',
    labelContents: null,
    labelCheckedOn: '2027-05-01',
    family: 'sugar',
    pack: { grams: 1000, priceMinor: 450 },
    densityGPerMl: null,
    roundingG: 1,
    eggPart: null,
    pasteurised: 'no',
    gelatine: 'no',
    alcohol: 'no',
    cochineal: 'no',
    honey: 'no',
    animalOrigin: 'no',
    measures: [],
    allergens: [],
    ...changes,
  };
}
