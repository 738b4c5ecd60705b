import type { EggPart } from '#shared/contracts/pantry.ts';
import { addDays, type LocalDate } from '#shared/dates/local-time.ts';
import { coverDays, type CoverPart } from './cover-days.ts';
import { eggWeightsMg } from './egg-sizes.ts';
import type { EggClass } from './egg-weights.ts';

/** A weight of shell egg wanted on a day. */
export type EggNeed = {
  readonly date: LocalDate;
  readonly part: EggPart;
  readonly grams: number;
};

/** Days a loose part keeps chilled after the day it was cracked. */
export type EggKeeping = { readonly whiteDays: number; readonly yolkDays: number };

/**
 * Loose whites and yolks keep 2 to 4 days chilled (FDA, refrigerator storage chart). Whites take
 * the long end and yolks, which skin over, the short one; the studio may say otherwise within it.
 */
export const eggKeeping = { whiteDays: 4, yolkDays: 2, leastDays: 2, mostDays: 4 } as const;

/** Where a need is taken from: grams out of the eggs cracked on a day. */
export type EggSource = {
  readonly crackedOn: LocalDate;
  readonly part: 'white' | 'yolk';
  readonly grams: number;
};

export type EggUse<Need extends EggNeed = EggNeed> = {
  readonly need: Need;
  readonly from: readonly EggSource[];
};

export type EggDay<Need extends EggNeed = EggNeed> = {
  readonly date: LocalDate;
  /** Eggs to crack on this day. */
  readonly crack: number;
  /** Of those, how many may go in whole; the rest are separated. */
  readonly whole: number;
  readonly uses: readonly EggUse<Need>[];
};

/** What nothing takes any more of the eggs cracked on a day. */
export type EggLeftover = {
  readonly part: 'white' | 'yolk';
  readonly crackedOn: LocalDate;
  readonly useBy: LocalDate;
  readonly grams: number;
};

export type EggPlan<Need extends EggNeed = EggNeed> = {
  readonly eggs: number;
  readonly days: readonly EggDay<Need>[];
  readonly leftovers: readonly EggLeftover[];
};

/**
 * Weights in fiftieths of a milligram, so that the white (33 in 50) and the yolk (17 in 50) of a
 * whole egg stay whole numbers.
 */
const unitsPerGram = 50_000;
const whiteShare = 33 / 50;

type Lot = { readonly crackedOn: LocalDate; readonly useBy: LocalDate; left: number };

/**
 * The fewest eggs to crack for all needs together, day by day. Whole egg is white and yolk in the
 * proportion an egg has them, so a loose white and a loose yolk can stand for it. Older parts are
 * used first, and nothing is used after its day.
 * Needs of no weight are passed over.
 */
export function planEggs<Need extends EggNeed>(
  needs: readonly Need[],
  size: EggClass = 'large',
  keeping: EggKeeping = eggKeeping,
): EggPlan<Need> {
  const wanted = needs.filter((it) => it.grams > 0);
  const egg = eggWeightsMg(size);
  const demandsOf = (part: 'white' | 'yolk') =>
    wanted.map((need) => ({ date: need.date, amount: unitsOf(need)[part] }));
  const parts: readonly CoverPart[] = [
    { demands: demandsOf('white'), perUnit: egg.white * 50, keepsDays: keeping.whiteDays },
    { demands: demandsOf('yolk'), perUnit: egg.yolk * 50, keepsDays: keeping.yolkDays },
  ];
  const cracked = coverDays(parts);
  const dates = [...new Set(wanted.map((it) => it.date))].toSorted();
  const lots: Record<'white' | 'yolk', Lot[]> = { white: [], yolk: [] };
  const days = dates.map((date): EggDay<Need> => {
    const crack = cracked.get(date) ?? 0;
    for (const [part, keepsDays] of [
      ['white', keeping.whiteDays],
      ['yolk', keeping.yolkDays],
    ] as const) {
      if (crack === 0) continue;
      lots[part].push({
        crackedOn: date,
        useBy: addDays(date, keepsDays),
        left: crack * egg[part] * 50,
      });
    }
    // Loose parts go to what takes them alone first, so that whole egg is cracked whole.
    const uses = wanted
      .filter((need) => need.date === date)
      .toSorted((a, b) => Number(a.part === 'whole') - Number(b.part === 'whole'))
      .map((need): EggUse<Need> => {
        const units = unitsOf(need);
        return {
          need,
          from: [
            ...take(lots.white, 'white', units.white, date),
            ...take(lots.yolk, 'yolk', units.yolk, date),
          ],
        };
      });
    return { date, crack, whole: wholeEggs(uses, date, crack, size), uses };
  });
  return {
    eggs: days.reduce((sum, it) => sum + it.crack, 0),
    days,
    leftovers: (['white', 'yolk'] as const)
      .flatMap((part) =>
        lots[part].map(({ crackedOn, useBy, left }): EggLeftover => ({
          part,
          crackedOn,
          useBy,
          grams: left / unitsPerGram,
        })),
      )
      .filter((it) => it.grams > 0)
      .toSorted((a, b) => (a.crackedOn < b.crackedOn ? -1 : a.crackedOn > b.crackedOn ? 1 : 0)),
  };
}

/** What a need takes of each part, rounded up to a fiftieth of a milligram. */
function unitsOf({ part, grams }: EggNeed): Record<'white' | 'yolk', number> {
  // Milligrams first: a weight is kept to the milligram, and whole eggs then split exactly.
  const mg = Math.ceil(Math.round(grams * 1_000_000) / 1000);
  if (part === 'white') return { white: mg * 50, yolk: 0 };
  if (part === 'yolk') return { white: 0, yolk: mg * 50 };
  return { white: mg * 33, yolk: mg * 17 };
}

/** Takes from the oldest lots that are still good. @throws when the plan does not cover it */
function take(
  lots: readonly Lot[],
  part: 'white' | 'yolk',
  amount: number,
  date: LocalDate,
): EggSource[] {
  const from: EggSource[] = [];
  let missing = amount;
  for (const lot of lots) {
    if (missing === 0) break;
    if (lot.left === 0 || lot.useBy < date) continue;
    const taken = Math.min(lot.left, missing);
    lot.left -= taken;
    missing -= taken;
    from.push({ crackedOn: lot.crackedOn, part, grams: taken / unitsPerGram });
  }
  if (missing > 0) throw new Error(`The eggs cracked do not cover the ${part}s of ${date}.`);
  return from;
}

/** Eggs of the day that whole-egg needs take up with white and yolk both. */
function wholeEggs(
  uses: readonly EggUse[],
  date: LocalDate,
  crack: number,
  size: EggClass,
): number {
  const fresh = uses
    .filter((it) => it.need.part === 'whole')
    .flatMap((it) => it.from.filter((from) => from.crackedOn === date));
  const grams = (part: 'white' | 'yolk') =>
    fresh.filter((it) => it.part === part).reduce((sum, it) => sum + it.grams, 0);
  const { whole } = eggWeightsMg(size);
  const eggs = Math.min(
    (grams('white') * 1000) / (whole * whiteShare),
    (grams('yolk') * 1000) / (whole * (1 - whiteShare)),
  );
  return Math.min(crack, Math.floor(eggs + 1e-6));
}
