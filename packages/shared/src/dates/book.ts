import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { addDays, weekdayOf } from './local-time.ts';
import type { LocalDate, UtcMinute } from './local-time.ts';
import { fitsTheCold } from './cold.ts';
import type {
  Box,
  Demand,
  PickupTime,
  Place,
  PlannedOrder,
  Refusal,
  Shift,
  Supply,
  Work,
} from './model.ts';

/** A stretch of a shift in which somebody or something is taken. */
type Span = { readonly from: UtcMinute; readonly to: UtcMinute; readonly units: number };

/** One use of one kind of worker or machine by a piece of work, measured from its start. */
type Use = {
  readonly track: string;
  readonly offset: number;
  readonly minutes: number;
  readonly units: number;
};

type Mark = { readonly allergen: AllergenId; readonly at: UtcMinute };

/** What is left of a shift. */
type Page = {
  readonly shift: Shift;
  readonly left: Map<string, number>;
  readonly limits: ReadonlyMap<string, number>;
  readonly spans: Map<string, Span[]>;
  /** Starts of work that contains an allergen, and ends of work kept apart from one. */
  readonly containing: Mark[];
  readonly keptApart: Mark[];
};

export const skillTrack = (skill: string): string => `skill:${skill}`;

/** Which workers and machines a piece of work takes, and when: hands first, then the oven. */
export function usesOf(work: Work): Use[] {
  const uses: Use[] = [];
  const add = (track: string, offset: number, minutes: number, units: number) => {
    if (minutes > 0 && units > 0) uses.push({ track, offset, minutes, units });
  };
  add('bench', 0, work.benchMinutes, 1);
  if (work.skill !== null) add(skillTrack(work.skill), 0, work.benchMinutes, 1);
  add('mixer', 0, work.mixerMinutes, 1);
  const baking = work.minutes - work.benchMinutes;
  if (baking > 0) add('oven', work.benchMinutes, baking, Math.ceil(work.ovenMinutes / baking));
  return uses;
}

/** Minutes a piece of work draws from each pool of a shift. */
export function drawsOf(work: Work): [track: string, minutes: number][] {
  const draws: [string, number][] = [
    ['bench', work.benchMinutes],
    ['mixer', work.mixerMinutes],
    ['oven', work.ovenMinutes],
  ];
  if (work.skill !== null) draws.push([skillTrack(work.skill), work.benchMinutes]);
  return draws;
}

/**
 * The order book as the planner works in it: what is left of every shift, window, cap and cold
 * night once the standing orders have their places. Orders can be put in and taken out again.
 */
export class Book {
  readonly supply: Supply;
  private readonly pages: readonly Page[];
  private readonly pageByKey: ReadonlyMap<string, Page>;
  private readonly orders = new Map<string, PlannedOrder>();

  constructor(supply: Supply, standing: readonly PlannedOrder[]) {
    this.supply = supply;
    this.pages = supply.shifts.map(openPage);
    this.pageByKey = new Map(this.pages.map((page) => [page.shift.key, page]));
    for (const order of standing) this.put(order);
  }

  standingOf(orderId: string): PlannedOrder | null {
    return this.orders.get(orderId) ?? null;
  }

  /** Gives the order its place; work in shifts that are not in the supply takes nothing. */
  put(order: PlannedOrder): void {
    this.orders.set(order.orderId, order);
    for (const [work, place] of placedWork(order)) this.putWork(order.demand, work, place);
  }

  /** Takes an order out again: the one that was put in last. */
  takeBack(order: PlannedOrder): void {
    this.orders.delete(order.orderId);
    for (const [work, place] of placedWork(order).toReversed())
      this.takeBackWork(order.demand, work, place);
  }

  putWork(demand: Demand, work: Work, place: Place): void {
    const page = this.pageByKey.get(place.shiftKey);
    if (page === undefined) return;
    for (const [track, minutes] of drawsOf(work))
      page.left.set(track, (page.left.get(track) ?? 0) - minutes);
    for (const { track, offset, minutes, units } of usesOf(work)) {
      const spans = page.spans.get(track) ?? [];
      spans.push({ from: place.startAt + offset, to: place.startAt + offset + minutes, units });
      page.spans.set(track, spans);
    }
    for (const allergen of demand.contains) page.containing.push({ allergen, at: place.startAt });
    for (const allergen of demand.apart)
      page.keptApart.push({ allergen, at: place.startAt + work.minutes });
  }

  /** Takes work out again: what was put in last goes first. */
  takeBackWork(demand: Demand, work: Work, place: Place): void {
    const page = this.pageByKey.get(place.shiftKey);
    if (page === undefined) return;
    for (const [track, minutes] of drawsOf(work))
      page.left.set(track, (page.left.get(track) ?? 0) + minutes);
    for (const { track } of usesOf(work)) page.spans.get(track)?.pop();
    page.containing.length -= demand.contains.length;
    page.keptApart.length -= demand.apart.length;
  }

  /** Orders standing for the day, of an occasion or of any. */
  countOn(date: LocalDate, occasionId: string | null): number {
    let count = 0;
    for (const { pickup, demand } of this.orders.values()) {
      if (pickup.date === date && (occasionId === null || demand.occasionId === occasionId))
        count += 1;
    }
    return count;
  }

  countInWindow(pickup: Pick<PickupTime, 'date' | 'startMinute'>): number {
    let count = 0;
    for (const order of this.orders.values()) {
      if (order.pickup.date === pickup.date && order.pickup.startMinute === pickup.startMinute)
        count += 1;
    }
    return count;
  }

  /** Whether the day takes one more of this occasion; null when it does. */
  refusesDay(date: LocalDate, occasionId: string): Refusal | null {
    const weekday = weekdayOf(date);
    const capped = this.supply.caps.some(
      (cap) =>
        (cap.occasionId === null || cap.occasionId === occasionId) &&
        (cap.weekday === null || cap.weekday === weekday) &&
        (cap.date === null || cap.date === date) &&
        this.countOn(date, cap.occasionId) >= cap.maxOrders,
    );
    if (capped) return { kind: 'cap' };
    if (this.supply.keptBack > 0) {
      const windows = this.supply.windows.get(date) ?? [];
      const handovers = windows.reduce((sum, it) => sum + it.handovers, 0);
      if (handovers - this.countOn(date, null) <= this.supply.keptBack)
        return { kind: 'kept-back' };
    }
    return null;
  }

  hasHandover(pickup: Pick<PickupTime, 'date' | 'startMinute'>): boolean {
    const window = this.supply.windows
      .get(pickup.date)
      ?.find((it) => it.startMinute === pickup.startMinute);
    return window !== undefined && this.countInWindow(pickup) < window.handovers;
  }

  /**
   * The earliest day, from `first` on, a cake may be filled so that every night up to its pickup
   * has room for it.
   */
  coldSince(boxes: readonly Box[], pickupDate: LocalDate, first: LocalDate): LocalDate {
    const { cold } = this.supply;
    let date = pickupDate;
    if (cold === null) return first;
    const standing = [...this.orders.values()];
    while (date > first) {
      const night = addDays(date, -1);
      const there = standing.filter(
        (it) => it.coldFrom !== null && it.coldFrom <= night && it.coldUntil > night,
      );
      if (!fitsTheCold(cold, [...there.flatMap((it) => it.demand.boxes), ...boxes])) break;
      date = night;
    }
    return date;
  }

  /** How much of a day's bench is taken, 0 to 1; a day without shifts is not full. */
  fillOf(date: LocalDate): number {
    let whole = 0;
    let left = 0;
    for (const page of this.pages) {
      if (page.shift.date !== date) continue;
      whole += page.shift.wholeBenchMinutes;
      left += page.left.get('bench') ?? 0;
    }
    return whole === 0 ? 0 : Math.min(1, Math.max(0, 1 - left / whole));
  }

  /** Bench minutes still free on a day; may be negative where too much stands. */
  freeBenchOf(date: LocalDate): number {
    return this.pages
      .filter((page) => page.shift.date === date)
      .reduce((sum, page) => sum + (page.left.get('bench') ?? 0), 0);
  }

  /** Index of the last shift that starts no later than a minute; -1 when there is none. */
  lastShiftBefore(at: UtcMinute): number {
    let low = 0;
    let high = this.pages.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      const page = this.pages[middle];
      if (page !== undefined && page.shift.startAt <= at) low = middle + 1;
      else high = middle;
    }
    return low - 1;
  }

  shiftAt(index: number): Shift | undefined {
    return this.pages[index]?.shift;
  }

  /**
   * The latest start of the work in a shift between two minutes, or null. `ownBench` is what the
   * same order already has of the shift.
   */
  latestStart(
    index: number,
    work: Work,
    demand: Pick<Demand, 'contains' | 'apart'>,
    earliest: UtcMinute,
    latest: UtcMinute,
    ownBench: number,
  ): UtcMinute | null {
    const page = this.pages[index];
    if (page === undefined) return null;
    const { shift } = page;
    if (ownBench + work.benchMinutes > shift.endAt - shift.startAt) return null;
    for (const [track, minutes] of drawsOf(work)) {
      if (minutes > 0 && (page.left.get(track) ?? 0) < minutes) return null;
    }
    let from = Math.max(earliest, shift.opensAt);
    let start = Math.min(latest, shift.endAt - work.minutes);
    for (const { allergen, at } of page.keptApart) {
      if (demand.contains.includes(allergen)) from = Math.max(from, at);
    }
    for (const { allergen, at } of page.containing) {
      if (demand.apart.includes(allergen)) start = Math.min(start, at - work.minutes);
    }
    const uses = usesOf(work);
    while (start >= from) {
      const earlier = earlierStart(page, uses, start);
      if (earlier === null) return start;
      start = earlier;
    }
    return null;
  }
}

/** Where to try next when a start meets something taken; null when it meets nothing. */
function earlierStart(page: Page, uses: readonly Use[], start: UtcMinute): UtcMinute | null {
  for (const { track, offset, minutes, units } of uses) {
    const from = start + offset;
    const to = from + minutes;
    const room = (page.limits.get(track) ?? 0) - units;
    const spans = (page.spans.get(track) ?? []).filter((it) => it.from < to && it.to > from);
    let clash: UtcMinute | null = room < 0 ? from : null;
    // The load only rises where a span begins (or where the work itself does).
    for (const point of [from, ...spans.map((it) => it.from)]) {
      if (point < from || (clash !== null && point <= clash)) continue;
      const load = spans.reduce(
        (sum, it) => sum + (it.from <= point && it.to > point ? it.units : 0),
        0,
      );
      if (load > room) clash = point;
    }
    // Everything between overlaps the same clash, so nothing is passed over.
    if (clash !== null) return clash - minutes - offset;
  }
  return null;
}

/** Each placed piece of work beside its place. */
export function placedWork(order: PlannedOrder): [Work, Place][] {
  const works = new Map(order.demand.work.map((work) => [work.key, work]));
  return order.places.flatMap((place): [Work, Place][] => {
    const work = works.get(place.key);
    return work === undefined ? [] : [[work, place]];
  });
}

function openPage(shift: Shift): Page {
  const left = new Map([
    ['bench', shift.benchMinutes],
    ['mixer', shift.mixerMinutes],
    ['oven', shift.ovenMinutes],
  ]);
  const limits = new Map([
    ['bench', shift.people.length],
    ['mixer', shift.mixers],
    ['oven', shift.decks],
  ]);
  for (const [skill, minutes] of shift.skillMinutes) {
    left.set(skillTrack(skill), minutes);
    limits.set(skillTrack(skill), shift.people.filter((it) => it.skills.includes(skill)).length);
  }
  return { shift, left, limits, spans: new Map(), containing: [], keptApart: [] };
}
