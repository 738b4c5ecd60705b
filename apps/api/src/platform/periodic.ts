import type { Logger } from './logger.ts';

export type Running = {
  /** Resolves when the work under way is finished; nothing begins after. */
  stop(): Promise<void>;
};

export type PeriodicWork = {
  readonly name: string;
  /** Pause between the end of one round and the beginning of the next, milliseconds. */
  readonly everyMs: number;
  readonly work: () => Promise<unknown>;
};

/** Does a piece of work now and again; a failure is logged and the next round comes all the same. */
export function startPeriodic({ name, everyMs, work }: PeriodicWork, logger: Logger): Running {
  let stopping = false;
  let timer: NodeJS.Timeout | null = null;
  let wake = (): void => undefined;

  const run = async (): Promise<void> => {
    while (!stopping) {
      try {
        await work();
      } catch (error) {
        logger.error({ err: error }, `${name} failed`);
      }
      if (stopping) return;
      await new Promise<void>((resolve) => {
        wake = resolve;
        timer = setTimeout(resolve, everyMs);
      });
    }
  };
  const running = run();

  return {
    async stop() {
      stopping = true;
      if (timer !== null) clearTimeout(timer);
      wake();
      await running;
    },
  };
}
