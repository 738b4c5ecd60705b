import { gPerOunce, gPerPound, mlPerUsCup } from '#shared/kitchen/measures.ts';
import type { AmountUnit } from './typed-line.ts';

/** Grams in a unit of weight, exactly. */
export const gramsPerUnit: Partial<Record<AmountUnit, number>> = {
  milligram: 0.001,
  gram: 1,
  kilogram: 1000,
  ounce: gPerOunce,
  pound: gPerPound,
};

/** Millilitres in a unit of volume, exactly; US customary. Cups and spoons are household measures. */
export const mlPerUnit: Partial<Record<AmountUnit, number>> = {
  milliliter: 1,
  liter: 1000,
  'fluid-ounce': mlPerUsCup / 8,
  pint: mlPerUsCup * 2,
  quart: mlPerUsCup * 4,
  gallon: mlPerUsCup * 16,
};

type Known = readonly [unit: AmountUnit, times: number];

/** Single letters differ by case: T is a tablespoon, t a teaspoon. */
const byExactCase: Readonly<Record<string, Known>> = {
  T: ['tablespoon', 1],
  t: ['teaspoon', 1],
  C: ['cup', 1],
  c: ['cup', 1],
  g: ['gram', 1],
  G: ['gram', 1],
  l: ['liter', 1],
  L: ['liter', 1],
};

const byName: readonly (readonly [names: string, unit: AmountUnit, times: number])[] = [
  ['cup cups', 'cup', 1],
  ['tablespoon tablespoons tbsp tbsps tbs tbl tbls tblsp', 'tablespoon', 1],
  ['teaspoon teaspoons tsp tsps', 'teaspoon', 1],
  ['stick sticks', 'stick', 1],
  ['can cans tin tins', 'can', 1],
  ['piece pieces pc pcs', 'piece', 1],
  ['dozen', 'piece', 12],
  ['pinch pinches', 'pinch', 1],
  ['dash dashes', 'pinch', 2],
  ['mg milligram milligrams', 'milligram', 1],
  ['gr gm gms gram grams gramme grammes', 'gram', 1],
  ['kg kgs kilo kilos kilogram kilograms', 'kilogram', 1],
  ['oz ozs ounce ounces', 'ounce', 1],
  ['lb lbs pound pounds', 'pound', 1],
  ['ml mls cc milliliter milliliters millilitre millilitres', 'milliliter', 1],
  ['cl centiliter centiliters centilitre centilitres', 'milliliter', 10],
  ['dl deciliter deciliters decilitre decilitres', 'milliliter', 100],
  ['liter liters litre litres', 'liter', 1],
  ['floz', 'fluid-ounce', 1],
  ['pt pts pint pints', 'pint', 1],
  ['qt qts quart quarts', 'quart', 1],
  ['gal gals gallon gallons', 'gallon', 1],
];
const byLowerCase = new Map<string, Known>(
  byName.flatMap(([names, unit, times]) =>
    names.split(' ').map((name): [string, Known] => [name, [unit, times]]),
  ),
);

const fluidOunces = /^fl(?:uid)?\.?\s*(?:oz|ounces?)\b\.?/iu;
const letters = /^\p{L}+/u;

export type TypedUnit = {
  readonly unit: AmountUnit;
  readonly times: number;
  readonly rest: string;
};

/** The unit a text starts with, blanks and a hyphen before it left out; null where there is none. */
export function readUnit(text: string): TypedUnit | null {
  const start = text.replace(/^\s*-?\s*/u, '');
  const fluid = fluidOunces.exec(start);
  if (fluid !== null) return { unit: 'fluid-ounce', times: 1, rest: start.slice(fluid[0].length) };
  const name = letters.exec(start)?.[0];
  if (name === undefined) {
    const pounds = /^#(?!\w)/u.test(start);
    return pounds ? { unit: 'pound', times: 1, rest: start.slice(1) } : null;
  }
  const known = byExactCase[name] ?? byLowerCase.get(name.toLowerCase());
  if (known === undefined) return null;
  const rest = start.slice(name.length).replace(/^\./u, '');
  return { unit: known[0], times: known[1], rest };
}
