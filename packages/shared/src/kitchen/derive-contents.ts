import { inSentence } from './labels/name-in-sentence.ts';
import type { AllergenEntry, Contents } from '#shared/contracts/menu.ts';
import { mergeAllergens } from './merge-allergens.ts';

/** What a label says about one thing; `unknown` is never taken for `no`. */
export type LabelFact = 'yes' | 'no' | 'unknown';

/** A bought product as its label was checked. */
export type IngredientNode = {
  readonly kind: 'ingredient';
  readonly id: string;
  /** Common name, as it is printed in an ingredient statement. */
  readonly name: string;
  /** What the product itself is made of, from its label; empty for a simple one. */
  readonly madeOf: string;
  readonly allergens: readonly AllergenEntry[];
  readonly gelatine: LabelFact;
  readonly alcohol: LabelFact;
  readonly cochineal: LabelFact;
  readonly honey: LabelFact;
  /** Meat, fish or slaughter products; gelatine whose source is not known counts as `unknown`. */
  readonly animalOrigin: LabelFact;
  /** Raw egg needs a heated step; pasteurised egg and no egg do not. */
  readonly egg: 'none' | 'raw' | 'pasteurised';
};

/** One step of a formula; only what matters for what the result contains. */
export type FormulaStep = {
  /**
   * Heat the mix itself must reach, read on a probe and logged, °C; null where there is none or
   * where something else is measured (syrup poured into eggs says nothing about the eggs).
   */
  readonly mixReachesC: number | null;
  readonly holdSeconds: number;
};

export type FormulaLine = {
  readonly weightMg: number;
  readonly part: IngredientNode | FormulaNode;
  /** Index of the step in which it goes in; later heat reaches it, earlier heat does not. */
  readonly joinsAtStep: number;
};

/** A formula by weight; lines may be other formulas (a custard inside a buttercream). */
export type FormulaNode = {
  readonly kind: 'formula';
  readonly id: string;
  readonly name: string;
  /** What is left of what goes in, parts per million; all of it where it is not told. */
  readonly yieldPpm?: number;
  readonly lines: readonly FormulaLine[];
  readonly steps: readonly FormulaStep[];
};

/** A formula that uses itself, directly or through others. */
export class FormulaCycle extends Error {
  readonly formulaIds: readonly string[];

  constructor(formulaIds: readonly string[]) {
    super(`These formulas use one another in a circle: ${formulaIds.join(' > ')}.`);
    this.name = 'FormulaCycle';
    this.formulaIds = formulaIds;
  }
}

/**
 * Egg counts as cooked at 160 °F / 71 °C (FDA consumer guidance for egg dishes), or at
 * 155 °F / 68 °C held for 17 seconds (Food Code 2022, 3-401.11, pooled eggs).
 */
export function cooksEgg(step: FormulaStep): boolean {
  if (step.mixReachesC === null) return false;
  return step.mixReachesC >= 71 || (step.mixReachesC >= 68 && step.holdSeconds >= 17);
}

type Gathered = {
  readonly allergens: readonly AllergenEntry[];
  readonly statement: string;
  /** Statements of the ingredients alone, by their part of the whole. */
  readonly dispersed: ReadonlyMap<string, number>;
  readonly facts: Record<'gelatine' | 'alcohol' | 'cochineal' | 'honey' | 'animalOrigin', boolean>;
  readonly rawEgg: boolean;
  /** Ids of the formulas in it, its own included. */
  readonly formulaIds: ReadonlySet<string>;
};

/** Nodes never change, so what was gathered of one holds wherever else it is used. */
const gatheredBefore = new WeakMap<FormulaNode, Gathered>();

/**
 * What a part of a cake has in it, gathered from its ingredients through all its formulas.
 * Unknown gelatine, alcohol, cochineal, honey and animal origin count as present.
 * Throws `FormulaCycle`.
 */
export function deriveContents(formula: FormulaNode): Contents {
  const { allergens, statement, facts, rawEgg } = gatherFormula(formula, []);
  return {
    allergens: [...allergens],
    statement,
    ...facts,
    undercookedEgg: rawEgg,
  };
}

function gatherFormula(formula: FormulaNode, above: readonly string[]): Gathered {
  const before = gatheredBefore.get(formula);
  const again = before && above.find((id) => before.formulaIds.has(id));
  if (again !== undefined) throw new FormulaCycle([...above, formula.id, again]);
  if (before !== undefined) return before;
  if (above.includes(formula.id)) throw new FormulaCycle([...above, formula.id]);
  const path = [...above, formula.id];
  const gathered = formula.lines.map((line) => ({
    line,
    inside:
      line.part.kind === 'formula' ? gatherFormula(line.part, path) : gatherIngredient(line.part),
  }));
  const lastHeat = formula.steps.findLastIndex(cooksEgg);
  const dispersed = disperse(gathered);
  const now: Gathered = {
    allergens: mergeAllergens(gathered.map((it) => it.inside.allergens)),
    statement: statementOf(gathered, dispersed),
    dispersed,
    facts: {
      gelatine: gathered.some((it) => it.inside.facts.gelatine),
      alcohol: gathered.some((it) => it.inside.facts.alcohol),
      cochineal: gathered.some((it) => it.inside.facts.cochineal),
      honey: gathered.some((it) => it.inside.facts.honey),
      animalOrigin: gathered.some((it) => it.inside.facts.animalOrigin),
    },
    rawEgg: gathered.some((it) => it.inside.rawEgg && it.line.joinsAtStep > lastHeat),
    formulaIds: new Set([formula.id, ...gathered.flatMap((it) => [...it.inside.formulaIds])]),
  };
  gatheredBefore.set(formula, now);
  return now;
}

function gatherIngredient(ingredient: IngredientNode): Gathered {
  const statement =
    ingredient.madeOf === '' ? ingredient.name : `${ingredient.name} (${ingredient.madeOf})`;
  return {
    allergens: ingredient.allergens,
    statement,
    dispersed: new Map([[statement, 1]]),
    facts: {
      gelatine: ingredient.gelatine !== 'no',
      alcohol: ingredient.alcohol !== 'no',
      cochineal: ingredient.cochineal !== 'no',
      honey: ingredient.honey !== 'no',
      animalOrigin: ingredient.animalOrigin !== 'no',
    },
    rawEgg: ingredient.egg === 'raw',
    formulaIds: new Set(),
  };
}

type GatheredLine = { readonly line: FormulaLine; readonly inside: Gathered };

/** Nobody reads a statement longer than this, and nested doubles would make it endless. */
const longestStatement = 4000;

/**
 * Descending by weight as used, by common name (21 CFR 101.4(a)(1)), compounds in parentheses; an
 * ingredient in two lines of one formula is named once with their weights together. One that
 * would be endless names what the compounds are made of without them (21 CFR 101.4(b)(2)(ii)).
 */
function statementOf(
  gathered: readonly GatheredLine[],
  dispersed: ReadonlyMap<string, number>,
): string {
  const weights = new Map<string, number>();
  for (const { line, inside } of gathered) {
    const text =
      line.part.kind === 'formula'
        ? `${inSentence(line.part.name)} (${inside.statement})`
        : inside.statement;
    weights.set(text, (weights.get(text) ?? 0) + line.weightMg);
  }
  const statement = heaviestFirst(weights);
  return statement.length > longestStatement ? heaviestFirst(dispersed) : statement;
}

function heaviestFirst(weights: ReadonlyMap<string, number>): string {
  return [...weights]
    .sort(([, a], [, b]) => b - a)
    .map(([text]) => text)
    .join(', ');
}

/** Each ingredient's part of what goes in, through all formulas. */
function disperse(gathered: readonly GatheredLine[]): ReadonlyMap<string, number> {
  const total = gathered.reduce((sum, it) => sum + it.line.weightMg, 0);
  const parts = new Map<string, number>();
  for (const { line, inside } of gathered) {
    for (const [text, part] of inside.dispersed) {
      const share = total > 0 ? (part * line.weightMg) / total : 0;
      parts.set(text, (parts.get(text) ?? 0) + share);
    }
  }
  return parts;
}
