/** What can be wrong with a formula, apart from the fields' own limits. */
export type FormulaProblemCode =
  | 'no-lines'
  | 'missing-part'
  | 'uses-itself'
  | 'not-a-weight'
  | 'too-heavy'
  | 'no-yield'
  | 'yield-over-100'
  | 'not-an-amount'
  | 'no-mixer';

/** One thing that is wrong, at a line (from 0) or, with null, with the whole. */
export type FormulaProblem = {
  readonly code: FormulaProblemCode;
  readonly line: number | null;
  /** For people; names the line by its number from 1 and its part. */
  readonly message: string;
  /** Names of the formulas that lead to it, outermost first; empty where it is here. */
  readonly path: readonly string[];
};

/** A formula that cannot be reckoned with; `problems` says where and why. */
export class FormulaFault extends Error {
  readonly problems: readonly FormulaProblem[];

  constructor(problems: readonly FormulaProblem[]) {
    super(problems.map((it) => it.message).join(' '));
    this.name = 'FormulaFault';
    this.problems = problems;
  }
}

/** A fault of one problem that belongs to no line. */
export function faultOf(code: FormulaProblemCode, message: string): FormulaFault {
  return new FormulaFault([{ code, line: null, message, path: [] }]);
}
