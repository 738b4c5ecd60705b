import type { Advice } from '#shared/contracts/estimates.ts';

export type Way = Advice['ways'][number];

/** What one press makes of a design, before what it changes is put into words. */
export type WayOut = Pick<Way, 'label' | 'patch'>;

/** Advice as a rule gives it: what its ways change is worked out for all of them in one place. */
export type Noted = Omit<Advice, 'ways'> & { readonly ways: readonly WayOut[] };

type NoteInput = Pick<Noted, 'code' | 'level' | 'step' | 'about' | 'sentence'> & Partial<Noted>;

/**
 * One piece of advice; without more said it has nothing instead, no ways and nothing to talk
 * over, and staff read the customer's sentence. `about` is unique within an estimate: a stop is
 * lifted by it.
 */
export function note(input: NoteInput): Noted {
  return { plain: input.sentence, instead: '', ways: [], talk: false, ...input };
}
