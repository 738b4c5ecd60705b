import type { FormulaLine } from '#shared/contracts/pantry.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import { formatLine } from '#shared/kitchen/formulas/read-formula-text.ts';
import type { TemperatureLead } from '#shared/kitchen/measures.ts';
import type { FieldProblem } from '#web/lib/forms.ts';
import { numberOf, ppmOf } from '../forms/read-amounts.ts';
import { degreesOf, hoursOf, minutesOf, secondsOf } from '../forms/read-kitchen.ts';
import type { EditorForm, StepRow } from './editor-form.ts';
import { type RowReading, readRow } from './read-row.ts';

/** The form read: what the contract is asked about, and which row each of its lines came from. */
export type TypedFormula = {
  readonly lines: readonly FormulaLine[];
  /** Key of the row of each line. */
  readonly keys: readonly number[];
  /** Everything but the lines; what cannot be read is NaN, and the contract says so. */
  readonly rest: Readonly<Record<string, unknown>>;
  /** Rows that cannot be weighed yet, each with why. */
  readonly unread: readonly FieldProblem[];
};

/** The name of a row's field, by its key: places change, keys do not. */
export const rowName = (key: number): string => `lines.${key}`;

/** Reads the form. Rows read before are not read again. */
export function typedFormula(
  form: EditorForm,
  index: PantryIndex,
  lead: TemperatureLead,
): TypedFormula {
  const lines: FormulaLine[] = [];
  const keys: number[] = [];
  const unread: FieldProblem[] = [];
  form.lines.forEach((row, at) => {
    const reading = readRow(row, index);
    if (reading.problem !== null) {
      unread.push({ name: rowName(row.key), message: `Line ${at + 1}: ${reading.problem}` });
    }
    if (reading.part === null || reading.grams === null) return;
    keys.push(row.key);
    lines.push({
      part: reading.part,
      grams: reading.grams,
      asTyped: keptText(row.text, reading),
      step: row.step,
    });
  });
  return { lines, keys, unread, rest: restOf(form, lead) };
}

/** The text is kept where it says more than the weight and the name do. */
function keptText(text: string, { name, grams }: RowReading): string | null {
  const typed = text.trim();
  return grams !== null && typed === formatLine(grams, name) ? null : typed;
}

function restOf({ fields, steps }: EditorForm, lead: TemperatureLead): TypedFormula['rest'] {
  return {
    steps: steps.map((it) => stepOf(it, lead)),
    yieldPpm: ppmOf(fields.yieldPercent),
    bakeLossPpm: ppmOf(fields.bakeLossPercent) ?? 0,
    densityGPerMl: numberOf(fields.density),
    baseColour: fields.baseColour === '' ? null : fields.baseColour,
    keepsRoomHours: hoursOf(fields.keepsRoom),
    keepsChilledHours: hoursOf(fields.keepsChilled),
    keepsFrozenHours: hoursOf(fields.keepsFrozen),
    holdsToC: degreesOf(fields.holdsTo, lead),
    refrigerate: fields.refrigerate,
    pasteurisedByDefault: fields.pasteurisedByDefault,
    note: fields.note,
  };
}

function stepOf(step: StepRow, lead: TemperatureLead) {
  return {
    text: step.text,
    activeMinutes: minutesOf(step.activeMinutes),
    waitingMinutes: minutesOf(step.waitingMinutes),
    resource: step.resource,
    critical:
      step.limit === null
        ? null
        : {
            limitC: degreesOf(step.limit.temperature, lead),
            seconds: secondsOf(step.limit.time),
            note: step.limit.note,
          },
    // A syrup without its mark is asked for one: NaN is no temperature.
    syrupTargetC: step.syrup === null ? null : (degreesOf(step.syrup, lead) ?? Number.NaN),
  };
}

/**
 * Problems of the contract's fields as the form has them: lines by their row's key, and counted
 * with the rows that could not be read.
 */
export function onTheForm(
  problems: readonly FieldProblem[],
  form: EditorForm,
  keys: readonly number[],
): readonly FieldProblem[] {
  return problems.map(({ name, message }) => {
    const line = /^lines\.(\d+)/.exec(name)?.[1];
    const key = line === undefined ? undefined : keys[Number(line)];
    if (key === undefined) return { name, message };
    const at = form.lines.findIndex((it) => it.key === key);
    return { name: rowName(key), message: message.replace(/^Line \d+/, `Line ${at + 1}`) };
  });
}
