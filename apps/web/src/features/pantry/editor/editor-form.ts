import * as z from 'zod/mini';
import {
  type FormulaDraft,
  type FormulaVersion,
  formulaKind,
  formulaPart,
  stepResources,
} from '#shared/contracts/pantry.ts';
import { type PantryIndex, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import { formatLine } from '#shared/kitchen/formulas/read-formula-text.ts';
import { benchFahrenheit, type TemperatureLead } from '#shared/kitchen/measures.ts';
import { limitTime } from '../formulas/formula-words.ts';
import { shelfText } from '../forms/read-kitchen.ts';
import { ppmText } from '../forms/read-amounts.ts';

/** A line as it is typed, with what was picked for its words. */
const lineRow = z.object({
  key: z.number(),
  text: z.string(),
  step: z.number(),
  /** What the version it came from says; stands until the line is typed in. */
  stored: z.nullable(z.object({ part: formulaPart, grams: z.number() })),
  /** What the baker chose where the words leave it open; stands as long as the words do. */
  picked: z.nullable(z.object({ part: formulaPart, words: z.string() })),
});
export type LineRow = z.infer<typeof lineRow>;

const stepRow = z.object({
  key: z.number(),
  text: z.string(),
  activeMinutes: z.string(),
  waitingMinutes: z.string(),
  resource: z.enum(stepResources),
  /** Null where nothing is measured. */
  limit: z.nullable(z.object({ temperature: z.string(), time: z.string(), note: z.string() })),
  /** Null where no syrup is boiled. */
  syrup: z.nullable(z.string()),
});
export type StepRow = z.infer<typeof stepRow>;

const editorFields = z.object({
  name: z.string(),
  kind: formulaKind,
  yieldPercent: z.string(),
  bakeLossPercent: z.string(),
  density: z.string(),
  /** Empty where it has no colour of its own. */
  baseColour: z.string(),
  keepsRoom: z.string(),
  keepsChilled: z.string(),
  keepsFrozen: z.string(),
  holdsTo: z.string(),
  refrigerate: z.boolean(),
  pasteurisedByDefault: z.boolean(),
  note: z.string(),
});
/** Everything of the form but its lines and steps. */
export type EditorFields = z.infer<typeof editorFields>;

/** A formula as it is typed: numbers stay text, so that nothing typed is lost. */
export const editorForm = z.object({
  fields: editorFields,
  lines: z.array(lineRow),
  steps: z.array(stepRow),
  /** Next key for a line or a step. */
  nextKey: z.number(),
});
export type EditorForm = z.infer<typeof editorForm>;

export const emptyForm: EditorForm = {
  fields: {
    name: '',
    kind: 'buttercream',
    yieldPercent: '100',
    bakeLossPercent: '0',
    density: '',
    baseColour: '',
    keepsRoom: '',
    keepsChilled: '',
    keepsFrozen: '',
    holdsTo: '',
    refrigerate: true,
    pasteurisedByDefault: false,
    note: '',
  },
  lines: [blankLine(0, 0)],
  steps: [],
  nextKey: 1,
};

export function blankLine(key: number, step: number, text = ''): LineRow {
  return { key, text, step, stored: null, picked: null };
}

export function blankStep(key: number, text = ''): StepRow {
  return {
    key,
    text,
    activeMinutes: '0',
    waitingMinutes: '0',
    resource: 'bench',
    limit: null,
    syrup: null,
  };
}

/** A version put on the form, its lines as they were typed or as they would be. */
export function formOfVersion(
  version: FormulaVersion,
  { name, kind }: Pick<EditorFields, 'name' | 'kind'>,
  index: PantryIndex,
  lead: TemperatureLead,
): EditorForm {
  const { lines, steps } = version;
  return {
    fields: {
      name,
      kind,
      yieldPercent: ppmText(version.yieldPpm),
      bakeLossPercent: ppmText(version.bakeLossPpm),
      density: String(version.densityGPerMl),
      baseColour: version.baseColour ?? '',
      keepsRoom: shelfText(version.keepsRoomHours),
      keepsChilled: shelfText(version.keepsChilledHours),
      keepsFrozen: shelfText(version.keepsFrozenHours),
      holdsTo: version.holdsToC === null ? '' : degreesText(version.holdsToC, lead),
      refrigerate: version.refrigerate,
      pasteurisedByDefault: version.pasteurisedByDefault,
      note: version.note,
    },
    lines: lines.map(({ part, grams, asTyped, step }, key) => ({
      key,
      text: asTyped ?? formatLine(grams, resolvePart(index, part).name),
      step,
      stored: { part, grams },
      picked: null,
    })),
    steps: steps.map((step, at) => ({
      key: lines.length + at,
      text: step.text,
      activeMinutes: String(step.activeMinutes),
      waitingMinutes: String(step.waitingMinutes),
      resource: step.resource,
      limit:
        step.critical === null
          ? null
          : {
              temperature: degreesText(step.critical.limitC, lead),
              time: step.critical.seconds === null ? '' : limitTime(step.critical.seconds),
              note: step.critical.note,
            },
      syrup: step.syrupTargetC === null ? null : degreesText(step.syrupTargetC, lead),
    })),
    nextKey: lines.length + steps.length,
  };
}

/** One scale is enough to type in; a hundredth of a degree keeps what was kept. */
function degreesText(celsius: number, lead: TemperatureLead): string {
  const value = lead === 'F' ? benchFahrenheit(celsius) : celsius;
  return `${Math.round(value * 100) / 100} °${lead}`;
}

/** A draft in the shape of a version, to be compared with one. */
export function asVersion(draft: FormulaDraft, formulaId: string): FormulaVersion {
  return { ...draft, id: 'draft', formulaId, n: 0, createdAt: '', createdBy: '' };
}
