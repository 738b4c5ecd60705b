/** A failure asked for in advance, with how many more times it will happen. */
export interface PlannedFailure<Failure> {
  failure: Failure;
  times: number;
}

export interface FailureQueue<Failure> {
  /** Plans a failure for the next `times` occasions that it fits. */
  add(planned: PlannedFailure<Failure>): void;
  /** Uses up one occasion of the first planned failure that fits, or answers undefined. */
  take<Chosen extends Failure>(fits: (failure: Failure) => failure is Chosen): Chosen | undefined;
  list(): PlannedFailure<Failure>[];
  clear(): void;
}

/** Failures wait in the order they were asked for; each is forgotten once it is used up. */
export function createFailureQueue<Failure>(): FailureQueue<Failure> {
  let waiting: PlannedFailure<Failure>[] = [];

  return {
    add(planned) {
      waiting.push({ ...planned });
    },
    take(fits) {
      for (const planned of waiting) {
        const { failure } = planned;
        if (!fits(failure)) continue;
        planned.times -= 1;
        waiting = waiting.filter((other) => other.times > 0);
        return failure;
      }
      return undefined;
    },
    list() {
      return waiting.map((planned) => ({ ...planned }));
    },
    clear() {
      waiting = [];
    },
  };
}
