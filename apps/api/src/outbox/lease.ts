import { QueryTypes } from 'sequelize';
import { currentDatabase } from '#api/db/current-database.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Clock } from '#api/platform/clock.ts';
import { withoutAddresses } from '#api/platform/logger.ts';
import { maxAttempts, pauseAfter } from './retry-plan.ts';

/** How long a worker may take over one row before another takes it for dead, milliseconds. */
const leaseMs = 120_000;

/** Longest error kept with a row, characters. */
const errorLength = 500;

/**
 * Tables whose rows are work to be done by one worker at a time, the state that work ends well in,
 * and which rows wait for one another. They share the columns id, order_id, state, attempts,
 * next_at, leased_until, leased_by and last_error.
 */
const tables = {
  outbox: {
    well: 'done',
    wellAt: 'done_at',
    inTurn: 'earlier.order_id = due.order_id',
  },
  sent_mail: {
    well: 'sent',
    wellAt: 'sent_at',
    // An inbox of ours that is full must not hold up what the customer is to hear.
    inTurn: 'earlier.order_id = due.order_id AND earlier.to_address = due.to_address',
  },
} as const;

/** A row a worker may work on now; `attempt` counts from 1. */
export type Lease = { readonly id: number; readonly attempt: number };

/** How a failed attempt was noted; `lost` when another worker has taken the row meanwhile. */
export type Postponed = 'again-later' | 'given-up' | 'lost';

export type LeaseQueueOptions = {
  readonly table: keyof typeof tables;
  readonly clock: Clock;
  /** Tells this worker's leases from another's. */
  readonly worker: string;
  readonly random?: () => number;
};

/**
 * Hands out the due rows of a table, oldest first. Rows of one order (of mail: to one address)
 * keep their order: a row waits while an earlier one is under way or failed a moment ago, though
 * not for one that is set for later. A lease that ran out (its worker was killed) is handed out
 * again.
 */
export class LeaseQueue {
  readonly #table: keyof typeof tables;
  readonly #clock: Clock;
  readonly #worker: string;
  readonly #random: () => number;

  constructor({ table, clock, worker, random = Math.random }: LeaseQueueOptions) {
    this.#table = table;
    this.#clock = clock;
    this.#worker = worker;
    this.#random = random;
  }

  /** The next due row, now leased to this worker; null when there is none. */
  async take(): Promise<Lease | null> {
    // Looking takes no lock; only what is found is looked at again by the one writer.
    if ((await this.#nextDue()) === null) return null;
    return inTransaction(async () => {
      const due = await this.#nextDue();
      if (due === null) return null;
      const attempt = due.attempts + 1;
      await this.#change(
        `state = 'leased', attempts = :attempt, leased_until = :until, leased_by = :worker
         WHERE id = :id`,
        { id: due.id, attempt, until: this.#after(leaseMs), worker: this.#worker },
      );
      return { id: due.id, attempt };
    });
  }

  /** The work is done. False when the lease was lost meanwhile. */
  async finish(lease: Lease): Promise<boolean> {
    const { well, wellAt } = tables[this.#table];
    return this.#end(lease, `state = '${well}', ${wellAt} = :now, last_error = NULL`, {});
  }

  /** The work is not to be done, ever. False when the lease was lost meanwhile. */
  async abandon(lease: Lease, state: 'given-up' | 'dropped', reason: string): Promise<boolean> {
    return this.#end(lease, 'state = :state, last_error = :reason', {
      state,
      reason: short(reason),
    });
  }

  /** The attempt failed: once more after a growing pause, or never after too many. */
  async postpone(lease: Lease, reason: string): Promise<Postponed> {
    if (lease.attempt >= maxAttempts) {
      return (await this.abandon(lease, 'given-up', reason)) ? 'given-up' : 'lost';
    }
    const kept = await this.#end(lease, `state = 'queued', next_at = :next, last_error = :reason`, {
      next: this.#after(pauseAfter(lease.attempt, this.#random)),
      reason: short(reason),
    });
    return kept ? 'again-later' : 'lost';
  }

  async #nextDue(): Promise<{ id: number; attempts: number } | null> {
    const [due] = await currentDatabase().sequelize.query<{ id: number; attempts: number }>(
      `SELECT id, attempts FROM ${this.#table} AS due
       WHERE state IN ('queued', 'leased') AND next_at <= :now
         AND (state = 'queued' OR leased_until <= :now)
         AND NOT EXISTS (
           SELECT 1 FROM ${this.#table} AS earlier
           WHERE ${tables[this.#table].inTurn} AND earlier.id < due.id
             AND earlier.state IN ('queued', 'leased')
             AND (earlier.attempts > 0 OR earlier.next_at <= :now)
         )
       ORDER BY next_at, id LIMIT 1`,
      { type: QueryTypes.SELECT, replacements: { now: this.#clock.now() } },
    );
    return due ?? null;
  }

  async #end(
    lease: Lease,
    change: string,
    values: Record<string, string | Date>,
  ): Promise<boolean> {
    return inTransaction(async () => {
      const changed = await this.#change(
        `${change}, leased_until = NULL, leased_by = NULL
         WHERE id = :id AND state = 'leased' AND leased_by = :worker AND attempts = :attempt`,
        {
          ...values,
          id: lease.id,
          worker: this.#worker,
          attempt: lease.attempt,
          now: this.#clock.now(),
        },
      );
      return changed === 1;
    });
  }

  async #change(change: string, values: Record<string, string | number | Date>): Promise<number> {
    const { sequelize } = currentDatabase();
    const type = QueryTypes.BULKUPDATE;
    return sequelize.query(`UPDATE ${this.#table} SET ${change}`, { type, replacements: values });
  }

  #after(milliseconds: number): Date {
    return new Date(this.#clock.now().getTime() + milliseconds);
  }
}

function short(reason: string): string {
  return withoutAddresses(reason).slice(0, errorLength);
}
