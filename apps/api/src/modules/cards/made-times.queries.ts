import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import { currentDatabase } from '#api/db/current-database.ts';

const row = z.object({
  formulaId: z.string(),
  finishedAt: z.nullable(z.string()),
  startAt: z.string(),
  minutes: z.int(),
});

const sql = `
  SELECT v.formula_id AS formulaId, b.finished_at AS finishedAt, a.start_at AS startAt, a.minutes
  FROM batch_shares bs JOIN batches b ON b.id = bs.batch_id
    JOIN formula_versions v ON v.id = b.formula_version_id
    JOIN assignments a ON a.batch_id = b.id
  WHERE bs.order_id = :orderId AND b.state <> 'dropped'`;

/**
 * When each formula of an order was made, or will be by the plan: the earliest of its batches, since
 * that one keeps no longer than the others. By the formula's id.
 */
export async function madeTimesOf(orderId: string): Promise<Map<string, Date>> {
  const rows = await currentDatabase().sequelize.query<object>(sql, {
    type: QueryTypes.SELECT,
    replacements: { orderId },
  });
  const times = new Map<string, Date>();
  for (const it of rows.map((each) => row.parse(each))) {
    const made =
      it.finishedAt === null
        ? new Date(new Date(it.startAt).getTime() + it.minutes * 60_000)
        : new Date(it.finishedAt);
    const before = times.get(it.formulaId);
    if (before === undefined || made < before) times.set(it.formulaId, made);
  }
  return times;
}
