import type { FormulaLine, FormulaVersion } from '#shared/contracts/pantry.ts';
import { FormulaFault, type FormulaProblem } from './formula-problem.ts';
import { resolvePart, versionName, type FormulaBody, type PantryIndex } from './pantry-index.ts';

/** The contract's limit for a line, grams: a tonne. */
const heaviestG = 1_000_000;

type Found = Pick<FormulaProblem, 'code' | 'path'> & {
  readonly what: string;
  /** Line, from 0, of the innermost formula of the path; null where it is a line of this one. */
  readonly innerLine: number | null;
};

/** What is wrong inside a version, and every formula that is in it, itself included. */
type Inside = { readonly problem: Found | null; readonly reach: ReadonlySet<string> };

const kept = new WeakMap<PantryIndex, Map<string, Inside>>();

/**
 * Everything that keeps a formula from being reckoned with, each at its line: parts that are not
 * in the pantry, a formula that uses itself (in whatever version, through whatever others),
 * weights that are none, a yield over 100 %. Empty for a sound one.
 */
export function checkFormula(body: FormulaBody, index: PantryIndex): FormulaProblem[] {
  const problems: FormulaProblem[] = [];
  const whole = (code: FormulaProblem['code'], message: string) =>
    problems.push({ code, line: null, message, path: [] });

  if (body.lines.length === 0) whole('no-lines', 'A formula needs at least one line.');
  if (!(body.yieldPpm > 0)) whole('no-yield', 'Something must be left: a yield of more than 0 %.');
  else if (body.yieldPpm > 1_000_000) {
    whole('yield-over-100', 'No more can come out than goes in: a yield of at most 100 %.');
  }
  for (const [line, it] of body.lines.entries()) {
    const found = weightProblem(it.grams) ?? partProblem(it, index, body.formulaId);
    if (found === null) continue;
    const name = resolvePart(index, it.part).name;
    problems.push({
      code: found.code,
      line,
      message: `Line ${line + 1}, ${name}: ${sentenceOf(found)}`,
      path: found.path,
    });
  }
  return problems;
}

/** Throws `FormulaFault` with everything `checkFormula` finds. */
export function requireSound(body: FormulaBody, index: PantryIndex): void {
  const problems = checkFormula(body, index);
  if (problems.length > 0) throw new FormulaFault(problems);
}

/**
 * Every version inside these lines, each once and after all that is inside it; never recursive,
 * so depth costs nothing. The lines must be sound.
 */
export function innermostFirst(
  lines: readonly FormulaLine[],
  index: PantryIndex,
): FormulaVersion[] {
  const order: FormulaVersion[] = [];
  const seen = new Set<string>();
  const stack: {
    readonly version: FormulaVersion | null;
    readonly lines: readonly FormulaLine[];
    next: number;
  }[] = [{ version: null, lines, next: 0 }];
  for (let top = stack.at(-1); top !== undefined; top = stack.at(-1)) {
    const line = top.lines[top.next];
    top.next += 1;
    if (line === undefined) {
      if (top.version !== null) order.push(top.version);
      stack.pop();
    } else if (line.part.kind === 'formula' && !seen.has(line.part.formulaVersionId)) {
      seen.add(line.part.formulaVersionId);
      const version = index.versions.get(line.part.formulaVersionId);
      if (version !== undefined) stack.push({ version, lines: version.lines, next: 0 });
    }
  }
  return order;
}

function sentenceOf({ what, path, innerLine }: Found): string {
  if (innerLine === null) return what;
  return `inside ${path.join(' > ')}, line ${innerLine + 1} ${what}`;
}

function weightProblem(grams: number): Found | null {
  if (!(grams > 0) || !Number.isFinite(grams)) {
    return {
      code: 'not-a-weight',
      what: 'needs a weight of more than nothing.',
      path: [],
      innerLine: null,
    };
  }
  if (grams <= heaviestG) return null;
  return { code: 'too-heavy', what: 'weighs more than a tonne.', path: [], innerLine: null };
}

const missing: Found = {
  code: 'missing-part',
  what: 'is not in the pantry.',
  path: [],
  innerLine: null,
};

function partProblem(
  { part }: FormulaLine,
  index: PantryIndex,
  formulaId: string | undefined,
): Found | null {
  if (part.kind === 'ingredient') return index.ingredients.has(part.ingredientId) ? null : missing;
  const version = index.versions.get(part.formulaVersionId);
  if (version === undefined) return missing;
  const inside = insideOf(version, index);
  if (formulaId !== undefined && inside.reach.has(formulaId)) {
    const own = index.formulas.get(formulaId)?.name ?? formulaId;
    return usesItself([own, ...wayTo(formulaId, version, index)]);
  }
  return inside.problem;
}

function usesItself(path: readonly string[]): Found {
  return {
    code: 'uses-itself',
    what: `the formula uses itself: ${path.join(' > ')}.`,
    path,
    innerLine: null,
  };
}

/** Names on the way from a version to one of a formula that is in its reach. */
function wayTo(formulaId: string, from: FormulaVersion, index: PantryIndex): string[] {
  const names: string[] = [];
  const seen = new Set<string>();
  for (let at: FormulaVersion | undefined = from; at !== undefined && !seen.has(at.id);) {
    seen.add(at.id);
    names.push(versionName(index, at));
    if (at.formulaId === formulaId) break;
    at = formulasIn(at.lines, index).find((it) => insideOf(it, index).reach.has(formulaId));
  }
  return names;
}

function formulasIn(lines: readonly FormulaLine[], index: PantryIndex): FormulaVersion[] {
  return lines.flatMap(({ part }) => {
    const version = part.kind === 'formula' ? index.versions.get(part.formulaVersionId) : undefined;
    return version === undefined ? [] : [version];
  });
}

/** Worked out for a version after all that is in it, and kept: saved versions never change. */
function insideOf(version: FormulaVersion, index: PantryIndex): Inside {
  let byId = kept.get(index);
  if (byId === undefined) {
    byId = new Map();
    kept.set(index, byId);
  }
  const before = byId.get(version.id);
  if (before !== undefined) return before;

  const open = new Map<string, { readonly version: FormulaVersion; next: number }>();
  const stack = [{ version, next: 0 }];
  open.set(version.id, { version, next: 0 });
  for (let top = stack.at(-1); top !== undefined; top = stack.at(-1)) {
    const line = top.version.lines[top.next];
    top.next += 1;
    if (line === undefined) {
      byId.set(top.version.id, gatherInside(top.version, index, byId));
      open.delete(top.version.id);
      stack.pop();
      continue;
    }
    if (line.part.kind !== 'formula' || byId.has(line.part.formulaVersionId)) continue;
    const inner = index.versions.get(line.part.formulaVersionId);
    // One that is still open is in a circle; whoever holds it finds no entry and says so.
    if (inner === undefined || open.has(inner.id)) continue;
    const frame = { version: inner, next: 0 };
    open.set(inner.id, frame);
    stack.push(frame);
  }
  const found = byId.get(version.id);
  return found ?? { problem: null, reach: new Set() };
}

function gatherInside(
  version: FormulaVersion,
  index: PantryIndex,
  byId: ReadonlyMap<string, Inside>,
): Inside {
  const name = versionName(index, version);
  const reach = new Set([version.formulaId]);
  let problem: Inside['problem'] = null;
  // A circle is told by its own names; anything else by the way that leads to it.
  const within = (found: Found, line: number): Found =>
    found.code === 'uses-itself'
      ? found
      : { ...found, path: [name, ...found.path], innerLine: found.innerLine ?? line };
  for (const [at, line] of version.lines.entries()) {
    let found = weightProblem(line.grams);
    const { part } = line;
    if (part.kind === 'ingredient') {
      if (!index.ingredients.has(part.ingredientId)) found ??= missing;
    } else {
      const inner = index.versions.get(part.formulaVersionId);
      const inside = byId.get(part.formulaVersionId);
      if (inner === undefined) found ??= missing;
      else if (inside === undefined) found ??= usesItself([name, versionName(index, inner)]);
      else if (inside.reach.has(version.formulaId)) {
        found ??= usesItself([name, ...wayTo(version.formulaId, inner, index)]);
      } else found ??= inside.problem;
      for (const id of inside?.reach ?? []) reach.add(id);
    }
    if (found !== null) problem ??= within(found, at);
  }
  return { problem, reach };
}
