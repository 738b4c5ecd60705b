import type { FormulaBody } from './pantry-index.ts';

export type FormulaTotals = {
  /** Grams that go in, and that come out of it. */
  readonly inG: number;
  readonly outG: number;
  /** What comes out takes up, mL; null without a density. */
  readonly outMl: number | null;
  /** Each line's part of what goes in, 0 to 1. */
  readonly shares: readonly number[];
};

/** What goes in, what is left, and each line's part of it; nothing is rounded. */
export function formulaTotals(
  body: FormulaBody & { readonly densityGPerMl?: number },
): FormulaTotals {
  const inG = body.lines.reduce((sum, it) => sum + it.grams, 0);
  const outG = (inG * body.yieldPpm) / 1e6;
  const density = body.densityGPerMl ?? 0;
  return {
    inG,
    outG,
    outMl: density > 0 ? outG / density : null,
    shares: body.lines.map((it) => (inG > 0 ? it.grams / inG : 0)),
  };
}

/**
 * Grams the mixer holds for so many that come out in the end: batter before the oven takes its
 * share. What boils away or stays in pans is gone before the bowl, or after it and small.
 */
export function mixedG(body: FormulaBody, outG: number): number {
  return outG / (1 - Math.min(body.bakeLossPpm ?? 0, 900_000) / 1e6);
}
