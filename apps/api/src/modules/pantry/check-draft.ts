import type { FormulaDraft } from '#shared/contracts/pantry.ts';
import { checkFormula } from '#shared/kitchen/formulas/check-formula.ts';
import type { FormulaProblem } from '#shared/kitchen/formulas/formula-problem.ts';
import { indexPantry, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import type { FormulaBook, PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { AppError } from '#api/platform/app-error.ts';
import type { Issue } from '#api/platform/app-error.ts';

/** Lines of all formulas inside one another, each as often as it is used. */
const mostLines = 10_000;

/** More than any kitchen; whatever follows formulas inside one another never runs out of stack. */
const mostLevels = 200;

/**
 * Refuses a draft that cannot be reckoned with, each fault at its line: parts that are not there
 * or were put away, a formula that uses itself through whatever others.
 * @throws `invalid-input`
 */
export function refuseUnsound(draft: FormulaDraft, pantry: FormulaBook, formulaId?: string): void {
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

/**
 * Formulas that use one another twice over and over would print a statement without an end, and
 * a tower of them would take whoever reads it too deep.
 */
function tangled({ lines }: FormulaDraft, index: PantryIndex): Issue[] {
  const known = new Map<string, Extent>();
  const extentOf = (inside: FormulaDraft['lines']): Extent => {
    let [count, levels] = [0, 0];
    for (const { part } of inside) {
      count += 1;
      if (part.kind === 'ingredient') continue;
      const id = part.formulaVersionId;
      const inner = known.get(id) ?? extentOf(index.versions.get(id)?.lines ?? []);
      known.set(id, inner);
      count = Math.min(mostLines + 1, count + inner.count);
      levels = Math.max(levels, inner.levels + 1);
    }
    return { count, levels };
  };
  const { count, levels } = extentOf(lines);
  const issue = (message: string): Issue[] => [{ path: ['draft', 'lines'], message }];
  if (count > mostLines) return issue('These formulas hold one another too many times over.');
  return levels > mostLevels
    ? issue(`Formulas inside one another go at most ${mostLevels} levels deep.`)
    : [];
}

/** Lines of a formula and of all inside it, and how deep they lie. */
type Extent = { readonly count: number; readonly levels: number };
