import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { FormulaCycle } from '#shared/kitchen/derive-contents.ts';
import type { FormulaLine, FormulaNode, IngredientNode } from '#shared/kitchen/derive-contents.ts';
import { groupBy } from '#shared/group-by.ts';
import { mergeAllergens } from '#shared/kitchen/merge-allergens.ts';
import { FormulaLine as LineRow } from '#api/db/models/formula-line.ts';
import { FormulaStep as StepRow } from '#api/db/models/formula-step.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';
import { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';

/** Every formula version and ingredient there is, as the pure rules want them. */
export type Pantry = {
  readonly ingredients: ReadonlyMap<string, IngredientNode>;
  /** Ids of ingredients still bought. */
  readonly active: ReadonlySet<string>;
  readonly versions: ReadonlyMap<string, FormulaVersion>;
  /** The current version of each formula, by the formula's id. */
  readonly currentVersionIds: ReadonlyMap<string, string>;
  /** A version with everything inside it. @throws when there is none, or it holds itself */
  formulaNode(versionId: string): FormulaNode;
};

/** Reads the whole pantry in six queries; it is small, and asked for once per catalogue version. */
export async function loadPantry(): Promise<Pantry> {
  const [ingredients, allergens, formulas, versions, lines, steps] = await Promise.all([
    Ingredient.findAll(),
    IngredientAllergen.findAll(),
    Formula.findAll(),
    FormulaVersion.findAll(),
    LineRow.findAll({ order: [['position', 'ASC']] }),
    StepRow.findAll({ order: [['position', 'ASC']] }),
  ]);
  const allergensOf = groupBy(allergens, (it) => it.ingredientId);
  const nodes = new Map(
    ingredients.map((it) => [it.id, ingredientNode(it, allergensOf.get(it.id) ?? [])]),
  );
  const names = new Map(formulas.map((it) => [it.id, it.name]));
  const versionsById = new Map(versions.map((it) => [it.id, it]));
  const linesOf = groupBy(lines, (it) => it.versionId);
  const stepsOf = groupBy(steps, (it) => it.versionId);

  const build = (versionId: string, above: readonly string[]): FormulaNode => {
    if (above.includes(versionId)) throw new FormulaCycle([...above, versionId]);
    const version = present(versionsById.get(versionId), versionId);
    const path = [...above, versionId];
    return {
      kind: 'formula',
      id: version.formulaId,
      name: names.get(version.formulaId) ?? version.formulaId,
      lines: (linesOf.get(versionId) ?? []).map((line): FormulaLine => ({
        weightMg: line.weightMg,
        joinsAtStep: Number(line.stage ?? 0),
        part:
          line.formulaVersionId === null
            ? present(nodes.get(line.ingredientId ?? ''), line.ingredientId)
            : build(line.formulaVersionId, path),
      })),
      steps: (stepsOf.get(versionId) ?? []).map((step) => ({
        mixReachesC: step.criticalLimitC,
        holdSeconds: step.criticalSeconds ?? 0,
      })),
    };
  };

  return {
    ingredients: nodes,
    active: new Set(ingredients.filter((it) => it.archivedAt === null).map((it) => it.id)),
    versions: versionsById,
    currentVersionIds: new Map(
      formulas.flatMap((it) =>
        it.currentVersionId === null ? [] : [[it.id, it.currentVersionId] as const],
      ),
    ),
    formulaNode: (versionId) => build(versionId, []),
  };
}

/** Each ingredient a formula holds, however deep. */
export function ingredientIdsOf(node: FormulaNode): string[] {
  return node.lines.flatMap(({ part }) =>
    part.kind === 'ingredient' ? [part.id] : ingredientIdsOf(part),
  );
}

function ingredientNode(row: Ingredient, allergens: readonly IngredientAllergen[]): IngredientNode {
  return {
    kind: 'ingredient',
    id: row.id,
    name: row.labelName,
    madeOf: row.labelContents ?? '',
    allergens: mergeAllergens(allergens.map((it) => [entryOf(it)])),
    gelatine: row.gelatine,
    alcohol: row.alcohol,
    cochineal: row.cochineal,
    honey: row.honey,
    animalOrigin: row.animalOrigin,
    egg: eggOf(row),
  };
}

/** Egg whose treatment the label does not tell counts as raw. */
function eggOf(row: Ingredient): IngredientNode['egg'] {
  if (row.eggPart === null) return 'none';
  return row.pasteurised === 'yes' ? 'pasteurised' : 'raw';
}

function entryOf(row: IngredientAllergen): AllergenEntry {
  return {
    allergen: row.allergen,
    species: row.species === null ? [] : [row.species],
    state: row.state,
  };
}

function present<T>(found: T | undefined, id: string | null): T {
  if (found === undefined) throw new Error(`The pantry has no ${id ?? 'such part'}.`);
  return found;
}
