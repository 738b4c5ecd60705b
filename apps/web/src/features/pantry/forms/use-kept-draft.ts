import { useEffect, useRef, useState } from 'react';
import type * as z from 'zod/mini';
import { type KeptDraft, dropKeptDraft, readKeptDraft, writeKeptDraft } from './kept-draft.ts';

/** Typing rests this long before it is kept. */
const restMs = 400;

type Options<T> = {
  readonly key: string;
  readonly contract: z.ZodMiniType<T>;
  readonly values: T;
  readonly basedOn: string | null;
  /** Something differs from what was there to begin with; otherwise nothing is kept. */
  readonly unsaved: boolean;
};

/**
 * Keeps on the device what is written and not saved, and tells of what an earlier tab left there.
 * While that is neither taken up nor dropped, nothing is written over it.
 */
export function useKeptDraft<T>({ key, contract, values, basedOn, unsaved }: Options<T>) {
  const [found, setFound] = useState<KeptDraft<T> | null>(() =>
    readKeptDraft(key, contract, Date.now()),
  );
  const [kept, setKept] = useState(true);
  const waiting = useRef<(() => void) | null>(null);

  useEffect(() => {
    if (!unsaved || found !== null) {
      waiting.current = null;
      return undefined;
    }
    const write = () => {
      waiting.current = null;
      setKept(writeKeptDraft(key, { savedAt: Date.now(), basedOn, values }));
    };
    waiting.current = write;
    const timer = setTimeout(write, restMs);
    return () => clearTimeout(timer);
  }, [key, basedOn, values, unsaved, found]);

  useEffect(() => {
    const flush = () => waiting.current?.();
    window.addEventListener('pagehide', flush);
    return () => {
      window.removeEventListener('pagehide', flush);
      flush();
    };
  }, []);

  return {
    /** What an earlier tab left, until it is taken up or dropped. */
    found,
    /** Whether the device takes what is written. */
    kept,
    /** The earlier draft is on the form now, or is not wanted. */
    settle: (drop: boolean) => {
      if (drop) dropKeptDraft(key);
      setFound(null);
    },
    /** Saved: nothing is left to keep. */
    clear: () => {
      waiting.current = null;
      dropKeptDraft(key);
      setFound(null);
    },
  };
}
