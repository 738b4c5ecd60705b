import type { FormulaVersion, Ingredient, Pantry } from '#shared/contracts/pantry.ts';
import type { Contents } from '#shared/contracts/menu.ts';
import { deriveContents, FormulaCycle } from './derive-contents.ts';
import type { FormulaNode, IngredientNode } from './derive-contents.ts';
import { labelAllergens } from './label-allergens.ts';

/** The part of a pantry that says what is in what. */
export type Shelves = Pick<Pantry, 'ingredients' | 'formulas' | 'versions'>;

/** A pantry as what is in what is asked of it. */
export type KitchenBook = {
  readonly ingredients: ReadonlyMap<string, IngredientNode>;
  readonly versions: ReadonlyMap<string, FormulaVersion>;
  /** The current version of each formula, by the formula's id. */
  readonly currentVersionIds: ReadonlyMap<string, string>;
  /**
   * A version with everything inside it; the same object each time, however often it is used.
   * @throws `FormulaCycle` when it holds itself, an error when the pantry has no such version
   */
  node(versionId: string): FormulaNode;
  /** What a version contains through everything in it, worked out once. */
  contents(versionId: string): Contents;
};

const books = new WeakMap<Shelves, KitchenBook>();

/** A pantry as the rules about contents read it: the same book for the same pantry. */
export function kitchenBook(shelves: Shelves): KitchenBook {
  const before = books.get(shelves);
  if (before !== undefined) return before;
  const book = makeBook(shelves);
  books.set(shelves, book);
  return book;
}

function makeBook({ ingredients, formulas, versions }: Shelves): KitchenBook {
  const bought = new Map(ingredients.map((it) => [it.id, ingredientNode(it)]));
  const names = new Map(formulas.map(({ id, name }) => [id, name]));
  const kept = new Map(versions.map((it) => [it.id, it]));
  const built = new Map<string, FormulaNode>();
  const open: string[] = [];

  const node = (versionId: string): FormulaNode => {
    const before = built.get(versionId);
    if (before !== undefined) return before;
    if (open.includes(versionId)) throw new FormulaCycle([...open, versionId]);
    const version = present(kept.get(versionId), versionId);
    open.push(versionId);
    try {
      const made = formulaNode(version, names.get(version.formulaId) ?? '', {
        ingredient: (id) => present(bought.get(id), id),
        formula: node,
      });
      built.set(versionId, made);
      return made;
    } finally {
      open.pop();
    }
  };
  const derived = new Map<string, Contents>();
  const contents = (versionId: string): Contents => {
    const found = derived.get(versionId) ?? deriveContents(node(versionId));
    derived.set(versionId, found);
    return found;
  };
  return {
    ingredients: bought,
    versions: kept,
    currentVersionIds: new Map(formulas.map((it) => [it.id, it.currentVersionId])),
    node,
    contents,
  };
}

type Finders = {
  readonly ingredient: (id: string) => IngredientNode;
  readonly formula: (versionId: string) => FormulaNode;
};

function formulaNode(
  { formulaId, lines, steps, yieldPpm }: FormulaVersion,
  name: string,
  find: Finders,
): FormulaNode {
  return {
    kind: 'formula',
    id: formulaId,
    name,
    yieldPpm,
    lines: lines.map(({ part, grams, step }) => ({
      weightMg: Math.round(grams * 1000),
      joinsAtStep: step,
      part:
        part.kind === 'ingredient'
          ? find.ingredient(part.ingredientId)
          : find.formula(part.formulaVersionId),
    })),
    steps: steps.map(({ critical }) => ({
      mixReachesC: critical?.limitC ?? null,
      holdSeconds: critical?.seconds ?? 0,
    })),
  };
}

/** A bought product as the rules read it; egg whose treatment the label does not tell is raw. */
export function ingredientNode(bought: Ingredient): IngredientNode {
  return {
    kind: 'ingredient',
    id: bought.id,
    name: bought.labelName,
    madeOf: bought.labelContents ?? '',
    allergens: labelAllergens(bought),
    gelatine: bought.gelatine,
    alcohol: bought.alcohol,
    cochineal: bought.cochineal,
    honey: bought.honey,
    animalOrigin: bought.animalOrigin,
    egg: bought.eggPart === null ? 'none' : bought.pasteurised === 'yes' ? 'pasteurised' : 'raw',
  };
}

/** The versions that are kept, by their formulas: what an order is made with instead of today's. */
export function keptVersions(
  versionIds: readonly string[],
  { versions }: Pick<KitchenBook, 'versions'>,
): Map<string, string> {
  return new Map(
    versionIds.flatMap((id) => {
      const version = versions.get(id);
      return version === undefined ? [] : [[version.formulaId, id] as const];
    }),
  );
}

/** One decoration: what of it is bought as it is, and the formula of the rest. */
export type MadeDecoration = {
  readonly id: string;
  readonly name: string;
  readonly weightMg: number;
  readonly bought: readonly { readonly ingredientId: string; readonly weightMg: number }[];
  /** Null where nothing of it is made. */
  readonly versionId: string | null;
};

/** A decoration as if it were a formula: of bought goods, of a formula, of both or of no food. */
export function decorationNode(
  { id, name, weightMg, bought, versionId }: MadeDecoration,
  book: KitchenBook,
): FormulaNode {
  return {
    kind: 'formula',
    // Formulas have ids of their own, which may be the same word.
    id: `decoration ${id}`,
    name,
    lines: [
      ...bought.flatMap((line) => {
        const part = book.ingredients.get(line.ingredientId);
        return part === undefined ? [] : [{ weightMg: line.weightMg, part, joinsAtStep: 0 }];
      }),
      ...(versionId === null ? [] : [{ weightMg, part: book.node(versionId), joinsAtStep: 0 }]),
    ],
    steps: [],
  };
}

/** Every ingredient a formula holds, however deep, each once. */
export function ingredientIdsIn(formula: FormulaNode): ReadonlySet<string> {
  const found = new Set<string>();
  const seen = new Set<FormulaNode>();
  const look = (node: FormulaNode): void => {
    if (seen.has(node)) return;
    seen.add(node);
    for (const { part } of node.lines) {
      if (part.kind === 'ingredient') found.add(part.id);
      else look(part);
    }
  };
  look(formula);
  return found;
}

function present<T>(found: T | undefined, id: string): T {
  if (found === undefined) throw new Error(`The pantry has no ${id}.`);
  return found;
}
