import type { AllergenEntry } from '#shared/contracts/menu.ts';
import { FormulaCycle, type FormulaNode, type IngredientNode } from '../derive-contents.ts';
import { mergeAllergens } from '../merge-allergens.ts';

/** A finished part of a cake: its formula, and the grams of it that are in the cake. */
export type LabelledPart = {
  /** As people read it: "Lemon curd filling". */
  readonly name: string;
  readonly node: FormulaNode;
  readonly finishedG: number;
};

/** One ingredient of the whole as a label names it, with all that was used of it. */
export type WeighedIngredient = {
  readonly name: string;
  /** What a bought compound is made of, from its own label; empty for a simple one. */
  readonly madeOf: string;
  readonly usedG: number;
  readonly allergens: readonly AllergenEntry[];
  /** The bought products behind the name. */
  readonly products: readonly IngredientNode[];
};

/**
 * What went into some parts, by common name, the heaviest first: 21 CFR 101.4(a)(1), and Regulation
 * (EU) 1169/2011 article 18(1), weights as they were used. A formula inside a formula gives its own
 * ingredients (101.4(b)(2)(ii)), so that sugar in sponge and frosting is one sugar. What baking and
 * boiling take away was used too: grams are those that went in for what is in the cake. Two products
 * with the same words on a label are one line. Throws `FormulaCycle`.
 */
export function weighIngredients(parts: readonly LabelledPart[]): WeighedIngredient[] {
  const found = new Map<string, { usedG: number; products: Map<string, IngredientNode> }>();
  const known = new Map<FormulaNode, Shares>();
  for (const { node, finishedG } of parts) {
    for (const { ingredient, share } of sharesOf(node, [], known).values()) {
      const key = `${ingredient.name.trim().toLowerCase()}|${ingredient.madeOf.trim().toLowerCase()}`;
      const line = found.get(key) ?? { usedG: 0, products: new Map<string, IngredientNode>() };
      line.usedG += share * finishedG;
      line.products.set(ingredient.id, ingredient);
      found.set(key, line);
    }
  }
  return [...found.values()]
    .flatMap(({ usedG, products }) => {
      const all = [...products.values()];
      const [first] = all;
      if (first === undefined) return [];
      return {
        name: first.name.trim(),
        madeOf: first.madeOf.trim(),
        usedG,
        allergens: mergeAllergens(all.map((it) => it.allergens)),
        products: all,
      };
    })
    .sort((a, b) => b.usedG - a.usedG || a.name.localeCompare(b.name));
}

/** Grams of each ingredient that went in for a gram of the finished formula, by its id. */
type Shares = ReadonlyMap<string, { readonly ingredient: IngredientNode; readonly share: number }>;

function sharesOf(
  formula: FormulaNode,
  above: readonly string[],
  known: Map<FormulaNode, Shares>,
): Shares {
  const before = known.get(formula);
  if (before !== undefined) return before;
  if (above.includes(formula.id)) throw new FormulaCycle([...above, formula.id]);
  const path = [...above, formula.id];
  const inMg = formula.lines.reduce((sum, line) => sum + line.weightMg, 0);
  const leftMg = inMg * (formula.yieldPpm === undefined ? 1 : formula.yieldPpm / 1e6);
  const shares = new Map<string, { ingredient: IngredientNode; share: number }>();
  const add = (ingredient: IngredientNode, share: number) => {
    const sum = (shares.get(ingredient.id)?.share ?? 0) + share;
    shares.set(ingredient.id, { ingredient, share: sum });
  };
  for (const { part, weightMg } of formula.lines) {
    // A formula of nothing has no shares; its ingredients are named all the same.
    const share = leftMg > 0 ? weightMg / leftMg : 0;
    if (part.kind === 'ingredient') add(part, share);
    else {
      for (const inner of sharesOf(part, path, known).values()) {
        add(inner.ingredient, inner.share * share);
      }
    }
  }
  known.set(formula, shares);
  return shares;
}
