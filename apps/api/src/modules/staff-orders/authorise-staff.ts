import { authorise } from '#api/modules/authorise.ts';
import type { Actor, Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { mayStaff } from './staff-orders.policy.ts';
import type { StaffOrderAction } from './staff-orders.policy.ts';

/** The member of staff who may do this. @throws `not-signed-in`, `not-allowed` */
export function authoriseStaff(actor: Actor, action: StaffOrderAction): Staff {
  authorise(actor, mayStaff(actor, action));
  if (actor.kind !== 'staff') throw new AppError('not-allowed');
  return actor;
}
