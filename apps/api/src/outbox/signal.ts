/** Tells loops in this process that there is work; other processes find it by looking. */
export type Signal = {
  notify(): void;
  /** @returns a function that ends the subscription */
  subscribe(listener: () => void): () => void;
};

export function createSignal(): Signal {
  const listeners = new Set<() => void>();
  return {
    notify() {
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

/** An outbox row has been committed. */
export const outboxSignal = createSignal();

/** A rendered mail has been committed. */
export const mailSignal = createSignal();
