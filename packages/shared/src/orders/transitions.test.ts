import { describe, expect, it } from 'vitest';
import { orderStatuses, type OrderStatus } from '../contracts/vocabulary.ts';
import {
  findTransition,
  isLive,
  orderTransitions,
  type OrderAction,
  type OrderActor,
  type OrderFacts,
} from './transitions.ts';

const clear: OrderFacts = {
  depositDue: false,
  planned: true,
  blocked: false,
  balanceDue: false,
  contentsOpen: false,
};
const actors = ['guest', 'customer', 'counter', 'baker', 'owner', 'system'] as const;
const actions = [...new Set(orderTransitions.map((it) => it.action))];

/** The state an action leads to, or null where it is not allowed. */
const lead = (
  from: OrderStatus | null,
  action: OrderAction,
  actor: OrderActor,
  facts: Partial<OrderFacts> = {},
): OrderStatus | null => findTransition(from, action, actor, { ...clear, ...facts })?.to ?? null;

type Step = readonly [action: OrderAction, actor: OrderActor, to: OrderStatus];

function walk(steps: readonly Step[], facts: Partial<OrderFacts> = {}): void {
  let at: OrderStatus | null = null;
  for (const [action, actor, to] of steps) {
    expect([action, lead(at, action, actor, facts)]).toEqual([action, to]);
    at = to;
  }
}

describe('an order’s life', () => {
  it('goes from asked to collected in one press where no deposit is due', () => {
    walk([
      ['submit', 'guest', 'asked'],
      ['confirm', 'baker', 'confirmed'],
      ['start', 'baker', 'making'],
      ['ready', 'counter', 'ready'],
      ['collect', 'counter', 'collected'],
    ]);
  });

  it('goes by a quote and a deposit where one is due', () => {
    walk(
      [
        ['submit', 'customer', 'asked'],
        ['quote', 'baker', 'quoted'],
        ['agree', 'customer', 'agreed'],
        ['pay-deposit', 'system', 'confirmed'],
      ],
      { depositDue: true },
    );
  });

  it('is confirmed by agreeing where nothing is due first, or by the owner’s waiver', () => {
    expect(lead('quoted', 'agree', 'guest')).toBe('confirmed');
    expect(lead('agreed', 'waive-deposit', 'owner', { depositDue: true })).toBe('confirmed');
    expect(lead('agreed', 'waive-deposit', 'baker', { depositDue: true })).toBeNull();
  });

  it('waits for the deposit when a baker confirms an order that needs one', () => {
    expect(lead('asked', 'confirm', 'baker', { depositDue: true })).toBe('agreed');
  });

  it('may be marked ready without having been marked as started', () => {
    expect(lead('confirmed', 'ready', 'counter')).toBe('ready');
  });
});

describe('what is in the way', () => {
  it('keeps a cake here until its customer knows what has changed in it', () => {
    const facts = { contentsOpen: true };
    expect(lead('making', 'ready', 'counter', facts)).toBeNull();
    expect(lead('confirmed', 'ready', 'owner', facts)).toBeNull();
    expect(lead('ready', 'collect', 'baker', facts)).toBeNull();
    expect(lead('confirmed', 'start', 'baker', facts)).toBe('making');
  });

  it.each([{ planned: false }, { blocked: true }])(
    '%j keeps an order from being confirmed',
    (facts) => {
      expect(lead('asked', 'confirm', 'owner', facts)).toBeNull();
      expect(lead('quoted', 'agree', 'customer', facts)).toBeNull();
      expect(lead('agreed', 'pay-deposit', 'system', facts)).toBeNull();
      expect(lead('agreed', 'waive-deposit', 'owner', facts)).toBeNull();
    },
  );

  it('a balance due keeps the cake at the counter', () => {
    expect(lead('ready', 'collect', 'counter', { balanceDue: true })).toBeNull();
    expect(lead('ready', 'collect', 'counter')).toBe('collected');
  });

  it('is not looked at while nobody knows the facts', () => {
    expect(findTransition('asked', 'confirm', 'baker')).not.toBeNull();
  });

  it('lets exactly one transition through for the same facts', () => {
    const guarded = (facts: OrderFacts) =>
      orderTransitions.filter(
        (it) =>
          it.action === 'confirm' &&
          findTransition('asked', 'confirm', 'baker', facts)?.to === it.to &&
          it.from.includes('asked'),
      );
    for (const depositDue of [true, false])
      expect(guarded({ ...clear, depositDue })).toHaveLength(1);
  });
});

describe('who may do what', () => {
  const allowed = (action: OrderAction, from: OrderStatus | null) =>
    actors.filter((actor) => findTransition(from, action, actor) !== null);

  it.each([
    ['submit', null, ['guest', 'customer', 'baker', 'owner']],
    ['quote', 'asked', ['baker', 'owner']],
    ['agree', 'quoted', ['guest', 'customer']],
    ['confirm', 'asked', ['baker', 'owner']],
    ['decline', 'asked', ['baker', 'owner']],
    ['withdraw', 'asked', ['guest', 'customer']],
    ['pay-deposit', 'agreed', ['counter', 'baker', 'owner', 'system']],
    ['waive-deposit', 'agreed', ['owner']],
    ['lapse', 'quoted', ['system']],
    ['cancel', 'confirmed', ['guest', 'customer', 'baker', 'owner']],
    ['start', 'confirmed', ['baker', 'owner']],
    ['ready', 'making', ['counter', 'baker', 'owner']],
    ['collect', 'ready', ['counter', 'baker', 'owner']],
    ['uncollected', 'ready', ['counter', 'baker', 'owner']],
    ['move', 'confirmed', ['baker', 'owner']],
  ] as const)('%s from %s: %j', (action, from, who) => {
    expect(allowed(action, from)).toEqual(who);
  });

  it('covers every action there is', () => {
    expect(actions).toHaveLength(15);
  });
});

describe('ends', () => {
  const over = [
    'collected',
    'declined',
    'withdrawn',
    'lapsed',
    'cancelled',
    'uncollected',
  ] as const satisfies readonly OrderStatus[];

  it.each(over)('%s is one: nobody can do anything more', (status) => {
    for (const action of actions) {
      for (const actor of actors) expect(findTransition(status, action, actor)).toBeNull();
    }
    expect(isLive(status)).toBe(false);
  });

  it('every other state takes room in the plan and leads on', () => {
    for (const status of orderStatuses.filter((it) => !over.some((end) => end === it))) {
      expect(isLive(status)).toBe(true);
      expect(orderTransitions.some((it) => it.from.includes(status) && it.to !== status)).toBe(
        true,
      );
    }
  });

  it('every state can be reached', () => {
    const reached = new Set(orderTransitions.map((it) => it.to));
    expect([...reached].sort()).toEqual([...orderStatuses].sort());
  });

  it('come by withdrawing before, and by cancelling after, an order is confirmed', () => {
    for (const status of ['asked', 'quoted', 'agreed'] as const) {
      expect(lead(status, 'withdraw', 'guest')).toBe('withdrawn');
      expect(lead(status, 'cancel', 'guest')).toBeNull();
      expect(lead(status, 'decline', 'baker')).toBe('declined');
    }
    for (const status of ['confirmed', 'making', 'ready'] as const) {
      expect(lead(status, 'withdraw', 'guest')).toBeNull();
      expect(lead(status, 'decline', 'baker')).toBeNull();
      expect(lead(status, 'cancel', 'customer')).toBe('cancelled');
    }
  });
});

describe('e-mails', () => {
  const emails = (from: OrderStatus | null, action: OrderAction, actor: OrderActor) =>
    findTransition(from, action, actor, clear)?.emails;

  it('follow from the transition', () => {
    expect(emails(null, 'submit', 'guest')).toEqual(['order-received', 'new-order']);
    expect(emails('asked', 'confirm', 'baker')).toEqual(['confirmed']);
    expect(emails('asked', 'decline', 'baker')).toEqual(['declined']);
    expect(emails('asked', 'withdraw', 'guest')).toEqual(['withdrawn']);
    expect(emails('making', 'ready', 'counter')).toEqual(['ready']);
    expect(emails('ready', 'collect', 'counter')).toEqual(['thank-you']);
    expect(emails('confirmed', 'move', 'baker')).toEqual(['moved']);
  });

  it('say nothing of the kitchen’s own clock', () => {
    expect(emails('confirmed', 'start', 'baker')).toEqual([]);
  });

  it('moving keeps the state', () => {
    for (const status of ['asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready'] as const) {
      expect(lead(status, 'move', 'owner')).toBe(status);
    }
  });
});
