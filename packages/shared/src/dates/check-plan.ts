import { checkCold, checkPickup } from './check-pickup.ts';
import type { PlannedOrder, Shift, Supply, Work } from './model.ts';
import type { Fault, MakeFault, Placed } from './plan-fault.ts';

/**
 * The independent checker: verifies a plan against the definitions of the model. It shares
 * nothing with the planner but the types and the calendar, so that a mistake there is found here.
 */

/** What stands in the book, gathered once for many checks. */
export type Standing = {
  readonly supply: Supply;
  readonly orders: readonly PlannedOrder[];
  readonly byShift: ReadonlyMap<string, readonly Placed[]>;
};

/** Gathers standing orders for `checkAddition`. */
export function gatherStanding(supply: Supply, orders: readonly PlannedOrder[]): Standing {
  const byShift = new Map<string, Placed[]>();
  for (const order of orders) {
    for (const placed of readPlaces(supply, order)) {
      const key = placed.shift?.key;
      if (key !== undefined) byShift.set(key, [...(byShift.get(key) ?? []), placed]);
    }
  }
  return { supply, orders, byShift };
}

/** Every fault of one order beside those that stand; an empty list is a plan that holds. */
export function checkAddition(standing: Standing, order: PlannedOrder): Fault[] {
  const { supply } = standing;
  const others = standing.orders.filter((it) => it.orderId !== order.orderId);
  const placed = readPlaces(supply, order);
  const fault = faultOf(order);
  const touched = new Set(placed.map((it) => it.shift?.key).filter((key) => key !== undefined));
  return [
    ...checkComplete(order, fault),
    ...checkTimes(supply, order, placed, fault),
    ...checkLinks(order, placed, fault),
    ...[...touched].flatMap((key) => {
      const rest = (standing.byShift.get(key) ?? []).filter((it) => it.orderId !== order.orderId);
      return checkShift(
        placed.filter((it) => it.shift?.key === key),
        rest,
        fault,
      );
    }),
    ...checkAllergens(order, placed, others, standing, fault),
    ...checkCold(supply, order, placed, others, fault),
    ...checkPickup(supply, order, others, fault),
  ];
}

/**
 * What another window of the same day can spoil in a plan that holds for an earlier one: its
 * times against the pickup, and the window itself. Everything else is the same.
 */
export function checkLaterWindow(standing: Standing, order: PlannedOrder): Fault[] {
  const { supply } = standing;
  const others = standing.orders.filter((it) => it.orderId !== order.orderId);
  const fault = faultOf(order);
  return [
    ...checkTimes(supply, order, readPlaces(supply, order), fault),
    ...checkPickup(supply, order, others, fault),
  ];
}

/** Every fault of a whole plan. Orders that have standing work in shifts gone by are checked from now on. */
export function checkPlan(supply: Supply, orders: readonly PlannedOrder[]): Fault[] {
  const standing = gatherStanding(supply, orders);
  return orders.flatMap((order) => checkAddition(standing, order));
}

function faultOf({ orderId }: PlannedOrder): MakeFault {
  return (rule, sentence) => ({ rule, orderId, sentence });
}

const shiftIndexes = new WeakMap<Supply, ReadonlyMap<string, Shift>>();

function shiftsOf(supply: Supply): ReadonlyMap<string, Shift> {
  let index = shiftIndexes.get(supply);
  if (index === undefined) {
    index = new Map(supply.shifts.map((it) => [it.key, it]));
    shiftIndexes.set(supply, index);
  }
  return index;
}

function readPlaces(supply: Supply, order: PlannedOrder): Placed[] {
  const shifts = shiftsOf(supply);
  const placed: Placed[] = [];
  for (const place of order.places) {
    const work = order.demand.work.find((it) => it.key === place.key);
    if (work === undefined) continue;
    placed.push({
      orderId: order.orderId,
      work,
      shift: shifts.get(place.shiftKey),
      start: place.startAt,
      end: place.startAt + work.minutes,
    });
  }
  return placed;
}

function checkComplete(order: PlannedOrder, fault: MakeFault): Fault[] {
  const faults: Fault[] = [];
  for (const work of order.demand.work) {
    const times = order.places.filter((it) => it.key === work.key).length;
    if (times !== 1)
      faults.push(fault('missing-work', `${work.label} stands ${times} times in the plan.`));
  }
  for (const place of order.places) {
    if (!order.demand.work.some((it) => it.key === place.key)) {
      faults.push(fault('unknown-work', `${place.key} is no work of this order.`));
    }
  }
  return faults;
}

function checkTimes(
  supply: Supply,
  order: PlannedOrder,
  placed: readonly Placed[],
  fault: MakeFault,
): Fault[] {
  const faults: Fault[] = [];
  for (const { work, shift, start, end } of placed) {
    if (!Number.isInteger(start))
      faults.push(fault('outside-shift', `${work.label} does not start on a whole minute.`));
    if (start < supply.now) faults.push(fault('in-the-past', `${work.label} starts before now.`));
    if (shift === undefined || start < shift.startAt || end > shift.endAt) {
      faults.push(fault('outside-shift', `${work.label} is not inside its shift.`));
    }
    if (end > order.pickup.startAt)
      faults.push(fault('after-pickup', `${work.label} ends after the pickup begins.`));
    if (work.within !== null && order.pickup.endAt - start > work.within) {
      faults.push(fault('too-early', `${work.label} is too long before the pickup.`));
    }
  }
  return faults;
}

function checkLinks(order: PlannedOrder, placed: readonly Placed[], fault: MakeFault): Fault[] {
  const faults: Fault[] = [];
  const at = new Map(placed.map((it) => [it.work.key, it]));
  for (const link of order.demand.links) {
    const before = at.get(link.before);
    const after = at.get(link.after);
    if (before === undefined || after === undefined) continue;
    const between = after.start - before.end;
    if (between < link.gap)
      faults.push(
        fault('gap', `${after.work.label} is only ${between} min after ${before.work.label}.`),
      );
    if (link.keeps !== null && between > link.keeps) {
      faults.push(
        fault('shelf-life', `${before.work.label} does not keep until ${after.work.label}.`),
      );
    }
  }
  return faults;
}

/** Sums of a shift against its capacities, and people and machines at every minute. */
function checkShift(own: readonly Placed[], rest: readonly Placed[], fault: MakeFault): Fault[] {
  const shift = own[0]?.shift;
  if (shift === undefined) return [];
  const all = [...own, ...rest];
  const total = (minutesOf: (work: Work) => number) =>
    all.reduce((sum, it) => sum + minutesOf(it.work), 0);
  const faults: Fault[] = [];
  const limit = (name: string, needed: number, capacity: number) => {
    if (needed > capacity)
      faults.push(fault('capacity', `${shift.key}: ${name} ${needed} of ${capacity} min.`));
  };
  // A resource nobody of this order draws on cannot be overdrawn by it.
  if (own.some((it) => it.work.benchMinutes > 0))
    limit(
      'bench',
      total((it) => it.benchMinutes),
      shift.benchMinutes,
    );
  if (own.some((it) => it.work.mixerMinutes > 0))
    limit(
      'mixer',
      total((it) => it.mixerMinutes),
      shift.mixerMinutes,
    );
  if (own.some((it) => it.work.ovenMinutes > 0))
    limit(
      'oven',
      total((it) => it.ovenMinutes),
      shift.ovenMinutes,
    );
  for (const skill of new Set(own.map((it) => it.work.skill))) {
    if (skill === null) continue;
    const skilled = shift.people.filter((it) => it.skills.includes(skill)).length;
    limit(
      skill,
      total((it) => (it.skill === skill ? it.benchMinutes : 0)),
      shift.skillMinutes.get(skill) ?? 0,
    );
    const most = busiest(
      all
        .filter((it) => it.work.skill === skill)
        .map((it) => [it.start, it.start + it.work.benchMinutes, 1]),
    );
    if (most > skilled) faults.push(fault('hands', `${shift.key}: ${most} at ${skill} at once.`));
  }
  const ownBench = own.reduce((sum, it) => sum + it.work.benchMinutes, 0);
  if (ownBench > shift.endAt - shift.startAt) {
    faults.push(fault('one-order-a-shift', `${shift.key}: one order takes ${ownBench} min.`));
  }
  const hands = busiest(all.map((it) => [it.start, it.start + it.work.benchMinutes, 1]));
  if (hands > shift.people.length)
    faults.push(fault('hands', `${shift.key}: ${hands} pieces of work at once.`));
  const mixing = busiest(all.map((it) => [it.start, it.start + it.work.mixerMinutes, 1]));
  if (mixing > shift.mixers) faults.push(fault('hands', `${shift.key}: ${mixing} mixers at once.`));
  const baking = busiest(
    all
      .filter((it) => it.work.ovenMinutes > 0)
      .map((it) => {
        const from = it.start + it.work.benchMinutes;
        return [from, it.end, Math.ceil(it.work.ovenMinutes / (it.end - from))];
      }),
  );
  if (baking > shift.decks)
    faults.push(fault('hands', `${shift.key}: ${baking} oven decks at once.`));
  return faults;
}

/** The most units in use at any moment of half-open stretches. */
function busiest(
  stretches: readonly (readonly [from: number, to: number, units: number])[],
): number {
  const steps = stretches
    .filter(([from, to]) => to > from)
    .flatMap(([from, to, units]): [number, number][] => [
      [from, units],
      [to, -units],
    ])
    .toSorted((a, b) => a[0] - b[0] || a[1] - b[1]);
  let now = 0;
  let most = 0;
  for (const [, change] of steps) {
    now += change;
    most = Math.max(most, now);
  }
  return most;
}

/** Work kept apart from an allergen is over before any that contains it starts in its shift. */
function checkAllergens(
  order: PlannedOrder,
  placed: readonly Placed[],
  others: readonly PlannedOrder[],
  standing: Standing,
  fault: MakeFault,
): Fault[] {
  const faults: Fault[] = [];
  const demands = new Map(others.map((it) => [it.orderId, it.demand]));
  for (const own of placed) {
    for (const other of standing.byShift.get(own.shift?.key ?? '') ?? []) {
      const theirs = demands.get(other.orderId);
      if (theirs === undefined) continue;
      const apart = order.demand.apart.some((it) => theirs.contains.includes(it));
      const wanted = theirs.apart.some((it) => order.demand.contains.includes(it));
      if (apart && own.end > other.start)
        faults.push(
          fault(
            'allergen',
            `${own.work.label} is not before work with an allergen it is kept apart from.`,
          ),
        );
      if (wanted && other.end > own.start)
        faults.push(
          fault(
            'allergen',
            `${own.work.label} is not after work kept apart from an allergen in it.`,
          ),
        );
    }
  }
  return faults;
}
