import type { Demand, Work } from './model.ts';

/** One piece of work with its links both ways and how near the pickup its chain lets it come. */
export type ChainedWork = {
  readonly work: Work;
  readonly before: readonly {
    readonly key: string;
    readonly gap: number;
    readonly keeps: number | null;
  }[];
  readonly after: readonly {
    readonly key: string;
    readonly gap: number;
    readonly keeps: number | null;
  }[];
  /** Minutes that must lie between its end and the pickup, at least. */
  readonly tail: number;
};

/**
 * The work in an order in which everything comes after what follows it, nearest to the pickup
 * first.
 * @throws when the links go round in a circle or name work that is not there
 */
export function chainBackwards(demand: Demand): ChainedWork[] {
  const works = new Map(demand.work.map((work) => [work.key, work]));
  const tails = new Map<string, number>();
  const tailOf = (key: string, path: readonly string[]): number => {
    const known = tails.get(key);
    if (known !== undefined) return known;
    if (path.includes(key)) throw new Error(`Work goes round in a circle at ${key}.`);
    let tail = 0;
    for (const link of demand.links) {
      if (link.before !== key) continue;
      const after = works.get(link.after);
      if (after === undefined)
        throw new Error(`A link names work that is not there: ${link.after}`);
      tail = Math.max(tail, link.gap + after.minutes + tailOf(after.key, [...path, key]));
    }
    tails.set(key, tail);
    return tail;
  };
  return demand.work
    .map((work) => ({
      work,
      before: demand.links
        .filter((it) => it.after === work.key)
        .map(({ before, gap, keeps }) => ({ key: before, gap, keeps })),
      after: demand.links
        .filter((it) => it.before === work.key)
        .map(({ after, gap, keeps }) => ({ key: after, gap, keeps })),
      tail: tailOf(work.key, []),
    }))
    .toSorted(
      (a, b) =>
        a.tail - b.tail || b.work.minutes - a.work.minutes || (a.work.key < b.work.key ? -1 : 1),
    );
}
