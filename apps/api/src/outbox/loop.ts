import type { Logger } from '#api/platform/logger.ts';
import type { Signal } from './signal.ts';

export type Loop = {
  start(): void;
  /** Ends after the piece of work under way. */
  stop(): Promise<void>;
};

export type LoopOptions = {
  readonly name: string;
  /** Does one piece of work; false when there was none. */
  readonly next: () => Promise<boolean>;
  /** Says in this process that there is work. */
  readonly signal: Signal;
  readonly logger: Logger;
  /** How often to look for work that another process left, milliseconds. */
  readonly pollMs?: number;
};

/** Does pieces of work one after the other while there are any, then waits for more. */
export function createLoop({ name, next, signal, logger, pollMs = 1000 }: LoopOptions): Loop {
  let stopping = false;
  let called = false;
  let wake: (() => void) | null = null;
  let running: Promise<void> | null = null;
  let unsubscribe: () => void = () => undefined;

  const call = (): void => {
    called = true;
    wake?.();
  };

  const rest = (): Promise<void> =>
    new Promise((resolve) => {
      if (called || stopping) return resolve();
      const timer = setTimeout(done, pollMs);
      function done(): void {
        clearTimeout(timer);
        wake = null;
        resolve();
      }
      wake = done;
    });

  const run = async (): Promise<void> => {
    while (!stopping) {
      called = false;
      try {
        while (!stopping && (await next()));
      } catch (error) {
        logger.error({ err: error }, `${name}: looking for work failed`);
      }
      await rest();
    }
  };

  return {
    start() {
      if (running !== null) throw new Error(`${name} runs already.`);
      stopping = false;
      unsubscribe = signal.subscribe(call);
      running = run();
    },
    async stop() {
      stopping = true;
      unsubscribe();
      wake?.();
      await running;
      running = null;
    },
  };
}
