import type { Book } from './book.ts';
import type { ChainedWork } from './chain.ts';
import { chainBackwards } from './chain.ts';
import { addDays } from './local-time.ts';
import type { LocalDate, UtcMinute } from './local-time.ts';
import type { Demand, PickupTime, Place, Placement, Work } from './model.ts';
import { coldStartsWith } from './model.ts';

/** Work in the order the planner places it; worked out once per design. */
export type ReadyDemand = { readonly demand: Demand; readonly chain: readonly ChainedWork[] };

/** @throws when the demand's links make no order */
export function readyDemand(demand: Demand): ReadyDemand {
  return { demand, chain: chainBackwards(demand) };
}

type Progress = {
  readonly placed: Map<string, { readonly startAt: UtcMinute; readonly endAt: UtcMinute }>;
  /** In the order they were placed. */
  readonly done: [Work, Place][];
  readonly ownBench: Map<string, number>;
  coldFrom: LocalDate | null;
};

/**
 * The simple planner. Keeps every standing order where it is and gives the new one's work the
 * latest free places: nearest to the pickup first, each piece as late as what follows it, the
 * free minutes and hands of the shifts, its shelf life and the cold allow. The book is left as it
 * was. A refusal with `no-place` is this planner's own: another plan may exist.
 */
export function placeWork(
  book: Book,
  { demand, chain }: ReadyDemand,
  pickup: PickupTime,
  orderId: string,
): Placement {
  if (!book.hasHandover(pickup)) return { found: false, refusal: { kind: 'window-full' } };
  const refusal = book.refusesDay(pickup.date, demand.occasionId);
  if (refusal !== null) return { found: false, refusal };
  const coldSince = book.coldSince(demand.boxes, pickup.date, firstFillDay(book, demand, pickup));
  const progress: Progress = { placed: new Map(), done: [], ownBench: new Map(), coldFrom: null };
  const stuck = chain.find(
    (piece) => !placePiece(book, demand, piece, pickup, coldSince, progress),
  );
  for (const [work, place] of progress.done.toReversed()) book.takeBackWork(demand, work, place);
  if (stuck !== undefined) return { found: false, refusal: { kind: 'no-place', work: stuck.work } };
  const places = progress.done.map(([, place]) => place);
  return {
    found: true,
    order: { orderId, demand, pickup, places, coldFrom: progress.coldFrom, coldUntil: pickup.date },
  };
}

/** No fill can be on a day before this one, by how long a finished cake keeps. */
function firstFillDay(book: Book, { work }: Demand, pickup: PickupTime): LocalDate {
  const { today } = book.supply;
  let reach = 0;
  for (const { kind, within } of work) {
    if (kind !== coldStartsWith) continue;
    if (within === null) return today;
    reach = Math.max(reach, within);
  }
  const first = addDays(pickup.date, -Math.ceil(reach / (24 * 60)) - 1);
  return first < today ? today : first;
}

function placePiece(
  book: Book,
  demand: Demand,
  piece: ChainedWork,
  pickup: PickupTime,
  coldSince: LocalDate,
  progress: Progress,
): boolean {
  const { work } = piece;
  const { earliest, latest } = boundsOf(piece, pickup, book.supply.now, progress);
  for (let index = book.lastShiftBefore(latest); index >= 0; index -= 1) {
    const shift = book.shiftAt(index);
    if (shift === undefined || shift.endAt <= earliest) return false;
    if (work.kind === coldStartsWith && shift.date < coldSince) return false;
    const own = progress.ownBench.get(shift.key) ?? 0;
    const startAt = book.latestStart(index, work, demand, earliest, latest, own);
    if (startAt === null) continue;
    const place = { key: work.key, shiftKey: shift.key, startAt };
    book.putWork(demand, work, place);
    progress.done.push([work, place]);
    progress.placed.set(work.key, { startAt, endAt: startAt + work.minutes });
    progress.ownBench.set(shift.key, own + work.benchMinutes);
    if (
      work.kind === coldStartsWith &&
      (progress.coldFrom === null || shift.date < progress.coldFrom)
    ) {
      progress.coldFrom = shift.date;
    }
    return true;
  }
  return false;
}

/** The first and last minute a piece may start, given what follows it. */
function boundsOf(
  { work, after }: ChainedWork,
  pickup: PickupTime,
  now: UtcMinute,
  progress: Progress,
): { readonly earliest: UtcMinute; readonly latest: UtcMinute } {
  let earliest = work.within === null ? now : Math.max(now, pickup.endAt - work.within);
  let latest = pickup.startAt - work.minutes;
  for (const link of after) {
    const next = progress.placed.get(link.key);
    if (next === undefined) continue;
    latest = Math.min(latest, next.startAt - link.gap - work.minutes);
    if (link.keeps !== null)
      earliest = Math.max(earliest, next.startAt - link.keeps - work.minutes);
  }
  return { earliest, latest };
}
