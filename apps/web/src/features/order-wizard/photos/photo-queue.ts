import type { UploadedPhoto } from '#shared/contracts/photos.ts';
import { describeFailure } from '#web/lib/describe-failure.ts';
import { ApiProblem, NetworkProblem } from '#web/lib/http.ts';

/** A photo on its way. Once it has arrived it leaves the queue and is an answer of the form. */
export type QueuedPhoto = {
  readonly key: number;
  readonly name: string;
  readonly file: Blob;
  readonly state: 'waiting' | 'sending' | 'lost' | 'refused';
  /** How much has left the device, 0 to 1. */
  readonly share: number;
  /** Times the connection was lost so far. */
  readonly losses: number;
  /** Why it was refused, in words; empty otherwise. */
  readonly message: string;
};

export type PhotoQueueOptions = {
  readonly upload: (
    file: Blob,
    name: string,
    options: { onProgress: (share: number) => void; signal: AbortSignal },
  ) => Promise<UploadedPhoto>;
  /** Runs something later; answers how to call it off. */
  readonly later: (run: () => void, ms: number) => () => void;
};

/** Told of every photo that has arrived. */
export type OnArrived = (photo: UploadedPhoto, from: QueuedPhoto) => void;

/** Pauses before trying again by itself; after the last, every time that long. */
export const retryPausesMs = [2_000, 5_000, 15_000, 30_000] as const;

/** What the server may well take at another time. */
const passing = new Set(['unavailable', 'too-many-requests', 'internal']);

/**
 * Sends photos one after another. A lost connection is waited out with growing pauses, and tried
 * at once when the device says it is back or the customer presses; a refusal is for the customer.
 */
export class PhotoQueue {
  readonly #options: PhotoQueueOptions;
  readonly #listeners = new Set<() => void>();
  readonly #arrivals = new Set<OnArrived>();
  #photos: readonly QueuedPhoto[] = [];
  #nextKey = 1;
  #running: { readonly key: number; readonly abort: AbortController } | null = null;
  #callOff: (() => void) | null = null;

  constructor(options: PhotoQueueOptions) {
    this.#options = options;
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  /** Told of arrivals; answers how to stop listening. */
  readonly onArrival = (listener: OnArrived): (() => void) => {
    this.#arrivals.add(listener);
    return () => this.#arrivals.delete(listener);
  };

  readonly snapshot = (): readonly QueuedPhoto[] => this.#photos;

  add(files: readonly { readonly file: Blob; readonly name: string }[]): void {
    const added = files.map(({ file, name }) => {
      const key = this.#nextKey;
      this.#nextKey += 1;
      return { key, name, file, state: 'waiting', share: 0, losses: 0, message: '' } as const;
    });
    this.#set([...this.#photos, ...added]);
    this.#pump();
  }

  /** Takes a photo out, stopping it if it is on its way. */
  remove(key: number): void {
    if (this.#running?.key === key) this.#running.abort.abort();
    this.#set(this.#photos.filter((it) => it.key !== key));
    this.#pump();
  }

  /** Everything that was lost is tried again now; with a key, that one alone, refused or not. */
  retry(key?: number): void {
    this.#callOff?.();
    this.#callOff = null;
    this.#set(
      this.#photos.map((it) =>
        (key === undefined ? it.state === 'lost' : it.key === key && it.state !== 'sending')
          ? { ...it, state: 'waiting', share: 0, message: '' }
          : it,
      ),
    );
    this.#pump();
  }

  /** Stops everything and forgets it. */
  clear(): void {
    this.#callOff?.();
    this.#callOff = null;
    this.#running?.abort.abort();
    this.#set([]);
  }

  #set(photos: readonly QueuedPhoto[]): void {
    this.#photos = photos;
    for (const listener of this.#listeners) listener();
  }

  #change(key: number, change: Partial<QueuedPhoto>): void {
    this.#set(this.#photos.map((it) => (it.key === key ? { ...it, ...change } : it)));
  }

  #pump(): void {
    const next = this.#photos.find((it) => it.state === 'waiting');
    if (this.#running !== null || next === undefined) return;
    void this.#send(next);
  }

  async #send(photo: QueuedPhoto): Promise<void> {
    const { key } = photo;
    const abort = new AbortController();
    this.#running = { key, abort };
    this.#change(key, { state: 'sending', share: 0 });
    try {
      const arrived = await this.#options.upload(photo.file, photo.name, {
        signal: abort.signal,
        onProgress: (share) => this.#change(key, { share }),
      });
      if (!abort.signal.aborted) {
        this.#set(this.#photos.filter((it) => it.key !== key));
        for (const told of this.#arrivals) told(arrived, photo);
      }
    } catch (error) {
      if (!abort.signal.aborted) this.#failed(photo, error);
    }
    this.#running = null;
    this.#pump();
  }

  #failed(photo: QueuedPhoto, error: unknown): void {
    const again =
      error instanceof NetworkProblem || (error instanceof ApiProblem && passing.has(error.code));
    if (!again) {
      const { title, detail } = describeFailure(error);
      const message = detail === '' ? `${title}.` : detail;
      this.#change(photo.key, { state: 'refused', message });
      return;
    }
    const losses = photo.losses + 1;
    this.#change(photo.key, { state: 'lost', losses });
    const pause = retryPausesMs[Math.min(losses, retryPausesMs.length) - 1] ?? 30_000;
    this.#callOff ??= this.#options.later(() => {
      this.#callOff = null;
      this.retry();
    }, pause);
  }
}
