import { Link } from 'react-router-dom';
import type { AccountView } from '#shared/contracts/accounts.ts';
import { formatDay } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { paths } from '#web/config/paths.ts';

type Props = {
  readonly orders: AccountView['orders'];
  readonly locale: string;
  /** A state in a word. */
  readonly wordOf: (status: AccountView['orders'][number]['status']) => string;
};

/** A customer's orders, newest first. */
export function OwnOrders({ orders, locale, wordOf }: Props) {
  if (orders.length === 0) {
    return (
      <EmptyState
        title="No orders yet"
        action={<LinkButton to={paths.order}>Order a cake</LinkButton>}
      >
        <p>What you order with this address appears here, guest orders too.</p>
      </EmptyState>
    );
  }
  return (
    <ul className="divide-y divide-seam">
      {orders.map((it) => (
        <li
          key={it.code}
          className="relative grid gap-x-6 gap-y-1 px-3 py-4 hover:bg-cloud sm:grid-cols-[6rem_1fr_auto]"
        >
          <p className="text-slate tabular-nums">No. {it.number}</p>
          <div>
            <Link to={paths.myOrder(it.code)} className="link after:absolute after:inset-0">
              {formatDay(it.date, { locale, year: true })}
            </Link>
            <p>{it.summary}</p>
          </div>
          <div className="sm:text-right">
            <p className="font-semibold">{wordOf(it.status)}</p>
            <p className="text-slate tabular-nums">
              {formatMoney(it.totalMinor, it.currency, locale)}
            </p>
          </div>
        </li>
      ))}
    </ul>
  );
}
