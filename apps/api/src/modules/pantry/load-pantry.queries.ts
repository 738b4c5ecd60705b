import type { Pantry, PartFormulas } from '#shared/contracts/pantry.ts';
import { coveringId, styleId } from '#shared/contracts/vocabulary.ts';
import { groupBy } from '#shared/group-by.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import type { Database } from '#api/db/database.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import { isInTransaction } from '#api/db/transaction.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { Covering } from '#api/db/models/covering.ts';
import { DecorationIngredient } from '#api/db/models/decoration-ingredient.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Equipment } from '#api/db/models/equipment.ts';
import { Filling } from '#api/db/models/filling.ts';
import { FormulaLine } from '#api/db/models/formula-line.ts';
import { FormulaStep } from '#api/db/models/formula-step.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';
import { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import { IngredientMeasure } from '#api/db/models/ingredient-measure.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { Studio } from '#api/db/models/studio.ts';
import { User } from '#api/db/models/user.ts';
import { presentFormula, presentIngredient, presentVersion } from './pantry.presenter.ts';

/** The pantry as it is, whoever reads it. */
export type WholePantry = Omit<Pantry, 'can'>;

type Kept = {
  readonly database: Database;
  readonly version: string;
  readonly pantry: WholePantry;
};

let kept: Kept | null = null;

/**
 * The whole pantry as it stands now; read again only once something in it has changed. Inside a
 * transaction it is read afresh, with what that has written, and not kept.
 */
export async function currentPantry(): Promise<WholePantry> {
  const version = await pantryVersion();
  if (isInTransaction()) return loadPantry(version);
  const database = currentDatabase();
  if (kept?.database === database && kept.version === version) return kept.pantry;
  const pantry = await loadPantry(version);
  kept = { database, version, pantry };
  return pantry;
}

/** Mixers and altitude are settings; all else is the catalogue. */
async function pantryVersion(): Promise<string> {
  const { catalogueVersion, settingsVersion } = await readPlanVersions();
  return `${catalogueVersion}.${settingsVersion}`;
}

async function loadPantry(version: string): Promise<WholePantry> {
  const [studio, book, mixers, ingredients, formulas, versions, parts] = await Promise.all([
    Studio.findByPk(1, { rejectOnEmpty: true }),
    PriceBookVersion.findOne({ order: [['n', 'DESC']] }),
    Equipment.findAll({ where: { kind: 'mixer', active: true }, order: [['capacityMg', 'ASC']] }),
    loadIngredients(),
    Formula.findAll({ order: [['name', 'ASC']] }),
    loadVersions(),
    loadParts(),
  ]);
  return {
    version,
    currency: book?.content.currency ?? studio.currency,
    altitudeM: studio.altitudeM,
    ingredients,
    formulas: formulas.flatMap(presentFormula),
    versions,
    parts,
    mixers: mixers.flatMap(({ id, name, capacityMg }) =>
      capacityMg === null ? [] : [{ id, name, capacityG: capacityMg / 1000 }],
    ),
  };
}

async function loadIngredients(): Promise<WholePantry['ingredients']> {
  const [rows, allergens, measures] = await Promise.all([
    Ingredient.findAll({ order: [['name', 'ASC']] }),
    IngredientAllergen.findAll(),
    IngredientMeasure.findAll(),
  ]);
  const allergensOf = groupBy(allergens, (it) => it.ingredientId);
  const measuresOf = groupBy(measures, (it) => it.ingredientId);
  return rows.map((row) =>
    presentIngredient(row, allergensOf.get(row.id) ?? [], measuresOf.get(row.id) ?? []),
  );
}

async function loadVersions(): Promise<WholePantry['versions']> {
  const [rows, lines, steps] = await Promise.all([
    FormulaVersion.findAll({
      order: [
        ['formulaId', 'ASC'],
        ['n', 'ASC'],
      ],
    }),
    FormulaLine.findAll({ order: [['position', 'ASC']] }),
    FormulaStep.findAll({ order: [['position', 'ASC']] }),
  ]);
  const linesOf = groupBy(lines, (it) => it.versionId);
  const stepsOf = groupBy(steps, (it) => it.versionId);
  const writers = await User.findAll({
    attributes: ['id', 'name'],
    where: { id: [...new Set(rows.flatMap(({ createdByUserId }) => createdByUserId ?? []))] },
  });
  const names = new Map(writers.map(({ id, name }) => [id, name]));
  return rows.map((row) =>
    presentVersion(row, {
      lines: linesOf.get(row.id) ?? [],
      steps: stepsOf.get(row.id) ?? [],
      createdBy: names.get(row.createdByUserId ?? '') ?? '',
    }),
  );
}

/** Parts that are not offered any more too: orders may still have them. */
async function loadParts(): Promise<PartFormulas> {
  const [sponges, fillings, styles, coverings, decorations] = await Promise.all([
    Sponge.findAll(),
    Filling.findAll(),
    ButtercreamStyle.findAll(),
    Covering.findAll(),
    Decoration.findAll({ include: [{ model: DecorationIngredient, as: 'ingredients' }] }),
  ]);
  return {
    sponges: Object.fromEntries(sponges.map((it) => [it.id, it.formulaId])),
    fillings: Object.fromEntries(fillings.map((it) => [it.id, it.formulaId])),
    styles: Object.fromEntries(styles.map((it) => [styleId.parse(it.id), it.formulaId])),
    coverings: Object.fromEntries(
      coverings.flatMap((it) =>
        it.formulaId === null ? [] : [[coveringId.parse(it.id), it.formulaId] as const],
      ),
    ),
    decorations: Object.fromEntries(
      decorations.map((it) => [
        it.id,
        {
          formulaId: it.formulaId,
          ingredients: (it.ingredients ?? []).map(({ ingredientId, weightMg }) => ({
            ingredientId,
            grams: weightMg / 1000,
          })),
          materialsCostMinor: it.materialsCostMinor,
        },
      ]),
    ),
  };
}
