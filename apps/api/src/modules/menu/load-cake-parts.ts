import type { AllergenEntry, Contents, Menu } from '#shared/contracts/menu.ts';
import { finishId } from '#shared/contracts/vocabulary.ts';
import { deriveContents } from '#shared/kitchen/derive-contents.ts';
import type { FormulaNode } from '#shared/kitchen/derive-contents.ts';
import { decorationPrice } from '#shared/kitchen/decoration-price.ts';
import { mergeAllergens } from '#shared/kitchen/merge-allergens.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { CoveringFinish } from '#api/db/models/covering-finish.ts';
import { Covering } from '#api/db/models/covering.ts';
import { DecorationIngredient } from '#api/db/models/decoration-ingredient.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Filling } from '#api/db/models/filling.ts';
import type { FormulaVersion } from '#api/db/models/formula-version.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { ingredientIdsOf, loadPantry } from './formula-tree.ts';
import type { Pantry } from './formula-tree.ts';
import { offered } from './offered.ts';

type CakeParts = Pick<Menu, 'sponges' | 'fillings' | 'styles' | 'coverings' | 'decorations'> & {
  /** Union over what is in use plus what the owner adds. */
  handles: AllergenEntry[];
};

const nothing: Contents = {
  allergens: [],
  statement: '',
  gelatine: false,
  alcohol: false,
  cochineal: false,
  honey: false,
  animalOrigin: false,
  undercookedEgg: false,
};

/** Parts of a cake as the public sees them, each with what its formulas say is in it. */
export async function loadCakeParts(prices: PriceBookContent): Promise<CakeParts> {
  const [pantry, sponges, fillings, styles, coverings, finishes, decorations, owners] =
    await Promise.all([
      loadPantry(),
      Sponge.findAll(offered),
      Filling.findAll(offered),
      ButtercreamStyle.findAll(offered),
      Covering.findAll(offered),
      CoveringFinish.findAll(),
      Decoration.findAll({
        ...offered,
        include: [{ model: DecorationIngredient, as: 'ingredients' }],
      }),
      KitchenAllergen.findAll(),
    ]);
  const used = new Set<string>();
  const read = (formulaId: string) => readFormula(pantry, formulaId, used);

  const parts: Omit<CakeParts, 'handles'> = {
    sponges: sponges.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        colour: row.colourHex,
        contents,
        densityGPerMl: version.densityMgPerMl / 1000,
        bakeLossPpm: version.bakeLossPpm,
        levellingPpm: row.levellingPpm,
        surchargePerPortionMinor: prices.spongeSurcharges[row.id] ?? 0,
      };
    }),
    fillings: fillings.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        colour: row.colourHex,
        contents,
        densityGPerMl: version.densityMgPerMl / 1000,
        thicknessMm: row.thicknessUm / 1000,
        soft: row.soft,
        holdsToC: limitOf(version),
        surchargePerPortionMinor: prices.fillingSurcharges[row.id] ?? 0,
      };
    }),
    styles: styles.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        how: row.how,
        bestFor: row.bestFor,
        sweetness: row.sweetness,
        smoothness: row.smoothness,
        colour: version.baseColourHex ?? '#ffffff',
        holdsToC: limitOf(version),
        detail: row.detail,
        crusts: row.crusts,
        refrigerate: version.refrigerate,
        contents,
        densityGPerMl: version.densityMgPerMl / 1000,
        surchargePerPortionMinor: prices.styleSurcharges[row.id] ?? 0,
      };
    }),
    coverings: [],
    decorations: decorations.map((row) => ({
      id: row.id,
      name: row.name,
      blurb: row.blurb,
      glyph: row.glyph,
      edge: row.edge,
      sources: row.sources,
      needs: row.detail,
      priceMinor: decorationPrice(row, prices),
      per: row.per,
      minutes: row.minutes,
      madeAhead: row.madeAhead,
      skill: row.skillId,
      noticeDays: row.noticeDays,
      weightG: Math.round(row.weightMg / 1000),
      caution: row.caution,
      smallParts: row.smallParts,
      contents: decorationContents(row, pantry, used),
    })),
  };
  parts.coverings = coverings.map((row) => {
    const formula = row.formulaId === null ? null : read(row.formulaId);
    return {
      id: row.id,
      name: row.name,
      blurb: row.blurb,
      colour: row.colourHex,
      // Where there is no formula of its own, the buttercream decides: the steadiest one is the bound.
      holdsToC:
        row.holdsToC ??
        (formula === null
          ? Math.max(...parts.styles.map((it) => it.holdsToC))
          : limitOf(formula.version)),
      detail: row.detail,
      finishes: finishes
        .filter((it) => it.coveringId === row.id)
        .map((it) => finishId.parse(it.finishId)),
      contents: formula?.contents ?? nothing,
      densityGPerMl:
        formula === null
          ? Math.max(...parts.styles.map((it) => it.densityGPerMl))
          : formula.version.densityMgPerMl / 1000,
      thicknessMm: (row.finalCoatUm === 0 ? row.crumbCoatUm : row.finalCoatUm) / 1000,
      surchargePerPortionMinor: prices.coveringSurcharges[row.id] ?? 0,
    };
  });
  return { ...parts, handles: handledAllergens(pantry, used, owners) };
}

function readFormula(
  pantry: Pantry,
  formulaId: string,
  used: Set<string>,
): { version: FormulaVersion; contents: Contents } {
  const versionId = pantry.currentVersionIds.get(formulaId);
  const version = versionId === undefined ? undefined : pantry.versions.get(versionId);
  if (version === undefined) throw new Error(`The formula ${formulaId} has no current version.`);
  const node = pantry.formulaNode(version.id);
  for (const id of ingredientIdsOf(node)) used.add(id);
  return { version, contents: deriveContents(node) };
}

/** A formula that does not say counts as holding nowhere warm. */
function limitOf(version: FormulaVersion): number {
  return version.holdsToC ?? 20;
}

function decorationContents(row: Decoration, pantry: Pantry, used: Set<string>): Contents {
  const lines: FormulaNode['lines'] = (row.ingredients ?? []).flatMap((line) => {
    const part = pantry.ingredients.get(line.ingredientId);
    return part === undefined ? [] : [{ weightMg: line.weightMg, part, joinsAtStep: 0 }];
  });
  const versionId =
    row.formulaId === null ? undefined : pantry.currentVersionIds.get(row.formulaId);
  const made: FormulaNode['lines'] =
    versionId === undefined
      ? []
      : [{ weightMg: row.weightMg, part: pantry.formulaNode(versionId), joinsAtStep: 0 }];
  const node: FormulaNode = {
    kind: 'formula',
    id: row.id,
    name: row.name,
    lines: [...lines, ...made],
    steps: [],
  };
  for (const id of ingredientIdsOf(node)) used.add(id);
  return deriveContents(node);
}

/**
 * "Also handled in this kitchen": the union over ingredients in use plus what the owner adds.
 * What is handled is handled: a maker's "may contain" stays on the part it belongs to.
 */
function handledAllergens(
  pantry: Pantry,
  used: ReadonlySet<string>,
  owners: readonly KitchenAllergen[],
): AllergenEntry[] {
  const bought = [...used].flatMap((id) =>
    (pantry.ingredients.get(id)?.allergens ?? []).filter((it) => it.state === 'contains'),
  );
  const added = owners
    .filter((it) => it.handled)
    .map((it): AllergenEntry => ({ allergen: it.allergen, species: [], state: 'contains' }));
  return mergeAllergens([bought, added]);
}
