import type { FinishId, Place } from '#shared/contracts/vocabulary.ts';

/** The finishes as they are read. */
export const finishWords: Readonly<Record<FinishId, string>> = {
  smooth: 'Smooth',
  textured: 'Textured',
  piped: 'Piped',
};

/** The places a cake may stand, as they are read. */
export const placeWords: Readonly<Record<Place, string>> = {
  indoors: 'Indoors',
  shade: 'Outside, in shade',
  sun: 'In the sun',
};
