import type { KitchenRules } from '#shared/contracts/kitchen-rules.ts';
import type { ResolvedBody } from '#shared/kitchen/resolve-design.ts';
import { areaMm2, perimeterMm, type Block } from '#shared/kitchen/sizes.ts';
import type { Link, Work } from './model.ts';
import type { ByWeight, WorkTimes } from './work-times.ts';

/** What the studio mixes and bakes with. */
export type Equipment = {
  /** Grams the smallest mixer takes. */
  readonly bowlG: number;
  readonly decks: number;
  /** Area of the smallest deck, square millimetres. */
  readonly deckMm2: number;
};

/**
 * One tier, the sheet or one kind of cutting cake as the bench sees it; grams are of all of them,
 * whole and rounded up.
 */
export type Layer = {
  readonly body: ResolvedBody;
  /** Its place from the board up; null for cutting cakes, which stand by themselves. */
  readonly tier: number | null;
  /** Tells its work apart within the order. */
  readonly key: string;
  /** How many are made alike. */
  readonly count: number;
  readonly name: string;
  readonly batterG: number;
  readonly fillingG: number;
  readonly frostingG: number;
  readonly coveringG: number;
};

export type NewWork = Partial<Work> & Pick<Work, 'key' | 'kind' | 'label' | 'minutes'>;

/** Keys of work that was split: the first part waits for what is before, what is after for the last. */
type Parts = { readonly first: string; readonly last: string; readonly all: readonly string[] };

export const minutesAnHour = 60;
export const hoursADay = 24;

/** Collects work and links; one key is one piece of work. */
export class Expansion {
  readonly work: Work[] = [];
  readonly links: Link[] = [];
  readonly times: WorkTimes;
  readonly equipment: Equipment;
  readonly rules: KitchenRules;

  constructor(times: WorkTimes, equipment: Equipment, rules: KitchenRules) {
    this.times = times;
    this.equipment = equipment;
    this.rules = rules;
  }

  /** How long before the pickup window's end the finished cake may be begun. */
  get finishedWithin(): number {
    return (this.times.keeps.finishedHours - this.times.keeps.servedAfterHours) * minutesAnHour;
  }

  add(work: NewWork): string {
    // Nothing takes no time at all: an order of things needs a difference between them.
    const minutes = Math.max(1, work.minutes);
    this.work.push({
      tier: null,
      benchMinutes: minutes,
      mixerMinutes: 0,
      ovenMinutes: 0,
      skill: null,
      batch: null,
      within: null,
      ...work,
      minutes,
    });
    return work.key;
  }

  link(before: string, after: string, gap: number, keepsHours: number | null): void {
    this.links.push({
      before,
      after,
      gap,
      keeps: keepsHours === null ? null : keepsHours * minutesAnHour,
    });
  }

  /** Hand work in parts no longer than the longest piece; `chained` where it is on the cake. */
  addParts(work: NewWork, chained: boolean): Parts {
    const parts = splitMinutes(work.minutes, this.times.longestPiece);
    const all = parts.map((minutes, n) =>
      this.add(
        parts.length === 1
          ? work
          : {
              ...work,
              key: `${work.key}/${n + 1}`,
              label: `${work.label}, part ${n + 1} of ${parts.length}`,
              minutes,
            },
      ),
    );
    if (chained) all.slice(1).forEach((key, n) => this.link(all[n] ?? key, key, 0, null));
    return { first: all[0] ?? work.key, last: all.at(-1) ?? work.key, all };
  }
}

/** Whole minutes in as few equal parts as keep each within the longest; at least one part. */
export function splitMinutes(minutes: number, longest: number): number[] {
  const count = Math.max(1, Math.ceil(minutes / longest));
  const base = Math.floor(minutes / count);
  const more = minutes - base * count;
  return Array.from({ length: count }, (_, n) => base + (n < more ? 1 : 0));
}

/** bowls x fixed + grams x rate, rounded up to whole minutes. */
export function batchMinutes(bowls: number, grams: number, times: ByWeight): number {
  return bowls * times.perBowl + Math.ceil((grams * times.perKg) / 1000);
}

/** Tenths of minutes per square decimetre, rounded up. */
export function byArea(squareMm: number, perDm2Tenths: number): number {
  return Math.ceil((squareMm * perDm2Tenths) / 100_000);
}

/** What can be seen and coated: sides and top. */
export function coatedMm2(block: Block): number {
  return Math.round(areaMm2(block) + perimeterMm(block) * block.heightMm);
}

export const sum = (numbers: readonly number[]): number =>
  numbers.reduce((total, it) => total + it, 0);
