import type { AllergenEntry, Contents, Menu } from '#shared/contracts/menu.ts';
import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { finishId } from '#shared/contracts/vocabulary.ts';
import { decorationPrice } from '#shared/kitchen/decoration-price.ts';
import { deriveContents } from '#shared/kitchen/derive-contents.ts';
import type { FormulaNode } from '#shared/kitchen/derive-contents.ts';
import { decorationNode, ingredientIdsIn } from '#shared/kitchen/kitchen-book.ts';
import type { KitchenBook } from '#shared/kitchen/kitchen-book.ts';
import { mergeAllergens } from '#shared/kitchen/merge-allergens.ts';
import type { PriceBookContent } from '#shared/contracts/prices.ts';
import { ButtercreamStyle } from '#api/db/models/buttercream-style.ts';
import { CoveringFinish } from '#api/db/models/covering-finish.ts';
import { Covering } from '#api/db/models/covering.ts';
import { DecorationIngredient } from '#api/db/models/decoration-ingredient.ts';
import { Decoration } from '#api/db/models/decoration.ts';
import { Filling } from '#api/db/models/filling.ts';
import { KitchenAllergen } from '#api/db/models/kitchen-allergen.ts';
import { Sponge } from '#api/db/models/sponge.ts';
import { inOrder, offered } from '#api/db/offered.ts';

export type CakeParts = Pick<Menu, 'sponges' | 'fillings' | 'styles' | 'coverings' | 'decorations'>;

/** What the catalogue says of the parts of a cake, before a formula is looked at. */
export type CakeRows = {
  readonly sponges: readonly Sponge[];
  readonly fillings: readonly Filling[];
  readonly styles: readonly ButtercreamStyle[];
  readonly coverings: readonly Covering[];
  readonly finishes: readonly CoveringFinish[];
  readonly decorations: readonly Decoration[];
  /** What the owner adds to what the kitchen handles. */
  readonly owners: readonly KitchenAllergen[];
};

/** Which version of a formula to read; undefined for the current one. */
export type VersionOf = (formulaId: string) => string | undefined;

/** The parts on offer; with those that are not any more, where old orders are read. */
export async function loadCakeRows({ archivedToo = false } = {}): Promise<CakeRows> {
  const which = archivedToo ? { order: inOrder } : offered;
  const [sponges, fillings, styles, coverings, finishes, decorations, owners] = await Promise.all([
    Sponge.findAll(which),
    Filling.findAll(which),
    ButtercreamStyle.findAll(which),
    Covering.findAll(which),
    CoveringFinish.findAll(),
    Decoration.findAll({
      ...which,
      include: [{ model: DecorationIngredient, as: 'ingredients' }],
    }),
    KitchenAllergen.findAll(),
  ]);
  return { sponges, fillings, styles, coverings, finishes, decorations, owners };
}

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
export function cakePartsOf(
  rows: CakeRows,
  book: KitchenBook,
  prices: PriceBookContent,
  versionOf: VersionOf = () => undefined,
): CakeParts {
  const read = (formulaId: string) => readFormula(book, formulaId, versionOf);

  const parts: CakeParts = {
    sponges: rows.sponges.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        colour: version.baseColour ?? row.colourHex,
        contents,
        densityGPerMl: version.densityGPerMl,
        bakeLossPpm: version.bakeLossPpm,
        levellingPpm: row.levellingPpm,
        surchargePerPortionMinor: prices.spongeSurcharges[row.id] ?? 0,
      };
    }),
    fillings: rows.fillings.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        colour: version.baseColour ?? row.colourHex,
        contents,
        densityGPerMl: version.densityGPerMl,
        thicknessMm: row.thicknessUm / 1000,
        soft: row.soft,
        holdsToC: limitOf(version),
        surchargePerPortionMinor: prices.fillingSurcharges[row.id] ?? 0,
      };
    }),
    styles: rows.styles.map((row) => {
      const { version, contents } = read(row.formulaId);
      return {
        id: row.id,
        name: row.name,
        blurb: row.blurb,
        how: row.how,
        bestFor: row.bestFor,
        sweetness: row.sweetness,
        smoothness: row.smoothness,
        colour: version.baseColour ?? '#ffffff',
        holdsToC: limitOf(version),
        detail: row.detail,
        crusts: row.crusts,
        refrigerate: version.refrigerate,
        contents,
        densityGPerMl: version.densityGPerMl,
        surchargePerPortionMinor: prices.styleSurcharges[row.id] ?? 0,
      };
    }),
    coverings: [],
    decorations: rows.decorations.map((row) => ({
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
      keepsDays: row.keepsDays,
      skill: row.skillId,
      noticeDays: row.noticeDays,
      weightG: Math.round(row.weightMg / 1000),
      caution: row.caution,
      smallParts: row.smallParts,
      contents: deriveContents(decorationOf(row, book, versionOf)),
    })),
  };
  parts.coverings = rows.coverings.map((row) => {
    const formula = row.formulaId === null ? null : read(row.formulaId);
    return {
      id: row.id,
      name: row.name,
      blurb: row.blurb,
      colour: formula?.version.baseColour ?? row.colourHex,
      // Where there is no formula of its own, the buttercream decides: the steadiest one is the bound.
      holdsToC:
        row.holdsToC ??
        (formula === null
          ? Math.max(...parts.styles.map((it) => it.holdsToC))
          : limitOf(formula.version)),
      detail: row.detail,
      finishes: rows.finishes
        .filter((it) => it.coveringId === row.id)
        .map((it) => finishId.parse(it.finishId)),
      contents: formula?.contents ?? nothing,
      densityGPerMl:
        formula === null
          ? Math.max(...parts.styles.map((it) => it.densityGPerMl))
          : formula.version.densityGPerMl,
      thicknessMm: (row.finalCoatUm === 0 ? row.crumbCoatUm : row.finalCoatUm) / 1000,
      surchargePerPortionMinor: prices.coveringSurcharges[row.id] ?? 0,
    };
  });
  return parts;
}

function versionIdOf(book: KitchenBook, formulaId: string, versionOf: VersionOf): string {
  const versionId = versionOf(formulaId) ?? book.currentVersionIds.get(formulaId);
  if (versionId === undefined) throw new Error(`The formula ${formulaId} has no current version.`);
  return versionId;
}

function readFormula(
  book: KitchenBook,
  formulaId: string,
  versionOf: VersionOf,
): { version: FormulaVersion; contents: Contents } {
  const versionId = versionIdOf(book, formulaId, versionOf);
  const version = book.versions.get(versionId);
  if (version === undefined) throw new Error(`The pantry has no version ${versionId}.`);
  return { version, contents: book.contents(versionId) };
}

/** A formula that does not say counts as holding nowhere warm. */
function limitOf(version: FormulaVersion): number {
  return version.holdsToC ?? 20;
}

function decorationOf(row: Decoration, book: KitchenBook, versionOf: VersionOf): FormulaNode {
  const { id, name, weightMg, formulaId, ingredients: bought = [] } = row;
  const versionId = formulaId === null ? null : versionIdOf(book, formulaId, versionOf);
  return decorationNode({ id, name, weightMg, bought, versionId }, book);
}

/**
 * "Also handled in this kitchen": the union over ingredients in use plus what the owner adds.
 * What is handled is handled: a maker's "may contain" stays on the part it belongs to.
 */
export function handledAllergens(rows: CakeRows, book: KitchenBook): AllergenEntry[] {
  const current: VersionOf = () => undefined;
  const made = [...rows.sponges, ...rows.fillings, ...rows.styles, ...rows.coverings]
    .filter(({ archivedAt }) => archivedAt === null)
    .flatMap(({ formulaId }) => formulaId ?? [])
    .map((formulaId) => book.node(versionIdOf(book, formulaId, current)));
  const put = rows.decorations
    .filter(({ archivedAt }) => archivedAt === null)
    .map((row) => decorationOf(row, book, current));
  const used = new Set([...made, ...put].flatMap((node) => [...ingredientIdsIn(node)]));
  const bought = [...used].flatMap((id) =>
    (book.ingredients.get(id)?.allergens ?? []).filter((it) => it.state === 'contains'),
  );
  const added = rows.owners
    .filter((it) => it.handled)
    .map((it): AllergenEntry => ({ allergen: it.allergen, species: [], state: 'contains' }));
  return mergeAllergens([bought, added]);
}
