import type { FormulaDraft } from '#shared/contracts/pantry.ts';
import { checkFormula } from '#shared/kitchen/formulas/check-formula.ts';
import type { FormulaProblem } from '#shared/kitchen/formulas/formula-problem.ts';
import { indexPantry, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { Issue } from '#api/platform/app-error.ts';
import type { WholePantry } from './load-pantry.queries.ts';

/** Lines of all formulas inside one another, each as often as it is used. */
const mostLines = 10_000;

/**
 * Refuses a draft that cannot be reckoned with, each fault at its line: parts that are not there
 * or were put away, a formula that uses itself through whatever others.
 * @throws `invalid-input`
 */
export function refuseUnsound(draft: FormulaDraft, pantry: WholePantry, formulaId?: string): void {
  const index = indexPantry(pantry);
  const unsound = checkFormula({ ...draft, formulaId }, index).map(issueOf);
  const issues =
    unsound.length > 0 ? unsound : [...putAway(draft, index), ...tangled(draft, index)];
  if (issues.length > 0) throw new AppError('invalid-input', { issues });
}

function issueOf({ code, line, message }: FormulaProblem): Issue {
  if (line === null) {
    return { path: ['draft', code === 'no-lines' ? 'lines' : 'yieldPpm'], message };
  }
  const field = code === 'not-a-weight' || code === 'too-heavy' ? 'grams' : 'part';
  return { path: ['draft', 'lines', line, field], message };
}

function putAway({ lines }: FormulaDraft, index: PantryIndex): Issue[] {
  return lines.flatMap(({ part }, line) => {
    const found = resolvePart(index, part);
    const archivedAt =
      found.kind === 'ingredient'
        ? found.ingredient.archivedAt
        : found.kind === 'formula'
          ? (found.formula?.archivedAt ?? null)
          : null;
    if (archivedAt === null) return [];
    const message = `Line ${line + 1}, ${found.name}: was put away. Bring it back, or take another.`;
    return [{ path: ['draft', 'lines', line, 'part'], message }];
  });
}

/** Formulas that use one another twice over and over would print a statement without an end. */
function tangled({ lines }: FormulaDraft, index: PantryIndex): Issue[] {
  const counted = new Map<string, number>();
  const countOf = (versionId: string): number => {
    const before = counted.get(versionId);
    if (before !== undefined) return before;
    const inside = index.versions.get(versionId)?.lines ?? [];
    const count = Math.min(mostLines + 1, sumOf(inside));
    counted.set(versionId, count);
    return count;
  };
  const sumOf = (inside: FormulaDraft['lines']): number =>
    inside.reduce(
      (sum, { part }) => sum + 1 + (part.kind === 'formula' ? countOf(part.formulaVersionId) : 0),
      0,
    );
  if (sumOf(lines) <= mostLines) return [];
  const message = 'These formulas hold one another too many times over.';
  return [{ path: ['draft', 'lines'], message }];
}
