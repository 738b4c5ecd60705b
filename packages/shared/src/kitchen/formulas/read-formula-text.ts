import type { PantryIndex } from './pantry-index.ts';
import type { ReadFormula, ReadLine } from './typed-line.ts';

/** One line as a baker types it. */
export function readFormulaLine(asTyped: string, _index: PantryIndex, stage = 0): ReadLine {
  return {
    asTyped,
    kind: asTyped.trim() === '' ? 'blank' : 'line',
    stage,
    amounts: [],
    words: asTyped.trim(),
    note: null,
    match: null,
    candidates: [],
    grams: null,
    reckoned: false,
    decided: null,
    problem: null,
    findings: [],
  };
}

/** A whole formula as a baker types it; no line is lost. */
export function readFormulaText(text: string, index: PantryIndex): ReadFormula {
  return { lines: text.split(/\r?\n/u).map((it) => readFormulaLine(it, index)), stages: [] };
}
