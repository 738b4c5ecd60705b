import type { FieldProblem } from '#web/lib/forms.ts';
import type { EditorForm } from './editor-form.ts';

/**
 * The problems to show. Before anybody has tried to save, only of what is typed: a field nobody
 * has come to yet is not wrong.
 */
export function liveProblems(
  problems: readonly FieldProblem[],
  form: EditorForm,
  tried: boolean,
): readonly FieldProblem[] {
  return tried ? problems : problems.filter(({ name }) => isTyped(name, form));
}

function isTyped(name: string, { fields, steps, lines }: EditorForm): boolean {
  const [group, at = '', field = ''] = name.split('.');
  if (group === 'lines') return lines.some((it) => it.text.trim() !== '') && at !== '';
  if (group === 'steps') {
    const step = steps[Number(at)];
    if (step === undefined) return false;
    return field === 'text' ? step.text !== '' : step.limit?.temperature !== '';
  }
  return { name: fields.name, densityGPerMl: fields.density }[name] !== '';
}
