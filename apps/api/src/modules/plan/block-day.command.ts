import { Op, QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { Closure } from '#api/db/models/closure.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';

/**
 * Closes a day for work and pickups. Nothing that stands is dropped: the numbers of the orders
 * with work or a pickup on that day are answered, so that somebody looks at them.
 * @throws `wrong-state` when the day is closed already
 */
export function blockDay(block: {
  readonly date: LocalDate;
  readonly reason: string;
  readonly actor: Staff;
}): Promise<{ readonly id: string; readonly standing: number[] }> {
  const { date, reason, actor } = block;
  return inTransaction(async () => {
    const already = await Closure.findOne({
      where: { reopenedAt: null, fromDate: { [Op.lte]: date }, toDate: { [Op.gte]: date } },
    });
    if (already !== null) {
      throw new AppError('wrong-state', { detail: 'That day is closed already.' });
    }
    const { id } = await Closure.create({
      fromDate: date,
      toDate: date,
      kind: 'blocked',
      reason,
      createdByUserId: actor.userId,
    });
    await noteSettingsChange();
    await noteAudit(actor, { action: 'block-day', subjectKind: 'closure', subjectId: id });
    return { id, standing: await standingOn(date) };
  });
}

const numberRow = z.object({ number: z.int() });

async function standingOn(date: LocalDate): Promise<number[]> {
  const rows = await currentDatabase().sequelize.query<object>(
    `SELECT o.number FROM orders o
     WHERE o.status IN ('asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready')
       AND (o.pickup_date = :date
         OR EXISTS (SELECT 1 FROM tasks t JOIN assignments a ON a.task_id = t.id
           JOIN shifts s ON s.id = a.shift_id
           WHERE t.order_id = o.id AND s.local_date = :date AND t.state <> 'dropped')
         OR EXISTS (SELECT 1 FROM batch_shares b JOIN assignments a ON a.batch_id = b.batch_id
           JOIN shifts s ON s.id = a.shift_id
           WHERE b.order_id = o.id AND s.local_date = :date))
     ORDER BY o.number`,
    { type: QueryTypes.SELECT, replacements: { date } },
  );
  return rows.map((it) => numberRow.parse(it).number);
}
