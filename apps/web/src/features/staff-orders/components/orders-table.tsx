import { createColumnHelper, tableFeatures, useTable } from '@tanstack/react-table';
import { Link } from 'react-router-dom';
import type { ListOrdersQuery, OrderRow } from '#shared/contracts/staff.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { StatusMark } from '#web/components/order/status-mark.tsx';
import { paths } from '#web/config/paths.ts';
import { classNames } from '#web/lib/class-names.ts';
import { type SortKey, sortedBy, writeOrdersSearch } from '../search/orders-search.ts';
import { RowMarks } from './row-marks.tsx';

type Props = {
  readonly rows: readonly OrderRow[];
  readonly query: ListOrdersQuery;
  readonly locale: string;
};

// The server finds, filters, sorts and pages: the table only lays out.
const features = tableFeatures({});
const column = createColumnHelper<typeof features, OrderRow>();

const sorts: Readonly<Record<string, SortKey>> = {
  number: 'number',
  customer: 'customer',
  pickup: 'pickup',
  status: 'status',
  total: 'total',
};

const columns = (locale: string) =>
  column.columns([
    column.accessor('number', {
      header: 'No.',
      cell: ({ getValue }) => (
        <Link
          to={paths.staffOrder(getValue())}
          className="link inline-flex min-h-11 items-center tabular-nums"
        >
          {getValue()}
        </Link>
      ),
    }),
    column.accessor('customer', {
      header: 'Customer',
      cell: ({ row: { original } }) => (
        <>
          <p className="font-semibold">{original.customer}</p>
          <p className="text-sm text-slate">{original.summary}</p>
          <RowMarks row={original} />
        </>
      ),
    }),
    column.accessor('pickup', {
      header: 'Pickup',
      cell: ({ row: { original } }) => (
        <p className="tabular-nums">
          {formatDay(original.pickup.date, { locale })}
          <br />
          <span className="text-slate">{formatTime(original.pickup.start)}</span>
        </p>
      ),
    }),
    column.accessor('headCount', {
      header: 'People',
      cell: ({ getValue }) => <span className="tabular-nums">{getValue()}</span>,
    }),
    column.accessor('status', {
      header: 'Status',
      cell: ({ getValue }) => <StatusMark status={getValue()} />,
    }),
    column.accessor((row) => row.totalMinor, {
      id: 'total',
      header: 'Total',
      cell: ({ row: { original } }) => (
        <span className="tabular-nums">
          {formatMoney(original.totalMinor, original.currency, locale)}
        </span>
      ),
    }),
  ]);

const ends = new Set(['headCount', 'total']);

/** The orders in a table; headings sort, the address keeps it. */
export function OrdersTable({ rows, query, locale }: Props) {
  const table = useTable({ features, columns: columns(locale), data: [...rows] });
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Orders</caption>
      <thead>
        {table.getHeaderGroups().map((group) => (
          <tr key={group.id}>
            {group.headers.map((header) => (
              <Heading
                key={header.id}
                name={String(header.column.columnDef.header)}
                sort={sorts[header.column.id]}
                query={query}
                end={ends.has(header.column.id)}
              />
            ))}
          </tr>
        ))}
      </thead>
      <tbody>
        {table.getRowModel().rows.map((row) => (
          <tr key={row.id} className="border-t border-seam hover:bg-cloud">
            {row.getAllCells().map((cell) => (
              <td
                key={cell.id}
                className={classNames(
                  'px-3 py-2 align-top first:pl-5 last:pr-5',
                  cell.column.id !== 'number' && 'pt-4',
                  ends.has(cell.column.id) && 'text-right',
                )}
              >
                <table.FlexRender cell={cell} />
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

type HeadingProps = {
  readonly name: string;
  readonly sort: SortKey | undefined;
  readonly query: ListOrdersQuery;
  readonly end: boolean;
};

function Heading({ name, sort, query, end }: HeadingProps) {
  const sorted = sort !== undefined && query.sort === sort ? (query.order ?? 'asc') : null;
  return (
    <th
      scope="col"
      aria-sort={sorted === null ? undefined : sorted === 'asc' ? 'ascending' : 'descending'}
      className={classNames(
        'px-3 py-1 text-sm font-semibold first:pl-5 last:pr-5',
        end ? 'text-right' : 'text-left',
      )}
    >
      {sort === undefined ? (
        <span className="text-slate">{name}</span>
      ) : (
        <Link
          to={`?${writeOrdersSearch(sortedBy(query, sort))}`}
          className={classNames(
            'inline-flex min-h-11 items-center gap-1.5',
            sorted === null ? 'text-slate hover:text-ink' : 'text-ink',
          )}
        >
          {name}
          <svg viewBox="0 0 10 12" className="h-3" aria-hidden="true">
            <path
              d="M1.5 4.5L5 1l3.5 3.5"
              fill="none"
              stroke={sorted === 'asc' ? 'var(--color-cobalt)' : 'var(--color-seam)'}
              strokeWidth="1.8"
            />
            <path
              d="M1.5 7.5L5 11l3.5-3.5"
              fill="none"
              stroke={sorted === 'desc' ? 'var(--color-cobalt)' : 'var(--color-seam)'}
              strokeWidth="1.8"
            />
          </svg>
        </Link>
      )}
    </th>
  );
}
