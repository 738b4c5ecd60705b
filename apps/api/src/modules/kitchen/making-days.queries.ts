import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import type { MakingDay } from '#shared/kitchen/needs/dated-needs.ts';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import { isLive } from '#shared/orders/transitions.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { Order } from '#api/db/models/order.ts';

/** When the plan makes an order's formulas, and decorates. */
export type MakingDays = {
  /** By formula; only what is still to be made, but a formula that is all made has no share. */
  readonly byFormula: ReadonlyMap<string, readonly MakingDay[]>;
  /** The first decorating still to be done; null where there is none. */
  readonly decorating: LocalDate | null;
};

const batchRow = z.object({
  orderId: z.string(),
  formulaId: z.string(),
  date: z.string(),
  weightMg: z.int(),
  state: z.string(),
});
const taskRow = z.object({ orderId: z.string(), date: z.string() });

const batchesSql = `
  SELECT bs.order_id AS orderId, v.formula_id AS formulaId, s.local_date AS date,
    bs.weight_mg AS weightMg, b.state
  FROM batch_shares bs JOIN batches b ON b.id = bs.batch_id
    JOIN formula_versions v ON v.id = b.formula_version_id
    JOIN assignments a ON a.batch_id = b.id JOIN shifts s ON s.id = a.shift_id
  WHERE bs.order_id IN (:orderIds) AND b.state <> 'dropped'
  ORDER BY s.local_date`;

const decoratingSql = `
  SELECT t.order_id AS orderId, min(s.local_date) AS date
  FROM tasks t JOIN assignments a ON a.task_id = t.id JOIN shifts s ON s.id = a.shift_id
  WHERE t.order_id IN (:orderIds) AND t.kind = 'decorate' AND t.state IN ('planned', 'late')
  GROUP BY t.order_id`;

/** Making days by order. What should have been made before `today` and was not counts as today's. */
export async function makingDaysOf(
  orderIds: readonly string[],
  today: LocalDate,
): Promise<Map<string, MakingDays>> {
  const replacements = { orderIds: [...orderIds] };
  const { sequelize } = currentDatabase();
  const [batches, tasks] = await Promise.all([
    sequelize.query<object>(batchesSql, { type: QueryTypes.SELECT, replacements }),
    sequelize.query<object>(decoratingSql, { type: QueryTypes.SELECT, replacements }),
  ]);
  const batchesOf = groupBy(
    batches.map((it) => batchRow.parse(it)),
    (it) => it.orderId,
  );
  const decorating = new Map(
    tasks.map((it) => taskRow.parse(it)).map(({ orderId, date }) => [orderId, date]),
  );
  const notBefore = (date: LocalDate) => (date < today ? today : date);
  return new Map(
    orderIds.map((orderId) => {
      const byFormula = new Map<string, MakingDay[]>();
      for (const [formulaId, of] of groupBy(batchesOf.get(orderId) ?? [], (it) => it.formulaId)) {
        const whole = of.reduce((sum, it) => sum + it.weightMg, 0);
        byFormula.set(
          formulaId,
          of.map(({ date, weightMg, state }) => ({
            date: notBefore(date),
            share: state === 'planned' || state === 'late' ? weightMg / whole : 0,
          })),
        );
      }
      const day = decorating.get(orderId);
      return [orderId, { byFormula, decorating: day === undefined ? null : notBefore(day) }];
    }),
  );
}

const idRow = z.object({ id: z.string() });

/** Live orders with something still to be made up to a day. */
const toMakeSql = `
  SELECT DISTINCT bs.order_id AS id
  FROM batch_shares bs JOIN batches b ON b.id = bs.batch_id
    JOIN assignments a ON a.batch_id = b.id JOIN shifts s ON s.id = a.shift_id
  WHERE s.local_date <= :to AND b.state IN ('planned', 'late')
  UNION
  SELECT DISTINCT t.order_id AS id
  FROM tasks t JOIN assignments a ON a.task_id = t.id JOIN shifts s ON s.id = a.shift_id
  WHERE s.local_date <= :to AND t.kind = 'decorate' AND t.state IN ('planned', 'late')`;

const unplacedSql = `
  SELECT o.id FROM orders o
  WHERE o.pickup_date BETWEEN :from AND :to
    AND NOT EXISTS (SELECT 1 FROM tasks t WHERE t.order_id = o.id AND t.state <> 'dropped')`;

/** Orders the plan makes up to `to`, held places too; and those collected then without a place. */
export async function ordersToMake(
  from: LocalDate,
  to: LocalDate,
): Promise<{ readonly planned: readonly Order[]; readonly unplaced: readonly Order[] }> {
  const find = async (sql: string) => {
    const rows = await currentDatabase().sequelize.query<object>(sql, {
      type: QueryTypes.SELECT,
      replacements: { from, to },
    });
    return Order.findAll({
      where: { id: rows.map((it) => idRow.parse(it).id), status: orderStatuses.filter(isLive) },
      order: [
        ['pickupDate', 'ASC'],
        ['number', 'ASC'],
      ],
    });
  };
  const [planned, unplaced] = await Promise.all([find(toMakeSql), find(unplacedSql)]);
  return { planned, unplaced };
}
