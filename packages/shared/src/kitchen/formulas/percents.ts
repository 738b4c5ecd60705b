import { resolvePart, type FormulaBody, type PantryIndex } from './pantry-index.ts';

/** What the lines are a percentage of: one line's weight, or all flour or all butter together. */
export type PercentBase =
  { readonly of: 'line'; readonly line: number } | { readonly of: 'flour' | 'butter' };

export type PercentView = {
  /** Grams that count as 100 %. */
  readonly baseG: number;
  /** Each line's percent of it. */
  readonly lines: readonly number[];
  readonly total: number;
};

/**
 * The baker's view: each line as a percentage of the flour, of the butter or of one line, by the
 * weights of this formula alone (flour inside another formula belongs to that one). Null where
 * there is nothing to be a percentage of.
 */
export function percentsOf(
  body: FormulaBody,
  index: PantryIndex,
  base: PercentBase,
): PercentView | null {
  const baseG = body.lines.reduce((sum, it, line) => {
    if (base.of === 'line') return line === base.line ? it.grams : sum;
    const part = resolvePart(index, it.part);
    const counts = part.kind === 'ingredient' && part.ingredient.family === base.of;
    return counts ? sum + it.grams : sum;
  }, 0);
  if (!(baseG > 0)) return null;
  const lines = body.lines.map((it) => (it.grams / baseG) * 100);
  return { baseG, lines, total: lines.reduce((sum, it) => sum + it, 0) };
}
