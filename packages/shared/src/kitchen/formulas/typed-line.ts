import type { FormulaPart, HouseholdMeasure } from '#shared/contracts/pantry.ts';

/** Units of weight and of volume beside the household measures. */
export type ExactUnit =
  | 'milligram'
  | 'gram'
  | 'kilogram'
  | 'ounce'
  | 'pound'
  | 'milliliter'
  | 'liter'
  | 'fluid-ounce'
  | 'pint'
  | 'quart'
  | 'gallon';
export type AmountUnit = HouseholdMeasure | ExactUnit;

/** One measure of an amount: `1 1/2 cups`, `8-10 oz`, `1 14-oz can`. */
export type AmountPart = {
  readonly unit: AmountUnit;
  /** Equal unless a range was typed. */
  readonly least: number;
  readonly most: number;
  /** What is taken: the middle of a range. */
  readonly count: number;
  /** `sifted`, `packed`; of eggs their size; null where nothing was said. */
  readonly qualifier: string | null;
  /** Grams of one, where the line says it itself (a 14-oz can). */
  readonly statedG: number | null;
};

/** One amount of a line as it was typed; several parts where they add up (`1 cup plus 2 tbsp`). */
export type ReadAmount = { readonly typed: string; readonly parts: readonly AmountPart[] };

/** An amount with its weight, once it is known what it is an amount of. */
export type WeighedAmount = ReadAmount & {
  /** Null where the ingredient has no weight for the measure. */
  readonly grams: number | null;
  /** By a density or another measure, not by a weight of its own. */
  readonly reckoned: boolean;
};

/** Two amounts of one line that disagree by more than their kind allows. */
export type ProofFinding = {
  /** What was typed, the measure or pack first, the weight second. */
  readonly measure: string;
  readonly weight: string;
  /** Grams the measure stands for, and grams that were written. */
  readonly measureG: number;
  readonly writtenG: number;
  /** How far the written weight is from the measure's, parts per million, signed. */
  readonly offPpm: number;
  /** The measure that would go with the written weight; null where none is sensible. */
  readonly measureFor: string | null;
  /** A whole sentence for people: what disagrees, and which of the two would be right how. */
  readonly message: string;
};

export type PartCandidate = { readonly part: FormulaPart; readonly name: string };

export type ReadProblemCode =
  | 'not-read'
  | 'no-amount'
  | 'to-taste'
  | 'no-weight'
  | 'two-things'
  | 'unknown-part'
  | 'which-part';

/** A line of a typed formula: what was made of it, and always what was typed. */
export type ReadLine = {
  readonly asTyped: string;
  readonly kind: 'line' | 'heading' | 'blank';
  /** Headings before it: 0 before the first, then 1, 2… */
  readonly stage: number;
  readonly amounts: readonly WeighedAmount[];
  /** The words taken for the ingredient, or the heading's. */
  readonly words: string;
  /** What is done to it or said of it: `softened`. */
  readonly note: string | null;
  readonly match: PartCandidate | null;
  /** Nearest first; the match, if any, is the first. */
  readonly candidates: readonly PartCandidate[];
  /** What the line weighs in with; null until it is known. */
  readonly grams: number | null;
  /** By a density or another measure, not by a weight that was typed or kept. */
  readonly reckoned: boolean;
  /** What was decided where the line leaves it open: the middle of a range, a point or a comma. */
  readonly decided: string | null;
  readonly problem: { readonly code: ReadProblemCode; readonly message: string } | null;
  readonly findings: readonly ProofFinding[];
};

export type ReadFormula = {
  readonly lines: readonly ReadLine[];
  /** Headings in order; the stage of a line is 1 more than its heading's place here. */
  readonly stages: readonly string[];
};
