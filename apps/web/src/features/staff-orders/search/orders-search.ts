import { type ListOrdersQuery, listOrdersQuery } from '#shared/contracts/staff.ts';
import { type OrderStatus, orderStatuses } from '#shared/contracts/vocabulary.ts';

/** Sorting by these goes from the largest first at the first press: the newest, the dearest. */
export type SortKey = NonNullable<ListOrdersQuery['sort']>;
const downFirst: readonly SortKey[] = ['number', 'total', 'created'];

export const perPageDefault = 25;

/**
 * What an address of the orders asks for. Each part is read by itself, so that one that makes no
 * sense is left out and the rest still holds.
 */
export function readOrdersSearch(search: URLSearchParams): ListOrdersQuery {
  const { shape } = listOrdersQuery;
  const statuses = search.getAll('status');
  const status = orderStatuses.filter((it) => statuses.includes(it));
  const parts = {
    find: shape.find.safeParse(search.get('find') ?? undefined).data,
    from: shape.from.safeParse(search.get('from') ?? undefined).data,
    to: shape.to.safeParse(search.get('to') ?? undefined).data,
    sort: shape.sort.safeParse(search.get('sort') ?? undefined).data,
    order: shape.order.safeParse(search.get('order') ?? undefined).data,
    page: shape.page.safeParse(numberIn(search, 'page')).data,
    perPage: shape.perPage.safeParse(numberIn(search, 'perPage')).data,
    allergies: search.get('allergies') === 'true' ? true : undefined,
    status: status.length === 0 ? undefined : status,
  };
  return tidy(parts);
}

function numberIn(search: URLSearchParams, name: string): number | undefined {
  const text = search.get(name);
  return text === null ? undefined : Number(text);
}

function tidy(query: ListOrdersQuery): ListOrdersQuery {
  const { find, from, to, ...rest } = query;
  return {
    ...rest,
    ...(find === undefined || find === '' ? {} : { find }),
    // The other way round is what was meant.
    ...(from !== undefined && to !== undefined && from > to
      ? { from: to, to: from }
      : { from, to }),
  };
}

/** The address of a query, without what is as it would be anyway. */
export function writeOrdersSearch(query: ListOrdersQuery): string {
  const search = new URLSearchParams();
  for (const name of ['find', 'from', 'to', 'sort', 'order'] as const) {
    const value = query[name];
    if (value !== undefined && value !== '') search.set(name, value);
  }
  for (const status of query.status ?? []) search.append('status', status);
  if (query.allergies === true) search.set('allergies', 'true');
  if ((query.page ?? 1) > 1) search.set('page', String(query.page));
  if (query.perPage !== undefined && query.perPage !== perPageDefault) {
    search.set('perPage', String(query.perPage));
  }
  return search.toString();
}

/** The same orders, sorted by a column; pressing the column that sorts already turns it round. */
export function sortedBy(query: ListOrdersQuery, sort: SortKey): ListOrdersQuery {
  const first = downFirst.includes(sort) ? 'desc' : 'asc';
  const order = query.sort === sort ? ((query.order ?? first) === 'asc' ? 'desc' : 'asc') : first;
  return { ...query, sort, order, page: undefined };
}

/** With a status added to those that are shown, or taken away. */
export function withStatus(query: ListOrdersQuery, status: OrderStatus): ListOrdersQuery {
  const now = query.status ?? [];
  const next = now.includes(status) ? now.filter((it) => it !== status) : [...now, status];
  return { ...query, status: next.length === 0 ? undefined : next, page: undefined };
}

/** What the server is asked: without a sort of one's own, the newest order comes first. */
export function asAsked(query: ListOrdersQuery): ListOrdersQuery {
  const sorted = query.sort === undefined ? ({ sort: 'number', order: 'desc' } as const) : {};
  return { ...query, ...sorted, perPage: query.perPage ?? perPageDefault };
}

/** Whether anything narrows the list. */
export function isNarrowed(query: ListOrdersQuery): boolean {
  return (
    query.find !== undefined ||
    query.status !== undefined ||
    query.from !== undefined ||
    query.to !== undefined ||
    query.allergies === true
  );
}
