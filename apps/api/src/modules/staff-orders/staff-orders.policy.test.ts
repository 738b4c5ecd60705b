import { describe, expect, it } from 'vitest';
import type { Actor } from '#api/platform/actor.ts';
import { mayStaff } from './staff-orders.policy.ts';
import type { StaffOrderAction } from './staff-orders.policy.ts';

const staff = { kind: 'staff', userId: 's1', name: '', email: '' } as const;
const people = { name: '', email: '', orderIds: ['o1'] };
const nobodies: Actor[] = [
  { kind: 'visitor' },
  { kind: 'visitor', awaiting: 'second-factor' },
  { kind: 'guest', orderIds: ['o1'] },
  { kind: 'customer', userId: 'u1', ...people },
];

/** Counter, baker, owner; product.md, "People". */
const table: Record<StaffOrderAction, readonly [boolean, boolean, boolean]> = {
  'see-orders': [true, true, true],
  confirm: [false, true, true],
  decline: [false, true, true],
  move: [false, true, true],
  start: [false, true, true],
  ready: [true, true, true],
  collect: [true, true, true],
  uncollected: [true, true, true],
  write: [true, true, true],
  'answer-allergy': [false, true, true],
  'record-talk': [false, true, true],
  'lift-stop': [false, false, true],
  'renew-link': [true, true, true],
  'add-photos': [true, true, true],
  'acknowledge-contents': [false, true, true],
  'tell-contents': [true, true, true],
  'send-mail-again': [true, true, true],
  'block-days': [false, true, true],
};

const isAction = (action: string): action is StaffOrderAction => Object.hasOwn(table, action);

describe.each(Object.keys(table).filter(isAction))('%s', (action) => {
  it('is for exactly these roles', () => {
    const roles = (['counter', 'baker', 'owner'] as const).map((role) =>
      mayStaff({ ...staff, role }, action),
    );
    expect(roles).toEqual(table[action]);
    for (const actor of nobodies) expect(mayStaff(actor, action)).toBe(false);
  });
});
