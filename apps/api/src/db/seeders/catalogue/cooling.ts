import type { SeedStep } from './catalogue-types.ts';

/**
 * A cooked custard comes down from 135 to 70 °F (57 to 21 °C) within two hours and to 41 °F (5 °C)
 * within six in all (Food Code 2022, 3-501.14).
 */
export const coolToRoom: NonNullable<SeedStep['critical']> = {
  note: 'From 135 °F (57 °C) to 70 °F (21 °C) within 2 h of the stove.',
  limitC: 21,
  seconds: 7200,
};

/** The rest of the way; an hour's chilling is for texture and no safety limit. */
export const chill: Omit<SeedStep, 'text'> = {
  activeMinutes: 1,
  waitingMinutes: 120,
  resource: 'cold',
  critical: {
    note: '41 °F (5 °C) within 6 h in all, trays in one layer.',
    limitC: 5,
    seconds: 21_600,
  },
};
