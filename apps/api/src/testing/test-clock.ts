import type { Clock } from '#api/platform/clock.ts';

const units = { seconds: 1000, minutes: 60_000, hours: 3_600_000, days: 86_400_000 } as const;

/** A clock that stands still until it is set. */
export class TestClock implements Clock {
  #now: Date;

  /** @param start an instant, such as `2026-05-04T12:00:00Z` */
  constructor(start: string | Date = '2026-05-04T14:00:00Z') {
    this.#now = new Date(start);
  }

  now(): Date {
    return new Date(this.#now);
  }

  set(instant: string | Date): void {
    this.#now = new Date(instant);
  }

  advance(by: Partial<Record<keyof typeof units, number>>): void {
    let time = this.#now.getTime();
    if (by.seconds) time += by.seconds * units.seconds;
    if (by.minutes) time += by.minutes * units.minutes;
    if (by.hours) time += by.hours * units.hours;
    if (by.days) time += by.days * units.days;
    this.#now = new Date(time);
  }
}
