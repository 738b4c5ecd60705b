import type { FormulaPart } from '#shared/contracts/pantry.ts';
import { type PantryIndex, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import { formatLine, readFormulaLine } from '#shared/kitchen/formulas/read-formula-text.ts';
import type { PartCandidate, ProofFinding } from '#shared/kitchen/formulas/typed-line.ts';
import type { LineRow } from './editor-form.ts';

/** What a row is taken for. */
export type RowReading = {
  readonly kind: 'line' | 'blank' | 'unread';
  readonly part: FormulaPart | null;
  /** What it is called in the pantry; empty while that is not known. */
  readonly name: string;
  readonly grams: number | null;
  readonly words: string;
  /** What was decided where the line leaves it open. */
  readonly said: readonly string[];
  readonly problem: string | null;
  readonly candidates: readonly PartCandidate[];
  readonly findings: readonly ProofFinding[];
};

const read = new WeakMap<PantryIndex, WeakMap<LineRow, RowReading>>();

/** Reads a row once: rows are never changed, so that typing in one reads that one alone. */
export function readRow(row: LineRow, index: PantryIndex): RowReading {
  let rows = read.get(index);
  if (rows === undefined) {
    rows = new WeakMap();
    read.set(index, rows);
  }
  let reading = rows.get(row);
  if (reading === undefined) {
    reading = readNow(row, index);
    rows.set(row, reading);
  }
  return reading;
}

const blank: RowReading = {
  kind: 'blank',
  part: null,
  name: '',
  grams: null,
  words: '',
  said: [],
  problem: null,
  candidates: [],
  findings: [],
};

function readNow(row: LineRow, index: PantryIndex): RowReading {
  if (row.text.trim() === '') return blank;
  const plain = readFormulaLine(row.text, index);
  const picked = row.stored?.part ?? (row.picked?.words === plain.words ? row.picked.part : null);
  const line = picked === null ? plain : readFormulaLine(row.text, index, { part: picked });
  if (row.stored !== null) {
    const { part, grams } = row.stored;
    const found = resolvePart(index, part);
    return {
      ...blank,
      kind: 'line',
      part,
      name: found.name,
      grams,
      words: line.words,
      problem: found.kind === 'missing' ? 'Is not in the pantry.' : putAway(part, index),
      findings: line.findings,
    };
  }
  const part = line.match?.part ?? null;
  const said = [
    line.decided ?? '',
    line.reckoned ? 'reckoned, not weighed' : '',
    line.note ?? '',
  ].filter((it) => it !== '');
  const problem =
    line.kind === 'heading'
      ? 'Reads as a heading, not as something to weigh.'
      : (line.problem?.message ??
        (part === null || line.grams === null
          ? 'Write how much of what: “340 g milk”, “1 1/2 cups milk”.'
          : putAway(part, index)));
  return {
    kind: part !== null && line.grams !== null ? 'line' : 'unread',
    part,
    name: line.match?.name ?? '',
    grams: line.grams,
    words: line.words,
    said,
    problem,
    candidates: line.candidates.slice(0, 4),
    findings: line.findings,
  };
}

/** Something archived may stay in old versions, but nothing new is made with it. */
function putAway(part: FormulaPart, index: PantryIndex): string | null {
  const found = resolvePart(index, part);
  const archivedAt =
    found.kind === 'ingredient'
      ? found.ingredient.archivedAt
      : found.kind === 'formula'
        ? (found.formula?.archivedAt ?? null)
        : null;
  return archivedAt === null
    ? null
    : `${found.name} is archived. Take it back into use, or write another.`;
}

/** The text of a row once the baker has taken one of two figures that disagree. */
export function settledText(
  finding: ProofFinding,
  take: 'measure' | 'weight',
  { name, words }: Pick<RowReading, 'name' | 'words'>,
): string {
  const what = words === '' ? name : words;
  const grams = Math.round(take === 'measure' ? finding.measureG : finding.writtenG);
  if (take === 'measure') return `${finding.measure} ${what}, ${grams} g`;
  return finding.measureFor === null
    ? formatLine(grams, what)
    : `${finding.measureFor} ${what}, ${grams} g`;
}
