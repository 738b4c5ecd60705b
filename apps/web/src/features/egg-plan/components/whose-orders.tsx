import { Link } from 'react-router-dom';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';

type Props = { readonly orders: readonly number[]; readonly unplaced: readonly number[] };

/** Whose work is meant, and which pickups of those days have no place in the plan. */
export function WhoseOrders({ orders, unplaced }: Props) {
  return (
    <div className="grid gap-3">
      {orders.length > 0 && (
        <p className="text-sm text-slate">
          For <OrderLinks numbers={orders} />, confirmed or held, on the days the plan makes each
          formula. What is made already is left out.
        </p>
      )}
      {unplaced.length > 0 && (
        <Notice tone="butter" title="Not counted: no place in the plan">
          <p>
            <OrderLinks numbers={unplaced} /> {unplaced.length === 1 ? 'is' : 'are'} to be collected
            on these days but {unplaced.length === 1 ? 'has' : 'have'} no work planned.
          </p>
        </Notice>
      )}
    </div>
  );
}

export function OrderLinks({ numbers }: { readonly numbers: readonly number[] }) {
  return (
    <>
      No.{' '}
      {numbers.map((number, at) => (
        <span key={number}>
          {at > 0 && ', '}
          <Link to={paths.staffOrder(number)} className="link tabular-nums">
            {number}
          </Link>
        </span>
      ))}
    </>
  );
}
