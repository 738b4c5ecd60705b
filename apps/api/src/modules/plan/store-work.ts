import { Op } from 'sequelize';
import type { CreationAttributes } from 'sequelize';
import { placedWork } from '#shared/dates/book.ts';
import { fromUtcMinute } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { PlannedOrder, Work } from '#shared/dates/model.ts';
import { Assignment } from '#api/db/models/assignment.ts';
import { BatchShare } from '#api/db/models/batch-share.ts';
import { Batch } from '#api/db/models/batch.ts';
import { ShiftPerson } from '#api/db/models/shift-person.ts';
import { Shift } from '#api/db/models/shift.ts';
import { TaskLink } from '#api/db/models/task-link.ts';
import { Task } from '#api/db/models/task.ts';
import { newId } from '#api/platform/ids.ts';
import { formulaVersionOf } from './batch-formulas.ts';
import { loadHours, measureShift, shiftKey } from './load-supply.ts';

/** What the tasks of an order point at. */
export type WorkOwner = {
  readonly orderId: string;
  readonly revisionId: string;
  /** The cake among the order's items. */
  readonly itemId: string | null;
};

/** Where a piece of work went: a task, or the order's own batch. */
type Row = { readonly taskId: string | null; readonly batchId: string | null };

/** Writes a checked plan of one order: shifts where needed, tasks, batches, links, times. */
export async function storeWork(
  owner: WorkOwner,
  planned: PlannedOrder,
  planVersion: number,
): Promise<void> {
  const shiftIds = await ensureShifts(planned);
  const shiftOf = (shiftKey: string): string => {
    const id = shiftIds.get(shiftKey);
    if (id === undefined) throw new Error(`The plan names a shift that is not there: ${shiftKey}`);
    return id;
  };
  const placed = placedWork(planned);
  const rows = await storePieces(
    owner,
    placed.map(([work, place]) => ({ work, shiftId: shiftOf(place.shiftKey) })),
  );
  await TaskLink.bulkCreate(
    planned.demand.links.flatMap((link) => {
      const before = rows.get(link.before);
      const after = rows.get(link.after);
      if (before === undefined || after === undefined) return [];
      return {
        beforeTaskId: before.taskId,
        beforeBatchId: before.batchId,
        afterTaskId: after.taskId,
        afterBatchId: after.batchId,
        gapMinutes: link.gap,
        keepsMinutes: link.keeps,
      };
    }),
  );
  await Assignment.bulkCreate(
    placed.map(([work, place]) => ({
      taskId: rows.get(work.key)?.taskId ?? null,
      batchId: rows.get(work.key)?.batchId ?? null,
      shiftId: shiftOf(place.shiftKey),
      startAt: fromUtcMinute(place.startAt),
      minutes: work.minutes,
      planVersion,
    })),
  );
}

async function storePieces(
  owner: WorkOwner,
  pieces: readonly { readonly work: Work; readonly shiftId: string }[],
): Promise<Map<string, Row>> {
  const rows = new Map<string, Row>();
  const tasks: CreationAttributes<Task>[] = [];
  const batches: CreationAttributes<Batch>[] = [];
  const shares: CreationAttributes<BatchShare>[] = [];
  for (const { work, shiftId } of pieces) {
    const id = newId();
    const minutes = {
      benchMinutes: work.benchMinutes,
      mixerMinutes: work.mixerMinutes,
      ovenMinutes: work.ovenMinutes,
    };
    const formulaVersionId = work.batch === null ? null : await formulaVersionOf(work.batch.source);
    if (work.batch !== null && formulaVersionId !== null) {
      const weightMg = work.batch.grams * 1000;
      batches.push({
        id,
        formulaVersionId,
        shiftId,
        bowls: work.batch.bowls,
        weightMg,
        ...minutes,
      });
      shares.push({ batchId: id, orderId: owner.orderId, weightMg });
      rows.set(work.key, { taskId: null, batchId: id });
      continue;
    }
    // Something made without a formula of the studio's is still work on the order.
    tasks.push({
      id,
      orderId: owner.orderId,
      revisionId: owner.revisionId,
      itemId: owner.itemId,
      kind: work.kind,
      label: work.label,
      tierPosition: work.tier,
      skillId: work.skill,
      withinMinutes: work.within,
      ...minutes,
    });
    rows.set(work.key, { taskId: id, batchId: null });
  }
  await Task.bulkCreate(tasks);
  await Batch.bulkCreate(batches);
  await BatchShare.bulkCreate(shares);
  return rows;
}

/** Shifts of the weekly pattern are written down when the first work is put into them. */
async function ensureShifts(planned: PlannedOrder): Promise<Map<string, string>> {
  const keys = new Set(planned.places.map((it) => it.shiftKey));
  const dates: LocalDate[] = [...keys].map((key) => key.slice(0, 10)).toSorted();
  const first = dates[0];
  const last = dates.at(-1);
  if (first === undefined || last === undefined) return new Map();
  const written = await Shift.findAll({ where: { localDate: { [Op.between]: [first, last] } } });
  const ids = new Map(written.map((it) => [shiftKey(it.localDate, it.startMinute), it.id]));
  const missing = [...keys].filter((key) => !ids.has(key));
  if (missing.length === 0) return ids;
  const hours = await loadHours(first, last);
  for (const plain of [...hours.shifts.values()].flat()) {
    const key = shiftKey(plain.date, plain.startMinute);
    if (!missing.includes(key)) continue;
    const whole = measureShift(plain, hours, 0);
    const shift = await Shift.create({
      localDate: plain.date,
      startMinute: plain.startMinute,
      endMinute: plain.endMinute,
      startAt: fromUtcMinute(whole.startAt),
      endAt: fromUtcMinute(whole.endAt),
      weeklyShiftId: plain.weeklyShiftId,
      benchMinutes: whole.benchMinutes,
      mixerMinutes: whole.mixerMinutes,
      ovenMinutes: whole.ovenMinutes,
    });
    await ShiftPerson.bulkCreate(
      plain.people.map(({ id }) => ({ shiftId: shift.id, personId: id })),
    );
    ids.set(key, shift.id);
  }
  return ids;
}

/**
 * Takes an order's unbegun work out of the plan; what was started or finished stays as it was.
 * @returns whether there was any
 */
export async function removeWork(orderId: string): Promise<boolean> {
  const tasks = await Task.destroy({ where: { orderId, state: ['planned', 'late'] } });
  const shares = await BatchShare.findAll({ where: { orderId }, include: ['batch'] });
  let batches = 0;
  for (const share of shares) {
    const { batch } = share;
    if (batch === undefined || !['planned', 'late'].includes(batch.state)) continue;
    batches += 1;
    await share.destroy();
    const others = await BatchShare.sum('weightMg', { where: { batchId: batch.id } });
    if (others > 0) await batch.update({ weightMg: others });
    else await batch.destroy();
  }
  return tasks + batches > 0;
}

/** Whether any of an order's work has begun. */
export async function hasBegun(orderId: string): Promise<boolean> {
  const begun = ['started', 'finished'] as const;
  if ((await Task.count({ where: { orderId, state: [...begun] } })) > 0) return true;
  const shares = await BatchShare.findAll({ where: { orderId }, include: ['batch'] });
  return shares.some(({ batch }) => batch?.state === 'started' || batch?.state === 'finished');
}
