import { OutboxRow } from '#api/db/models/outbox-row.ts';
import type { Clock } from '#api/platform/clock.ts';
import type { Logger } from '#api/platform/logger.ts';
import type { EventHandlers, EventKind, HandlerContext } from './events.ts';
import { isEventKind, readPayload } from './events.ts';
import { LeaseQueue } from './lease.ts';
import type { Lease } from './lease.ts';
import { createLoop } from './loop.ts';
import type { Loop } from './loop.ts';
import { maxAttempts } from './retry-plan.ts';
import { outboxSignal } from './signal.ts';

export type Dispatcher = Loop & {
  /** Carries out every row that is due now and answers how many were tried. For tests. */
  runOnce(): Promise<number>;
};

export type DispatcherOptions = {
  /** All of them in the program; a test may give the few it is about. */
  readonly handlers: Partial<EventHandlers>;
  readonly clock: Clock;
  readonly logger: Logger;
  /** Tells this process from other workers on the same file. */
  readonly worker: string;
  readonly random?: () => number;
};

/**
 * Carries out outbox rows, each at least once: a crash between a handler's work and our note of it
 * repeats the handler, which is idempotent. A row that fails is tried again after growing pauses
 * for about two days and then stays as `given-up`, with its last error, where staff can see it.
 */
export function createDispatcher({
  handlers,
  clock,
  logger,
  worker,
  random,
}: DispatcherOptions): Dispatcher {
  const queue = new LeaseQueue({ table: 'outbox', clock, worker, random });

  const next = async (): Promise<boolean> => {
    const lease = await queue.take();
    if (lease === null) return false;
    const row = await OutboxRow.findByPk(lease.id, { rejectOnEmpty: true });
    const about = { outboxId: row.id, kind: row.kind, attempt: lease.attempt };
    const failure = await attempt(handlers, row, lease);
    if (failure === null) {
      if (!(await queue.finish(lease))) logger.warn(about, 'an outbox row took too long');
      return true;
    }
    const outcome = await queue.postpone(lease, failure.message);
    const level = outcome === 'given-up' ? 'error' : 'warn';
    logger[level]({ ...about, outcome, err: failure }, 'an outbox row failed');
    return true;
  };

  return {
    ...createLoop({ name: 'outbox', next, signal: outboxSignal, logger }),
    async runOnce() {
      let tried = 0;
      while (await next()) tried += 1;
      return tried;
    },
  };
}

async function attempt(
  handlers: Partial<EventHandlers>,
  row: OutboxRow,
  lease: Lease,
): Promise<Error | null> {
  try {
    if (lease.attempt > maxAttempts) throw new Error('Its worker ended during every attempt.');
    if (!isEventKind(row.kind)) throw new Error(`Nothing here handles ${row.kind}.`);
    await handle(handlers, row.kind, row.payload, {
      outboxId: row.id,
      uniqueKey: row.uniqueKey,
    });
    return null;
  } catch (error) {
    return error instanceof Error ? error : new Error(String(error));
  }
}

async function handle<K extends EventKind>(
  handlers: Partial<EventHandlers>,
  kind: K,
  payload: unknown,
  context: HandlerContext,
): Promise<void> {
  const handler = handlers[kind];
  if (!handler) throw new Error(`Nothing here handles ${kind}.`);
  await handler(readPayload(kind, payload), context);
}
