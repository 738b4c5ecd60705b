import * as z from 'zod/mini';
import {
  emailAddress,
  id,
  instant,
  line,
  localDate,
  minor,
  minuteOfDay,
  prose,
  requiredLine,
  rowVersion,
} from './common.ts';
import { contentChangeView } from './contents.ts';
import { cake, design, extra, guests, look, setting } from './design.ts';
import { estimate, price } from './estimates.ts';
import { photo, photoClaim } from './photos.ts';
import { orderStatus } from './vocabulary.ts';

export const reachBy = z.enum(['email', 'phone', 'text']);

/** Digits, spaces and the usual signs; 7 to 15 digits (ITU-T E.164). */
export const phoneNumber = line(40).check(
  z.refine((it) => {
    const digits = it.replaceAll(/\D/g, '').length;
    return it === '' || (/^[+\d\s().\-/x]+$/i.test(it) && digits >= 7 && digits <= 15);
  }, 'Write a phone number with 7 to 15 digits.'),
);

export const day = z.object({
  ...guests.shape,
  date: z.nullable(localDate).check(z.refine((it) => it !== null, 'Choose a day.')),
  windowStart: z
    .nullable(minuteOfDay)
    .check(z.refine((it) => it !== null, 'Choose when you will collect.')),
});

export const you = z
  .object({
    name: requiredLine(120, 'Tell us your name.'),
    email: emailAddress,
    phone: phoneNumber,
    reachBy,
    /** Somebody else collects. */
    otherCollects: z.boolean(),
    collectorName: line(120),
    collectorPhone: phoneNumber,
  })
  .check(
    z.refine((it) => it.reachBy === 'email' || it.phone !== '', {
      message: 'We need a number to reach you that way.',
      path: ['phone'],
    }),
    z.refine((it) => !it.otherCollects || it.collectorName !== '', {
      message: 'Tell us who will collect it.',
      path: ['collectorName'],
    }),
  );

export const consents = z.object({
  policies: z
    .boolean()
    .check(z.refine((it) => it, 'Please read and agree to the policies to send your order.')),
  /** Needed only where an allergy is declared. */
  allergyData: z.boolean(),
  showPhotos: z.boolean(),
});

/**
 * `POST /api/orders`, with an `Idempotency-Key` header: the wizard's one form. Nullable answers
 * may be empty in a draft and are refused here.
 */
export const submitOrder = z
  .object({
    day,
    cake,
    setting,
    look,
    extras: z.array(extra).check(z.maxLength(20)),
    photos: z.array(photoClaim).check(z.maxLength(8, 'At most eight photos.')),
    you,
    consents,
    /** The total the customer saw; another one at the server is `price-changed`. */
    seenTotalMinor: z.nullable(minor),
    /** Sent without a promise: the date was "ask us". */
    askWithoutDate: z.boolean(),
  })
  .check(
    z.refine((it) => it.cake.coating !== null, {
      message: 'Choose what goes over the cake.',
      path: ['cake', 'coating'],
    }),
    z.refine((it) => it.day.allergies.length === 0 || it.consents.allergyData, {
      message: 'We need your consent to keep what you told us about allergies.',
      path: ['consents', 'allergyData'],
    }),
    z.refine((it) => it.look.words.every((word) => word.tier < Math.max(1, it.cake.tiers.length)), {
      message: 'These words are on a tier that is not there.',
      path: ['look', 'words'],
    }),
    z.refine(
      (it) =>
        it.look.decorations.every(
          (placed) => placed.tier === null || placed.tier < Math.max(1, it.cake.tiers.length),
        ),
      { message: 'A decoration is on a tier that is not there.', path: ['look', 'decorations'] },
    ),
  );
export type SubmitOrder = z.infer<typeof submitOrder>;

/** The answer to sending an order. */
export const submittedOrder = z.object({
  code: z.string(),
  number: z.int(),
  /** Whether a place in the plan is kept, until when, and what keeps it longer. */
  hold: z.nullable(z.object({ expiresAt: instant, needsLink: z.boolean() })),
  /** The private link's key, once, for the browser that sent it. */
  key: z.nullable(z.string()),
});
export type SubmittedOrder = z.infer<typeof submittedOrder>;

export const message = z.object({
  id,
  from: z.enum(['customer', 'studio']),
  authorName: z.string(),
  body: z.string(),
  at: instant,
});
export type Message = z.infer<typeof message>;

/**
 * A stop the owner takes the order against, for a written reason that stays; nothing is confirmed
 * before the customer has read and accepted it.
 */
export const liftedStop = z.object({
  id,
  /** What was stopped, as the customer was told. */
  sentence: z.string(),
  reason: z.string(),
  by: z.string(),
  at: instant,
  acceptedAt: z.nullable(instant),
});
export type LiftedStop = z.infer<typeof liftedStop>;

/** `POST /api/orders/:code/accept-lifted-stop` */
export const acceptLiftedStop = z.object({ rowVersion, liftedStopId: id });
export type AcceptLiftedStop = z.infer<typeof acceptLiftedStop>;

/** Coarse on purpose: a finer clock invites worry. */
export const progressStages = [
  'received',
  'agreed',
  'in-the-kitchen',
  'ready',
  'collected',
] as const;
export const progressStage = z.enum(progressStages);

export const pickup = z.object({
  date: localDate,
  start: minuteOfDay,
  minutes: z.int(),
  zone: z.string(),
  startAt: instant,
});
export type Pickup = z.infer<typeof pickup>;

/** `GET /api/orders/:code`: what the customer sees of an order. */
export const orderView = z.object({
  code: z.string(),
  number: z.int(),
  status: orderStatus,
  rowVersion,
  stage: z.nullable(progressStage),
  /** Why it ended, in words for the customer; null while it lives. */
  ending: z.nullable(z.string()),
  pickup,
  /** Of the page about the cake alone; null before there is a promise to make it. */
  careCode: z.nullable(z.string()),
  hold: z.nullable(z.object({ expiresAt: instant, needsLink: z.boolean() })),
  design,
  offer: estimate,
  /** The agreed quote's price once there is one. */
  agreedPrice: z.nullable(price),
  orderedBy: z.object({ name: z.string(), email: z.string(), phone: z.string() }),
  collector: z.nullable(z.object({ name: z.string(), phone: z.string() })),
  /** What is in the cake now and was not when it was ordered, oldest first. */
  contentChanges: z._default(z.array(contentChangeView), []),
  photos: z.array(photo),
  messages: z.array(message),
  lifted: z.array(liftedStop),
  createdAt: instant,
  /** Nearest open days, after a decline. */
  otherDates: z.array(localDate),
  showPhotos: z.boolean(),
  can: z.object({
    withdraw: z.boolean(),
    write: z.boolean(),
    addPhotos: z.boolean(),
    seeCalendarFile: z.boolean(),
    acceptLifted: z.boolean(),
  }),
});
export type OrderView = z.infer<typeof orderView>;

export const withdrawOrder = z.object({ rowVersion, reason: prose(500) });
export type WithdrawOrder = z.infer<typeof withdrawOrder>;

export const writeMessage = z.object({
  body: z
    .string()
    .check(
      z.trim(),
      z.minLength(1, 'Write something first.'),
      z.maxLength(4000, 'At most 4,000 characters, please.'),
    ),
});
export type WriteMessage = z.infer<typeof writeMessage>;

/** `POST /api/order-access`: the key of the private link, for a cookie good for that order. */
export const openPrivateLink = z.object({
  code: z.string().check(z.maxLength(20)),
  key: z.string().check(z.maxLength(100)),
});
