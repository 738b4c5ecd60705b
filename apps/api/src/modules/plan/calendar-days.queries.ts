import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { CalendarDay } from '#shared/contracts/staff.ts';
import { taskKind } from '#shared/contracts/vocabulary.ts';
import type { TaskKind } from '#shared/contracts/vocabulary.ts';
import { formatDuration, formatWeekday } from '#shared/dates/format.ts';
import { datesInRange } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { groupBy } from '#shared/group-by.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { loadHours, measureShift } from './load-supply.ts';
import type { Hours } from './load-supply.ts';

const loadRow = z.object({
  date: z.string(),
  number: z.int(),
  kind: taskKind,
  minutes: z.int(),
});
type LoadRow = z.infer<typeof loadRow>;

const loadSql = `
  SELECT s.local_date AS date, o.number, t.kind, sum(t.bench_minutes) AS minutes
  FROM shifts s JOIN assignments a ON a.shift_id = s.id JOIN tasks t ON t.id = a.task_id
    JOIN orders o ON o.id = t.order_id
  WHERE s.local_date BETWEEN :from AND :to AND t.state <> 'dropped'
  GROUP BY s.local_date, o.number, t.kind
  UNION ALL
  SELECT s.local_date AS date, o.number,
    CASE f.kind WHEN 'sponge' THEN 'bake' WHEN 'custard' THEN 'custard'
      WHEN 'buttercream' THEN 'buttercream' ELSE 'filling' END AS kind,
    sum(b.bench_minutes) AS minutes
  FROM shifts s JOIN assignments a ON a.shift_id = s.id JOIN batches b ON b.id = a.batch_id
    JOIN batch_shares bs ON bs.batch_id = b.id JOIN orders o ON o.id = bs.order_id
    JOIN formula_versions v ON v.id = b.formula_version_id JOIN formulas f ON f.id = v.formula_id
  WHERE s.local_date BETWEEN :from AND :to AND b.state <> 'dropped'
  GROUP BY s.local_date, o.number, f.kind`;

const pickupRow = z.object({ date: z.string(), pickups: z.int() });

/** Every handover of the day that has happened or stands: with a place, or agreed to. */
const pickupSql = `
  SELECT o.pickup_date AS date, count(*) AS pickups FROM orders o
  WHERE o.pickup_date BETWEEN :from AND :to
    AND (o.status IN ('agreed', 'confirmed', 'making', 'ready', 'collected')
      OR (o.status IN ('asked', 'quoted')
        AND EXISTS (SELECT 1 FROM tasks t WHERE t.order_id = o.id AND t.state <> 'dropped')))
  GROUP BY o.pickup_date`;

/** What each kind of work is called in the middle of a sentence. */
const doing: Record<TaskKind, string> = {
  bake: 'baking',
  custard: 'custard',
  buttercream: 'buttercream',
  filling: 'filling',
  'fill-and-crumb-coat': 'filling and crumb coat',
  'final-coat': 'final coat',
  cover: 'covering',
  decorate: 'decorating',
  stack: 'stacking',
  box: 'boxing',
  handover: 'handing over',
};

/** How many of a day's largest pieces of work are named. */
const mostNamed = 3;

/** The studio's days for the staff: hours, load, pickups, and what fills them. At most 62 days. */
export async function loadCalendarDays(from: LocalDate, to: LocalDate): Promise<CalendarDay[]> {
  const { sequelize } = currentDatabase();
  const options = { type: QueryTypes.SELECT, replacements: { from, to } } as const;
  const [hours, loads, pickups] = await Promise.all([
    loadHours(from, to),
    sequelize.query<object>(loadSql, options),
    sequelize.query<object>(pickupSql, options),
  ]);
  const loadBy = groupBy(
    loads.map((it) => loadRow.parse(it)),
    (it) => it.date,
  );
  const pickupsBy = new Map(
    pickups.map((it) => pickupRow.parse(it)).map((it) => [it.date, it.pickups]),
  );
  return datesInRange(from, to).map((date) => {
    const load = loadBy.get(date) ?? [];
    const shifts = hours.shifts.get(date) ?? [];
    return {
      date,
      closed: closedOn(date, hours),
      benchMinutes: shifts.reduce((sum, it) => sum + measureShift(it, hours, 0).benchMinutes, 0),
      plannedMinutes: load.reduce((sum, it) => sum + it.minutes, 0),
      pickups: pickupsBy.get(date) ?? 0,
      shifts: shifts.map((it) => ({
        start: it.startMinute,
        end: it.endMinute,
        people: it.people.map((person) => person.name),
      })),
      why: whyOf(load),
    };
  });
}

function closedOn(date: LocalDate, { closures, shifts, windows }: Hours): CalendarDay['closed'] {
  const closure = closures.get(date);
  if (closure !== undefined) return { id: closure.id, reason: closure.reason };
  if (shifts.has(date) || windows.has(date)) return null;
  return { id: null, reason: `No work on a ${formatWeekday(date)}` };
}

/** "No. 2421 decorating 1 h 40", largest first. */
function whyOf(load: readonly LoadRow[]): string[] {
  return load
    .filter((it) => it.minutes > 0)
    .toSorted((a, b) => b.minutes - a.minutes || a.number - b.number)
    .slice(0, mostNamed)
    .map((it) => `No. ${it.number} ${doing[it.kind]} ${formatDuration(it.minutes)}`);
}
