import type { HouseholdMeasure, Ingredient, IngredientMeasure } from '#shared/contracts/pantry.ts';
import { gPerOunce, mlPerUsCup } from '#shared/kitchen/measures.ts';

/** Exact by definition: 16 tablespoons or 48 teaspoons of volume to the US cup. */
export const mlPerMeasure = {
  cup: mlPerUsCup,
  tablespoon: mlPerUsCup / 16,
  teaspoon: mlPerUsCup / 48,
} as const;
type VolumeMeasure = keyof typeof mlPerMeasure;

export const isVolume = (measure: string): measure is VolumeMeasure => measure in mlPerMeasure;

/** What one measure weighs; `reckoned` where it comes from a density and not from a scale. */
export type MeasureWeight = { readonly grams: number; readonly reckoned: boolean };

/** A qualifier as typed (`sifted`) finds its own weight; without one, the plain or first entry. */
function entryOf(
  ingredient: Ingredient,
  measure: HouseholdMeasure,
  qualifier: string | null,
): IngredientMeasure | null {
  const own = ingredient.measures.filter((it) => it.measure === measure && it.grams > 0);
  const asked = qualifier === null ? undefined : own.find((it) => it.qualifier === qualifier);
  return asked ?? own.find((it) => it.qualifier === null) ?? own[0] ?? null;
}

/**
 * Grams of one measure of an ingredient, by its own weight for that very measure: spoons never
 * make a cup (16 tablespoons of powdered sugar are not a cup by weight). Failing that by its
 * density, marked as reckoned; null where neither is known.
 */
export function weightOfMeasure(
  ingredient: Ingredient,
  measure: HouseholdMeasure,
  qualifier: string | null = null,
): MeasureWeight | null {
  const entry = entryOf(ingredient, measure, qualifier);
  if (entry !== null) return { grams: entry.grams, reckoned: false };
  if (!isVolume(measure) || ingredient.densityGPerMl === null) return null;
  return { grams: ingredient.densityGPerMl * mlPerMeasure[measure], reckoned: true };
}

/**
 * Grams of one millilitre: the density where one is kept, else by the largest measure of volume
 * there is a weight for. Always reckoned.
 */
export function gramsPerMl(ingredient: Ingredient): number | null {
  if (ingredient.densityGPerMl !== null) return ingredient.densityGPerMl;
  for (const measure of ['cup', 'tablespoon', 'teaspoon'] as const) {
    const entry = entryOf(ingredient, measure, null);
    if (entry !== null) return entry.grams / mlPerMeasure[measure];
  }
  return null;
}

/** Fractions that household measures are marked with, smallest first. */
const marks: readonly (readonly [value: number, text: string])[] = [
  [0, ''],
  [1 / 4, '¼'],
  [1 / 3, '⅓'],
  [1 / 2, '½'],
  [2 / 3, '⅔'],
  [3 / 4, '¾'],
  [1, ''],
];

type Marked = { readonly value: number; readonly text: string };

/** Spoons are sold by halves and quarters, and half a stick is cut by eye. */
const finestMark: Partial<Record<HouseholdMeasure, number>> = {
  teaspoon: 1 / 4,
  tablespoon: 1 / 2,
  stick: 1 / 2,
};

/** The nearest of whole, ¼, ⅓, ½, ⅔ and ¾, or of multiples of `finest`; never nothing. */
function nearestMark(count: number, finest: number | null = null): Marked {
  const whole = Math.floor(count);
  const usable = marks.filter(([value]) => finest === null || Number.isInteger(value / finest));
  let best: readonly [number, string] = [0, ''];
  for (const mark of usable) {
    if (whole + mark[0] === 0) continue;
    const closer = Math.abs(whole + mark[0] - count) < Math.abs(whole + best[0] - count);
    if (whole + best[0] === 0 || closer) best = mark;
  }
  const value = whole + best[0];
  const shown = best[0] === 1 ? whole + 1 : whole;
  return { value, text: `${shown === 0 ? '' : shown}${best[1]}` };
}

const words: Readonly<Record<HouseholdMeasure, readonly [one: string, more: string]>> = {
  cup: ['cup', 'cups'],
  tablespoon: ['tbsp', 'tbsp'],
  teaspoon: ['tsp', 'tsp'],
  stick: ['stick', 'sticks'],
  can: ['can', 'cans'],
  piece: ['piece', 'pieces'],
  pinch: ['pinch', 'pinches'],
};
const eggWords = {
  whole: ['egg', 'eggs'],
  white: ['white', 'whites'],
  yolk: ['yolk', 'yolks'],
} as const;

function say(ingredient: Ingredient, measure: HouseholdMeasure, { value, text }: Marked): string {
  const [one, more] =
    measure === 'piece' && ingredient.eggPart !== null
      ? eggWords[ingredient.eggPart]
      : words[measure];
  return `${text} ${value > 1 ? more : one}`;
}

/** How many of a measure grams are, in its marks: `1¼ cups`; null where its weight is not known. */
export function inMeasure(
  ingredient: Ingredient,
  measure: HouseholdMeasure,
  grams: number,
  qualifier: string | null = null,
): Household | null {
  const weight = weightOfMeasure(ingredient, measure, qualifier);
  if (weight === null || !(grams > 0)) return null;
  const count = grams / weight.grams;
  const counted = measure === 'piece' || measure === 'can' || measure === 'pinch';
  const rounded = Math.max(1, Math.round(count));
  const mark = counted
    ? { value: rounded, text: String(rounded) }
    : nearestMark(count, finestMark[measure] ?? null);
  return {
    text: say(ingredient, measure, mark),
    count: mark.value,
    grams: mark.value * weight.grams,
    offPpm: Math.round((mark.value / count - 1) * 1e6),
    reckoned: weight.reckoned,
  };
}

export type Household = {
  readonly text: string;
  readonly count: number;
  /** What the words weigh; differs from the grams asked for by `offPpm`. */
  readonly grams: number;
  readonly offPpm: number;
  readonly reckoned: boolean;
};

/**
 * What somebody still counts out: more, and the scale is quicker. Household words further from the
 * grams than `mostOffPpm` are not said, further than `aboutPpm` with "about" (all memory).
 */
const sense = {
  most: { piece: 200, stick: 12, can: 24, cup: 40, tablespoon: 8, teaspoon: 6, pinch: 2 },
  aboutPpm: 20_000,
  mostOffPpm: 60_000,
  /** Eggs come whole, so their count may be further off: the grams beside it are weighed. */
  mostEggOffPpm: 150_000,
} as const;

const largestFirst = ['piece', 'stick', 'can', 'cup', 'tablespoon', 'teaspoon', 'pinch'] as const;

/** Measures that go together, the larger in steps of its own, with how many of the smaller. */
const together = [
  { large: 'cup', step: 1 / 4, small: 'tablespoon', mostSmall: 3 },
  { large: 'tablespoon', step: 1, small: 'teaspoon', mostSmall: 2 },
] as const;

/** Two measures together, each by its own weight: `1 cup + 2 tbsp`, `4 tbsp + 2 tsp`. */
function twoTogether(
  ingredient: Ingredient,
  grams: number,
  { large, step, small, mostSmall }: (typeof together)[number],
): Household | null {
  const largeG = weightOfMeasure(ingredient, large);
  const smallG = weightOfMeasure(ingredient, small);
  if (largeG === null || smallG === null) return null;
  const count = Math.floor(grams / largeG.grams / step + 1e-9) * step;
  const rest = Math.round((grams - count * largeG.grams) / smallG.grams);
  if (count === 0 || count > sense.most[large] || rest < 1 || rest > mostSmall) return null;
  const total = count * largeG.grams + rest * smallG.grams;
  const first = say(ingredient, large, nearestMark(count));
  return {
    text: `${first} + ${say(ingredient, small, { value: rest, text: String(rest) })}`,
    count,
    grams: total,
    offPpm: Math.round((total / grams - 1) * 1e6),
    reckoned: largeG.reckoned || smallG.reckoned,
  };
}

/** The largest measure that comes close enough, else the closest; eggs in their shells by count. */
export function householdOf(ingredient: Ingredient, grams: number): Household | null {
  if (!(grams > 0) || !Number.isFinite(grams)) return null;
  const eggs = ingredient.eggPart === null ? null : inMeasure(ingredient, 'piece', grams);
  if (eggs !== null) return Math.abs(eggs.offPpm) > sense.mostEggOffPpm ? null : eggs;
  const options = largestFirst.flatMap((measure) => {
    const found = inMeasure(ingredient, measure, grams);
    return found === null || found.count > sense.most[measure] ? [] : [found];
  });
  const pairs = together.flatMap((it) => twoTogether(ingredient, grams, it) ?? []);
  const all = [...options, ...pairs];
  const close = all.find((it) => Math.abs(it.offPpm) <= sense.aboutPpm);
  if (close !== undefined) return close;
  const [nearest] = all.toSorted((a, b) => Math.abs(a.offPpm) - Math.abs(b.offPpm));
  if (nearest === undefined || Math.abs(nearest.offPpm) > sense.mostOffPpm) return null;
  return nearest;
}

export type HouseholdUnits = 'us' | 'metric';
const pourable: readonly string[] = ['dairy', 'liquid', 'fat', 'flavour'];

/**
 * An ingredient's grams in measures beside the grams: US household measures by its own weights
 * (`2½ cups`, `5 sticks`, `12 yolks`), or millilitres of what is poured. `about` where the words
 * are more than 2 % off or reckoned by a density; null where nothing sensible can be said.
 */
export function formatHousehold(
  ingredient: Ingredient,
  grams: number,
  units: HouseholdUnits = 'us',
): string | null {
  if (units === 'metric') {
    const perMl = pourable.includes(ingredient.family) ? gramsPerMl(ingredient) : null;
    const pieces = inMeasure(ingredient, 'piece', grams);
    if (pieces !== null && Math.abs(pieces.offPpm) <= sense.mostOffPpm) return worded(pieces);
    const ml = perMl === null || !(grams > 0) ? 0 : Math.round(grams / perMl);
    return ml === 0 ? null : `about ${ml} mL`;
  }
  const found = householdOf(ingredient, grams);
  return found === null ? null : worded(found);
}

function worded({ text, offPpm, reckoned }: Household): string {
  return reckoned || Math.abs(offPpm) > sense.aboutPpm ? `about ${text}` : text;
}

/** `1 lb 4¼ oz`, to the quarter ounce; grams not negative. */
export function formatPounds(grams: number): string {
  const quarters = Math.round((grams / gPerOunce) * 4);
  const pounds = Math.floor(quarters / 64);
  const ounces = (quarters - pounds * 64) / 4;
  const rest = ounces === 0 ? '' : `${nearestMark(ounces, 1 / 4).text} oz`;
  if (pounds === 0) return rest === '' ? '0 oz' : rest;
  return rest === '' ? `${pounds} lb` : `${pounds} lb ${rest}`;
}

/** `850 g`, `0.4 g`, `1.25 kg`: as the bench reads a scale. Grams not negative. */
export function formatGrams(grams: number): string {
  if (grams >= 10_000) return `${trim(grams / 1000, 1)} kg`;
  if (grams >= 1000) return `${trim(grams / 1000, 3)} kg`;
  return `${trim(grams, grams < 1 ? 2 : grams < 20 ? 1 : 0)} g`;
}

const trim = (value: number, digits: number) => String(Number(value.toFixed(digits)));
