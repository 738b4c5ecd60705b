import type { StaffRole } from '#shared/contracts/vocabulary.ts';

/** What each role may do, as the owner chooses between them. */
export const roleWords: Readonly<
  Record<StaffRole, { readonly name: string; readonly may: string }>
> = {
  counter: {
    name: 'Counter',
    may: 'sees orders and pickups, marks ready and collected, writes to customers',
  },
  baker: {
    name: 'Baker',
    may: 'all of counter, and confirms, declines, moves pickups and blocks days',
  },
  owner: { name: 'Owner', may: 'everything, people and lifting a stop included' },
};
