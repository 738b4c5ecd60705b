import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import type { Actor } from '#api/platform/actor.ts';

/**
 * What staff may do with orders, whatever state they are in; the table of moves in
 * `#shared/orders/transitions.ts` adds when.
 */
export type StaffOrderAction =
  | 'see-orders'
  | 'confirm'
  | 'decline'
  | 'move'
  | 'start'
  | 'ready'
  | 'collect'
  | 'uncollected'
  | 'write'
  | 'answer-allergy'
  | 'record-talk'
  | 'lift-stop'
  | 'renew-link'
  | 'add-photos'
  | 'send-mail-again'
  | 'acknowledge-contents'
  | 'tell-contents'
  | 'block-days';

const everyone: readonly StaffRole[] = ['counter', 'baker', 'owner'];
const bakers: readonly StaffRole[] = ['baker', 'owner'];
const owners: readonly StaffRole[] = ['owner'];

const allowed: Readonly<Record<StaffOrderAction, readonly StaffRole[]>> = {
  'see-orders': everyone,
  confirm: bakers,
  decline: bakers,
  move: bakers,
  start: bakers,
  ready: everyone,
  collect: everyone,
  uncollected: everyone,
  write: everyone,
  'answer-allergy': bakers,
  'record-talk': bakers,
  'lift-stop': owners,
  'renew-link': everyone,
  'add-photos': everyone,
  'send-mail-again': everyone,
  'acknowledge-contents': bakers,
  'tell-contents': everyone,
  'block-days': bakers,
};

export function mayStaff(actor: Actor, action: StaffOrderAction): boolean {
  return actor.kind === 'staff' && allowed[action].includes(actor.role);
}
