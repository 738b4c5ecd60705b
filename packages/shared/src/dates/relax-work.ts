import { chainBackwards } from './chain.ts';
import type { LocalDate, UtcMinute } from './local-time.ts';
import type { Demand, PickupTime, PlannedOrder, Shift, Supply, Work } from './model.ts';

/** What there is too little of, whatever is moved, and the last day of work it is needed on. */
export type Shortage = { readonly resource: string; readonly day: LocalDate };

type Bounds = {
  readonly work: Work;
  /** It starts at most so long before the pickup window's end; null is any time before. */
  readonly reach: number | null;
  /** It ends at least so long before the pickup window's start. */
  readonly tail: number;
};

/** Per piece of work, the stretch before the pickup in which it has to lie; by its chain alone. */
function boundsOf(demand: Demand): Bounds[] {
  const reaches = new Map<string, number | null>();
  return chainBackwards(demand).map(({ work, after, tail }) => {
    let reach = work.within;
    for (const { key, keeps } of after) {
      const next = reaches.get(key) ?? null;
      if (keeps === null || next === null) continue;
      reach = Math.min(reach ?? Infinity, next + keeps + work.minutes);
    }
    reaches.set(work.key, reach);
    return { work, reach, tail };
  });
}

const knownBounds = new WeakMap<Demand, readonly Bounds[]>();

function cachedBounds(demand: Demand): readonly Bounds[] {
  let bounds = knownBounds.get(demand);
  if (bounds === undefined) {
    bounds = boundsOf(demand);
    knownBounds.set(demand, bounds);
  }
  return bounds;
}

type Resource = {
  readonly name: string;
  readonly needs: (work: Work) => number;
  /** What a shift has of it in all, and how many can be used at once. */
  readonly has: (shift: Shift) => readonly [minutes: number, atOnce: number];
};

function resourcesOf(demand: Demand): Resource[] {
  const skills = new Set(demand.work.flatMap((it) => it.skill ?? []));
  return [
    {
      name: 'bench',
      needs: (it) => it.benchMinutes,
      has: (it) => [it.benchMinutes, it.people.length],
    },
    { name: 'mixer', needs: (it) => it.mixerMinutes, has: (it) => [it.mixerMinutes, it.mixers] },
    { name: 'oven', needs: (it) => it.ovenMinutes, has: (it) => [it.ovenMinutes, it.decks] },
    ...[...skills].map((skill): Resource => ({
      name: skill,
      needs: (it) => (it.skill === skill ? it.benchMinutes : 0),
      has: (it) => [
        it.skillMinutes.get(skill) ?? 0,
        it.people.filter((person) => person.skills.includes(skill)).length,
      ],
    })),
  ];
}

/**
 * The sure no: splittable work against nested windows per resource, with every standing order
 * free to move inside its own bounds. A shortage here means that no plan exists; null decides
 * nothing.
 */
export function findShortage(
  supply: Supply,
  standing: readonly PlannedOrder[],
  demand: Demand,
  pickup: PickupTime,
): Shortage | null {
  const bounds = cachedBounds(demand);
  const open = new Set(supply.shifts.map((it) => it.key));
  const starts = new Set(bounds.map(({ reach }) => startOf(supply.now, pickup, reach)));
  for (const from of [...starts].toSorted((a, b) => b - a)) {
    const shifts = supply.shifts.filter((it) => it.endAt > from && it.startAt < pickup.startAt);
    for (const resource of resourcesOf(demand)) {
      const own = mustLie(bounds, supply.now, pickup, from, pickup.startAt, resource);
      if (own === 0) continue;
      let capacity = 0;
      let alone = 0;
      for (const shift of shifts) {
        const inside = Math.min(shift.endAt, pickup.startAt) - Math.max(shift.opensAt, from);
        const [minutes, atOnce] = resource.has(shift);
        const usable = Math.min(minutes, atOnce * Math.max(0, inside));
        capacity += usable;
        alone += Math.min(usable, shift.endAt - shift.startAt);
      }
      let committed = 0;
      for (const order of standing) {
        if (order.pickup.startAt > pickup.startAt || order.pickup.endAt < from) continue;
        const placed = new Set(
          order.places.filter((it) => open.has(it.shiftKey)).map((it) => it.key),
        );
        const theirs = cachedBounds(order.demand).filter((it) => placed.has(it.work.key));
        committed += mustLie(theirs, supply.now, order.pickup, from, pickup.startAt, resource);
      }
      const short = committed + own > capacity || (resource.name === 'bench' && own > alone);
      if (short) return { resource: resource.name, day: shifts.at(-1)?.date ?? pickup.date };
    }
  }
  return null;
}

function startOf(now: UtcMinute, pickup: PickupTime, reach: number | null): UtcMinute {
  return reach === null ? now : Math.max(now, pickup.endAt - reach);
}

/** Minutes of the work that cannot lie anywhere but between two instants. */
function mustLie(
  bounds: readonly Bounds[],
  now: UtcMinute,
  pickup: PickupTime,
  from: UtcMinute,
  to: UtcMinute,
  resource: Resource,
): number {
  let minutes = 0;
  for (const { work, reach, tail } of bounds) {
    if (startOf(now, pickup, reach) >= from && pickup.startAt - tail <= to)
      minutes += resource.needs(work);
  }
  return minutes;
}
