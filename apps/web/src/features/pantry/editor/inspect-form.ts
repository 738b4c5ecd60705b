import * as z from 'zod/mini';
import {
  type FormulaDraft,
  type FormulaLine,
  type FormulaVersion,
  createFormula,
  formulaDraft,
  formulaStep,
} from '#shared/contracts/pantry.ts';
import { type VersionChange, compareVersions } from '#shared/kitchen/formulas/compare-versions.ts';
import {
  type EvaluatedFormula,
  evaluateFormula,
} from '#shared/kitchen/formulas/evaluate-formula.ts';
import type { FieldProblem } from '#web/lib/forms.ts';
import { checkDraft } from '../forms/check-draft.ts';
import { percentBase } from '../formulas/percent-choice.ts';
import { type House, compareWords } from '../house.ts';
import type { Shelf } from '../shelf.ts';
import { type EditorForm, asVersion } from './editor-form.ts';
import { onTheForm, typedFormula } from './typed-formula.ts';

type Ground = {
  readonly shelf: Shelf;
  /** Null for a new formula. */
  readonly formulaId: string | null;
  /** What the differences are told against. */
  readonly against: FormulaVersion | null;
  readonly percentOf: string | null;
  readonly house: Pick<House, 'temperatureLead' | 'labelRegion'>;
};

/** Everything that follows from what is typed. */
export type Inspected = {
  /** The lines that could be read. */
  readonly lines: readonly FormulaLine[];
  /** Of the lines that could be read. */
  readonly seen: EvaluatedFormula;
  /** Each row's percent of what goes in, by the row's key. */
  readonly shares: ReadonlyMap<number, number>;
  /** Each row's percent of what was chosen to count as 100 %. */
  readonly percents: ReadonlyMap<number, number>;
  /** Rows whose weight is not known yet. */
  readonly unread: number;
  /** All that keeps it from being saved. */
  readonly problems: readonly FieldProblem[];
  /** What would be saved; null while there are problems. */
  readonly draft: FormulaDraft | null;
  readonly changes: readonly VersionChange[] | null;
};

/** Reads, checks, evaluates and compares what is typed; quick enough for every keystroke. */
export function inspectForm(form: EditorForm, ground: Ground): Inspected {
  const { shelf, formulaId, against, percentOf, house } = ground;
  const typed = typedFormula(form, shelf.index, house.temperatureLead);
  const checked = checkDraft(formulaDraft, { ...typed.rest, lines: typed.lines });
  const name = checkDraft(createFormula.shape.name, form.fields.name);
  const steps = checkDraft(z.array(formulaStep), typed.rest['steps']);
  const yieldPpm = Number(typed.rest['yieldPpm']);
  const densityGPerMl = Number(typed.rest['densityGPerMl']);
  const seen = evaluateFormula(
    {
      draft: {
        lines: [...typed.lines],
        steps: steps.ok ? steps.value : [],
        yieldPpm: yieldPpm > 0 && yieldPpm <= 1_000_000 ? yieldPpm : 1_000_000,
        densityGPerMl,
      },
      formulaId,
      name: form.fields.name,
      percentOf: percentOf === null ? null : percentBase(percentOf),
    },
    shelf.index,
  );
  const faults = onTheForm(
    seen.problems.map(({ line, message }) => ({
      name: line === null ? 'lines' : `lines.${line}`,
      message,
    })),
    form,
    typed.keys,
  );
  const problems = once([
    ...(name.ok ? [] : [{ name: 'name', message: name.problems[0]?.message ?? '' }]),
    ...typed.unread,
    ...faults,
    ...(checked.ok ? [] : onTheForm(checked.problems, form, typed.keys)),
  ]);
  const draft = problems.length === 0 && checked.ok ? checked.value : null;
  return {
    lines: typed.lines,
    seen,
    shares: byKey(
      typed.keys,
      seen.totals.shares.map((it) => it * 100),
    ),
    percents: byKey(typed.keys, seen.percents?.lines ?? []),
    unread: typed.unread.length,
    problems,
    draft,
    changes:
      against === null || draft === null
        ? null
        : compareVersions(
            against,
            asVersion(draft, against.formulaId),
            shelf.index,
            compareWords(house),
          ),
  };
}

function byKey(keys: readonly number[], values: readonly number[]): ReadonlyMap<number, number> {
  return new Map(keys.flatMap((key, at) => [[key, values[at] ?? 0] as const]));
}

function once(problems: readonly FieldProblem[]): readonly FieldProblem[] {
  const seen = new Set<string>();
  return problems.filter(({ name }) => !seen.has(name) && seen.add(name));
}
