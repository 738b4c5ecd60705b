import type { EggPart, FormulaVersion, Ingredient } from '#shared/contracts/pantry.ts';
import { eggG, largeEggG, type EggClass, dozenOunces } from '#shared/kitchen/eggs/egg-weights.ts';
import { gramsPerMl, isVolume, mlPerMeasure, weightOfMeasure } from './household.ts';
import type { AmountPart, ReadAmount, WeighedAmount } from './typed-line.ts';
import { gramsPerUnit, mlPerUnit } from './units-typed.ts';

/** What an amount is an amount of; null while that is not known. */
export type WeighedThing =
  | { readonly kind: 'ingredient'; readonly ingredient: Ingredient }
  | { readonly kind: 'formula'; readonly version: FormulaVersion }
  | null;

type Weight = { readonly grams: number; readonly reckoned: boolean };

/** A pinch is taken for a sixteenth of a teaspoon (common practice, no source). */
const pinchesPerTeaspoon = 16;
/** Of what pours, a spoon is the same part of a cup by weight as by volume. */
const pours: readonly string[] = ['dairy', 'liquid', 'fat', 'flavour', 'egg'];

/** A heaping cup is weighed as a level one, and that is only reckoned. */
const inexact: readonly string[] = ['heaping', 'heaped', 'rounded', 'scant', 'generous'];

/** The weight of an amount, part by part; null grams where one of them is not known. */
export function weighAmount(amount: ReadAmount, thing: WeighedThing): WeighedAmount {
  let grams: number | null = 0;
  let reckoned = false;
  for (const part of amount.parts) {
    const one = weightOfOne(part, thing);
    grams = one === null || grams === null ? null : grams + one.grams * part.count;
    reckoned ||= one?.reckoned === true || inexact.includes(part.qualifier ?? '');
  }
  return { ...amount, grams, reckoned };
}

/** Grams of one of a part's unit. */
export function weightOfOne(part: AmountPart, thing: WeighedThing): Weight | null {
  const exact = part.statedG ?? gramsPerUnit[part.unit];
  if (exact !== undefined) return { grams: exact, reckoned: false };
  if (thing === null) return null;
  const { unit } = part;
  const ml = mlPerUnit[unit] ?? (isVolume(unit) ? mlPerMeasure[unit] : undefined);
  if (thing.kind === 'formula') {
    return ml === undefined ? null : { grams: ml * thing.version.densityGPerMl, reckoned: true };
  }
  return weightOfIngredient(part, thing.ingredient, ml);
}

function weightOfIngredient(
  { unit, qualifier }: AmountPart,
  ingredient: Ingredient,
  ml: number | undefined,
): Weight | null {
  switch (unit) {
    case 'piece':
      return weightOfPiece(ingredient, qualifier);
    case 'pinch': {
      const own = weightOfMeasure(ingredient, unit);
      if (own !== null) return own;
      const spoon = weightOfMeasure(ingredient, 'teaspoon');
      return spoon && { grams: spoon.grams / pinchesPerTeaspoon, reckoned: true };
    }
    case 'stick':
    case 'can':
      return weightOfMeasure(ingredient, unit);
    case 'cup':
    case 'tablespoon':
    case 'teaspoon': {
      const own = weightOfMeasure(ingredient, unit, qualifier);
      if (own !== null || !pours.includes(ingredient.family)) return own;
      break;
    }
    default:
      break;
  }
  const perMl = gramsPerMl(ingredient);
  return ml === undefined || perMl === null ? null : { grams: ml * perMl, reckoned: true };
}

const isEggClass = (size: string): size is EggClass => size in dozenOunces;

/** One piece as its label or scale says; an egg of another size in proportion to the large one. */
function weightOfPiece(ingredient: Ingredient, size: string | null): Weight | null {
  const own = weightOfMeasure(ingredient, 'piece');
  if (ingredient.eggPart === null) return own;
  const large = own?.grams ?? largeEggG[ingredient.eggPart];
  return {
    grams: large * sizeFactor(ingredient.eggPart, size),
    reckoned: own === null || (size !== null && size !== 'large'),
  };
}

function sizeFactor(part: EggPart, size: string | null): number {
  return size !== null && isEggClass(size) ? eggG(part, size) / eggG(part) : 1;
}
