import type { DraftRecord } from './draft-record.ts';
import type { DraftShelf } from './draft-storage.ts';

/** What a page adds to its answers when it keeps them. */
export type DraftContent = Pick<DraftRecord, 'values' | 'reached' | 'pictures' | 'attempt'>;

export type DraftStatus = {
  /** When this page's answers were last on the shelf; null if never. */
  readonly savedAt: number | null;
  /** The device would not keep them. */
  readonly refused: boolean;
  /**
   * Another page has written a newer draft, or has sent or begun anew this one (`cleared`); nothing
   * is kept here until one is chosen.
   */
  readonly other: DraftRecord | 'cleared' | null;
};

export type DraftKeeperOptions = {
  readonly shelf: DraftShelf;
  /** Tells this page's drafts from another's. */
  readonly writer: string;
  readonly now: () => number;
  readonly later: (run: () => void, ms: number) => () => void;
};

/** Typing rests this long before it is kept. */
const restMs = 400;

/**
 * Keeps one page's answers on the device, and never over a newer draft of another page: that one
 * is offered, and whichever is chosen is kept from then on.
 */
export class DraftKeeper {
  readonly #options: DraftKeeperOptions;
  readonly #listeners = new Set<() => void>();
  #status: DraftStatus;
  #waiting: DraftContent | null = null;
  #callOff: (() => void) | null = null;

  constructor(options: DraftKeeperOptions, restored: DraftRecord | null) {
    this.#options = options;
    this.#status = { savedAt: restored?.savedAt ?? null, refused: false, other: null };
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly status = (): DraftStatus => this.#status;

  /** Listens to other pages; answers how to stop. */
  readonly listen = (): (() => void) =>
    this.#options.shelf.onOtherPage((record) => {
      if (record !== null) this.#meet(record);
      else if (this.#status.savedAt !== null) this.#set({ other: 'cleared' });
    });

  /** Keeps the answers once typing rests. */
  keep(content: DraftContent): void {
    this.#waiting = content;
    this.#callOff?.();
    this.#callOff = this.#options.later(() => this.flush(), restMs);
  }

  /** Keeps at once what still waits: before the page goes away, and before sending. */
  flush(): void {
    this.#callOff?.();
    this.#callOff = null;
    if (this.#waiting === null || this.#status.other !== null) return;
    const onShelf = this.#options.shelf.read();
    if (onShelf !== null && this.#meet(onShelf)) return;
    this.#write(this.#waiting);
  }

  /** This page's answers win over the other page's draft. */
  keepMine(): void {
    this.#set({ other: null });
    if (this.#waiting !== null) this.#write(this.#waiting);
  }

  /** The other page wins; the caller shows its draft, or an empty form where it is null. */
  takeOther(): DraftRecord | null {
    const { other } = this.#status;
    this.#waiting = null;
    const taken = other === 'cleared' ? null : other;
    this.#set({ other: null, savedAt: taken?.savedAt ?? null });
    return taken;
  }

  /** Forgets the draft: the order was sent, or is begun anew. */
  clear(): void {
    this.#callOff?.();
    this.#callOff = null;
    this.#waiting = null;
    this.#options.shelf.clear();
    this.#set({ savedAt: null, other: null, refused: false });
  }

  #meet(record: DraftRecord): boolean {
    const newer = record.savedAt > (this.#status.savedAt ?? 0);
    if (record.writer === this.#options.writer || !newer) return false;
    this.#set({ other: record });
    return true;
  }

  #write(content: DraftContent): void {
    const savedAt = this.#options.now();
    const kept = this.#options.shelf.write({
      ...content,
      version: 1,
      savedAt,
      writer: this.#options.writer,
    });
    this.#waiting = null;
    this.#set(kept ? { savedAt, refused: false } : { refused: true });
  }

  #set(change: Partial<DraftStatus>): void {
    this.#status = { ...this.#status, ...change };
    for (const listener of this.#listeners) listener();
  }
}
