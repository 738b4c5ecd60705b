import type { PricesView } from '#shared/contracts/prices.ts';
import { instantWords } from '#web/components/order/order-times.ts';

type Props = {
  readonly prices: PricesView;
  readonly zone: string;
  readonly locale: string;
};

/** The books there were; each stays as it was, for the orders that were priced by it. */
export function VersionList({ prices, zone, locale }: Props) {
  return (
    <ol className="grid divide-y divide-seam">
      {prices.versions.map(({ n, since, by, orders }) => (
        <li key={n} className="grid gap-0.5 py-2.5 text-sm">
          <p className="flex flex-wrap items-baseline justify-between gap-x-4">
            <strong>
              Version {n}
              {n === prices.n && ', in force'}
            </strong>
            <span className="text-slate tabular-nums">
              {orders === 0 ? 'no orders' : orders === 1 ? '1 order' : `${orders} orders`}
            </span>
          </p>
          <p className="text-slate">
            {instantWords(since, zone, locale)},{' '}
            {by === null ? 'the book the studio began with' : `by ${by}`}
          </p>
        </li>
      ))}
    </ol>
  );
}
