import type { EggPart } from '#shared/contracts/pantry.ts';
import { explodeFormula } from '../formulas/explode-formula.ts';
import { FormulaFault } from '../formulas/formula-problem.ts';
import { currentVersion, type PantryIndex } from '../formulas/pantry-index.ts';
import { eggOf } from './egg-of.ts';
import { largeEggG } from './egg-weights.ts';
import type { EggLeftover } from './plan-eggs.ts';

/** What is left of the eggs cracked on a day. */
export type LeftoverDay = {
  readonly crackedOn: string;
  readonly whiteG: number;
  readonly yolkG: number;
  readonly whiteUseBy: string | null;
  readonly yolkUseBy: string | null;
};

/** Something the studio makes that would use leftovers up. */
export type LeftoverUse = {
  readonly formulaId: string;
  readonly name: string;
  readonly part: EggPart;
  /** Grams that would come out of it. */
  readonly outG: number;
  /** It is written for pasteurised egg, so raw leftovers need a measured mix or the advisory. */
  readonly pasteurised: boolean;
};

export function leftoverDays(leftovers: readonly EggLeftover[]): LeftoverDay[] {
  const dates = [...new Set(leftovers.map((it) => it.crackedOn))].toSorted();
  return dates.map((crackedOn) => {
    const of = (part: EggLeftover['part']) =>
      leftovers.find((it) => it.crackedOn === crackedOn && it.part === part);
    const [white, yolk] = [of('white'), of('yolk')];
    return {
      crackedOn,
      whiteG: white?.grams ?? 0,
      yolkG: yolk?.grams ?? 0,
      whiteUseBy: white?.useBy ?? null,
      yolkUseBy: yolk?.useBy ?? null,
    };
  });
}

/** Less is not worth another bowl, grams that come out (memory). */
const worthMakingG = 100;

/**
 * What leftovers could become: of the studio's formulas in use, those whose egg they are, and how
 * much of each they make, largest first. Whole egg is a white and a yolk in their proportion.
 */
export function leftoverUses(
  left: Pick<LeftoverDay, 'whiteG' | 'yolkG'>,
  index: PantryIndex,
): LeftoverUse[] {
  const uses: LeftoverUse[] = [];
  for (const formula of index.formulas.values()) {
    const version = currentVersion(index, formula.id);
    if (formula.archivedAt !== null || version === null) continue;
    const eggs = eggPerKg(version, index);
    if (eggs === null) continue;
    const grams = Math.min(
      eggs.white > 0 ? left.whiteG / eggs.white : Infinity,
      eggs.yolk > 0 ? left.yolkG / eggs.yolk : Infinity,
    );
    const outG = grams * 1000;
    if (!Number.isFinite(outG) || outG < worthMakingG) continue;
    const part = eggs.white > 0 ? (eggs.yolk > 0 ? 'whole' : 'white') : 'yolk';
    uses.push({
      formulaId: formula.id,
      name: formula.name,
      part,
      outG,
      pasteurised: eggs.pasteurised,
    });
  }
  return uses.toSorted((a, b) => Number(a.pasteurised) - Number(b.pasteurised) || b.outG - a.outG);
}

type EggPerKg = { readonly white: number; readonly yolk: number; readonly pasteurised: boolean };

/** Grams of white and yolk in a kilogram of the result; null for a formula that cannot be made. */
function eggPerKg(
  version: Parameters<typeof explodeFormula>[0],
  index: PantryIndex,
): EggPerKg | null {
  try {
    const { ingredients } = explodeFormula(version, index, 1000);
    let [white, yolk, pasteurised] = [0, 0, false];
    for (const [id, grams] of ingredients) {
      const ingredient = index.ingredients.get(id);
      const egg = ingredient === undefined ? null : eggOf(ingredient);
      if (ingredient === undefined || egg === null) continue;
      pasteurised ||= !egg.shell || ingredient.pasteurised === 'yes';
      if (egg.part !== 'yolk')
        white += egg.part === 'white' ? grams : (grams * largeEggG.white) / largeEggG.whole;
      if (egg.part !== 'white')
        yolk += egg.part === 'yolk' ? grams : (grams * largeEggG.yolk) / largeEggG.whole;
    }
    return { white, yolk, pasteurised };
  } catch (error) {
    if (error instanceof FormulaFault) return null;
    throw error;
  }
}
