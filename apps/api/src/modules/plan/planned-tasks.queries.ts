import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { PlannedTask } from '#shared/contracts/staff.ts';
import { taskKind } from '#shared/contracts/vocabulary.ts';
import { localAt } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { Studio } from '#api/db/models/studio.ts';

const row = z.object({
  orderId: z.string(),
  id: z.string(),
  kind: taskKind,
  label: z.string(),
  startAt: z.string(),
  minutes: z.int(),
  state: z.enum(['planned', 'started', 'finished', 'late']),
  pinned: z.int(),
});

/** A batch carries its formula's name; a task its own label. */
const sql = `
  SELECT t.order_id AS orderId, t.id, t.kind, t.label, a.start_at AS startAt, a.minutes, t.state,
    a.pinned
  FROM tasks t JOIN assignments a ON a.task_id = t.id
  WHERE t.order_id IN (:orderIds) AND t.state <> 'dropped'
  UNION ALL
  SELECT bs.order_id AS orderId, b.id,
    CASE f.kind WHEN 'sponge' THEN 'bake' WHEN 'custard' THEN 'custard'
      WHEN 'buttercream' THEN 'buttercream' ELSE 'filling' END AS kind,
    CASE f.kind WHEN 'sponge' THEN 'Bake ' WHEN 'custard' THEN 'Cook ' ELSE 'Make ' END || f.name
      AS label,
    a.start_at AS startAt, a.minutes, b.state, a.pinned
  FROM batch_shares bs JOIN batches b ON b.id = bs.batch_id
    JOIN formula_versions v ON v.id = b.formula_version_id JOIN formulas f ON f.id = v.formula_id
    JOIN assignments a ON a.batch_id = b.id
  WHERE bs.order_id IN (:orderIds) AND b.state <> 'dropped'
  ORDER BY startAt, minutes DESC`;

/** The work of orders with its times, tasks and batches alike, in order of start. */
export async function plannedTasksOf(
  orderIds: readonly string[],
): Promise<Map<string, PlannedTask[]>> {
  if (orderIds.length === 0) return new Map();
  const { zone } = await Studio.findByPk(1, { rejectOnEmpty: true });
  const rows = await currentDatabase().sequelize.query<object>(sql, {
    type: QueryTypes.SELECT,
    replacements: { orderIds: [...orderIds] },
  });
  const parsed = rows.map((it) => row.parse(it));
  return new Map(
    [...groupBy(parsed, (it) => it.orderId)].map(([orderId, work]) => [
      orderId,
      work.map((it): PlannedTask => {
        const startAt = new Date(it.startAt);
        const local = localAt(startAt, zone);
        return {
          id: it.id,
          kind: it.kind,
          label: it.label,
          startAt: startAt.toISOString(),
          date: local.date,
          start: local.minute,
          minutes: it.minutes,
          state: it.state,
          pinned: it.pinned === 1,
        };
      }),
    ]),
  );
}
