import type { FormulaVersion, Ingredient, PartFormulas } from '#shared/contracts/pantry.ts';
import { bowlsFor, type BowlPlan, type Mixer } from '../formulas/bowls.ts';
import { explodeFormula } from '../formulas/explode-formula.ts';
import { FormulaFault } from '../formulas/formula-problem.ts';
import { versionName, type PantryIndex } from '../formulas/pantry-index.ts';
import { scaleFormula, type ScaledFormula } from '../formulas/scale-formula.ts';
import { mixedG } from '../formulas/totals.ts';
import { partWeights, type WeighedPart } from '../part-weights.ts';
import { isPiped, timesOf } from '../piped.ts';
import type { ResolvedDesign } from '../resolve-design.ts';
import { partName } from './part-name.ts';

export type NeedsInput = {
  readonly resolved: ResolvedDesign;
  readonly index: PantryIndex;
  readonly parts: PartFormulas;
  /** The version a formula is made by: an order's own, else the current one; null for none. */
  readonly versionOf: (formulaId: string) => string | null;
  readonly mixers: readonly Mixer[];
};

/** One formula of the order, as the bench makes it. */
export type FormulaNeed = {
  readonly version: FormulaVersion;
  readonly name: string;
  readonly scaled: ScaledFormula;
  /** Grams that must come out: baked sponge before levelling, frosting with bowl and bag. */
  readonly outG: number;
  /** Grams in the mixer: what goes in for a batter, what comes out for the rest. */
  readonly mixG: number;
  /** Null where the studio has no mixer, or no step of the formula uses one. */
  readonly bowls: BowlPlan | null;
  /** Names of what it is for: parts of the menu, or formulas it goes into. */
  readonly for: readonly string[];
};

export type IngredientNeed = {
  readonly ingredient: Ingredient;
  readonly grams: number;
  /** How much of it is in decorations, whose materials the owner prices as a whole. */
  readonly forDecorationsG: number;
  /** How much of it goes on as it is, in no formula. */
  readonly asItIsG: number;
};

/** Something the cake has that no formula tells of; its weight is missing from the rest. */
export type UnknownNeed = {
  readonly name: string;
  readonly grams: number;
  readonly why: 'no-formula' | 'unsound' | 'no-ingredient';
  /** What is wrong with the formula; empty where there is none. */
  readonly message: string;
};

export type KitchenNeeds = {
  /** What is inside others before them. */
  readonly formulas: readonly FormulaNeed[];
  /** Everything bought, through all formulas and decorations, by exact weight. */
  readonly ingredients: readonly IngredientNeed[];
  readonly unknown: readonly UnknownNeed[];
};

type Buy = (ingredientId: string, weights: Partial<Weights> & Pick<Weights, 'grams'>) => void;

type Weights = Omit<IngredientNeed, 'ingredient'>;

type Wanted = { readonly version: FormulaVersion; outG: number; readonly for: Set<string> };

/**
 * Everything a design takes, formula by formula and ingredient by ingredient, unrounded beside the
 * kitchen's roundings. What cannot be reckoned is named, never left out in silence.
 */
export function needsOf(input: NeedsInput): KitchenNeeds {
  const { resolved, index, mixers } = input;
  const unknown: UnknownNeed[] = [];
  const wanted = new Map<string, Wanted>();
  const want = (version: FormulaVersion, outG: number, what: string) => {
    const known = wanted.get(version.id);
    if (known === undefined) wanted.set(version.id, { version, outG, for: new Set([what]) });
    else {
      known.outG += outG;
      known.for.add(what);
    }
  };
  const bought = new Map<string, Weights>();
  const buy: Buy = (id, { grams, forDecorationsG = 0, asItIsG = 0 }) => {
    const known = bought.get(id) ?? { grams: 0, forDecorationsG: 0, asItIsG: 0 };
    bought.set(id, {
      grams: known.grams + grams,
      forDecorationsG: known.forDecorationsG + forDecorationsG,
      asItIsG: known.asItIsG + asItIsG,
    });
  };

  for (const part of partWeights(resolved).parts) {
    if (part.toMakeG <= 0) continue;
    const name = partName(part, resolved.menu);
    if (part.part === 'decoration') {
      buyDecoration(part, input, buy);
      const made = input.parts.decorations[part.id];
      // Bought whole and put on: its own list says what is in it.
      if (made === undefined || made.formulaId === null) continue;
    }
    const version = versionOf(part, input);
    if (version === null) {
      unknown.push({ name, grams: part.toMakeG, why: 'no-formula', message: '' });
      continue;
    }
    const outG = finishedG(part, version);
    try {
      const exploded = explodeFormula(version, index, outG);
      for (const inside of exploded.formulas.toReversed()) {
        want(inside.version, inside.outG, versionName(index, version));
      }
      want(version, outG, name);
      for (const [id, grams] of exploded.ingredients) {
        buy(id, { grams, forDecorationsG: part.part === 'decoration' ? grams : 0 });
      }
    } catch (error) {
      if (!(error instanceof FormulaFault)) throw error;
      unknown.push({ name, grams: part.toMakeG, why: 'unsound', message: error.message });
    }
  }
  const ingredients: IngredientNeed[] = [];
  for (const [id, weights] of bought) {
    const ingredient = index.ingredients.get(id);
    if (ingredient !== undefined) ingredients.push({ ingredient, ...weights });
    else unknown.push({ name: id, grams: weights.grams, why: 'no-ingredient', message: '' });
  }
  return {
    formulas: [...wanted.values()].map((it) => formulaNeed(it, index, mixers)),
    ingredients: ingredients.toSorted((a, b) => b.grams - a.grams),
    unknown,
  };
}

function formulaNeed(
  { version, outG, for: purposes }: Wanted,
  index: PantryIndex,
  mixers: readonly Mixer[],
): FormulaNeed {
  const scaled = scaleFormula(version, index, { toG: outG });
  const mixG = mixedG(version, outG);
  return {
    version,
    name: versionName(index, version),
    scaled,
    outG,
    mixG,
    bowls:
      usesMixer(version) && mixers.some((it) => it.capacityG > 0) ? bowlsFor(mixG, mixers) : null,
    for: [...purposes],
  };
}

/**
 * What must come out of the formula. A sponge is reckoned in batter; the oven takes its share, and
 * the formula's yield is of what leaves the oven.
 */
function finishedG({ part, toMakeG }: WeighedPart, version: FormulaVersion): number {
  return part === 'sponge' ? toMakeG * (1 - version.bakeLossPpm / 1e6) : toMakeG;
}

function versionOf(part: WeighedPart, input: NeedsInput): FormulaVersion | null {
  const formulaId = formulaIdOf(part, input.parts);
  if (formulaId === null) return null;
  const id = input.versionOf(formulaId);
  return id === null ? null : (input.index.versions.get(id) ?? null);
}

function formulaIdOf({ part, id }: WeighedPart, parts: PartFormulas): string | null {
  const known: Readonly<Record<string, string | undefined>> = {
    sponge: parts.sponges,
    filling: parts.fillings,
    style: parts.styles,
    covering: parts.coverings,
    decoration: {},
  }[part];
  if (part === 'decoration') return parts.decorations[id]?.formulaId ?? null;
  return known[id] ?? null;
}

/** Ingredients of a decoration are listed for one of it. */
function buyDecoration({ id }: WeighedPart, { resolved, parts }: NeedsInput, buy: Buy): void {
  const times = resolved.decorations
    .filter(
      (it) => it.decoration.id === id && it.placed.source === 'studio' && !isPiped(it.decoration),
    )
    .reduce((sum, it) => sum + timesOf(it, resolved.tiers.length), 0);
  for (const it of parts.decorations[id]?.ingredients ?? []) {
    const grams = it.grams * times;
    buy(it.ingredientId, { grams, forDecorationsG: grams, asItIsG: grams });
  }
}

/** A formula without steps is taken for one that is mixed. */
function usesMixer({ steps }: FormulaVersion): boolean {
  return steps.length === 0 || steps.some((it) => it.resource === 'mixer');
}
