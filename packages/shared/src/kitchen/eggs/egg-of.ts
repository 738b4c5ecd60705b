import type { EggPart, Ingredient } from '#shared/contracts/pantry.ts';
import { shellEggG } from '../formulas/round-grams.ts';

/** Egg as egg: which part, and whether it is cracked or poured from a carton. */
export type EggKind = { readonly part: EggPart; readonly shell: boolean };

/** Null for what is no egg, and for bought things that only have some in them (a flower paste). */
export function eggOf(ingredient: Ingredient): EggKind | null {
  const { eggPart, family } = ingredient;
  if (eggPart === null || family !== 'egg') return null;
  return { part: eggPart, shell: shellEggG(ingredient) !== null };
}
