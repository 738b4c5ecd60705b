import type { Menu } from '#shared/contracts/menu.ts';
import type { Formula, FormulaVersion, Pantry } from '#shared/contracts/pantry.ts';
import { FormulaFault } from '#shared/kitchen/formulas/formula-problem.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import {
  type ScaleTo,
  type ScaledFormula,
  scaleFormula,
} from '#shared/kitchen/formulas/scale-formula.ts';
import { gramsOf, numberOf } from '../forms/read-amounts.ts';
import { tierNeedG } from './tier-need.ts';

/** How much is to be made, as typed. */
export type MakeAsked = {
  readonly by: 'written' | 'weight' | 'tiers' | 'bowls';
  readonly weight: string;
  readonly tiers: string;
  /** Place of the size among the menu's. */
  readonly size: number;
  readonly heightMm: number;
  readonly layers: string;
  readonly bowls: string;
  readonly mixerId: string;
};

export type Made =
  | { readonly ok: true; readonly scaled: ScaledFormula; readonly wantedG: number | null }
  | {
      readonly ok: false;
      readonly field: 'weight' | 'tiers' | 'bowls' | null;
      readonly message: string;
    };

type Ground = {
  readonly formula: Formula;
  readonly version: FormulaVersion;
  readonly pantry: Pantry;
  readonly index: PantryIndex;
  readonly menu: Menu;
};

/** The formula for what is asked, or what is wrong with the asking; never throws. */
export function makeAmount(asked: MakeAsked, ground: Ground): Made {
  const to = scaleTo(asked, ground);
  if (!('to' in to)) return { ok: false, ...to };
  try {
    const scaled = scaleFormula(ground.version, ground.index, to.to);
    return { ok: true, scaled, wantedG: to.wantedG };
  } catch (error) {
    if (!(error instanceof FormulaFault)) throw error;
    const field = asked.by === 'written' ? null : asked.by;
    return { ok: false, field, message: error.message };
  }
}

type Asked =
  | { readonly to: ScaleTo; readonly wantedG: number | null }
  | { readonly field: 'weight' | 'tiers' | 'bowls'; readonly message: string };

function scaleTo(asked: MakeAsked, { formula, version, pantry, menu }: Ground): Asked {
  switch (asked.by) {
    case 'written':
      return { to: { factor: 1 }, wantedG: null };
    case 'weight': {
      const grams = gramsOf(asked.weight);
      if (grams === null || !(grams > 0)) {
        return { field: 'weight', message: 'Write a weight: “1,850 g”, “4 lb”.' };
      }
      return { to: { toG: grams }, wantedG: grams };
    }
    case 'tiers': {
      const count = numberOf(asked.tiers);
      const layers = numberOf(asked.layers);
      const size = menu.tierSizes[asked.size];
      if (count === null || !(count > 0) || layers === null || !(layers >= 1) || !size) {
        return { field: 'tiers', message: 'Write how many tiers, and of how many layers.' };
      }
      const heightMm = size.heightsMm.includes(asked.heightMm)
        ? asked.heightMm
        : (size.heightsMm[0] ?? 100);
      const grams = tierNeedG(
        formula,
        version,
        { count, size, heightMm, layers },
        menu,
        pantry.parts,
      );
      if (grams === null || !(grams > 0)) {
        return { field: 'tiers', message: 'A tier like that takes none of this.' };
      }
      return { to: { toG: grams }, wantedG: grams };
    }
    case 'bowls': {
      const bowls = numberOf(asked.bowls);
      const mixer = pantry.mixers.find((it) => it.id === asked.mixerId) ?? pantry.mixers.at(-1);
      if (mixer === undefined) return { field: 'bowls', message: 'The studio has no mixer yet.' };
      if (bowls === null || !(bowls > 0)) {
        return { field: 'bowls', message: 'Write how many bowls.' };
      }
      // A bowl is full of what goes in; what comes out of it is less.
      const bowlG = (mixer.capacityG * version.yieldPpm) / 1e6;
      return { to: { bowls, bowlG }, wantedG: null };
    }
  }
}
