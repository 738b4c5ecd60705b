import { findTransition } from '#shared/orders/transitions.ts';
import type {
  OrderAction,
  OrderActor,
  OrderEmail,
  OrderFacts,
  OrderTransition,
} from '#shared/orders/transitions.ts';
import type { IdFacts } from '#api/db/json-shapes.ts';
import { changeOne } from '#api/db/change-one.ts';
import { Order } from '#api/db/models/order.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import type { EventKind } from '#api/outbox/events.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { noteOrderEvent, orderRoleOf } from './note-order-event.command.ts';
import type { OrderEventKind } from './note-order-event.command.ts';

export type StatusChange = {
  /** As it was loaded. */
  readonly order: Order;
  /** As the client last saw it. */
  readonly rowVersion: number;
  readonly action: OrderAction;
  readonly actor: Actor | 'system';
  /** Guards are tried only where facts are given. */
  readonly facts?: OrderFacts;
  /** What changes with the status. */
  readonly values?: Partial<
    Pick<
      Order,
      | 'agreedRevisionId'
      | 'currentRevisionId'
      | 'confirmedAt'
      | 'endedAt'
      | 'endedBy'
      | 'endedReason'
      | 'pickupDate'
      | 'windowStartMinute'
      | 'windowMinutes'
      | 'pickupAt'
      | 'zone'
      | 'dateAnswer'
    >
  >;
  readonly data?: IdFacts;
};

const eventOfAction: Partial<Record<OrderAction, OrderEventKind>> = {
  submit: 'submitted',
  confirm: 'confirmed',
  decline: 'declined',
  withdraw: 'withdrawn',
  move: 'moved',
  start: 'started',
  ready: 'ready',
  collect: 'collected',
  uncollected: 'uncollected',
};

const outboxOfEmail: Partial<Record<OrderEmail, 'order-asked' | OrderOutboxKind>> = {
  'order-received': 'order-asked',
  'new-order': 'order-asked',
  confirmed: 'order-confirmed',
  declined: 'order-declined',
  withdrawn: 'order-withdrawn',
  moved: 'order-moved',
  ready: 'order-ready',
  'thank-you': 'order-collected',
};
type OrderOutboxKind = Extract<
  EventKind,
  | 'order-confirmed'
  | 'order-declined'
  | 'order-withdrawn'
  | 'order-moved'
  | 'order-ready'
  | 'order-collected'
>;

/** An actor as the table of moves knows them. */
export function orderActorOf(actor: Actor | 'system'): OrderActor {
  return actor === 'system' ? 'system' : orderRoleOf(actor);
}

/** Whether the table lets this actor make this move from where the order is; guards apart. */
export function canMove(order: Pick<Order, 'status'>, action: OrderAction, actor: Actor): boolean {
  return findTransition(order.status, action, orderActorOf(actor)) !== null;
}

/**
 * Moves an order by the table in `#shared/orders/transitions.ts`, which alone decides a status: one
 * conditional update, its event, and an outbox row for each e-mail, in the running transaction.
 * @throws `changed-meanwhile` when somebody was faster, `wrong-state` when the order is past it
 */
export async function changeOrderStatus(change: StatusChange): Promise<OrderTransition> {
  const { order, action, actor, rowVersion } = change;
  if (order.rowVersion !== rowVersion) throw changedMeanwhile(order);
  const transition = findTransition(order.status, action, orderActorOf(actor), change.facts);
  if (transition === null) throw wrongState(order);
  const changed = await changeOne(
    Order,
    { ...change.values, status: transition.to, rowVersion: rowVersion + 1 },
    { id: order.id, rowVersion, status: order.status },
  );
  if (!changed) throw changedMeanwhile(await order.reload());
  const kind = eventOfAction[action];
  if (kind === undefined) throw new Error(`Nothing is written for ${action}.`);
  await noteOrderEvent({
    orderId: order.id,
    kind,
    actor,
    fromStatus: order.status,
    toStatus: transition.to,
    data: change.data,
  });
  await enqueueEmails(order.id, transition, rowVersion + 1);
  return transition;
}

/** One outbox row per cause; a cause may have several e-mails. */
export async function enqueueEmails(
  orderId: string,
  transition: OrderTransition,
  rowVersion: number,
): Promise<void> {
  const kinds = new Set(transition.emails.flatMap((email) => outboxOfEmail[email] ?? []));
  for (const kind of kinds) {
    await enqueue(kind, { orderId }, { uniqueKey: `${kind}:${orderId}:${rowVersion}`, orderId });
  }
}

/** What the client must know to look again. */
export function changedMeanwhile(order: Order): AppError {
  return new AppError('changed-meanwhile', {
    detail: 'Somebody changed this order while you had it open. Look at it again, please.',
    facts: { status: order.status, rowVersion: order.rowVersion },
  });
}

export function wrongState(order: Order): AppError {
  return new AppError('wrong-state', {
    detail: `Order No. ${order.number} is ${order.status} now.`,
    facts: { status: order.status, rowVersion: order.rowVersion },
  });
}
