import type { DecorationSource } from '#shared/contracts/vocabulary.ts';

/** Who makes or brings a decoration. */
export const sourceWords: Readonly<Record<DecorationSource, string>> = {
  studio: 'We make it',
  customer: 'You bring it',
  florist: 'Your florist brings it',
};
