import type { Ingredient } from '#shared/contracts/pantry.ts';
import type { ProofFinding, WeighedAmount } from './typed-line.ts';

/** Where amounts of one line disagree. */
export function proofread(
  _amounts: readonly WeighedAmount[],
  _ingredient: Ingredient | null,
): ProofFinding[] {
  return [];
}
