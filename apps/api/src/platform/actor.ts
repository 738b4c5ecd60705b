import type { StaffRole } from '#shared/contracts/vocabulary.ts';

/**
 * Who asks. Policies decide by this and nothing else; it is worked out once per request.
 * `orderIds` are the orders whose private link this browser has opened.
 */
export type Actor =
  | {
      readonly kind: 'visitor';
      /** Signed in with a password whose second factor is still to come: no rights yet. */
      readonly awaiting?: 'second-factor';
    }
  | { readonly kind: 'guest'; readonly orderIds: readonly string[] }
  | {
      readonly kind: 'customer';
      readonly userId: string;
      readonly name: string;
      readonly email: string;
      readonly orderIds: readonly string[];
    }
  | {
      readonly kind: 'staff';
      readonly role: StaffRole;
      readonly userId: string;
      readonly name: string;
      readonly email: string;
    };

export type Staff = Extract<Actor, { kind: 'staff' }>;
export type Customer = Extract<Actor, { kind: 'customer' }>;

/** The one word tables of rights are keyed by. */
export type ActorRole = 'visitor' | 'guest' | 'customer' | StaffRole;

export function roleOf(actor: Actor): ActorRole {
  return actor.kind === 'staff' ? actor.role : actor.kind;
}

/** The user's id, or null for visitors and guests. */
export function userIdOf(actor: Actor): string | null {
  return actor.kind === 'staff' || actor.kind === 'customer' ? actor.userId : null;
}

/** Whether the actor holds this order: by its private link, or as the customer whose it is. */
export function holdsOrder(
  actor: Actor,
  order: { readonly id: string; readonly customerId: string | null },
): boolean {
  if (actor.kind !== 'guest' && actor.kind !== 'customer') return false;
  if (actor.orderIds.includes(order.id)) return true;
  return actor.kind === 'customer' && order.customerId === actor.userId;
}
