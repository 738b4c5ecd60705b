/** Lets so many pieces of work in at once; the rest wait their turn, up to a limit. */
export type Gate = {
  /** @throws GateFull when too many are waiting already */
  run<T>(work: () => Promise<T>): Promise<T>;
};

export class GateFull extends Error {
  override name = 'GateFull';
  constructor() {
    super('Too many are waiting at this gate.');
  }
}

export function createGate({ atOnce, waiting }: { atOnce: number; waiting: number }): Gate {
  const queue: (() => void)[] = [];
  let inside = 0;
  return {
    async run(work) {
      if (inside >= atOnce) {
        if (queue.length >= waiting) throw new GateFull();
        await new Promise<void>((enter) => queue.push(enter));
      } else {
        inside += 1;
      }
      try {
        return await work();
      } finally {
        // The place is handed on, so nobody slips in between.
        const next = queue.shift();
        if (next === undefined) inside -= 1;
        else next();
      }
    },
  };
}
