import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { Op } from 'sequelize';
import { changeOne } from '#api/db/change-one.ts';
import { currentClock, currentDatabase } from '#api/db/current-database.ts';
import { Closure } from '#api/db/models/closure.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';
import { AppError } from '#api/platform/app-error.ts';

/**
 * Closes a day for work and pickups. Nothing that stands is dropped: the numbers of the orders
 * with work or a pickup on that day are answered, so that somebody looks at them. Joins the
 * transaction of its cause.
 * @throws `wrong-state` when the day is closed already
 */
export async function blockDay(block: {
  readonly date: LocalDate;
  readonly reason: string;
  readonly userId: string | null;
}): Promise<{ readonly id: string; readonly standing: number[] }> {
  const { date, reason, userId } = block;
  const already = await Closure.findOne({
    where: { reopenedAt: null, fromDate: { [Op.lte]: date }, toDate: { [Op.gte]: date } },
  });
  if (already !== null)
    throw new AppError('wrong-state', { detail: 'That day is closed already.' });
  const closure = await Closure.create({
    fromDate: date,
    toDate: date,
    kind: 'blocked',
    reason,
    createdByUserId: userId,
  });
  await noteSettingsChange();
  return { id: closure.id, standing: await standingOn(date) };
}

/**
 * Opens a closed day again; joins the transaction of its cause.
 * @returns false when it was open, or never closed
 */
export async function openDay({ id }: { readonly id: string }): Promise<boolean> {
  const opened = await changeOne(
    Closure,
    { reopenedAt: currentClock().now() },
    { id, reopenedAt: null },
  );
  if (opened) await noteSettingsChange();
  return opened;
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
