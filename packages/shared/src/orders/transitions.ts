import type { OrderStatus, Role } from '../contracts/vocabulary.ts';

/**
 * An order's life, written once: who may move it from where to where, under which guard, and
 * which e-mails follow. The API, what the pages offer and the tests all read this table; nothing
 * else decides a status.
 */
export type OrderAction =
  | 'submit'
  | 'quote'
  | 'agree'
  | 'confirm'
  | 'pay-deposit'
  | 'waive-deposit'
  | 'decline'
  | 'withdraw'
  | 'lapse'
  | 'cancel'
  | 'move'
  | 'start'
  | 'ready'
  | 'collect'
  | 'uncollected';

/** `guest` holds one order's private link; `system` is the worker. */
export type OrderActor = Role | 'guest' | 'system';

/** Facts a transition may depend on; worked out by the API before it asks. */
export type OrderFacts = {
  /** A deposit is due before the order is confirmed. */
  readonly depositDue: boolean;
  /** The order has a place in the plan. */
  readonly planned: boolean;
  /** Advice at `stop`, or an allergy told in words, is still open. */
  readonly blocked: boolean;
  /** Money is owed and the terms do not allow handing over first. */
  readonly balanceDue: boolean;
  /**
   * Something in it has changed that its customer does not know of yet, or that is against what
   * guests told and no baker has seen to.
   */
  readonly contentsOpen: boolean;
};

export type OrderGuard =
  'planned-and-clear' | 'deposit-due' | 'no-deposit-due' | 'nothing-owed' | 'contents-told';

export type OrderEmail =
  | 'order-received'
  | 'new-order'
  | 'quote-ready'
  | 'quote-agreed'
  | 'confirmed'
  | 'declined'
  | 'withdrawn'
  | 'lapsed'
  | 'cancelled'
  | 'moved'
  | 'ready'
  | 'thank-you'
  | 'payment-received';

export type OrderTransition = {
  readonly from: readonly (OrderStatus | null)[];
  readonly action: OrderAction;
  readonly actors: readonly OrderActor[];
  readonly guards: readonly OrderGuard[];
  readonly to: OrderStatus;
  readonly emails: readonly OrderEmail[];
};

const customers = ['customer', 'guest'] as const;
const bakers = ['baker', 'owner'] as const;
const counters = ['counter', 'baker', 'owner'] as const;
const agreedOn = ['confirmed', 'making', 'ready'] as const;

export const orderTransitions: readonly OrderTransition[] = [
  {
    from: [null],
    action: 'submit',
    actors: [...customers, ...bakers],
    guards: [],
    to: 'asked',
    emails: ['order-received', 'new-order'],
  },
  {
    from: ['asked', 'quoted'],
    action: 'quote',
    actors: bakers,
    guards: [],
    to: 'quoted',
    emails: ['quote-ready'],
  },
  {
    from: ['quoted'],
    action: 'agree',
    actors: customers,
    guards: ['planned-and-clear', 'deposit-due'],
    to: 'agreed',
    emails: ['quote-agreed'],
  },
  {
    from: ['quoted'],
    action: 'agree',
    actors: customers,
    guards: ['planned-and-clear', 'no-deposit-due'],
    to: 'confirmed',
    emails: ['quote-agreed', 'confirmed'],
  },
  {
    from: ['asked'],
    action: 'confirm',
    actors: bakers,
    guards: ['planned-and-clear', 'deposit-due'],
    to: 'agreed',
    emails: ['quote-ready'],
  },
  {
    from: ['asked'],
    action: 'confirm',
    actors: bakers,
    guards: ['planned-and-clear', 'no-deposit-due'],
    to: 'confirmed',
    emails: ['confirmed'],
  },
  {
    from: ['agreed'],
    action: 'pay-deposit',
    actors: ['system', ...counters],
    guards: ['planned-and-clear'],
    to: 'confirmed',
    emails: ['payment-received', 'confirmed'],
  },
  {
    from: ['agreed'],
    action: 'waive-deposit',
    actors: ['owner'],
    guards: ['planned-and-clear'],
    to: 'confirmed',
    emails: ['confirmed'],
  },
  {
    from: ['asked', 'quoted', 'agreed'],
    action: 'decline',
    actors: bakers,
    guards: [],
    to: 'declined',
    emails: ['declined'],
  },
  {
    from: ['asked', 'quoted', 'agreed'],
    action: 'withdraw',
    actors: customers,
    guards: [],
    to: 'withdrawn',
    emails: ['withdrawn'],
  },
  {
    from: ['quoted', 'agreed'],
    action: 'lapse',
    actors: ['system'],
    guards: [],
    to: 'lapsed',
    emails: ['lapsed'],
  },
  {
    from: agreedOn,
    action: 'cancel',
    actors: [...customers, ...bakers],
    guards: [],
    to: 'cancelled',
    emails: ['cancelled'],
  },
  { from: ['confirmed'], action: 'start', actors: bakers, guards: [], to: 'making', emails: [] },
  {
    from: ['confirmed', 'making'],
    action: 'ready',
    actors: counters,
    guards: ['contents-told'],
    to: 'ready',
    emails: ['ready'],
  },
  {
    from: ['ready'],
    action: 'collect',
    actors: counters,
    guards: ['nothing-owed', 'contents-told'],
    to: 'collected',
    emails: ['thank-you'],
  },
  {
    from: ['ready'],
    action: 'uncollected',
    actors: counters,
    guards: [],
    to: 'uncollected',
    emails: [],
  },
  // Moving the pickup keeps the state; it is listed so that who may do it stands here too.
  ...(['asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready'] as const).map((status) => ({
    from: [status],
    action: 'move' as const,
    actors: bakers,
    guards: [],
    to: status,
    emails: ['moved' as const],
  })),
];

const guardHolds: Record<OrderGuard, (facts: OrderFacts) => boolean> = {
  'planned-and-clear': (facts) => facts.planned && !facts.blocked,
  'deposit-due': (facts) => facts.depositDue,
  'no-deposit-due': (facts) => !facts.depositDue,
  'nothing-owed': (facts) => !facts.balanceDue,
  'contents-told': (facts) => !facts.contentsOpen,
};

/** The transition an actor may make, or null; guards are looked at only when facts are given. */
export function findTransition(
  from: OrderStatus | null,
  action: OrderAction,
  actor: OrderActor,
  facts?: OrderFacts,
): OrderTransition | null {
  return (
    orderTransitions.find(
      (it) =>
        it.action === action &&
        it.from.includes(from) &&
        it.actors.includes(actor) &&
        (facts === undefined || it.guards.every((guard) => guardHolds[guard](facts))),
    ) ?? null
  );
}

/** Whether an order in this state still takes room in the plan when it has a place. */
export function isLive(status: OrderStatus): boolean {
  return ['asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready'].includes(status);
}
