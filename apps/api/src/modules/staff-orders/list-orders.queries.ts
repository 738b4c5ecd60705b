import { QueryTypes } from 'sequelize';
import * as z from 'zod/mini';
import type { ListOrdersQuery } from '#shared/contracts/staff.ts';
import { orderStatus, orderStatuses } from '#shared/contracts/vocabulary.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { currentDatabase } from '#api/db/current-database.ts';

export type FoundOrders = {
  readonly ids: readonly string[];
  readonly total: number;
  readonly page: number;
  readonly perPage: number;
  /** How many there are in each state, whatever state was asked for. */
  readonly counts: Record<string, number>;
};

type Condition = { readonly sql: string; readonly values: Record<string, unknown> };

/**
 * Columns that are sorted by, on orders alone wherever that does: a page in the order of an index
 * reads no more orders than it shows. Nothing of the request reaches this text.
 */
const sortColumns: Record<NonNullable<ListOrdersQuery['sort']>, string> = {
  pickup: 'o.pickup_date {dir}, o.window_start_minute {dir}',
  number: 'o.number {dir}',
  status: `CASE o.status ${orderStatuses.map((it, n) => `WHEN '${it}' THEN ${n}`).join(' ')} END {dir}`,
  customer: `(SELECT c.name FROM order_contacts c
    WHERE c.order_id = o.id AND c.role = 'ordered') COLLATE NOCASE {dir}`,
  total: '(SELECT r.total_minor FROM order_revisions r WHERE r.id = o.current_revision_id) {dir}',
  created: 'o.created_at {dir}',
};

const idRow = z.object({ id: z.string() });
const countRow = z.object({ status: orderStatus, count: z.int() });

/** Finds, filters, sorts and pages orders in the database. */
export async function findOrders(query: ListOrdersQuery): Promise<FoundOrders> {
  const { sequelize } = currentDatabase();
  const page = query.page ?? 1;
  const perPage = query.perPage ?? 25;
  const others = conditionsOf(query);
  const all = query.status === undefined ? others : [...others, statusCondition(query.status)];
  const direction = query.order === 'desc' ? 'DESC' : 'ASC';
  const order = sortColumns[query.sort ?? 'pickup'].replaceAll('{dir}', direction);
  const [ids, counts] = await Promise.all([
    sequelize.query<object>(
      `SELECT o.id FROM orders o ${whereOf(all)} ORDER BY ${order}, o.number ${direction}
       LIMIT :perPage OFFSET :offset`,
      {
        type: QueryTypes.SELECT,
        replacements: { ...valuesOf(all), perPage, offset: (page - 1) * perPage },
      },
    ),
    sequelize.query<object>(
      `SELECT o.status, count(*) AS count FROM orders o ${whereOf(others)} GROUP BY o.status`,
      {
        type: QueryTypes.SELECT,
        replacements: valuesOf(others),
      },
    ),
  ]);
  const byStatus = new Map<OrderStatus, number>();
  for (const row of counts) {
    const { status, count } = countRow.parse(row);
    byStatus.set(status, count);
  }
  const wanted: readonly OrderStatus[] = query.status ?? orderStatuses;
  return {
    ids: ids.map((row) => idRow.parse(row).id),
    total: wanted.reduce((sum, status) => sum + (byStatus.get(status) ?? 0), 0),
    page,
    perPage,
    counts: Object.fromEntries(byStatus),
  };
}

function conditionsOf(query: ListOrdersQuery): Condition[] {
  const { find, from, to, allergies } = query;
  const conditions = termsOf(find ?? '').map(termCondition);
  if (from !== undefined) conditions.push({ sql: 'o.pickup_date >= :from', values: { from } });
  if (to !== undefined) conditions.push({ sql: 'o.pickup_date <= :to', values: { to } });
  if (allergies !== undefined) {
    conditions.push({
      sql: `${allergies ? '' : 'NOT '}EXISTS (SELECT 1 FROM declared_allergies a
        WHERE a.revision_id = o.current_revision_id AND a.erased_at IS NULL)`,
      values: {},
    });
  }
  return conditions;
}

function statusCondition(statuses: readonly string[]): Condition {
  // An empty list asks for none.
  if (statuses.length === 0) return { sql: '0', values: {} };
  return { sql: 'o.status IN (:statuses)', values: { statuses } };
}

/** Every word must be found somewhere: "No. 2421 osei" is an order's number and a name. */
function termsOf(find: string): string[] {
  return find
    .split(/\s+/)
    .map((term) => term.replace(/^#/, ''))
    .filter((term) => term !== '' && !/^no\.?$/i.test(term))
    .slice(0, 8);
}

function termCondition(term: string, index: number): Condition {
  const like = `:like${index}`;
  return {
    sql: `(CAST(o.number AS TEXT) = :term${index}
      OR o.code = upper(:term${index})
      OR EXISTS (SELECT 1 FROM order_contacts k WHERE k.order_id = o.id
        AND (k.name LIKE ${like} ESCAPE '~' OR k.email LIKE ${like} ESCAPE '~' OR k.phone LIKE ${like} ESCAPE '~'))
      OR EXISTS (SELECT 1 FROM order_revisions r
        WHERE r.id = o.current_revision_id AND r.note LIKE ${like} ESCAPE '~')
      OR EXISTS (SELECT 1 FROM order_items i JOIN item_tiers t ON t.item_id = i.id
        WHERE i.revision_id = o.current_revision_id AND t.words LIKE ${like} ESCAPE '~')
      OR EXISTS (SELECT 1 FROM messages m WHERE m.order_id = o.id AND m.body LIKE ${like} ESCAPE '~'))`,
    values: {
      [`term${index}`]: term,
      [`like${index}`]: `%${term.replaceAll(/[~%_]/g, '~$&')}%`,
    },
  };
}

function whereOf(conditions: readonly Condition[]): string {
  return conditions.length === 0 ? '' : `WHERE ${conditions.map(({ sql }) => sql).join(' AND ')}`;
}

function valuesOf(conditions: readonly Condition[]): Record<string, unknown> {
  return Object.fromEntries(conditions.flatMap(({ values }) => Object.entries(values)));
}
