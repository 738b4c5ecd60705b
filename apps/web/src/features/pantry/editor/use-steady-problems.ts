import { useState } from 'react';
import type { FieldProblem } from '#web/lib/forms.ts';

/**
 * The same list for the same problems: a letter that changes nothing about them then draws nothing
 * anew but its own line.
 */
export function useSteadyProblems(problems: readonly FieldProblem[]): readonly FieldProblem[] {
  const [steady, setSteady] = useState(problems);
  const same =
    steady.length === problems.length &&
    steady.every(
      (it, at) => it.name === problems[at]?.name && it.message === problems[at]?.message,
    );
  if (same) return steady;
  setSteady(problems);
  return problems;
}
