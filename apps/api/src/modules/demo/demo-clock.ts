import type { Clock } from '#api/platform/clock.ts';

/** A clock that is set to when the demo's orders were sent and worked on. */
export class DemoClock implements Clock {
  #now: Date;

  constructor(now: Date) {
    this.#now = now;
  }

  now(): Date {
    return new Date(this.#now);
  }

  set(now: Date): void {
    this.#now = now;
  }
}
