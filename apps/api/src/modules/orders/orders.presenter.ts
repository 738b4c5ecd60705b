import type { ContentChangeView } from '#shared/contracts/contents.ts';
import type { LiftedStop, Message, OrderView, Pickup } from '#shared/contracts/orders.ts';
import type { Photo } from '#shared/contracts/photos.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { isLive } from '#shared/orders/transitions.ts';
import type { Order } from '#api/db/models/order.ts';
import type { Actor } from '#api/platform/actor.ts';
import { careCodeOf } from '#api/modules/cards/care-code.queries.ts';
import { canMove } from './change-order-status.command.ts';
import { designOf } from './order-design.queries.ts';
import { mayOrder } from './orders.policy.ts';
import { pickupOf } from './pickup.queries.ts';
import { resourceOf } from './orders.queries.ts';
import type { OrderRecord } from './orders.queries.ts';

export type OrderPage = OrderRecord & {
  readonly hold: { readonly expiresAt: Date; readonly needsLink: boolean } | null;
  readonly photos: Photo[];
  readonly messages: Message[];
  readonly lifted: readonly LiftedStop[];
  readonly contentChanges: ContentChangeView[];
  readonly otherDates: string[];
};

/** Coarse on purpose; null once it has ended otherwise than by being collected. */
const stageOf: Record<OrderStatus, OrderView['stage']> = {
  asked: 'received',
  quoted: 'received',
  agreed: 'agreed',
  confirmed: 'agreed',
  making: 'in-the-kitchen',
  ready: 'ready',
  collected: 'collected',
  declined: null,
  withdrawn: null,
  lapsed: null,
  cancelled: null,
  uncollected: null,
};

/** What the customer sees of an order. */
export function presentOrder(page: OrderPage, actor: Actor): OrderView {
  const { order, revision, contacts } = page;
  const ordered = contacts.find((it) => it.role === 'ordered');
  const collects = contacts.find((it) => it.role === 'collects');
  const may = (action: Parameters<typeof mayOrder>[1]) =>
    mayOrder(actor, action, resourceOf(order));
  return {
    code: order.code,
    number: order.number,
    status: order.status,
    rowVersion: order.rowVersion,
    stage: stageOf[order.status],
    ending: endingOf(order),
    pickup: pickupOf(order, revision),
    careCode: careCodeOf(order),
    hold: presentHold(page.hold),
    design: designOf(revision),
    offer: page.estimate,
    agreedPrice: page.agreedPrice,
    orderedBy: {
      name: ordered?.name ?? '',
      email: ordered?.email ?? '',
      phone: ordered?.phone ?? '',
    },
    collector: collects === undefined ? null : { name: collects.name, phone: collects.phone ?? '' },
    photos: page.photos.filter(({ kind }) => kind !== 'fault'),
    messages: page.messages,
    lifted: page.lifted.map(presentLifted),
    contentChanges: page.contentChanges,
    createdAt: order.createdAt.toISOString(),
    otherDates: page.otherDates,
    showPhotos: order.showPhotos,
    can: {
      withdraw: may('withdraw') && canMove(order, 'withdraw', actor),
      write: may('write'),
      addPhotos: may('add-photos'),
      seeCalendarFile: may('see-calendar-file'),
      acceptLifted:
        may('accept-lifted-stop') &&
        isLive(order.status) &&
        page.lifted.some(({ acceptedAt }) => acceptedAt === null),
    },
  };
}

/** What the customer reads; the staff's own words stay with the staff. */
function presentLifted({ id, sentence, reason, by, at, acceptedAt }: LiftedStop): LiftedStop {
  return { id, sentence, reason, by, at, acceptedAt };
}

export function presentHold(
  hold: OrderPage['hold'],
): { expiresAt: Pickup['startAt']; needsLink: boolean } | null {
  return hold === null
    ? null
    : { expiresAt: hold.expiresAt.toISOString(), needsLink: hold.needsLink };
}

/** Why it ended, in words for the customer. */
function endingOf(order: Order): string | null {
  switch (order.status) {
    case 'declined':
      return order.endedReason ?? 'The studio could not take this order.';
    case 'withdrawn':
      return 'You withdrew this order. Nothing is owed.';
    case 'lapsed':
      return 'The quote ran out before it was agreed, so the place was given up.';
    case 'cancelled':
      return order.endedReason ?? 'This order was cancelled.';
    case 'uncollected':
      return 'The cake was not collected. Please call us.';
    case 'asked':
    case 'quoted':
    case 'agreed':
    case 'confirmed':
    case 'making':
    case 'ready':
    case 'collected':
      return null;
  }
}
