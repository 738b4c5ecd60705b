import { currentClock } from '#api/db/current-database.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { afterCommit, isInTransaction } from '#api/db/transaction.ts';
import type { EventKind, EventPayloads } from './events.ts';
import { readPayload } from './events.ts';
import { outboxSignal } from './signal.ts';

export type EnqueueOptions = {
  /** Names this one happening: enqueued again under the same key, nothing is added. */
  readonly uniqueKey: string;
  /** Rows of one order are carried out in turn. */
  readonly orderId?: string;
  /** Not carried out before this instant. */
  readonly notBefore?: Date;
};

/**
 * Writes down a side effect in the transaction that causes it; the dispatcher carries it out once
 * that is committed. The row is the queue.
 * @returns false when the key was there already
 * @throws outside `inTransaction`
 */
export async function enqueue<K extends EventKind>(
  kind: K,
  payload: EventPayloads[K],
  { uniqueKey, orderId, notBefore }: EnqueueOptions,
): Promise<boolean> {
  if (!isInTransaction()) throw new Error('enqueue belongs in the transaction of its cause.');
  if (await OutboxRow.findOne({ where: { uniqueKey } })) return false;
  await OutboxRow.create({
    kind,
    payload: readPayload(kind, payload),
    uniqueKey,
    orderId,
    nextAt: notBefore ?? currentClock().now(),
  });
  afterCommit(() => outboxSignal.notify());
  return true;
}
