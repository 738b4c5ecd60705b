import { currentClock } from '#api/db/current-database.ts';
import { FormulaLine } from '#api/db/models/formula-line.ts';
import { FormulaStep } from '#api/db/models/formula-step.ts';
import { FormulaVersion } from '#api/db/models/formula-version.ts';
import { Formula } from '#api/db/models/formula.ts';
import { IngredientAllergen } from '#api/db/models/ingredient-allergen.ts';
import { IngredientMeasure } from '#api/db/models/ingredient-measure.ts';
import { Ingredient } from '#api/db/models/ingredient.ts';
import type { SeedFormula, SeedIngredient, SeedTrait } from './catalogue/catalogue-types.ts';
import { buttercreamFormulas } from './catalogue/formulas-buttercream.ts';
import { fillingFormulas } from './catalogue/formulas-filling.ts';
import { spongeFormulas } from './catalogue/formulas-sponge.ts';
import { dairyAndEggs } from './catalogue/ingredients-dairy.ts';
import { dryGoods } from './catalogue/ingredients-dry.ts';
import { finishingGoods } from './catalogue/ingredients-finishes.ts';
import { fruitAndFlavours } from './catalogue/ingredients-flavours.ts';

const ingredients = [...dairyAndEggs, ...dryGoods, ...fruitAndFlavours, ...finishingGoods];
const formulas = [...spongeFormulas, ...fillingFormulas, ...buttercreamFormulas];

const mg = (grams: number) => Math.round(grams * 1000);

/** Ingredients as bought, and the house formulas. `today` is the day the labels were read. */
export async function seedPantry(today: string): Promise<void> {
  for (const ingredient of ingredients) await createIngredient(ingredient, today);
  const versions = new Map<string, string>();
  for (const formula of formulas) {
    versions.set(formula.id, await createFormula(formula, versions));
  }
}

async function createIngredient(seed: SeedIngredient, today: string): Promise<void> {
  const has = (trait: SeedTrait) => (seed.traits?.includes(trait) === true ? 'yes' : 'no');
  await Ingredient.create({
    id: seed.id,
    name: seed.name,
    brand: seed.brand,
    labelName: seed.commonName,
    labelContents: seed.madeOf ?? null,
    labelCheckedOn: today,
    family: seed.family,
    packMg: mg(seed.packG),
    packPriceMinor: seed.packPriceMinor,
    eggPart: seed.egg?.part ?? null,
    pasteurised: seed.egg?.pasteurised === true ? 'yes' : 'no',
    gelatine: has('gelatine'),
    alcohol: has('alcohol'),
    cochineal: has('cochineal'),
    animalOrigin: has('animal-origin'),
    honey: has('honey'),
    roundingMg: mg(seed.roundingG ?? 1),
    densityMgPerMl: seed.densityGPerMl === undefined ? null : mg(seed.densityGPerMl),
  });
  await IngredientAllergen.bulkCreate(
    seed.allergens.flatMap(({ allergen, species, state }) =>
      (species ?? [null]).map((each) => ({
        ingredientId: seed.id,
        allergen,
        species: each,
        state,
      })),
    ),
  );
  await IngredientMeasure.bulkCreate(
    (seed.measures ?? []).map(({ measure, qualifier, grams, source }) => ({
      ingredientId: seed.id,
      measure,
      qualifier: qualifier ?? null,
      weightMg: mg(grams),
      source: source ?? (seed.ndb === undefined ? null : `USDA SR28, ${seed.ndb}`),
    })),
  );
}

async function createFormula(
  seed: SeedFormula,
  versions: ReadonlyMap<string, string>,
): Promise<string> {
  await Formula.create({ id: seed.id, kind: seed.kind, name: seed.name });
  const stages = [...(seed.earlier ?? []).map((older) => ({ ...seed, ...older })), seed];
  let newest = '';
  for (const [index, stage] of stages.entries()) {
    const age = (stages.length - 1 - index) * daysBetweenVersions;
    newest = await createVersion(stage, { n: index + 1, age, versions });
  }
  return newest;
}

/** How long each older version is said to have been in use. */
const daysBetweenVersions = 120;

type Versioned = {
  readonly n: number;
  /** Days ago. */
  readonly age: number;
  readonly versions: ReadonlyMap<string, string>;
};

async function createVersion(seed: SeedFormula, { n, age, versions }: Versioned): Promise<string> {
  const version = await FormulaVersion.create({
    formulaId: seed.id,
    n,
    createdAt: new Date(currentClock().now().getTime() - age * 86_400_000),
    note: seed.note ?? '',
    yieldPpm: seed.yieldPpm,
    densityMgPerMl: mg(seed.densityGPerMl),
    bakeLossPpm: seed.bakeLossPpm ?? 0,
    baseColourHex: seed.colour,
    keepsRoomHours: seed.roomHours,
    keepsChilledHours: seed.chilledHours,
    keepsFrozenHours: seed.frozenDays * 24,
    holdsToC: seed.holdsToC,
    refrigerate: seed.refrigerate,
    pasteurisedByDefault: seed.lines.some(
      (line) => 'ingredient' in line && isPasteurisedEgg(line.ingredient),
    ),
  });
  await FormulaLine.bulkCreate(
    seed.lines.map((line, position) => ({
      versionId: version.id,
      position,
      ingredientId: 'ingredient' in line ? line.ingredient : null,
      formulaVersionId: 'formula' in line ? (versions.get(line.formula) ?? null) : null,
      weightMg: mg(line.grams),
      asTyped: line.typed ?? null,
      step: line.step ?? 0,
    })),
  );
  await FormulaStep.bulkCreate(
    seed.steps.map((step, position) => ({
      versionId: version.id,
      position,
      text: step.text,
      activeMinutes: step.activeMinutes,
      waitingMinutes: step.waitingMinutes,
      resource: step.resource,
      criticalLimitC: step.critical?.limitC ?? null,
      criticalSeconds: step.critical?.seconds ?? null,
      criticalNote: step.critical?.note ?? null,
      syrupTargetC: step.syrupTargetC ?? null,
    })),
  );
  // Lines and steps are closed once the formula points at the version.
  await Formula.update({ currentVersionId: version.id }, { where: { id: seed.id } });
  return version.id;
}

function isPasteurisedEgg(id: string): boolean {
  return ingredients.some((it) => it.id === id && it.egg?.pasteurised === true);
}
