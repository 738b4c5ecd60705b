import type { Deps } from '#api/modules/deps.ts';
import { tidySignIn } from '#api/modules/sessions/tidy-sign-in.command.ts';
import { beatMs, noteBeat } from '#api/outbox/beat.ts';
import { type PeriodicWork, type Running, startPeriodic } from '#api/platform/periodic.ts';

const minuteMs = 60_000;

/** What comes round by the clock, beside the work that rows ask for. */
function rounds(deps: Deps, name: string): readonly PeriodicWork[] {
  return [
    { name: 'beat', everyMs: beatMs, work: () => noteBeat(name, deps.clock) },
    { name: 'tidy-sign-in', everyMs: 60 * minuteMs, work: () => tidySignIn(deps) },
  ];
}

/** Starts the work that nobody waits for. */
export async function start(deps: Deps): Promise<Running> {
  const name = `worker-${process.pid}`;
  // Shown once before anybody asks whether the program is ready.
  await noteBeat(name, deps.clock);
  const running = rounds(deps, name).map((round) => startPeriodic(round, deps.logger));
  return {
    async stop() {
      await Promise.all(running.map((each) => each.stop()));
    },
  };
}
