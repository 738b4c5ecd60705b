import type {
  Formula,
  FormulaLine,
  FormulaPart,
  FormulaVersion,
  Ingredient,
  Pantry,
} from '#shared/contracts/pantry.ts';

/** The parts of the pantry that formulas are read with. */
export type FormulaBook = Pick<Pantry, 'ingredients' | 'formulas' | 'versions'>;

/** Lines and what is left of them: a version, or a draft that has none yet. */
export type FormulaBody = {
  /** The formula it belongs to; a draft of a new one belongs to none yet. */
  readonly formulaId?: string;
  readonly lines: readonly FormulaLine[];
  /** What is left of what goes in, parts per million. */
  readonly yieldPpm: number;
  /** What of that loss the oven takes; none unless said. */
  readonly bakeLossPpm?: number;
};

/** What a line's part is. */
export type ResolvedPart =
  | { readonly kind: 'ingredient'; readonly name: string; readonly ingredient: Ingredient }
  | {
      readonly kind: 'formula';
      readonly name: string;
      readonly version: FormulaVersion;
      readonly formula: Formula | null;
    }
  | { readonly kind: 'missing'; readonly name: string };

/** The pantry by id; made once per pantry by `indexPantry`. */
export type PantryIndex = {
  readonly book: FormulaBook;
  readonly ingredients: ReadonlyMap<string, Ingredient>;
  readonly formulas: ReadonlyMap<string, Formula>;
  readonly versions: ReadonlyMap<string, FormulaVersion>;
};

const known = new WeakMap<FormulaBook, PantryIndex>();

/** The same index for the same pantry, so that what is kept by index is kept. */
export function indexPantry(book: FormulaBook): PantryIndex {
  const before = known.get(book);
  if (before !== undefined) return before;
  const index: PantryIndex = {
    book,
    ingredients: new Map(book.ingredients.map((it) => [it.id, it])),
    formulas: new Map(book.formulas.map((it) => [it.id, it])),
    versions: new Map(book.versions.map((it) => [it.id, it])),
  };
  known.set(book, index);
  return index;
}

/** The version a formula is made by today; null for a formula that is not there. */
export function currentVersion(index: PantryIndex, formulaId: string): FormulaVersion | null {
  const formula = index.formulas.get(formulaId);
  return formula === undefined ? null : (index.versions.get(formula.currentVersionId) ?? null);
}

/** What a formula version is called: its formula's name. */
export function versionName(index: PantryIndex, version: FormulaVersion): string {
  return index.formulas.get(version.formulaId)?.name ?? version.formulaId;
}

export function resolvePart(index: PantryIndex, part: FormulaPart): ResolvedPart {
  if (part.kind === 'ingredient') {
    const ingredient = index.ingredients.get(part.ingredientId);
    return ingredient === undefined
      ? { kind: 'missing', name: part.ingredientId }
      : { kind: 'ingredient', name: ingredient.name, ingredient };
  }
  const version = index.versions.get(part.formulaVersionId);
  if (version === undefined) return { kind: 'missing', name: part.formulaVersionId };
  const formula = index.formulas.get(version.formulaId) ?? null;
  return { kind: 'formula', name: formula?.name ?? version.formulaId, version, formula };
}
