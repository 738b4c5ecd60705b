import type {
  Formula,
  FormulaVersion,
  Ingredient,
  IngredientDraft,
} from '#shared/contracts/pantry.ts';
import { invalidField, notFound } from '#api/platform/app-error.ts';
import type { WholePantry } from './load-pantry.queries.ts';

/** @throws `not-found` */
export function formulaIn(pantry: WholePantry, id: string): Formula {
  const formula = pantry.formulas.find((it) => it.id === id);
  if (formula === undefined) throw notFound();
  return formula;
}

/** @throws `not-found` */
export function versionIn(pantry: WholePantry, id: string): FormulaVersion {
  const version = pantry.versions.find((it) => it.id === id);
  if (version === undefined) throw notFound();
  return version;
}

/** @throws `not-found` */
export function ingredientIn(pantry: WholePantry, id: string): Ingredient {
  const ingredient = pantry.ingredients.find((it) => it.id === id);
  if (ingredient === undefined) throw notFound();
  return ingredient;
}

/** Two formulas of one name could not be told apart at the bench. @throws `invalid-input` */
export function refuseTakenName({ formulas }: WholePantry, name: string, own?: string): void {
  const taken = formulas.some(
    (it) => it.id !== own && it.archivedAt === null && plain(it.name) === plain(name),
  );
  if (taken) throw invalidField(['name'], 'Another formula has this name already.');
}

/** Nor two products of one name and maker on the shelf. @throws `invalid-input` */
export function refuseTakenProduct(
  { ingredients }: WholePantry,
  { name, brand }: Pick<IngredientDraft, 'name' | 'brand'>,
  own?: string,
): void {
  const taken = ingredients.some(
    (it) =>
      it.id !== own &&
      it.archivedAt === null &&
      plain(it.name) === plain(name) &&
      plain(it.brand ?? '') === plain(brand ?? ''),
  );
  if (taken) throw invalidField(['draft', 'name'], 'This one is on the shelf already.');
}

const plain = (words: string): string => words.trim().toLowerCase();
