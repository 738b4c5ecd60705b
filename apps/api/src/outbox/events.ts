import * as z from 'zod/mini';
import { id } from '#shared/contracts/common.ts';

/**
 * Everything that has effects outside the database, and what a handler needs to know of it: ids
 * only. Names, addresses and keys are read (or derived) when the handler runs.
 */
export type EventPayloads = {
  'order-asked': { orderId: string };
  'order-confirmed': { orderId: string };
  'order-declined': { orderId: string };
  'order-withdrawn': { orderId: string };
  'order-moved': { orderId: string };
  'order-ready': { orderId: string };
  'order-collected': { orderId: string };
  'hold-ran-out': { orderId: string };
  'warmth-to-ask': { orderId: string };
  'stop-lifted': { orderId: string; liftedStopId: string };
  'private-link-renewed': { orderId: string };
  /** Orders contain something else since one save; the studio is told once for all of them. */
  'contents-changed': { saveId: string };
  'contents-to-tell': { orderId: string; contentChangeId: string };
  'message-written': { orderId: string; messageId: string };
  'sign-in-link-asked': { tokenId: string };
  /** Staff never sign in by a link; the mail says how they do. */
  'sign-in-link-refused': { userId: string };
  'password-reset-asked': { tokenId: string };
  'action-to-confirm': { tokenId: string };
  'staff-invited': { tokenId: string };
  'mail-given-up': { sentMailId: number };
  'mail-to-send-again': { sentMailId: number; byUserId: string };
};

export type EventKind = keyof EventPayloads;

const ofOrder = z.object({ orderId: id });
const ofToken = z.object({ tokenId: id });
const ofUser = z.object({ userId: id });
const ofMessage = z.object({ orderId: id, messageId: id });
const ofSave = z.object({ saveId: id });
const ofContentChange = z.object({ orderId: id, contentChangeId: id });
const ofLiftedStop = z.object({ orderId: id, liftedStopId: id });
const ofMail = z.object({ sentMailId: z.int() });
const ofMailAgain = z.object({ sentMailId: z.int(), byUserId: id });

type Parsers = { readonly [K in EventKind]: (payload: unknown) => EventPayloads[K] };

const parsers: Parsers = {
  'order-asked': (payload) => ofOrder.parse(payload),
  'order-confirmed': (payload) => ofOrder.parse(payload),
  'order-declined': (payload) => ofOrder.parse(payload),
  'order-withdrawn': (payload) => ofOrder.parse(payload),
  'order-moved': (payload) => ofOrder.parse(payload),
  'order-ready': (payload) => ofOrder.parse(payload),
  'order-collected': (payload) => ofOrder.parse(payload),
  'hold-ran-out': (payload) => ofOrder.parse(payload),
  'warmth-to-ask': (payload) => ofOrder.parse(payload),
  'stop-lifted': (payload) => ofLiftedStop.parse(payload),
  'private-link-renewed': (payload) => ofOrder.parse(payload),
  'contents-changed': (payload) => ofSave.parse(payload),
  'contents-to-tell': (payload) => ofContentChange.parse(payload),
  'message-written': (payload) => ofMessage.parse(payload),
  'sign-in-link-asked': (payload) => ofToken.parse(payload),
  'sign-in-link-refused': (payload) => ofUser.parse(payload),
  'password-reset-asked': (payload) => ofToken.parse(payload),
  'action-to-confirm': (payload) => ofToken.parse(payload),
  'staff-invited': (payload) => ofToken.parse(payload),
  'mail-given-up': (payload) => ofMail.parse(payload),
  'mail-to-send-again': (payload) => ofMailAgain.parse(payload),
};

/** The row a handler works on; `uniqueKey` is the same on every repeat, for keys of its own. */
export type HandlerContext = { readonly outboxId: number; readonly uniqueKey: string };

/**
 * One handler per kind. A crash after its work and before our note of it repeats the work, so
 * every handler is idempotent: it writes what it writes once, by a unique key.
 */
export type EventHandlers = {
  readonly [K in EventKind]: (payload: EventPayloads[K], context: HandlerContext) => Promise<void>;
};

export function isEventKind(kind: string): kind is EventKind {
  return Object.hasOwn(parsers, kind);
}

/** @throws when the payload is not what the kind says */
export function readPayload<K extends EventKind>(kind: K, payload: unknown): EventPayloads[K] {
  return parsers[kind](payload);
}
