import { gPerPound } from '#shared/kitchen/measures.ts';
import { formatGrams, formatPounds, inMeasure } from './household.ts';
import type { AmountUnit, ProofFinding, WeighedAmount } from './typed-line.ts';
import { gramsPerUnit } from './units-typed.ts';
import type { WeighedThing } from './weigh-amount.ts';

/**
 * How far a measure and a weight on one line may be apart, parts per million of what the measure
 * weighs: a volume (or pieces, which grow) 10 %, a weight, stick or can 2 % (the kitchen's
 * definition; that eggs go with the volumes is ours).
 */
export const proofRules = { volumePpm: 100_000, weightPpm: 20_000 } as const;

const weighed: readonly AmountUnit[] = ['stick', 'can'];
const isWeight = (unit: AmountUnit) => gramsPerUnit[unit] !== undefined;
const goesByWeight = ({ parts }: WeighedAmount) =>
  parts.every((it) => isWeight(it.unit) || weighed.includes(it.unit));

/** Which of a line's amounts the others are held against: grams first, then other weights. */
function weightOf(amounts: readonly WeighedAmount[]): WeighedAmount | null {
  const known = amounts.filter((it) => it.grams !== null);
  const inUnits = (units: readonly AmountUnit[]) =>
    known.find((it) => it.parts.every(({ unit }) => units.includes(unit)));
  return (
    inUnits(['gram', 'kilogram', 'milligram']) ??
    inUnits(['ounce', 'pound']) ??
    inUnits(weighed) ??
    null
  );
}

/**
 * Where amounts of one line disagree: each other amount against the line's weight. Written recipes
 * often do, and one bad line ruins a batch. Either of the two may be the right one; both ways of
 * putting it right are said. Amounts that cannot be weighed are not judged.
 */
export function proofread(amounts: readonly WeighedAmount[], thing: WeighedThing): ProofFinding[] {
  const weight = weightOf(amounts);
  if (weight === null) return [];
  return amounts.flatMap((it) => {
    const found = it === weight ? null : disagreement(it, weight, thing);
    return found === null ? [] : [found];
  });
}

function disagreement(
  measure: WeighedAmount,
  weight: WeighedAmount,
  thing: WeighedThing,
): ProofFinding | null {
  if (measure.grams === null || weight.grams === null) return null;
  const allowed = goesByWeight(measure) ? proofRules.weightPpm : proofRules.volumePpm;
  const [low, high] = gramsRange(measure, measure.grams);
  const [writtenLow, writtenHigh] = gramsRange(weight, weight.grams);
  const apart = Math.max(low - writtenHigh, writtenLow - high, 0);
  // A thousandth of the limit is dust of floating point, not a disagreement.
  if (apart * 1e6 <= measure.grams * allowed * 1.001) return null;
  const offPpm = Math.round((weight.grams / measure.grams - 1) * 1e6);
  const measureFor = measureForWeight(measure, weight.grams, thing);
  const percent = Math.max(1, Math.round(Math.abs(offPpm) / 10_000));
  const should = formatGrams(measure.grams);
  const right = measureFor === null ? '' : `; ${measureFor} if the weight is right`;
  return {
    measure: measure.typed,
    weight: weight.typed,
    measureG: measure.grams,
    writtenG: weight.grams,
    offPpm,
    measureFor,
    message:
      `By ${measure.reckoned ? 'its measure and density' : 'its measure'} (${measure.typed}) ` +
      `this is ${should}; ${weight.typed} is ${percent} % ${offPpm > 0 ? 'more' : 'less'}. ` +
      `Write ${should} if the measure is right${right}.`,
  };
}

/** Grams of the ends of a range; the same twice where none was typed. */
function gramsRange({ parts }: WeighedAmount, grams: number): [number, number] {
  const count = parts.reduce((sum, it) => sum + it.count, 0);
  const least = parts.reduce((sum, it) => sum + it.least, 0);
  const most = parts.reduce((sum, it) => sum + it.most, 0);
  return count > 0 ? [(grams * least) / count, (grams * most) / count] : [grams, grams];
}

/** The written weight in the measure that was typed: `1¼ cups`. */
function measureForWeight(
  { parts }: WeighedAmount,
  grams: number,
  thing: WeighedThing,
): string | null {
  const [first] = parts;
  if (first === undefined) return null;
  if (first.statedG !== null) return null;
  const { unit } = first;
  if (isWeight(unit)) {
    return unit === 'pound' || unit === 'ounce' || grams >= gPerPound ? formatPounds(grams) : null;
  }
  if (thing?.kind !== 'ingredient') return null;
  switch (unit) {
    case 'cup':
    case 'tablespoon':
    case 'teaspoon':
    case 'stick':
    case 'can':
    case 'piece':
      return inMeasure(thing.ingredient, unit, grams, first.qualifier)?.text ?? null;
    default:
      return null;
  }
}
