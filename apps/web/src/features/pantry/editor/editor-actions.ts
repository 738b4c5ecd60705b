import type { FormulaPart } from '#shared/contracts/pantry.ts';
import {
  type EditorFields,
  type EditorForm,
  type LineRow,
  type StepRow,
  blankLine,
  blankStep,
} from './editor-form.ts';

/** Lines that were read out of a pasted text, with the headings that parted them. */
export type Pasted = {
  readonly headings: readonly string[];
  /** `stage` 0 is before the first heading. */
  readonly lines: readonly { readonly text: string; readonly stage: number }[];
};

export type EditorAction =
  | { readonly type: 'all'; readonly form: EditorForm }
  | { readonly type: 'fields'; readonly fields: Partial<EditorFields> }
  /** `words` are those of the text before, so that what was picked for them can stand. */
  | { readonly type: 'text'; readonly key: number; readonly text: string; readonly words: string }
  | {
      readonly type: 'pick';
      readonly key: number;
      readonly part: FormulaPart;
      readonly words: string;
    }
  | { readonly type: 'line-step'; readonly key: number; readonly step: number }
  | { readonly type: 'add-lines'; readonly at: number; readonly texts: readonly string[] }
  | { readonly type: 'paste'; readonly pasted: Pasted }
  | { readonly type: 'put-line'; readonly at: number; readonly row: LineRow }
  | { readonly type: 'remove-line'; readonly key: number }
  | { readonly type: 'to-note'; readonly key: number }
  | { readonly type: 'move-line'; readonly key: number; readonly by: 1 | -1 }
  | { readonly type: 'add-step' }
  | { readonly type: 'step'; readonly key: number; readonly patch: Partial<StepRow> }
  | { readonly type: 'remove-step'; readonly key: number }
  | { readonly type: 'move-step'; readonly key: number; readonly by: 1 | -1 };

/** A pasted tab is a blank: what is kept as a line stays one. */
const onOneLine = (text: string) => text.replaceAll(/\p{Cc}+/gu, ' ');

/** The form after one thing done to it; what did not change stays the same object. */
export function editorReducer(form: EditorForm, action: EditorAction): EditorForm {
  switch (action.type) {
    case 'all':
      return action.form;
    case 'fields':
      return { ...form, fields: { ...form.fields, ...action.fields } };
    case 'text':
      return changeLine(form, action.key, (row) => ({
        ...row,
        text: onOneLine(action.text),
        stored: null,
        picked: row.stored === null ? row.picked : { part: row.stored.part, words: action.words },
      }));
    case 'pick':
      return changeLine(form, action.key, (row) => ({
        ...row,
        stored: null,
        picked: { part: action.part, words: action.words },
      }));
    case 'line-step':
      return changeLine(form, action.key, (row) => ({ ...row, step: action.step }));
    case 'add-lines':
      return addLines(form, action.at, action.texts);
    case 'paste':
      return paste(form, action.pasted);
    case 'put-line':
      return { ...form, lines: form.lines.toSpliced(action.at, 0, action.row) };
    case 'remove-line':
      return { ...form, lines: form.lines.filter((it) => it.key !== action.key) };
    case 'to-note': {
      const row = form.lines.find((it) => it.key === action.key);
      if (row === undefined) return form;
      return {
        ...form,
        lines: form.lines.filter((it) => it.key !== action.key),
        fields: {
          ...form.fields,
          note: [form.fields.note, row.text.trim()].filter((it) => it !== '').join('\n'),
        },
      };
    }
    case 'move-line':
      return { ...form, lines: moved(form.lines, action.key, action.by) };
    case 'add-step':
      return {
        ...form,
        steps: [...form.steps, blankStep(form.nextKey)],
        nextKey: form.nextKey + 1,
      };
    case 'step':
      return {
        ...form,
        steps: form.steps.map((it) => (it.key === action.key ? { ...it, ...action.patch } : it)),
      };
    case 'remove-step':
      return withSteps(
        form,
        form.steps.filter((it) => it.key !== action.key),
      );
    case 'move-step':
      return withSteps(form, moved(form.steps, action.key, action.by));
  }
}

function changeLine(form: EditorForm, key: number, change: (row: LineRow) => LineRow): EditorForm {
  return { ...form, lines: form.lines.map((it) => (it.key === key ? change(it) : it)) };
}

function addLines(form: EditorForm, at: number, texts: readonly string[]): EditorForm {
  const step = form.lines[at - 1]?.step ?? form.lines[at]?.step ?? 0;
  const added = texts.map((text, i) => blankLine(form.nextKey + i, step, onOneLine(text)));
  return {
    ...form,
    lines: form.lines.toSpliced(at, 0, ...added),
    nextKey: form.nextKey + added.length,
  };
}

/** A pasted text goes to the end; its headings become steps, so that nothing of it is lost. */
function paste(form: EditorForm, { headings, lines }: Pasted): EditorForm {
  const before = form.steps.length;
  const steps = headings.map((text, i) => blankStep(form.nextKey + i, onOneLine(text)));
  const first = form.nextKey + steps.length;
  const rows = lines.map(({ text, stage }, i) =>
    blankLine(
      first + i,
      stage === 0 ? Math.max(0, before - 1) : before + stage - 1,
      onOneLine(text),
    ),
  );
  return {
    ...form,
    lines: [...form.lines.filter((it) => it.text.trim() !== ''), ...rows],
    steps: [...form.steps, ...steps],
    nextKey: first + rows.length,
  };
}

function moved<T extends { readonly key: number }>(
  rows: readonly T[],
  key: number,
  by: 1 | -1,
): T[] {
  const from = rows.findIndex((it) => it.key === key);
  const row = rows[from];
  const to = from + by;
  if (row === undefined || to < 0 || to >= rows.length) return [...rows];
  return rows.toSpliced(from, 1).toSpliced(to, 0, row);
}

/** Lines follow the step they go in at; those of a step that is gone go to the one before it. */
function withSteps(form: EditorForm, steps: readonly StepRow[]): EditorForm {
  const placeOf = (step: number) => {
    const to = steps.findIndex((it) => it.key === form.steps[step]?.key);
    return to === -1 ? Math.max(0, Math.min(step, steps.length) - 1) : to;
  };
  return {
    ...form,
    steps: [...steps],
    lines: form.lines.map((it) => {
      const step = placeOf(it.step);
      return step === it.step ? it : { ...it, step };
    }),
  };
}
