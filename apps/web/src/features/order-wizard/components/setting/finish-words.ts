import type { FinishId } from '#shared/contracts/vocabulary.ts';

/** The finishes as they are read. */
export const finishWords: Readonly<Record<FinishId, string>> = {
  smooth: 'Smooth',
  textured: 'Textured',
  piped: 'Piped',
};
