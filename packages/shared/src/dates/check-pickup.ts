import { addDays, datesInRange, weekdayOf } from './local-time.ts';
import type { LocalDate } from './local-time.ts';
import type { ColdPlace, PlannedOrder, Supply } from './model.ts';
import type { Fault, MakeFault, Placed } from './plan-fault.ts';

/** The checker's part that looks at days: nights in the cold, and the handover. */

/** From its fill and crumb coat to its pickup a cake has its places in the cold. */
export function checkCold(
  supply: Supply,
  order: PlannedOrder,
  placed: readonly Placed[],
  others: readonly PlannedOrder[],
  fault: MakeFault,
): Fault[] {
  const fills = placed
    .filter((it) => it.work.kind === 'fill-and-crumb-coat')
    .flatMap((it) => it.shift?.date ?? []);
  const first = fills.toSorted()[0];
  if (first !== undefined && (order.coldFrom === null || order.coldFrom > first)) {
    return [fault('cold', 'The cake is filled before it has its place in the cold.')];
  }
  if (order.coldUntil < order.pickup.date) {
    return [fault('cold', 'The cake leaves the cold before its pickup.')];
  }
  if (supply.cold === null || order.coldFrom === null) return [];
  const { cold } = supply;
  const from = order.coldFrom < supply.today ? supply.today : order.coldFrom;
  return datesInRange(from, addDays(order.pickup.date, -1)).flatMap((night) => {
    const boxes = [order, ...others]
      .filter((it) => it.coldFrom !== null && it.coldFrom <= night && night < it.coldUntil)
      .flatMap((it) => it.demand.boxes);
    return haveRoom(cold, boxes)
      ? []
      : [fault('cold', `No room in the cold in the night of ${night}.`)];
  });
}

type ColdBox = PlannedOrder['demand']['boxes'][number];

/** Hall's condition: every set of kinds of places must be enough for the boxes that need it. */
function haveRoom(cold: readonly ColdPlace[], boxes: readonly ColdBox[]): boolean {
  const wants = boxes.map((box) =>
    cold.reduce((mask, place, n) => {
      const upright = box.widthMm <= place.widthMm && box.depthMm <= place.depthMm;
      const turned = box.depthMm <= place.widthMm && box.widthMm <= place.depthMm;
      return box.heightMm <= place.heightMm && (upright || turned) ? mask | (1 << n) : mask;
    }, 0),
  );
  for (let set = 0; set < 1 << cold.length; set += 1) {
    const places = cold.reduce((sum, place, n) => sum + ((set >> n) & 1) * place.places, 0);
    if (wants.filter((mask) => (mask & ~set) === 0).length > places) return false;
  }
  return true;
}

/** The pickup lies in a window that takes it, with the notice, caps and places the studio keeps. */
export function checkPickup(
  supply: Supply,
  order: PlannedOrder,
  others: readonly PlannedOrder[],
  fault: MakeFault,
): Fault[] {
  const { pickup, demand } = order;
  const faults: Fault[] = [];
  const windows = supply.windows.get(pickup.date) ?? [];
  const window = windows.find((it) => it.startMinute === pickup.startMinute);
  const sameDay = others.filter((it) => it.pickup.date === pickup.date);
  if (window === undefined) {
    faults.push(fault('closed', `No pickup window on ${pickup.date} at ${pickup.startMinute}.`));
  } else {
    if (window.startAt !== pickup.startAt || window.endAt !== pickup.endAt) {
      faults.push(fault('window', 'The pickup is not when its window is.'));
    }
    const taken = sameDay.filter((it) => it.pickup.startMinute === pickup.startMinute).length;
    if (taken + 1 > window.handovers)
      faults.push(fault('window', `${taken + 1} handovers where there are ${window.handovers}.`));
  }
  for (const cap of supply.caps) {
    const counts = (it: PlannedOrder) =>
      cap.occasionId === null || it.demand.occasionId === cap.occasionId;
    if (!counts(order)) continue;
    if (cap.weekday !== null && cap.weekday !== weekdayOf(pickup.date)) continue;
    if (cap.date !== null && cap.date !== pickup.date) continue;
    if (sameDay.filter(counts).length + 1 > cap.maxOrders) {
      faults.push(fault('cap', `More than ${cap.maxOrders} orders on ${pickup.date}.`));
    }
  }
  const handovers = windows.reduce((sum, it) => sum + it.handovers, 0);
  if (supply.keptBack > 0 && sameDay.length + 1 > handovers - supply.keptBack) {
    faults.push(fault('kept-back', 'Only the handovers kept back for regulars are left.'));
  }
  if (pickup.date > supply.bookOpenUntil)
    faults.push(fault('book-not-open', 'The book is not open that far ahead.'));
  if (pickup.date < earliestDay(supply, demand.noticeDays))
    faults.push(fault('notice', 'That is less notice than it needs.'));
  return faults;
}

function earliestDay(supply: Supply, noticeDays: number): LocalDate {
  return addDays(supply.today, noticeDays);
}
