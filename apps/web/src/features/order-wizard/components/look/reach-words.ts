import type { Reach } from '#shared/kitchen/colour.ts';

/** How near a colour comes on a base, in the words of the trade. */
export const reachWords: Readonly<Record<Reach, string>> = {
  close: 'close',
  shifts: 'shifts',
  'not-on-this-base': 'not on this base',
};
