import type { LocalDate } from '#shared/dates/local-time.ts';

/** A pickup as people choose it. */
export type PickupChoice = { readonly date: LocalDate; readonly windowStart: number };
