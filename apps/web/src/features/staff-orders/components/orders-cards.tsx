import { Link } from 'react-router-dom';
import type { OrderRow } from '#shared/contracts/staff.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { StatusMark } from '#web/components/order/status-mark.tsx';
import { paths } from '#web/config/paths.ts';
import { RowMarks } from './row-marks.tsx';

type Props = { readonly rows: readonly OrderRow[]; readonly locale: string };

/** The orders one under the other, where a table would be squeezed. */
export function OrdersCards({ rows, locale }: Props) {
  return (
    <ul className="divide-y divide-seam">
      {rows.map((row) => (
        <li key={row.number} className="grid gap-1 px-4 py-3">
          <div className="flex items-baseline justify-between gap-4">
            <Link
              to={paths.staffOrder(row.number)}
              className="link inline-block min-w-0 py-1.5 text-lg"
            >
              <span className="tabular-nums">{row.number}</span> {row.customer}
            </Link>
            <span className="shrink-0 tabular-nums">
              {formatMoney(row.totalMinor, row.currency, locale)}
            </span>
          </div>
          <p className="font-semibold tabular-nums">
            {formatDay(row.pickup.date, { locale })}, {formatTime(row.pickup.start)}
          </p>
          <p className="text-sm text-slate">
            {row.summary}, for {row.headCount}
          </p>
          <StatusMark status={row.status} className="text-sm" />
          <RowMarks row={row} />
        </li>
      ))}
    </ul>
  );
}
