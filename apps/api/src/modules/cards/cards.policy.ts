import type { OrderStatus, StaffRole } from '#shared/contracts/vocabulary.ts';
import { holdsOrder } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';

/** What may be done with the labels and the care card of an order. */
export type CardAction = 'see-labels' | 'print-labels' | 'confirm-unknown' | 'see-care-card';

export type CardResource = {
  readonly id: string;
  readonly customerId: string | null;
  readonly status: OrderStatus;
};

const everyone: readonly StaffRole[] = ['counter', 'baker', 'owner'];

const staffMay: Readonly<Record<CardAction, readonly StaffRole[]>> = {
  'see-labels': everyone,
  'print-labels': everyone,
  // An unknown allergen is the owner's to answer for.
  'confirm-unknown': ['owner'],
  'see-care-card': everyone,
};

/** Staff by their role; whoever holds the order sees its care card, once there is a cake to come. */
export function mayCard(actor: Actor, action: CardAction, order: CardResource): boolean {
  if (actor.kind === 'staff') return staffMay[action].includes(actor.role);
  return action === 'see-care-card' && holdsOrder(actor, order) && hasCare(order.status);
}

/** A cake that is promised, being made, ready or handed over has a care card and a page. */
export function hasCare(status: OrderStatus): boolean {
  return (
    status === 'confirmed' || status === 'making' || status === 'ready' || status === 'collected'
  );
}
