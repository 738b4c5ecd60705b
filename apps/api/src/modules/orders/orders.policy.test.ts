import { describe, expect, it } from 'vitest';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import type { Actor } from '#api/platform/actor.ts';
import { mayOrder } from './orders.policy.ts';
import type { OrderAction } from './orders.policy.ts';

const order = (status: OrderStatus) => ({ id: 'o1', customerId: 'u1', status });
const account = { name: '', email: '', orderIds: [] };
const staff = { kind: 'staff', userId: 's1', name: '', email: '' } as const;

const actors = {
  visitor: { kind: 'visitor' },
  'its guest': { kind: 'guest', orderIds: ['o1'] },
  'another guest': { kind: 'guest', orderIds: ['o2'] },
  'its customer': { kind: 'customer', userId: 'u1', ...account },
  'another customer': { kind: 'customer', userId: 'u2', ...account },
  'a customer with its link': { kind: 'customer', userId: 'u2', ...account, orderIds: ['o1'] },
  counter: { ...staff, role: 'counter' },
  owner: { ...staff, role: 'owner' },
} satisfies Record<string, Actor>;

const holders = ['its guest', 'its customer', 'a customer with its link'];
const always = [...orderStatuses];

/** Who, and in which states; everybody and everything else is refused. */
const table: Record<OrderAction, { who: string[]; states: OrderStatus[] }> = {
  see: { who: [...holders, 'counter', 'owner'], states: always },
  withdraw: { who: holders, states: always },
  write: { who: holders, states: always },
  'accept-lifted-stop': { who: holders, states: always },
  'add-photos': {
    who: holders,
    states: ['asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready'],
  },
  'see-calendar-file': {
    who: [...holders, 'counter', 'owner'],
    states: ['confirmed', 'making', 'ready'],
  },
};

describe.each(Object.entries(actors))('%s', (name, actor) => {
  it.each([
    'see',
    'withdraw',
    'write',
    'accept-lifted-stop',
    'add-photos',
    'see-calendar-file',
  ] as const)('may %s exactly as the table says', (action) => {
    const { who, states } = table[action];
    const allowed = orderStatuses.filter((status) => mayOrder(actor, action, order(status)));
    expect(allowed).toEqual(
      who.includes(name) ? orderStatuses.filter((it) => states.includes(it)) : [],
    );
  });
});
