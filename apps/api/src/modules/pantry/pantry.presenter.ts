import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { Formula, FormulaVersion, Ingredient } from '#shared/contracts/pantry.ts';
import { allergenIds } from '#shared/contracts/vocabulary.ts';
import type { FormulaLine } from '#api/db/models/formula-line.ts';
import type { FormulaStep } from '#api/db/models/formula-step.ts';
import type { FormulaVersion as FormulaVersionRow } from '#api/db/models/formula-version.ts';
import type { Formula as FormulaRow } from '#api/db/models/formula.ts';
import type { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import type { IngredientMeasure } from '#api/db/models/ingredient-measure.ts';
import type { Ingredient as IngredientRow } from '#api/db/models/ingredient.ts';

/** A bought product as bakers read and edit it. */
export function presentIngredient(
  row: IngredientRow,
  allergens: readonly IngredientAllergen[],
  measures: readonly IngredientMeasure[],
): Ingredient {
  const { packMg, packPriceMinor, densityMgPerMl } = row;
  return {
    id: row.id,
    name: row.name,
    brand: row.brand,
    labelName: row.labelName,
    labelContents: row.labelContents,
    labelCheckedOn: row.labelCheckedOn,
    family: row.family,
    pack:
      packMg === null || packPriceMinor === null
        ? null
        : { grams: packMg / 1000, priceMinor: packPriceMinor },
    densityGPerMl: densityMgPerMl === null ? null : densityMgPerMl / 1000,
    roundingG: row.roundingMg / 1000,
    eggPart: row.eggPart,
    pasteurised: row.pasteurised,
    gelatine: row.gelatine,
    alcohol: row.alcohol,
    cochineal: row.cochineal,
    honey: row.honey,
    animalOrigin: row.animalOrigin,
    measures: measures.map(({ measure, qualifier, weightMg, source }) => ({
      measure,
      qualifier,
      grams: weightMg / 1000,
      source,
    })),
    allergens: entriesOf(allergens),
    archivedAt: row.archivedAt?.toISOString() ?? null,
  };
}

/** A species is a row; an entry holds all species of an allergen in one state. */
function entriesOf(rows: readonly IngredientAllergen[]): AllergenEntry[] {
  const entries = new Map<string, AllergenEntry>();
  for (const { allergen, species, state } of rows) {
    const key = `${allergen}:${state}:${species === null ? 'any' : 'some'}`;
    const entry = entries.get(key) ?? { allergen, species: [], state };
    entries.set(key, {
      ...entry,
      species: species === null ? [] : [...entry.species, species].sort(),
    });
  }
  return [...entries.values()].sort(
    (a, b) => allergenIds.indexOf(a.allergen) - allergenIds.indexOf(b.allergen),
  );
}

/** A formula that has a version; one being written has none yet. */
export function presentFormula(row: FormulaRow): Formula[] {
  const { id, kind, name, currentVersionId, archivedAt } = row;
  if (currentVersionId === null) return [];
  return [{ id, kind, name, currentVersionId, archivedAt: archivedAt?.toISOString() ?? null }];
}

type Inside = {
  readonly lines: readonly FormulaLine[];
  readonly steps: readonly FormulaStep[];
  readonly createdBy: string;
};

/** One version with all its lines and steps. */
export function presentVersion(row: FormulaVersionRow, inside: Inside): FormulaVersion {
  return {
    id: row.id,
    formulaId: row.formulaId,
    n: row.n,
    lines: inside.lines.map(presentLine),
    steps: inside.steps.map(presentStep),
    yieldPpm: row.yieldPpm,
    densityGPerMl: row.densityMgPerMl / 1000,
    bakeLossPpm: row.bakeLossPpm,
    baseColour: row.baseColourHex,
    keepsRoomHours: row.keepsRoomHours,
    keepsChilledHours: row.keepsChilledHours,
    keepsFrozenHours: row.keepsFrozenHours,
    holdsToC: row.holdsToC,
    refrigerate: row.refrigerate,
    pasteurisedByDefault: row.pasteurisedByDefault,
    note: row.note,
    createdAt: row.createdAt.toISOString(),
    createdBy: inside.createdBy,
  };
}

function presentLine(row: FormulaLine): FormulaVersion['lines'][number] {
  return {
    part:
      row.formulaVersionId === null
        ? { kind: 'ingredient', ingredientId: row.ingredientId ?? '' }
        : { kind: 'formula', formulaVersionId: row.formulaVersionId },
    grams: row.weightMg / 1000,
    asTyped: row.asTyped,
    step: row.step,
  };
}

function presentStep(row: FormulaStep): FormulaVersion['steps'][number] {
  const { text, activeMinutes, waitingMinutes, resource, syrupTargetC } = row;
  return {
    text,
    activeMinutes,
    waitingMinutes,
    resource,
    critical:
      row.criticalLimitC === null
        ? null
        : {
            limitC: row.criticalLimitC,
            seconds: row.criticalSeconds,
            note: row.criticalNote ?? '',
          },
    syrupTargetC,
  };
}
