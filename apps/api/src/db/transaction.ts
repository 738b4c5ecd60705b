import { AsyncLocalStorage } from 'node:async_hooks';
import { currentDatabase } from './current-database.ts';

/** A write was issued outside `inTransaction`. */
export class StrayWriteError extends Error {
  override name = 'StrayWriteError';
  constructor() {
    super('A write escaped its transaction: wrap it in inTransaction, and await all of it.');
  }
}

interface Scope {
  /** What Sequelize keeps for us: the transaction under way. */
  readonly kept: Map<string, unknown>;
  readonly afterCommit: (() => void)[];
  /** Between BEGIN and COMMIT. */
  open: boolean;
  /** A nested piece of work failed: whatever happens to its error, nothing is committed. */
  failed: { error: unknown } | null;
}

const scopes = new AsyncLocalStorage<Scope>();

/** The namespace Sequelize finds the running transaction in, so that no query can forget it. */
export const transactionNamespace = {
  bind: <T>(work: T): T => work,
  run(work: (context: object) => void): void {
    const scope = scopes.getStore();
    if (!scope?.open || scope.kept.get('transaction')) {
      throw new Error('Only inTransaction opens transactions.');
    }
    work(scope);
  },
  get(name: string): unknown {
    const scope = scopes.getStore();
    return scope?.open ? (scope.kept.get(name) ?? undefined) : undefined;
  },
  set(name: string, value: unknown): void {
    scopes.getStore()?.kept.set(name, value);
  },
};

/** The last writer in the queue: one at a time in this process, in the order they came. */
let lastWriter: Promise<unknown> = Promise.resolve();

/**
 * Runs work in one transaction (BEGIN IMMEDIATE): all of it is written, or none. The only caller
 * of `sequelize.transaction`. Inside another transaction it joins that one, and if it fails there
 * the whole fails. Nothing on the network belongs inside.
 */
export async function inTransaction<T>(work: () => Promise<T>): Promise<T> {
  const outer = scopes.getStore();
  if (outer?.open) return join(outer, work);
  const turn = lastWriter.then(() => begin(work));
  lastWriter = turn.catch(() => undefined);
  return turn;
}

async function join<T>(scope: Scope, work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    scope.failed ??= { error };
    throw error;
  }
}

async function begin<T>(work: () => Promise<T>): Promise<T> {
  const { sequelize, logger } = currentDatabase();
  const scope: Scope = { kept: new Map(), afterCommit: [], open: true, failed: null };
  const result = await scopes.run(scope, async () => {
    try {
      return await sequelize.transaction(async () => {
        const done = await work();
        if (scope.failed) throw scope.failed.error;
        return done;
      });
    } finally {
      scope.open = false;
    }
  });
  for (const wake of scope.afterCommit) {
    try {
      scopes.exit(wake);
    } catch (error) {
      logger.error({ err: error }, 'work after a commit failed');
    }
  }
  return result;
}

/** Whether a transaction is under way here. */
export function isInTransaction(): boolean {
  return scopes.getStore()?.open ?? false;
}

/**
 * Does something in this process once the running transaction is committed, such as waking the
 * dispatcher. Not for side effects that must happen: those are outbox rows.
 * @throws outside a transaction
 */
export function afterCommit(wake: () => void): void {
  const scope = scopes.getStore();
  if (!scope?.open) throw new Error('afterCommit needs a transaction under way.');
  scope.afterCommit.push(wake);
}

/** Resolves when every writer now in the queue has finished. */
export async function writersDone(): Promise<void> {
  await lastWriter;
}
