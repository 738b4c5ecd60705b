import type { CalendarLane, PlannedTask } from '#shared/contracts/staff.ts';
import { groupBy } from '#shared/group-by.ts';
import { type WorkSort, sortOf, taskWords } from '#web/components/order/task-glyph.tsx';
import { type TimeScale, reachOf, xOf } from './time-scale.ts';

export type Bead = {
  readonly key: string;
  readonly x: number;
  readonly sort: WorkSort;
  /** What the bead stands for: work of one sort that lies close together is one bead. */
  readonly tasks: readonly PlannedTask[];
  readonly label: string;
  /** Where the label fits; null when there is no room and only a look at the bead tells. */
  readonly side: 'above' | 'below' | null;
};

export type BeadString = {
  readonly beads: readonly Bead[];
  /** The thread, from the first bead (or the left edge) to the pickup (or the right edge). */
  readonly from: number;
  readonly to: number;
  /** Middle of the pickup's box; null when it lies outside these days. */
  readonly pickup: number | null;
  readonly comesFromBefore: boolean;
  readonly goesOn: boolean;
};

/** Half of the pickup's box, and the widest room a bead takes, pixels. */
export const pickupHalf = 29;
const beadRoom = 17;
const boxRoom = pickupHalf + 11;
/** How much of its day work may take up before the pickup, however early that is. */
const lastDayShare = 0.72;
const labelGap = 5;
/** Between the name of a pickup beyond these days and the right edge, pixels. */
export const endInset = 12;

type Draft = Omit<Bead, 'label' | 'side'>;

/**
 * Strings a cake's work along its days. Beads stay in the order of their work, within their own
 * day, and never cover one another; labels alternate above and below and never overlap. `measure`
 * gives a label's width in pixels; `beyond` is what names a pickup after these days, below at the
 * right edge.
 */
export function stringBeads(
  lane: Pick<CalendarLane, 'tasks' | 'pickup'>,
  scale: TimeScale,
  measure: (label: string) => number,
  beyond = '',
): BeadString {
  // The pickup's box is the handover's bead.
  const work = lane.tasks
    .filter((it) => it.kind !== 'handover')
    .toSorted((a, b) => (a.startAt < b.startAt ? -1 : a.startAt > b.startAt ? 1 : 0));
  const at = xOf(scale, lane.pickup.date, lane.pickup.start);
  const shown = work.filter((it) => {
    const x = xOf(scale, it.date, it.start);
    return x >= 0 && x <= scale.width;
  });
  const drafts = [...groupBy(shown, (it) => it.date)].flatMap(([date, tasks]) => {
    const [left, right] = reachOf(scale, date);
    // Work before the pickup leaves it room, but is not pressed into nothing for its sake.
    const before = Math.max(at - boxRoom, left + (right - left) * lastDayShare);
    return layOut(tasks, scale, left, date === lane.pickup.date ? Math.min(right, before) : right);
  });
  const last = drafts.findLast((it) => it.tasks.some((t) => t.date <= lane.pickup.date));
  const pickup =
    at >= 0 && at <= scale.width
      ? keepInside(Math.max(at, (last?.x ?? -boxRoom) + boxRoom), pickupHalf, scale.width)
      : null;
  const goesOn = at > scale.width;
  const below = goesOn && beyond !== '' ? scale.width - endInset - measure(beyond) : scale.width;
  const beads = placeLabels(drafts, { above: scale.width, below }, measure);
  const first = work[0];
  const comesFromBefore = first !== undefined && xOf(scale, first.date, first.start) < 0;
  return {
    beads,
    from: comesFromBefore ? 0 : (beads[0]?.x ?? pickup ?? 0),
    to: goesOn ? scale.width : (pickup ?? beads.at(-1)?.x ?? 0),
    pickup,
    comesFromBefore,
    goesOn,
  };
}

function keepInside(x: number, half: number, width: number): number {
  return Math.max(half, Math.min(width - half, x));
}

/** One day's beads between two edges: close ones of a sort become one, the rest move apart. */
function layOut(
  tasks: readonly PlannedTask[],
  scale: TimeScale,
  left: number,
  right: number,
): Draft[] {
  const room = Math.max(1, Math.floor((right - left) / beadRoom) + 1);
  let beads: Draft[] = [];
  for (const task of tasks) {
    const x = Math.min(right, xOf(scale, task.date, task.start));
    const last = beads.at(-1);
    if (last !== undefined && last.sort === sortOf[task.kind] && x - last.x < beadRoom) {
      beads[beads.length - 1] = { ...last, tasks: [...last.tasks, task] };
    } else {
      beads.push({ key: task.id, x, sort: sortOf[task.kind], tasks: [task] });
    }
  }
  while (beads.length > room) {
    const merged = mergeNearest(beads);
    if (merged.length === beads.length) break;
    beads = merged;
  }
  const gap = beads.length > 1 ? Math.min(beadRoom, (right - left) / (beads.length - 1)) : 0;
  return spread(beads, left, right, gap);
}

/** Joins the two neighbours of one sort that lie nearest each other, if there are any. */
function mergeNearest(beads: readonly Draft[]): Draft[] {
  let nearest: number | null = null;
  let distance = Infinity;
  for (let n = 1; n < beads.length; n += 1) {
    const [a, b] = [beads[n - 1], beads[n]];
    if (a && b && a.sort === b.sort && b.x - a.x < distance) {
      nearest = n;
      distance = b.x - a.x;
    }
  }
  if (nearest === null) return [...beads];
  const at = nearest;
  return beads.flatMap((bead, n) => {
    if (n === at) return [];
    const next = beads[at];
    return n === at - 1 && next ? [{ ...bead, tasks: [...bead.tasks, ...next.tasks] }] : [bead];
  });
}

/** Moves beads just as far as needed to lie `gap` apart between the edges. */
function spread(beads: readonly Draft[], left: number, right: number, gap: number): Draft[] {
  const xs: number[] = [];
  for (const bead of beads) {
    const last = xs.at(-1);
    xs.push(Math.max(bead.x, last === undefined ? left : last + gap));
  }
  let limit = right;
  for (let n = xs.length - 1; n >= 0; n -= 1) {
    xs[n] = Math.min(xs[n] ?? limit, limit);
    limit = (xs[n] ?? limit) - gap;
  }
  return beads.map((bead, n) => ({ ...bead, x: xs[n] ?? bead.x }));
}

function labelOf(tasks: readonly PlannedTask[]): string {
  const words = [...new Set(tasks.map((it) => taskWords[it.kind]))];
  return words.join(', ');
}

/** Alternates the labels' sides, moves on to the other side where one is taken, else leaves it out. */
function placeLabels(
  drafts: readonly Draft[],
  ends: Readonly<Record<'above' | 'below', number>>,
  measure: (label: string) => number,
): Bead[] {
  const taken = { above: -Infinity, below: -Infinity };
  let next: 'above' | 'below' = 'above';
  return drafts.map((draft) => {
    const label = labelOf(draft.tasks);
    const half = measure(label) / 2;
    const fits = (side: 'above' | 'below') =>
      draft.x - half >= taken[side] + labelGap &&
      draft.x - half >= 0 &&
      draft.x + half <= ends[side];
    const other = next === 'above' ? 'below' : 'above';
    const side = fits(next) ? next : fits(other) ? other : null;
    if (side !== null) {
      taken[side] = draft.x + half;
      next = side === 'above' ? 'below' : 'above';
    }
    return { ...draft, label, side };
  });
}
