import type { OrderStatus, Role } from '#shared/contracts/vocabulary.ts';
import type { IdFacts } from '#api/db/json-shapes.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import { roleOf, userIdOf } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';

export type OrderEventKind =
  | 'submitted'
  | 'confirmed'
  | 'declined'
  | 'withdrawn'
  | 'moved'
  | 'started'
  | 'ready'
  | 'collected'
  | 'uncollected'
  | 'hold-ran-out'
  | 'link-opened'
  | 'link-renewed'
  | 'message-written'
  | 'photo-added'
  | 'allergy-answered'
  | 'warmth-asked'
  | 'stop-talked'
  | 'stop-lifted'
  | 'lifted-stop-accepted'
  | 'contents-changed'
  | 'contents-put-right'
  | 'contents-acknowledged'
  | 'contents-told'
  | 'mail-sent-again';

export type NewOrderEvent = {
  readonly orderId: string;
  readonly kind: OrderEventKind;
  readonly actor: Actor | 'system';
  readonly fromStatus?: OrderStatus | null;
  readonly toStatus?: OrderStatus;
  /** Ids, codes and counts; never names, addresses or free text. */
  readonly data?: IdFacts;
};

/** Adds to what has happened to an order, for good; in the transaction of what happened. */
export async function noteOrderEvent(event: NewOrderEvent): Promise<void> {
  const last = await OrderEvent.max<number | null, OrderEvent>('seq', {
    where: { orderId: event.orderId },
  });
  await OrderEvent.create({
    orderId: event.orderId,
    seq: (last ?? 0) + 1,
    kind: event.kind,
    ...actorColumns(event.actor),
    fromStatus: event.fromStatus ?? null,
    toStatus: event.toStatus ?? null,
    data: event.data ?? {},
  });
}

function actorColumns(actor: Actor | 'system'): Pick<OrderEvent, 'actorKind' | 'actorUserId'> {
  if (actor === 'system') return { actorKind: 'system', actorUserId: null };
  return { actorKind: orderRoleOf(actor), actorUserId: userIdOf(actor) };
}

/** A visitor who acts on an order holds its key or has just sent it: a guest. */
export function orderRoleOf(actor: Actor): 'guest' | Role {
  const role = roleOf(actor);
  return role === 'visitor' ? 'guest' : role;
}
