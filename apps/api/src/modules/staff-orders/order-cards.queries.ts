import { Op } from 'sequelize';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { OrderRow } from '#shared/contracts/staff.ts';
import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { LiftedStop } from '#api/db/models/lifted-stop.ts';
import { OrderContact } from '#api/db/models/order-contact.ts';
import type { OrderRevision } from '#api/db/models/order-revision.ts';
import { Order } from '#api/db/models/order.ts';
import { unreadOf } from '#api/modules/messages/messages.queries.ts';
import { loadRevisions } from '#api/modules/orders/order-design.queries.ts';
import { menuOfAllTimes, summariseRevision } from '#api/modules/orders/order-summary.queries.ts';
import { estimatesNow } from '#api/modules/contents/content-changes.queries.ts';
import { pickupOf } from '#api/modules/orders/pickup.queries.ts';
import { activeHoldsOf } from '#api/modules/plan/plan.queries.ts';

/** An order with what lists and the calendar tell of it in a line. */
export type OrderCard = {
  readonly order: Order;
  readonly revision: OrderRevision;
  readonly customer: string;
  readonly summary: string;
  readonly allergies: boolean;
};

/** Cards of orders, in the order they are asked for. */
export async function loadOrderCards(ids: readonly string[]): Promise<OrderCard[]> {
  const orders = await Order.findAll({ where: { id: { [Op.in]: [...ids] } } });
  const [revisions, contacts, menu] = await Promise.all([
    loadRevisions(orders.flatMap(({ currentRevisionId }) => currentRevisionId ?? [])),
    OrderContact.findAll({ where: { orderId: { [Op.in]: [...ids] }, role: 'ordered' } }),
    menuOfAllTimes(),
  ]);
  const byId = new Map(orders.map((order) => [order.id, order]));
  const names = new Map(contacts.map(({ orderId, name }) => [orderId, name]));
  return ids.flatMap((id) => {
    const order = byId.get(id);
    const revision = revisions.get(order?.currentRevisionId ?? '');
    if (order === undefined || revision === undefined) return [];
    return [
      {
        order,
        revision,
        customer: names.get(id) ?? '',
        summary: summariseRevision(revision, menu),
        allergies: (revision.allergies ?? []).some(({ erasedAt }) => erasedAt === null),
      },
    ];
  });
}

/** Rows of the orders table. */
export async function loadOrderRows(ids: readonly string[]): Promise<OrderRow[]> {
  const cards = await loadOrderCards(ids);
  const [holds, unread, lifted] = await Promise.all([
    activeHoldsOf(ids),
    unreadOf(ids),
    LiftedStop.findAll({ where: { orderId: { [Op.in]: [...ids] } } }),
  ]);
  const revisions = cards.map(({ revision }) => revision);
  const now = await estimatesNow(revisions);
  const estimates = new Map(revisions.map(({ id }, index) => [id, now[index]]));
  return cards.map(({ order, revision, customer, summary, allergies }) => {
    const hold = holds.get(order.id);
    return {
      number: order.number,
      status: order.status,
      customer,
      summary,
      pickup: pickupOf(order, revision),
      headCount: revision.headCount,
      totalMinor: revision.totalMinor,
      currency: revision.currency,
      allergies,
      worst: worstOf(
        estimates.get(revision.id)?.advice ?? [],
        lifted.filter((it) => it.revisionId === revision.id),
      ),
      hold: hold === undefined ? null : { expiresAt: hold.expiresAt.toISOString() },
      createdAt: order.createdAt.toISOString(),
      unread: unread.get(order.id) ?? 0,
    };
  });
}

/** A stop the owner has lifted still needs care. */
function worstOf(advice: readonly Advice[], lifted: readonly LiftedStop[]): AdviceLevel {
  const open = advice.map((it): AdviceLevel => {
    const isLifted = lifted.some(({ code, about }) => code === it.code && about === it.about);
    return it.level === 'stop' && isLifted ? 'care' : it.level;
  });
  if (open.includes('stop')) return 'stop';
  return open.includes('care') ? 'care' : 'ok';
}
