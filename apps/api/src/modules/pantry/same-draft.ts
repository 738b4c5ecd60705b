import { householdMeasures } from '#shared/contracts/pantry.ts';
import type { FormulaDraft, IngredientDraft } from '#shared/contracts/pantry.ts';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import { mgOf } from './write-version.ts';

/** Whether two drafts of a formula say the same, to the milligram. */
export function isSameDraft(a: FormulaDraft, b: FormulaDraft): boolean {
  return JSON.stringify(formulaParts(a)) === JSON.stringify(formulaParts(b));
}

/** Field by field in one order, whatever order they were sent in. */
function formulaParts(it: FormulaDraft): unknown[] {
  return [
    it.lines.map(({ part, grams, asTyped, step }) => [
      part.kind === 'ingredient' ? part.ingredientId : part.formulaVersionId,
      mgOf(grams),
      asTyped,
      step,
    ]),
    it.steps.map((step) => [
      step.text,
      step.activeMinutes,
      step.waitingMinutes,
      step.resource,
      step.critical?.limitC ?? null,
      step.critical?.seconds ?? null,
      step.critical?.note ?? null,
      step.syrupTargetC,
    ]),
    it.yieldPpm,
    mgOf(it.densityGPerMl),
    it.bakeLossPpm,
    it.baseColour,
    it.keepsRoomHours,
    it.keepsChilledHours,
    it.keepsFrozenHours,
    it.holdsToC,
    it.refrigerate,
    it.pasteurisedByDefault,
    it.note,
  ];
}

/** Whether two drafts of an ingredient say the same, in whatever order their lists stand. */
export function isSameIngredient(a: IngredientDraft, b: IngredientDraft): boolean {
  return JSON.stringify(ingredientParts(a)) === JSON.stringify(ingredientParts(b));
}

/**
 * Whether the label says the same of what may hurt somebody: its allergens, the facts on it, and
 * that it was read at all. Its wording does not count.
 */
export function isSameLabel(a: IngredientDraft, b: IngredientDraft): boolean {
  return JSON.stringify(labelParts(a)) === JSON.stringify(labelParts(b));
}

function ingredientParts(it: IngredientDraft): unknown[] {
  return [
    ...labelParts(it),
    it.name,
    it.brand,
    it.labelName,
    it.labelContents,
    it.labelCheckedOn,
    it.family,
    it.pack === null ? null : [mgOf(it.pack.grams), it.pack.priceMinor],
    it.densityGPerMl === null ? null : mgOf(it.densityGPerMl),
    mgOf(it.roundingG),
    it.measures
      .map(({ measure, qualifier, grams, source }) => [
        householdMeasures.indexOf(measure),
        qualifier,
        mgOf(grams),
        source,
      ])
      .map((row) => JSON.stringify(row))
      .sort(),
  ];
}

function labelParts(it: IngredientDraft): unknown[] {
  return [
    it.labelCheckedOn === null,
    it.eggPart,
    it.pasteurised,
    it.gelatine,
    it.alcohol,
    it.cochineal,
    it.honey,
    it.animalOrigin,
    it.allergens
      .map(({ allergen, species, state }) => [
        allergenIds.indexOf(allergen),
        state,
        species.toSorted(),
      ])
      .map((row) => JSON.stringify(row))
      .sort(),
  ];
}
