import { requireSound } from './check-formula.ts';
import { faultOf, FormulaFault } from './formula-problem.ts';
import {
  resolvePart,
  type FormulaBody,
  type PantryIndex,
  type ResolvedPart,
} from './pantry-index.ts';
import { roundGrams, shellEggG } from './round-grams.ts';
import { formulaTotals, mixedG } from './totals.ts';

/** How much: grams that come out, a factor, bowls of so many grams of mix, or one line's grams. */
export type ScaleTo =
  | { readonly toG: number }
  | { readonly factor: number }
  | { readonly bowls: number; readonly bowlG: number }
  | { readonly line: number; readonly lineG: number };

export type ScaledLine = {
  readonly line: number;
  readonly part: ResolvedPart;
  /** In exactly the formula's proportion. */
  readonly exactG: number;
  /** As the bench weighs it. */
  readonly roundedG: number;
  readonly driftG: number;
  /** Parts per million of the exact weight. */
  readonly driftPpm: number;
  /** Whole eggs to crack; null where nothing is cracked. */
  readonly eggs: { readonly count: number; readonly eachG: number } | null;
};

export type ScaledFormula = {
  readonly factor: number;
  readonly lines: readonly ScaledLine[];
  readonly exactInG: number;
  readonly roundedInG: number;
  /** What comes out, by the exact and by the rounded weights. */
  readonly exactOutG: number;
  readonly roundedOutG: number;
  readonly driftG: number;
  readonly driftPpm: number;
};

/** No studio makes a hundred tonnes of one thing. */
const mostG = 100_000_000;

/**
 * A formula for another amount: exact proportions beside what the kitchen weighs, and how far the
 * one is from the other. Shell eggs are rounded to whole eggs, at least one.
 * Throws `FormulaFault` for an unsound formula or an amount that is none.
 */
export function scaleFormula(body: FormulaBody, index: PantryIndex, to: ScaleTo): ScaledFormula {
  requireSound(body, index);
  const { inG, outG } = formulaTotals(body);
  const factor = factorOf(body, to, outG);
  if (inG * factor > mostG) throw faultOf('too-heavy', 'That is more than a hundred tonnes.');
  const lines = body.lines.map((it, line): ScaledLine => {
    const part = resolvePart(index, it.part);
    const exactG = it.grams * factor;
    const eachG = part.kind === 'ingredient' ? shellEggG(part.ingredient) : null;
    const count = eachG === null ? 0 : Math.max(1, Math.round(exactG / eachG));
    const roundingG = part.kind === 'ingredient' ? part.ingredient.roundingG : null;
    const roundedG = eachG === null ? roundGrams(exactG, roundingG) : count * eachG;
    const driftG = roundedG - exactG;
    return {
      line,
      part,
      exactG,
      roundedG,
      driftG,
      driftPpm: Math.round((driftG / exactG) * 1e6),
      eggs: eachG === null ? null : { count, eachG },
    };
  });
  const exactInG = inG * factor;
  const roundedInG = lines.reduce((sum, it) => sum + it.roundedG, 0);
  const left = body.yieldPpm / 1e6;
  return {
    factor,
    lines,
    exactInG,
    roundedInG,
    exactOutG: exactInG * left,
    roundedOutG: roundedInG * left,
    driftG: roundedInG - exactInG,
    driftPpm: Math.round(((roundedInG - exactInG) / exactInG) * 1e6),
  };
}

function factorOf(body: FormulaBody, to: ScaleTo, outG: number): number {
  if ('factor' in to) return amountOf(to.factor, 'a factor');
  if ('toG' in to) return amountOf(to.toG, 'a weight') / outG;
  if ('bowls' in to) {
    const bowlG = amountOf(to.bowlG, 'a weight of one bowl');
    return (amountOf(to.bowls, 'a number of bowls') * bowlG) / mixedG(body, outG);
  }
  const line = body.lines[to.line];
  if (line === undefined) throw faultOf('missing-part', `There is no line ${to.line + 1}.`);
  if (!(to.lineG > 0) || !Number.isFinite(to.lineG)) {
    throw new FormulaFault([
      {
        code: 'not-an-amount',
        line: to.line,
        message: `Line ${to.line + 1}: write a weight of more than nothing.`,
        path: [],
      },
    ]);
  }
  return to.lineG / line.grams;
}

function amountOf(value: number, what: string): number {
  if (value > 0 && Number.isFinite(value)) return value;
  throw faultOf('not-an-amount', `Write ${what} of more than nothing.`);
}
