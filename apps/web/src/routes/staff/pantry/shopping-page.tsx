import { useNavigate, useSearchParams } from 'react-router-dom';
import type { Shopping } from '#shared/contracts/kitchen-sheet.ts';
import { formatList } from '#shared/dates/format.ts';
import { today as todayIn } from '#shared/dates/local-time.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { useShopping } from '#web/features/egg-plan/api/get-shopping.ts';
import { ShoppingList } from '#web/features/egg-plan/components/shopping-list.tsx';
import { SpanFields } from '#web/features/egg-plan/components/span-fields.tsx';
import { WhoseOrders } from '#web/features/egg-plan/components/whose-orders.tsx';
import { readSpan } from '#web/features/egg-plan/search/span.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { classNames } from '#web/lib/class-names.ts';
import { BakersOnly, isRefused } from './bakers-only.tsx';

/** `/staff/pantry/shopping?from&to`: what to buy for what is made on those days. */
export function ShoppingPage() {
  const { locale, zone } = useMenu().studio;
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const today = todayIn(new Date(), zone);
  const span = readSpan(params, today);
  const { data, error, isPending, isPlaceholderData, isFetching, refetch } = useShopping(span);
  if (isRefused(error)) return <BakersOnly title="Shopping" />;
  return (
    <div className="page grid gap-6 py-6 print:block print:space-y-4 print:px-0 print:pt-3">
      <PageTitle title="Shopping" />
      <form role="search" data-print="no" onSubmit={(event) => event.preventDefault()}>
        <SpanFields
          span={span}
          today={today}
          onSpan={(next) =>
            void navigate(`?${new URLSearchParams({ ...next }).toString()}`, { replace: true })
          }
        />
      </form>
      {isPending ? (
        <Pending what="Writing the list…" />
      ) : data === undefined ? (
        <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
      ) : (
        <div
          className={classNames(
            'grid gap-6 print:block print:space-y-4',
            isPlaceholderData && 'opacity-60',
          )}
        >
          {error !== null && (
            <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
          )}
          <WhoseOrders orders={data.orders} unplaced={data.unplaced} />
          <Bought list={data} locale={locale} />
        </div>
      )}
    </div>
  );
}

function Bought({ list, locale }: { readonly list: Shopping; readonly locale: string }) {
  const money = (minor: number) => formatMoney(minor, list.currency, locale);
  if (list.lines.length === 0) {
    return (
      <EmptyState title="Nothing to buy for these days">
        Nothing is planned then that is not made already. Choose other days.
      </EmptyState>
    );
  }
  const unknown = [...new Set(list.unknown.map((it) => it.name))];
  return (
    <>
      {unknown.length > 0 && (
        <Notice tone="butter" title="Not on the list">
          <p>No formula tells what goes into {formatList(unknown)}.</p>
        </Notice>
      )}
      <Rim label="What to buy" className="overflow-hidden print:border-0">
        <p className="border-b border-seam px-5 py-4 sm:px-7 print:px-0">
          <strong className="font-display text-2xl tabular-nums">{money(list.buyMinor)}</strong> in
          whole packs, of which {money(list.usedMinor)} goes into these cakes. Take away what you
          have on the shelf.
          {list.unpriced.length > 0 && (
            <span className="block text-sm">
              Not priced, and not in the sum: {formatList(list.unpriced)}.
            </span>
          )}
        </p>
        <ShoppingList list={list} locale={locale} />
      </Rim>
    </>
  );
}
