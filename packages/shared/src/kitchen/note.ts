import type { Advice } from '#shared/contracts/estimates.ts';

type NoteInput = Pick<Advice, 'code' | 'level' | 'step' | 'about' | 'sentence'> & Partial<Advice>;

/**
 * One piece of advice; without more said it has nothing instead, no ways and nothing to talk
 * over. `about` is unique within an estimate: a stop is lifted by it.
 */
export function note(input: NoteInput): Advice {
  return { instead: '', ways: [], talk: false, ...input };
}
