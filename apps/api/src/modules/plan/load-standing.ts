import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import { groupBy } from '#shared/group-by.ts';
import { allergenEntry } from '#shared/contracts/menu.ts';
import { allergenId, taskKind } from '#shared/contracts/vocabulary.ts';
import type { AllergenId } from '#shared/contracts/vocabulary.ts';
import { boxOf, keepsApart } from '#shared/dates/expand-design.ts';
import { addDays, toUtcMinute } from '#shared/dates/local-time.ts';
import type { UtcMinute } from '#shared/dates/local-time.ts';
import type { Link, Place, PlannedOrder, Supply, Work } from '#shared/dates/model.ts';
import { coldStartsWith } from '#shared/dates/model.ts';
import { Studio } from '#api/db/models/studio.ts';
import { kitchenOf } from '#api/db/kitchen-of.ts';
import { currentDatabase } from '#api/db/current-database.ts';
import { shiftKey } from './load-supply.ts';

/**
 * Every order with a place in the plan whose pickup is still to come (or that waits, ready, to be
 * collected), with its unfinished work. Read in a few statements: past orders cost nothing.
 */
export async function loadStanding(supply: Supply): Promise<PlannedOrder[]> {
  const rules = kitchenOf(await Studio.findByPk(1, { rejectOnEmpty: true }));
  const orders = await readRows(orderRow, ordersSql, { today: supply.today });
  const [work, links, fills, tiers, allergies] = await Promise.all([
    readRows(workRow, workSql, { today: supply.today }),
    readRows(linkRow, linksSql, { today: supply.today }),
    readRows(fillRow, fillsSql, { today: supply.today }),
    readRows(tierRow, tiersSql, { today: supply.today }),
    readRows(allergyRow, allergiesSql, { today: supply.today }),
  ]);
  const workBy = groupBy(work, (it) => it.orderId);
  const linksBy = groupBy(links, (it) => it.orderId);
  const tiersBy = groupBy(tiers, (it) => it.orderId);
  const allergiesBy = groupBy(allergies, (it) => it.orderId);
  const coldFrom = new Map(fills.map((it) => [it.orderId, it.firstDay]));
  return orders.map((order): PlannedOrder => {
    const mine = workBy.get(order.id) ?? [];
    const keys = new Set(mine.map((it) => it.id));
    const contains = containedIn(order.allergens);
    const startAt = toUtcMinute(new Date(order.pickupAt));
    return {
      orderId: order.id,
      demand: {
        occasionId: order.occasionId,
        noticeDays: 0,
        work: mine.map((it) => toWork(it, supply.now)),
        links: (linksBy.get(order.id) ?? [])
          .filter((it) => keys.has(it.before) && keys.has(it.after))
          .map(({ before, after, gap, keeps }): Link => ({ before, after, gap, keeps })),
        boxes: (tiersBy.get(order.id) ?? []).flatMap((it) =>
          Array.from({ length: it.quantity }, () => boxOf(it, rules)),
        ),
        contains,
        apart: (allergiesBy.get(order.id) ?? [])
          .map((it) => it.allergen)
          .filter((it) => !contains.includes(it)),
      },
      pickup: {
        date: order.pickupDate,
        startMinute: order.windowStart,
        startAt,
        endAt: startAt + order.windowMinutes,
      },
      places: mine.map(toPlace),
      coldFrom: coldFrom.get(order.id) ?? null,
      coldUntil: order.pickupDate < supply.today ? addDays(supply.today, 1) : order.pickupDate,
    };
  });
}

/** Orders that have a place: in a live state, with work, and not yet handed over. */
const standing = `
  SELECT o.id FROM orders o
  WHERE o.status IN ('asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready')
    AND (o.pickup_date >= :today OR o.status = 'ready')
    AND (EXISTS (SELECT 1 FROM tasks t WHERE t.order_id = o.id AND t.state <> 'dropped'))`;

const ordersSql = `
  SELECT o.id, o.occasion_id AS occasionId, o.pickup_date AS pickupDate, o.pickup_at AS pickupAt,
    o.window_start_minute AS windowStart, o.window_minutes AS windowMinutes,
    json_extract(r.estimate, '$.allergens') AS allergens
  FROM orders o JOIN order_revisions r ON r.id = o.current_revision_id
  WHERE o.id IN (${standing})
  ORDER BY o.number`;

const workSql = `
  SELECT t.id, t.order_id AS orderId, t.kind, t.label, t.tier_position AS tier,
    t.bench_minutes AS bench, t.mixer_minutes AS mixer, t.oven_minutes AS oven,
    t.skill_id AS skill, t.within_minutes AS within, t.state, t.started_at AS startedAt,
    a.start_at AS startAt, a.minutes, s.local_date AS date, s.start_minute AS shiftStart
  FROM tasks t JOIN assignments a ON a.task_id = t.id JOIN shifts s ON s.id = a.shift_id
  WHERE t.order_id IN (${standing}) AND t.state IN ('planned', 'started', 'late')
  UNION ALL
  SELECT b.id, min(bs.order_id) AS orderId,
    CASE f.kind WHEN 'sponge' THEN 'bake' WHEN 'custard' THEN 'custard'
      WHEN 'buttercream' THEN 'buttercream' ELSE 'filling' END AS kind,
    f.name AS label, NULL AS tier, b.bench_minutes AS bench, b.mixer_minutes AS mixer,
    b.oven_minutes AS oven, NULL AS skill, NULL AS within, b.state, b.started_at AS startedAt,
    a.start_at AS startAt, a.minutes, s.local_date AS date, s.start_minute AS shiftStart
  FROM batches b JOIN batch_shares bs ON bs.batch_id = b.id
    JOIN formula_versions v ON v.id = b.formula_version_id JOIN formulas f ON f.id = v.formula_id
    JOIN assignments a ON a.batch_id = b.id JOIN shifts s ON s.id = a.shift_id
  WHERE bs.order_id IN (${standing}) AND b.state IN ('planned', 'started', 'late')
  GROUP BY b.id`;

const linksSql = `
  SELECT coalesce(ta.order_id, bsa.order_id) AS orderId,
    coalesce(l.before_task_id, l.before_batch_id) AS before,
    coalesce(l.after_task_id, l.after_batch_id) AS after,
    l.gap_minutes AS gap, l.keeps_minutes AS keeps
  FROM task_links l
    LEFT JOIN tasks ta ON ta.id = l.after_task_id
    LEFT JOIN batch_shares bsa ON bsa.batch_id = l.after_batch_id
  WHERE l.after_task_id IN (SELECT id FROM tasks WHERE order_id IN (${standing}))
    OR l.after_batch_id IN (SELECT batch_id FROM batch_shares WHERE order_id IN (${standing}))`;

const fillsSql = `
  SELECT t.order_id AS orderId, min(s.local_date) AS firstDay
  FROM tasks t JOIN assignments a ON a.task_id = t.id JOIN shifts s ON s.id = a.shift_id
  WHERE t.order_id IN (${standing}) AND t.kind = '${coldStartsWith}' AND t.state <> 'dropped'
  GROUP BY t.order_id`;

const tiersSql = `
  SELECT o.id AS orderId, it.width_mm AS widthMm, it.depth_mm AS depthMm, it.height_mm AS heightMm,
    i.quantity
  FROM orders o JOIN order_items i ON i.revision_id = o.current_revision_id
    JOIN item_tiers it ON it.item_id = i.id
  WHERE o.id IN (${standing})`;

const allergiesSql = `
  SELECT DISTINCT o.id AS orderId, d.allergen
  FROM orders o JOIN declared_allergies d ON d.revision_id = o.current_revision_id
  WHERE o.id IN (${standing}) AND d.allergen IS NOT NULL
    AND d.severity IN (${keepsApart.map((it) => `'${it}'`).join(', ')})`;

const orderRow = z.object({
  id: z.string(),
  occasionId: z.string(),
  pickupDate: z.string(),
  pickupAt: z.string(),
  windowStart: z.int(),
  windowMinutes: z.int(),
  allergens: z.nullable(z.string()),
});

const workRow = z.object({
  id: z.string(),
  orderId: z.string(),
  kind: taskKind,
  label: z.string(),
  tier: z.nullable(z.int()),
  bench: z.int(),
  mixer: z.int(),
  oven: z.int(),
  skill: z.nullable(z.string()),
  within: z.nullable(z.int()),
  state: z.string(),
  startedAt: z.nullable(z.string()),
  startAt: z.string(),
  minutes: z.int(),
  date: z.string(),
  shiftStart: z.int(),
});
type WorkRow = z.infer<typeof workRow>;

const linkRow = z.object({
  orderId: z.string(),
  before: z.string(),
  after: z.string(),
  gap: z.int(),
  keeps: z.nullable(z.int()),
});

const fillRow = z.object({ orderId: z.string(), firstDay: z.string() });

const tierRow = z.object({
  orderId: z.string(),
  widthMm: z.int(),
  depthMm: z.int(),
  heightMm: z.int(),
  /** Cutting cakes of one kind are one item. */
  quantity: z.int(),
});

const allergyRow = z.object({ orderId: z.string(), allergen: allergenId });

async function readRows<Schema extends z.ZodMiniType>(
  row: Schema,
  sql: string,
  replacements: Record<string, unknown>,
): Promise<z.output<Schema>[]> {
  const { sequelize } = currentDatabase();
  const rows = await sequelize.query<object>(sql, { type: QueryTypes.SELECT, replacements });
  return rows.map((it) => row.parse(it));
}

function containedIn(json: string | null): AllergenId[] {
  if (json === null) return [];
  const entries = z
    .array(z.pick(allergenEntry, { allergen: true, state: true }))
    .parse(JSON.parse(json));
  return entries.filter((it) => it.state === 'contains').map((it) => it.allergen);
}

/** Started work counts with what is left of it; the rest as planned. */
function toWork(row: WorkRow, now: UtcMinute): Work {
  const since =
    row.startedAt === null ? 0 : Math.max(0, now - toUtcMinute(new Date(row.startedAt)));
  const left = (minutes: number) =>
    row.state === 'started' ? Math.max(0, minutes - since) : minutes;
  return {
    key: row.id,
    kind: row.kind,
    label: row.label,
    tier: row.tier,
    minutes: left(row.minutes),
    benchMinutes: left(row.bench),
    mixerMinutes: left(row.mixer),
    ovenMinutes: left(row.oven),
    skill: row.skill,
    batch: null,
    within: row.within,
  };
}

function toPlace(row: WorkRow): Place {
  return {
    key: row.id,
    shiftKey: shiftKey(row.date, row.shiftStart),
    startAt: toUtcMinute(new Date(row.startAt)),
  };
}
