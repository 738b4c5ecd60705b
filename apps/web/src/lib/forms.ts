import type { FieldErrors, FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { ApiProblem, type ProblemIssue } from '#web/lib/http.ts';

/** One line of the summary at the top of a form; `name` is the field's path. */
export type FieldProblem = { readonly name: string; readonly message: string };

/** The id of a field's control, so that the summary can link to it. */
export function fieldId(name: string): string {
  return `field-${name.replaceAll('.', '-')}`;
}

/** Every message in a form's errors, in the order of the form's own values. */
export function listFieldProblems<T extends FieldValues>(errors: FieldErrors<T>): FieldProblem[] {
  const found: FieldProblem[] = [];
  walk(errors, '', found);
  return found;
}

function walk(node: unknown, path: string, found: FieldProblem[]): void {
  if (typeof node !== 'object' || node === null || node instanceof Element) return;
  if ('message' in node && typeof node.message === 'string' && node.message !== '') {
    found.push({ name: path.replace(/\.root$/, ''), message: node.message });
    return;
  }
  for (const [key, child] of Object.entries(node)) {
    if (key !== 'ref') walk(child, path === '' ? key : `${path}.${key}`, found);
  }
}

/**
 * Puts the server's issues on the fields of their paths. Returns those that belong to no field of
 * the form (`has` says which paths it knows), for the summary.
 */
export function placeServerIssues<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  has: (path: string) => path is FieldPath<T>,
): readonly ProblemIssue[] {
  if (!(error instanceof ApiProblem)) return [];
  const homeless: ProblemIssue[] = [];
  for (const issue of error.issues) {
    const path = issue.path.join('.');
    if (has(path)) setError(path, { type: 'server', message: issue.message });
    else homeless.push(issue);
  }
  return homeless;
}
