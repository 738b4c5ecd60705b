import { Op, QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { CalendarDay, PlannedTask } from '#shared/contracts/staff.ts';
import { today } from '#shared/dates/local-time.ts';
import { currentClock, currentDatabase } from '#api/db/current-database.ts';
import { Order } from '#api/db/models/order.ts';
import { Studio } from '#api/db/models/studio.ts';
import { loadCalendarDays } from '#api/modules/plan/calendar-days.queries.ts';
import { plannedTasksOf } from '#api/modules/plan/planned-tasks.queries.ts';
import { blockersOf } from '#api/modules/staff-orders/blockers.queries.ts';
import { estimateNow } from '#api/modules/contents/content-changes.queries.ts';
import { loadOrderCards } from '#api/modules/staff-orders/order-cards.queries.ts';
import type { OrderCard } from '#api/modules/staff-orders/order-cards.queries.ts';
import { loadFit } from '#api/modules/staff-orders/staff-order.queries.ts';
import type { Fit } from '#api/modules/staff-orders/staff-order.queries.ts';

/** More requests than this are answered from the orders table. */
const mostWaiting = 40;

export type Calendar = {
  readonly today: string;
  readonly days: CalendarDay[];
  readonly lanes: readonly (OrderCard & { readonly tasks: PlannedTask[] })[];
  readonly waiting: readonly (OrderCard & { readonly advice: Advice | null; readonly fits: Fit })[];
};

const someIds = z.array(z.object({ id: z.string() }));

/** The studio's days: load, a lane per promised cake, and what waits for an answer. */
export async function loadCalendar(from: string, to: string): Promise<Calendar> {
  const [studio, days, lanes, waiting] = await Promise.all([
    Studio.findByPk(1, { rejectOnEmpty: true }),
    loadCalendarDays(from, to),
    loadLanes(from, to),
    loadWaiting(),
  ]);
  return { today: today(currentClock().now(), studio.zone), days, lanes, waiting };
}

/** Orders with a pickup or work in a range; found from the range, so that past years cost nothing. */
const touchingSql = `
  SELECT id FROM orders WHERE pickup_date BETWEEN :from AND :to
  UNION
  SELECT t.order_id FROM shifts s JOIN assignments a ON a.shift_id = s.id
    JOIN tasks t ON t.id = a.task_id
  WHERE s.local_date BETWEEN :from AND :to AND t.state <> 'dropped'
  UNION
  SELECT b.order_id FROM shifts s JOIN assignments a ON a.shift_id = s.id
    JOIN batch_shares b ON b.batch_id = a.batch_id
  WHERE s.local_date BETWEEN :from AND :to`;

/** Cakes that are promised and collected or worked on in the range, by pickup. */
async function loadLanes(from: string, to: string): Promise<Calendar['lanes']> {
  const rows = await currentDatabase().sequelize.query(
    `SELECT o.id FROM orders o
     WHERE o.status IN ('agreed', 'confirmed', 'making', 'ready', 'collected', 'uncollected')
       AND o.id IN (${touchingSql})
     ORDER BY o.pickup_date, o.window_start_minute, o.number`,
    { type: QueryTypes.SELECT, replacements: { from, to } },
  );
  const ids = someIds.parse(rows).map(({ id }) => id);
  const [cards, tasks] = await Promise.all([loadOrderCards(ids), plannedTasksOf(ids)]);
  return cards.map((card) => ({ ...card, tasks: tasks.get(card.order.id) ?? [] }));
}

/** Requests nobody has answered, the nearest pickup first. */
async function loadWaiting(): Promise<Calendar['waiting']> {
  const orders = await Order.findAll({
    attributes: ['id'],
    where: { status: { [Op.in]: ['asked', 'quoted'] } },
    order: [
      ['pickupDate', 'ASC'],
      ['number', 'ASC'],
    ],
    limit: mostWaiting,
  });
  const cards = await loadOrderCards(orders.map(({ id }) => id));
  return Promise.all(
    cards.map(async (card) => ({
      ...card,
      advice: await sharpestAdvice(card),
      fits: await loadFit(card),
    })),
  );
}

/** What has to be settled first, else what needs care. */
async function sharpestAdvice({ revision }: OrderCard): Promise<Advice | null> {
  const [blocker] = await blockersOf(revision);
  const { advice } = await estimateNow(revision);
  return blocker ?? advice.find(({ level }) => level === 'care') ?? null;
}
