import type { FormulaBody, PantryIndex } from './pantry-index.ts';
import { faultOf } from './formula-problem.ts';
import { formulaTotals, mixedG } from './totals.ts';

export type Mixer = { readonly id: string; readonly name: string; readonly capacityG: number };

export type BowlPlan = {
  readonly mixer: Mixer;
  readonly bowls: number;
  /** Grams in each of the equal bowls. */
  readonly eachG: number;
};

/**
 * The fewest equal bowls, each in the smallest mixer that takes it, by what the mixer holds
 * (`mixedG`); null for nothing to mix.
 * Throws `FormulaFault` without a mixer or with an amount that is none.
 */
export function bowlsFor(grams: number, mixers: readonly Mixer[]): BowlPlan | null {
  if (!(grams >= 0) || !Number.isFinite(grams)) {
    throw faultOf('not-an-amount', 'Write a weight, not below nothing.');
  }
  if (grams === 0) return null;
  const bySize = mixers
    .filter((it) => it.capacityG > 0)
    .toSorted((a, b) => a.capacityG - b.capacityG);
  const largest = bySize.at(-1);
  if (largest === undefined) throw faultOf('no-mixer', 'The studio has no mixer with a capacity.');
  const bowls = Math.ceil(grams / largest.capacityG - 1e-9);
  const eachG = grams / bowls;
  const mixer = bySize.find((it) => it.capacityG >= eachG - 1e-6) ?? largest;
  return { mixer, bowls, eachG };
}

/**
 * A whipped bowl cools in proportion to its eggs: about 10 minutes for 180 g of white, twice that
 * for double (common practice, no source); what counts is the bowl under 80 °F (27 °C, memory).
 */
export const cooling = { minutes: 10, perEggG: 180, underC: 30 } as const;

/**
 * Minutes one bowl of a formula takes to cool on the mixer; null for a formula that has no step
 * where the mixer waits for a cool bowl. `bowlG` is what the mixer holds.
 */
export function coolingMinutes(
  body: FormulaBody & {
    readonly steps: readonly {
      readonly resource: string;
      readonly critical: { readonly limitC: number } | null;
    }[];
  },
  index: PantryIndex,
  bowlG: number,
): number | null {
  const cools = body.steps.some(
    (it) => it.resource === 'mixer' && it.critical !== null && it.critical.limitC <= cooling.underC,
  );
  if (!cools) return null;
  let eggG = 0;
  for (const { part, grams } of body.lines) {
    if (part.kind !== 'ingredient') continue;
    if ((index.ingredients.get(part.ingredientId)?.eggPart ?? null) !== null) eggG += grams;
  }
  const wholeG = mixedG(body, formulaTotals(body).outG);
  return wholeG > 0 ? ((eggG / wholeG) * bowlG * cooling.minutes) / cooling.perEggG : null;
}
