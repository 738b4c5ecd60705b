import * as z from 'zod/mini';
import {
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
import { staffContentChange } from './contents.ts';
import { design } from './design.ts';
import { advice, estimate, price } from './estimates.ts';
import { liftedStop, message, pickup } from './orders.ts';
import { photo } from './photos.ts';
import { adviceLevel, orderStatus, taskKind } from './vocabulary.ts';

/** `GET /api/staff/orders`: finds, filters, sorts and pages on the server. */
export const listOrdersQuery = z.object({
  find: z.optional(line(100)),
  status: z.optional(z.array(orderStatus)),
  from: z.optional(localDate),
  to: z.optional(localDate),
  allergies: z.optional(z.boolean()),
  sort: z.optional(z.enum(['pickup', 'number', 'status', 'customer', 'total', 'created'])),
  order: z.optional(z.enum(['asc', 'desc'])),
  page: z.optional(z.int().check(z.minimum(1), z.maximum(100_000))),
  perPage: z.optional(z.int().check(z.minimum(5), z.maximum(100))),
});
export type ListOrdersQuery = z.infer<typeof listOrdersQuery>;

export const orderRow = z.object({
  number: z.int(),
  status: orderStatus,
  customer: z.string(),
  summary: z.string(),
  pickup,
  headCount: z.int(),
  totalMinor: minor,
  currency: z.string(),
  allergies: z.boolean(),
  worst: adviceLevel,
  hold: z.nullable(z.object({ expiresAt: instant })),
  createdAt: instant,
  unread: z.int(),
});
export type OrderRow = z.infer<typeof orderRow>;

export const orderList = z.object({
  rows: z.array(orderRow),
  total: z.int(),
  page: z.int(),
  perPage: z.int(),
  counts: z.record(z.string(), z.int()),
});
export type OrderList = z.infer<typeof orderList>;

export const plannedTask = z.object({
  id,
  kind: taskKind,
  label: z.string(),
  startAt: instant,
  /** Local, in the studio's zone. */
  date: localDate,
  start: minuteOfDay,
  minutes: z.int(),
  state: z.enum(['planned', 'started', 'finished', 'late']),
  pinned: z.boolean(),
});
export type PlannedTask = z.infer<typeof plannedTask>;

export const orderEvent = z.object({
  seq: z.int(),
  kind: z.string(),
  at: instant,
  actor: z.string(),
  sentence: z.string(),
});

export const declaredAllergy = z.object({
  id,
  allergen: z.nullable(z.string()),
  species: z.nullable(z.string()),
  text: z.string(),
  severity: z.string(),
  guests: z.int(),
  /** What the baker settled with the guest, and when; null while open. */
  answer: z.nullable(z.object({ text: z.string(), by: z.string(), at: instant })),
});
export type DeclaredAllergy = z.infer<typeof declaredAllergy>;

/**
 * A stop that is still open, and what it waits for: an answer to what was told in words, a talk to
 * be recorded, the owner's written reason, the customer's having read that reason, or nothing, where
 * the owner's own table refuses it.
 */
export const blocker = z.object({
  ...advice.shape,
  waitsFor: z.enum(['answer', 'talk', 'reason', 'customer', 'nothing']),
  /** The talk about it, where it is not about a declared allergy, which keeps its own. */
  talked: z.nullable(z.object({ text: z.string(), by: z.string(), at: instant })),
});
export type Blocker = z.infer<typeof blocker>;

/** A lifted stop as the staff read it, beside what the customer reads. */
export const staffLiftedStop = z.object({
  ...liftedStop.shape,
  code: z.string(),
  about: z.string(),
  plain: z.string(),
});
export type StaffLiftedStop = z.infer<typeof staffLiftedStop>;

export const sentMailRow = z.object({
  id,
  template: z.string(),
  to: z.string(),
  subject: z.string(),
  state: z.enum(['queued', 'leased', 'sent', 'given-up', 'dropped']),
  at: instant,
  attempts: z.int(),
  lastError: z.nullable(z.string()),
});
export type SentMailRow = z.infer<typeof sentMailRow>;

/** `GET /api/staff/mail/:id`: exactly what was sent. */
export const sentMailView = z.object({ ...sentMailRow.shape, html: z.string(), text: z.string() });
export type SentMailView = z.infer<typeof sentMailView>;

/** `GET /api/staff/orders/:number`: everything in one place. */
export const staffOrder = z.object({
  number: z.int(),
  code: z.string(),
  status: orderStatus,
  rowVersion,
  pickup,
  design,
  estimate,
  agreedPrice: z.nullable(price),
  allergies: z.array(declaredAllergy),
  hold: z.nullable(z.object({ expiresAt: instant, needsLink: z.boolean() })),
  /** Whether the plan has (or can find) room for it. */
  fits: z.object({ fits: z.boolean(), sentence: z.string() }),
  tasks: z.array(plannedTask),
  contacts: z.array(
    z.object({
      as: z.enum(['ordered', 'pays', 'collects']),
      name: z.string(),
      email: z.string(),
      phone: z.string(),
      reachBy: z.string(),
    }),
  ),
  messages: z.array(message),
  /** How many of the customer's messages nobody has opened. */
  unread: z.int(),
  /** What is in the cake now and was not when it was ordered, oldest first. */
  contentChanges: z._default(z.array(staffContentChange), []),
  photos: z.array(photo),
  events: z.array(orderEvent),
  mail: z.array(sentMailRow),
  showPhotos: z.boolean(),
  handover: z.nullable(
    z.object({
      collectedBy: z.string(),
      at: instant,
      condition: z.string(),
      photo: z.nullable(photo),
      by: z.string(),
    }),
  ),
  /** What must be settled before it may be confirmed. */
  blockers: z.array(blocker),
  lifted: z.array(staffLiftedStop),
  can: z.object({
    confirm: z.boolean(),
    decline: z.boolean(),
    move: z.boolean(),
    start: z.boolean(),
    ready: z.boolean(),
    collect: z.boolean(),
    uncollected: z.boolean(),
    write: z.boolean(),
    answerAllergy: z.boolean(),
    recordTalk: z.boolean(),
    liftStop: z.boolean(),
    renewLink: z.boolean(),
    addPhotos: z.boolean(),
    sendMailAgain: z.boolean(),
    acknowledgeContents: z._default(z.boolean(), false),
    tellContents: z._default(z.boolean(), false),
    /** What goes into it; what it costs to make; the pantry that both come from. */
    seeKitchen: z.boolean(),
    seeCost: z.boolean(),
    seePantry: z.boolean(),
  }),
});
export type StaffOrder = z.infer<typeof staffOrder>;

/** `GET /api/staff/orders/:number/confirmation`: the last look, price and e-mail, before one press. */
export const confirmationLook = z.object({
  rowVersion,
  price,
  email: z.object({ to: z.string(), subject: z.string(), text: z.string(), html: z.string() }),
  blockers: z.array(blocker),
  fits: z.object({ fits: z.boolean(), sentence: z.string() }),
});
export type ConfirmationLook = z.infer<typeof confirmationLook>;

/** Its query: the word the baker adds, so that the e-mail is shown exactly as it will go. */
export const confirmationQuery = z.object({ note: z.optional(prose(1000)) });

/** `POST .../confirm` */
export const confirmOrder = z.object({ rowVersion, note: z.optional(prose(1000)) });
export type ConfirmOrder = z.infer<typeof confirmOrder>;

/** `POST .../decline` */
export const declineOrder = z.object({
  rowVersion,
  reason: requiredLine(1000, 'Tell the customer why.'),
  offerDates: z.boolean(),
});
export type DeclineOrder = z.infer<typeof declineOrder>;

/** `POST .../move`: another pickup; the customer is told. */
export const moveOrder = z.object({
  rowVersion,
  date: localDate,
  windowStart: minuteOfDay,
  note: prose(1000),
});
export type MoveOrder = z.infer<typeof moveOrder>;

/** `POST .../start`, `.../ready`, `.../uncollected` */
export const markOrder = z.object({ rowVersion });
export type MarkOrder = z.infer<typeof markOrder>;

/** `POST .../collected` */
export const collectOrder = z.object({
  rowVersion,
  collectedBy: requiredLine(120, 'Write who collected it.'),
  condition: line(500),
  photoId: z.nullable(id),
});
export type CollectOrder = z.infer<typeof collectOrder>;

/** `POST .../allergies/:id/answer`: the talk, recorded; it never removes what the cake contains. */
export const answerAllergy = z.object({
  rowVersion,
  text: requiredLine(1000, 'Write what was said and settled.'),
});
export type AnswerAllergy = z.infer<typeof answerAllergy>;

/** `POST .../talks`: the talk about a stop that no declared allergy stands behind. */
export const recordTalk = z.object({
  rowVersion,
  about: z.string().check(z.maxLength(300)),
  text: requiredLine(1000, 'Write what was said and settled.'),
});
export type RecordTalk = z.infer<typeof recordTalk>;

/** `POST .../lift-stop`: the owner's written reason, which stays and which the customer reads. */
export const liftStop = z.object({
  rowVersion,
  about: z.string().check(z.maxLength(300)),
  reason: requiredLine(1000, 'Write the reason; it stays with the order.'),
});
export type LiftStop = z.infer<typeof liftStop>;

/**
 * `GET /api/staff/calendar?from&to`, and `GET /api/staff/orders/:number/dates?from&to`: the days
 * an order could move to, its own work set aside and without the limits that bind customers.
 */
export const calendarQuery = z.object({ from: localDate, to: localDate }).check(
  z.refine((it) => it.from <= it.to && Date.parse(it.to) - Date.parse(it.from) <= 62 * 86_400_000, {
    message: 'Ask for one to 62 days.',
    path: ['to'],
  }),
);

export const calendarDay = z.object({
  date: localDate,
  closed: z.nullable(z.object({ id: z.nullable(id), reason: z.string() })),
  /** Bench minutes there are and planned. */
  benchMinutes: z.int(),
  plannedMinutes: z.int(),
  pickups: z.int(),
  shifts: z.array(z.object({ start: minuteOfDay, end: minuteOfDay, people: z.array(z.string()) })),
  /** Largest pieces of work that fill the day, for people: "No. 2421 decorating 1 h 40". */
  why: z.array(z.string()),
});
export type CalendarDay = z.infer<typeof calendarDay>;

export const calendarLane = z.object({
  number: z.int(),
  customer: z.string(),
  summary: z.string(),
  status: orderStatus,
  pickup,
  tasks: z.array(plannedTask),
  allergies: z.boolean(),
  can: z.object({ ready: z.boolean(), collect: z.boolean(), start: z.boolean() }),
  rowVersion,
});
export type CalendarLane = z.infer<typeof calendarLane>;

export const waitingRequest = z.object({
  number: z.int(),
  rowVersion,
  customer: z.string(),
  summary: z.string(),
  pickup,
  /** The sharpest piece of advice, or null. */
  advice: z.nullable(advice),
  fits: z.object({ fits: z.boolean(), sentence: z.string() }),
  totalMinor: minor,
  currency: z.string(),
  can: z.object({ confirm: z.boolean(), decline: z.boolean() }),
});
export type WaitingRequest = z.infer<typeof waitingRequest>;

export const calendarView = z.object({
  today: localDate,
  days: z.array(calendarDay),
  lanes: z.array(calendarLane),
  waiting: z.array(waitingRequest),
  can: z.object({ blockDays: z.boolean() }),
});
export type CalendarView = z.infer<typeof calendarView>;

/** `POST /api/staff/closures`; `DELETE /api/staff/closures/:id` opens it again. */
export const blockDay = z.object({
  date: localDate,
  reason: requiredLine(120, 'Write why, for the team.'),
});
export type BlockDay = z.infer<typeof blockDay>;
/** Orders whose pickup or work stands on that day; blocking never drops them. */
export const blockedDay = z.object({ id, standing: z.array(z.int()) });
