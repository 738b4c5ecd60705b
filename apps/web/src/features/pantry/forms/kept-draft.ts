import * as z from 'zod/mini';

/** A draft older than this is of no use to anybody. */
const keptDays = 30;

const record = z.object({
  savedAt: z.number(),
  basedOn: z.nullable(z.string()),
  values: z.unknown(),
});

/** What was written and not saved, as the device keeps it. */
export type KeptDraft<T> = {
  readonly savedAt: number;
  /** What it was begun from, so that a newer version is noticed. */
  readonly basedOn: string | null;
  readonly values: T;
};

const storageKey = (key: string) => `pantry-draft:${key}`;

/** The draft under a key, or null: none, too old, or of another shape than today's. */
export function readKeptDraft<T>(
  key: string,
  values: z.ZodMiniType<T>,
  now: number,
): KeptDraft<T> | null {
  try {
    const text = window.localStorage.getItem(storageKey(key));
    if (text === null) return null;
    const found = record.safeParse(JSON.parse(text));
    if (!found.success || now - found.data.savedAt > keptDays * 86_400_000) return null;
    const read = values.safeParse(found.data.values);
    return read.success ? { ...found.data, values: read.data } : null;
  } catch {
    return null;
  }
}

/** False where the device will not keep it (private browsing, a full disk). */
export function writeKeptDraft<T>(key: string, draft: KeptDraft<T>): boolean {
  try {
    window.localStorage.setItem(storageKey(key), JSON.stringify(draft));
    return true;
  } catch {
    return false;
  }
}

export function dropKeptDraft(key: string): void {
  try {
    window.localStorage.removeItem(storageKey(key));
  } catch {
    // A device that keeps nothing has nothing to drop.
  }
}
