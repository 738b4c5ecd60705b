import type * as z from 'zod/mini';
import type { FieldProblem } from '#web/lib/forms.ts';
import { ApiProblem } from '#web/lib/http.ts';

export type Checked<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly FieldProblem[] };

/** Checks what was typed by the contract itself; every issue is a problem at its field's path. */
export function checkDraft<T>(contract: z.ZodMiniType<T>, typed: unknown): Checked<T> {
  const parsed = contract.safeParse(typed);
  if (parsed.success) return { ok: true, value: parsed.data };
  const seen = new Set<string>();
  const problems: FieldProblem[] = [];
  for (const issue of parsed.error.issues) {
    const name = issue.path.map(String).join('.');
    if (seen.has(name)) continue;
    seen.add(name);
    problems.push({ name, message: issue.message });
  }
  return { ok: false, problems };
}

/** What the server found wrong, at the paths of the form; empty for a failure of another kind. */
export function serverProblems(error: unknown): readonly FieldProblem[] {
  if (!(error instanceof ApiProblem)) return [];
  return error.issues.map(({ path, message }) => ({
    name: path
      .map(String)
      .join('.')
      .replace(/^draft\./, ''),
    message,
  }));
}

/** The message at a field, for its `error`. */
export function problemAt(problems: readonly FieldProblem[], name: string): string | undefined {
  return problems.find((it) => it.name === name)?.message;
}
