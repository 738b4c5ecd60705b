import type { StaffContentChange } from '#shared/contracts/contents.ts';
import type { Message } from '#shared/contracts/orders.ts';
import type { Photo } from '#shared/contracts/photos.ts';
import type {
  Blocker,
  PlannedTask,
  SentMailRow,
  StaffLiftedStop,
} from '#shared/contracts/staff.ts';
import { isLive } from '#shared/orders/transitions.ts';
import { Handover } from '#api/db/models/handover.ts';
import { OrderEvent } from '#api/db/models/order-event.ts';
import type { Order } from '#api/db/models/order.ts';
import { User } from '#api/db/models/user.ts';
import { staffContentChanges } from '#api/modules/contents/content-changes.queries.ts';
import { mailOfOrder } from '#api/modules/mail/sent-mail.queries.ts';
import { messagesOf, unreadOf } from '#api/modules/messages/messages.queries.ts';
import { designOf } from '#api/modules/orders/order-design.queries.ts';
import { liftedStopsOf } from '#api/modules/orders/lifted-stops.queries.ts';
import { loadOrderRecord } from '#api/modules/orders/orders.queries.ts';
import type { OrderRecord } from '#api/modules/orders/orders.queries.ts';
import { photosOf } from '#api/modules/photos/photos.queries.ts';
import { activeHoldsOf, fitOf } from '#api/modules/plan/plan.queries.ts';
import { plannedTasksOf } from '#api/modules/plan/planned-tasks.queries.ts';
import { blockersOf } from './blockers.queries.ts';
import { pickupChoiceOf } from './planned-order.ts';

export type Fit = { readonly fits: boolean; readonly sentence: string };

/** Everything the staff's page of an order shows. */
export type StaffOrderPage = OrderRecord & {
  readonly hold: { readonly expiresAt: Date; readonly needsLink: boolean } | null;
  readonly fits: Fit;
  readonly tasks: PlannedTask[];
  readonly messages: Message[];
  /** Messages of the customer that nobody in the studio has opened. */
  readonly unread: number;
  readonly photos: Photo[];
  readonly events: readonly OrderEvent[];
  readonly mail: SentMailRow[];
  readonly handover: Handover | null;
  readonly blockers: Blocker[];
  readonly lifted: StaffLiftedStop[];
  readonly contentChanges: StaffContentChange[];
  /** Names of the members of staff who answered something or did something, by id. */
  readonly names: ReadonlyMap<string, string>;
};

export async function loadStaffOrderPage(order: Order): Promise<StaffOrderPage> {
  const record = await loadOrderRecord(order);
  const { revision } = record;
  const [holds, fits, tasks, messages, unread, photos, events, mail, handover, blockers, lifted] =
    await Promise.all([
      activeHoldsOf([order.id]),
      loadFit(record),
      plannedTasksOf([order.id]),
      messagesOf(order.id),
      unreadOf([order.id]),
      photosOf([order.id]),
      OrderEvent.findAll({ where: { orderId: order.id }, order: [['seq', 'ASC']] }),
      mailOfOrder(order.id),
      Handover.findOne({ where: { orderId: order.id }, order: [['at', 'DESC']] }),
      blockersOf(revision),
      liftedStopsOf(revision),
    ]);
  return {
    ...record,
    hold: holds.get(order.id) ?? null,
    fits,
    tasks: tasks.get(order.id) ?? [],
    messages,
    unread: unread.get(order.id) ?? 0,
    photos: photos.get(order.id) ?? [],
    events,
    mail,
    handover,
    blockers: isUnconfirmed(order.status) ? blockers : [],
    lifted,
    contentChanges: await staffContentChanges(revision),
    names: await namesOf([
      ...events.map(({ actorUserId }) => actorUserId),
      ...(revision.allergies ?? []).map(({ answeredByUserId }) => answeredByUserId),
      handover?.byUserId ?? null,
    ]),
  };
}

/** Before it is confirmed, what is open is still to be settled. */
function isUnconfirmed(status: Order['status']): boolean {
  return status === 'asked' || status === 'quoted' || status === 'agreed';
}

/** Whether the plan has room; an order that has ended needs none. */
export async function loadFit({
  order,
  revision,
}: Pick<OrderRecord, 'order' | 'revision'>): Promise<Fit> {
  if (!isLive(order.status)) return { fits: true, sentence: 'It takes no room any more.' };
  return fitOf({
    orderId: order.id,
    design: designOf(revision),
    pickup: pickupChoiceOf(order, revision),
  });
}

async function namesOf(ids: readonly (string | null)[]): Promise<Map<string, string>> {
  const users = await User.findAll({ where: { id: [...new Set(ids.flatMap((id) => id ?? []))] } });
  return new Map(users.map(({ id, name }) => [id, name]));
}
