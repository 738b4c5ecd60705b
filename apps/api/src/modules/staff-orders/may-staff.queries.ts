import type { Actor } from '#api/platform/actor.ts';
import { mayStaff } from './staff-orders.policy.ts';
import type { StaffOrderAction } from './staff-orders.policy.ts';

/** The policy of the staff's work with orders, for what stands beside it. */
export function mayStaffDo(actor: Actor, action: StaffOrderAction): boolean {
  return mayStaff(actor, action);
}
