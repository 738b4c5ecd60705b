import * as z from 'zod/mini';
import { localDate, minuteOfDay } from './common.ts';
import { design } from './design.ts';

/** `POST /api/dates`: can this design be made for each day of a range (at most 200 days)? */
export const datesRequest = z
  .object({
    design,
    from: localDate,
    to: localDate,
  })
  .check(
    z.refine((it) => it.from <= it.to, {
      message: 'The range ends before it starts.',
      path: ['to'],
    }),
    z.refine((it) => Date.parse(it.to) - Date.parse(it.from) <= 200 * 86_400_000, {
      message: 'Ask for at most 200 days at once.',
      path: ['to'],
    }),
  );

export const dateAnswers = ['open', 'last-place', 'ask-us', 'checking', 'closed'] as const;
export const dateAnswer = z.enum(dateAnswers);
export type DateAnswer = z.infer<typeof dateAnswer>;

export const dateReasonCodes = [
  'closed-day',
  'too-soon',
  'too-far',
  'too-big',
  'window-full',
  'full',
] as const;
export const dateReason = z.object({
  code: z.enum(dateReasonCodes),
  sentence: z.string(),
  /** With `too-soon`: the earliest day that has enough notice. */
  earliest: z.nullable(localDate),
  /** With `full`: what is full and on which day of work. */
  resource: z.nullable(z.string()),
  day: z.nullable(localDate),
});
export type DateReason = z.infer<typeof dateReason>;

export const pickupWindow = z.object({
  start: minuteOfDay,
  minutes: z.int(),
  answer: dateAnswer,
});
export type PickupWindow = z.infer<typeof pickupWindow>;

export const dayAnswer = z.object({
  date: localDate,
  answer: dateAnswer,
  reason: z.nullable(dateReason),
  /** How full the bench is that day, 0 to 1; the public sees no more than this. */
  fill: z.number(),
  windows: z.array(pickupWindow),
});
export type DayAnswer = z.infer<typeof dayAnswer>;

export const datesResponse = z.object({
  /** Worked out for a typical cake of that size because the design is not complete. */
  likely: z.boolean(),
  days: z.array(dayAnswer),
  /** Nearest open days outside or inside the range, if any. */
  firstOpen: z.nullable(localDate),
});
export type DatesResponse = z.infer<typeof datesResponse>;
