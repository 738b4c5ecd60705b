import type { Contents } from '#shared/contracts/menu.ts';
import type { FormulaDraft } from '#shared/contracts/pantry.ts';
import { checkFormula } from './check-formula.ts';
import { formulaContents } from './formula-contents.ts';
import { formulaCost, type FormulaCost } from './formula-cost.ts';
import type { FormulaProblem } from './formula-problem.ts';
import { formatHousehold, type HouseholdUnits } from './household.ts';
import { resolvePart, type PantryIndex } from './pantry-index.ts';
import { percentsOf, type PercentBase, type PercentView } from './percents.ts';
import { formulaTotals, type FormulaTotals } from './totals.ts';

/** What an editor asks about: a draft, in a formula or in none yet, by its name as typed. */
export type FormulaAsked = {
  readonly draft: Pick<FormulaDraft, 'lines' | 'steps' | 'yieldPpm' | 'densityGPerMl'>;
  readonly formulaId: string | null;
  readonly name: string;
  readonly percentOf: PercentBase | null;
  /** The studio's own measures; US household ones unless said. */
  readonly units?: HouseholdUnits;
};

export type EvaluatedFormula = {
  /** Empty for a sound formula. */
  readonly problems: readonly FormulaProblem[];
  readonly totals: FormulaTotals;
  readonly percents: PercentView | null;
  /** Household measures beside the grams, by line; null where none is sensible. */
  readonly household: readonly (string | null)[];
  /** Null while a line cannot be reckoned with: nothing is claimed of half a formula. */
  readonly cost: FormulaCost | null;
  readonly contents: Contents | null;
};

/** Everything an editor shows beside a draft, quick enough for every keystroke. Never throws. */
export function evaluateFormula(
  { draft, formulaId, name, percentOf, units }: FormulaAsked,
  index: PantryIndex,
): EvaluatedFormula {
  const body = { ...draft, ...(formulaId !== null && { formulaId }) };
  const problems = checkFormula(body, index);
  const sound = problems.length === 0;
  return {
    problems,
    totals: formulaTotals(body),
    percents: percentOf === null ? null : percentsOf(body, index, percentOf),
    household: body.lines.map((it) => {
      const part = resolvePart(index, it.part);
      return part.kind === 'ingredient' ? formatHousehold(part.ingredient, it.grams, units) : null;
    }),
    cost: sound ? formulaCost(body, index) : null,
    contents: sound ? formulaContents(body, index, name) : null,
  };
}
