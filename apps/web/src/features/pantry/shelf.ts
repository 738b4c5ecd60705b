import type { Formula, FormulaPart, FormulaVersion, Pantry } from '#shared/contracts/pantry.ts';
import { type PantryIndex, indexPantry } from '#shared/kitchen/formulas/pantry-index.ts';

/** A formula with its versions, newest first. */
export type KeptFormula = {
  readonly formula: Formula;
  readonly current: FormulaVersion;
  readonly versions: readonly FormulaVersion[];
};

/** The pantry as the screens look things up in it, and who uses what. */
export type Shelf = {
  readonly pantry: Pantry;
  readonly index: PantryIndex;
  readonly formulas: ReadonlyMap<string, KeptFormula>;
  /** Formulas in use whose current version has the ingredient in it. */
  readonly formulasWith: (ingredientId: string) => readonly Formula[];
  /** Formulas in use whose current version uses any version of this one. */
  readonly formulasUsing: (formulaId: string) => readonly Formula[];
};

const shelves = new WeakMap<Pantry, Shelf>();

/** The pantry made ready to look things up in; made once for a pantry. */
export function shelfOf(pantry: Pantry): Shelf {
  let shelf = shelves.get(pantry);
  if (shelf === undefined) {
    shelf = makeShelf(pantry);
    shelves.set(pantry, shelf);
  }
  return shelf;
}

function makeShelf(pantry: Pantry): Shelf {
  const index = indexPantry(pantry);
  const formulas = new Map<string, KeptFormula>();
  for (const formula of pantry.formulas) {
    const versions = pantry.versions
      .filter((it) => it.formulaId === formula.id)
      .toSorted((a, b) => b.n - a.n);
    const current = versions.find((it) => it.id === formula.currentVersionId) ?? versions[0];
    if (current !== undefined) formulas.set(formula.id, { formula, current, versions });
  }
  const used = (test: (part: FormulaPart) => boolean) =>
    [...formulas.values()]
      .filter((it) => it.formula.archivedAt === null)
      .filter((it) => it.current.lines.some(({ part }) => test(part)))
      .map((it) => it.formula);
  return {
    pantry,
    index,
    formulas,
    formulasWith: (ingredientId) =>
      used((part) => part.kind === 'ingredient' && part.ingredientId === ingredientId),
    formulasUsing: (formulaId) =>
      used(
        (part) =>
          part.kind === 'formula' &&
          index.versions.get(part.formulaVersionId)?.formulaId === formulaId,
      ),
  };
}
