import type { DemoClock } from './demo-clock.ts';

type Step = { readonly at: Date; readonly work: () => Promise<void> };

/** Things that happened, in the order of their instants; each may add later ones. */
export class Timeline {
  readonly #clock: DemoClock;
  readonly #until: Date;
  #steps: Step[] = [];

  /** What would happen after `until` has not happened yet. */
  constructor(clock: DemoClock, until: Date) {
    this.#clock = clock;
    this.#until = until;
  }

  add(at: Date, work: () => Promise<void>): void {
    this.#steps.push({ at, work });
  }

  async run(): Promise<void> {
    for (;;) {
      const [next, ...rest] = this.#steps.toSorted((a, b) => a.at.getTime() - b.at.getTime());
      if (next === undefined || next.at > this.#until) return;
      this.#steps = rest;
      this.#clock.set(next.at);
      await next.work();
    }
  }
}
