import { readDraft, writeDraft, type DraftRecord } from './draft-record.ts';

const storageKey = 'order-draft';

/** Where drafts are kept; `localStorage` but for tests. */
export type DraftShelf = {
  /** The draft on the shelf now, by whichever page wrote it. */
  readonly read: () => DraftRecord | null;
  /** False where the device refuses to keep it (private browsing, a full disk). */
  readonly write: (record: DraftRecord) => boolean;
  readonly clear: () => void;
  /** Told whenever another page changes the shelf; answers how to stop listening. */
  readonly onOtherPage: (listen: (record: DraftRecord | null) => void) => () => void;
};

/** The device's own shelf. */
export function deviceShelf(now: () => number = Date.now): DraftShelf {
  return {
    read: () => {
      try {
        return readDraft(window.localStorage.getItem(storageKey), now());
      } catch {
        return null;
      }
    },
    write: (record) => {
      try {
        window.localStorage.setItem(storageKey, writeDraft(record));
        return true;
      } catch {
        return false;
      }
    },
    clear: () => {
      try {
        window.localStorage.removeItem(storageKey);
      } catch {
        // A device that keeps nothing has nothing to clear.
      }
    },
    onOtherPage: (listen) => {
      const onStorage = (event: StorageEvent) => {
        if (event.key !== storageKey && event.key !== null) return;
        listen(readDraft(event.newValue, now()));
      };
      window.addEventListener('storage', onStorage);
      return () => window.removeEventListener('storage', onStorage);
    },
  };
}
