import { createSmtpClient } from '#api/clients/smtp.ts';
import type { Deps } from '#api/modules/deps.ts';
import { createMailHandlers } from '#api/modules/mail/mail-handlers.ts';
import { createMailSender } from '#api/modules/mail/mail-sender.ts';
import { askForWarmth } from '#api/modules/orders/ask-for-warmth.command.ts';
import { removeStalePhotos } from '#api/modules/photos/remove-stale-photos.command.ts';
import { expireHolds } from '#api/modules/plan/expire-holds.command.ts';
import { removeExpired } from '#api/modules/sessions/remove-expired.command.ts';
import { beatMs, noteBeat } from '#api/outbox/beat.ts';
import { createDispatcher } from '#api/outbox/dispatcher.ts';
import type { Loop } from '#api/outbox/loop.ts';
import { newId } from '#api/platform/ids.ts';
import { type PeriodicWork, type Running, startPeriodic } from '#api/platform/periodic.ts';

const minuteMs = 60_000;
/** One row, whichever process goes round. */
const beatName = 'worker';

/** What comes round by the clock. */
function rounds(deps: Deps): readonly PeriodicWork[] {
  const { clock } = deps;
  return [
    { name: 'beat', everyMs: beatMs, work: () => noteBeat(beatName, clock) },
    { name: 'expire-holds', everyMs: minuteMs, work: () => expireHolds(clock.now()) },
    { name: 'ask-for-warmth', everyMs: 15 * minuteMs, work: () => askForWarmth(clock.now()) },
    { name: 'remove-stale-photos', everyMs: 60 * minuteMs, work: () => removeStalePhotos(deps) },
    { name: 'remove-expired', everyMs: 60 * minuteMs, work: () => removeExpired(deps) },
  ];
}

/** Starts the work that nobody waits for: side effects, mail, and what comes round by the clock. */
export async function start(deps: Deps): Promise<Running> {
  const { clock, logger, env } = deps;
  const worker = newId();
  const loops: readonly Loop[] = [
    createDispatcher({ handlers: createMailHandlers(deps), clock, logger, worker }),
    createMailSender({ smtp: createSmtpClient(env.smtp), clock, logger, worker }),
  ];
  // Shown once before anybody asks whether the program is ready.
  await noteBeat(beatName, clock);
  for (const loop of loops) loop.start();
  const periodic = rounds(deps).map((round) => startPeriodic(round, logger));
  return {
    async stop() {
      await Promise.all([...periodic, ...loops].map((each) => each.stop()));
    },
  };
}
