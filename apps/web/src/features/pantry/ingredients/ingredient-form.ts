import * as z from 'zod/mini';
import type { Ingredient, IngredientDraft } from '#shared/contracts/pantry.ts';
import {
  eggPart,
  householdMeasure,
  ingredientDraft,
  ingredientFamily,
  labelFact,
} from '#shared/contracts/pantry.ts';
import { allergenId, allergenState } from '#shared/contracts/vocabulary.ts';
import { gramsOf, minorOf, minorText, numberOf } from '../forms/read-amounts.ts';

/** An ingredient as it is typed: numbers stay text, so that nothing typed is lost. */
export const ingredientForm = z.object({
  name: z.string(),
  brand: z.string(),
  labelName: z.string(),
  labelContents: z.string(),
  labelCheckedOn: z.string(),
  family: ingredientFamily,
  packGrams: z.string(),
  packPrice: z.string(),
  density: z.string(),
  rounding: z.string(),
  eggPart: z.nullable(eggPart),
  pasteurised: labelFact,
  gelatine: labelFact,
  alcohol: labelFact,
  cochineal: labelFact,
  honey: labelFact,
  animalOrigin: labelFact,
  measures: z.array(
    z.object({
      key: z.number(),
      measure: householdMeasure,
      qualifier: z.string(),
      grams: z.string(),
      source: z.string(),
    }),
  ),
  /** One row per allergen and state; species tell rows of one allergen apart. */
  allergens: z.array(
    z.object({
      key: z.number(),
      allergen: allergenId,
      species: z.array(z.string()),
      state: allergenState,
    }),
  ),
});
export type IngredientForm = z.infer<typeof ingredientForm>;
export type AllergenRow = IngredientForm['allergens'][number];
export type MeasureRow = IngredientForm['measures'][number];

/** A key no row of the list has yet. */
export function nextKey(rows: readonly { readonly key: number }[]): number {
  return rows.reduce((top, it) => Math.max(top, it.key + 1), 0);
}

/** A product nobody has read the label of: everything is unknown until somebody has. */
export const emptyIngredient: IngredientForm = {
  name: '',
  brand: '',
  labelName: '',
  labelContents: '',
  labelCheckedOn: '',
  family: 'other',
  packGrams: '',
  packPrice: '',
  density: '',
  rounding: '1',
  eggPart: null,
  pasteurised: 'unknown',
  gelatine: 'unknown',
  alcohol: 'unknown',
  cochineal: 'unknown',
  honey: 'unknown',
  animalOrigin: 'unknown',
  measures: [],
  allergens: [],
};

/** What of an ingredient may be edited, without its id. */
export function draftOf(ingredient: Ingredient): IngredientDraft {
  return ingredientDraft.parse(ingredient);
}

/** What a draft kept on the device was begun from, or null where it no longer reads as a product. */
export function readBase(kept: string | null): IngredientDraft | null {
  try {
    const read = ingredientDraft.safeParse(JSON.parse(kept ?? 'null'));
    return read.success ? read.data : null;
  } catch {
    return null;
  }
}

export function formOf(draft: IngredientDraft, currency: string): IngredientForm {
  return {
    ...draft,
    brand: draft.brand ?? '',
    labelContents: draft.labelContents ?? '',
    labelCheckedOn: draft.labelCheckedOn ?? '',
    packGrams: draft.pack === null ? '' : String(draft.pack.grams),
    packPrice: draft.pack === null ? '' : minorText(draft.pack.priceMinor, currency),
    density: draft.densityGPerMl === null ? '' : String(draft.densityGPerMl),
    rounding: String(draft.roundingG),
    measures: draft.measures.map((it, key) => ({
      ...it,
      key,
      qualifier: it.qualifier ?? '',
      grams: String(it.grams),
      source: it.source ?? '',
    })),
    allergens: draft.allergens.map((it, key) => ({ ...it, key })),
  };
}

const orNull = (text: string) => (text.trim() === '' ? null : text);

/** The form in the contract's shape; what could not be read is NaN and the contract says so. */
export function typedDraft(form: IngredientForm, currency: string): unknown {
  const { packGrams, packPrice, density, rounding, ...rest } = form;
  const noPack = packGrams.trim() === '' && packPrice.trim() === '';
  return {
    ...rest,
    brand: orNull(form.brand),
    labelContents: orNull(form.labelContents),
    labelCheckedOn: orNull(form.labelCheckedOn),
    pack: noPack ? null : { grams: gramsOf(packGrams), priceMinor: minorOf(packPrice, currency) },
    densityGPerMl: numberOf(density),
    roundingG: gramsOf(rounding),
    pasteurised: form.eggPart === null ? 'no' : form.pasteurised,
    measures: form.measures.map((it) => ({
      measure: it.measure,
      qualifier: orNull(it.qualifier),
      grams: gramsOf(it.grams),
      source: orNull(it.source),
    })),
    allergens: form.allergens.map(({ allergen, species, state }) => ({
      allergen,
      species,
      state,
    })),
  };
}

/**
 * Both changes of one product together: what only one of the two changed stands as changed, and
 * where both did, mine stands.
 */
export function joinDrafts(
  base: IngredientDraft,
  theirs: IngredientDraft,
  mine: IngredientDraft,
): IngredientDraft {
  const changed = differingFields(base, mine);
  return ingredientDraft.parse({
    ...theirs,
    ...Object.fromEntries(changed.map((field) => [field, mine[field]])),
  });
}

const draftFields = [
  'name',
  'brand',
  'labelName',
  'labelContents',
  'labelCheckedOn',
  'family',
  'pack',
  'densityGPerMl',
  'roundingG',
  'eggPart',
  'pasteurised',
  'gelatine',
  'alcohol',
  'cochineal',
  'honey',
  'animalOrigin',
  'measures',
  'allergens',
] as const satisfies readonly (keyof IngredientDraft)[];
export type DraftField = (typeof draftFields)[number];

/** The fields two drafts do not agree in. */
export function differingFields(a: IngredientDraft, b: IngredientDraft): readonly DraftField[] {
  return draftFields.filter((field) => JSON.stringify(a[field]) !== JSON.stringify(b[field]));
}
