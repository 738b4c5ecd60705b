import { useCallback } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import type { ListOrdersQuery } from '#shared/contracts/staff.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useStaffOrders } from '#web/features/staff-orders/api/get-staff-orders.ts';
import { OrdersCards } from '#web/features/staff-orders/components/orders-cards.tsx';
import { OrdersFilter } from '#web/features/staff-orders/components/orders-filter.tsx';
import { OrdersTable } from '#web/features/staff-orders/components/orders-table.tsx';
import { Pager } from '#web/features/staff-orders/components/pager.tsx';
import { ViewBar } from '#web/features/staff-orders/components/view-bar.tsx';
import {
  asAsked,
  isNarrowed,
  readOrdersSearch,
  writeOrdersSearch,
} from '#web/features/staff-orders/search/orders-search.ts';
import { classNames } from '#web/lib/class-names.ts';
import { roomForTable, useMedia } from '#web/lib/use-media.ts';

/** `/staff/orders`: the address says what is found, filtered, sorted and which page. */
export function OrdersPage() {
  const { locale } = useMenu().studio;
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const query = readOrdersSearch(search);
  const asked = asAsked(query);
  const { data, error, isPending, isPlaceholderData, isFetching, refetch } = useStaffOrders(asked);
  const table = useMedia(roomForTable);
  const onQuery = useCallback(
    (next: ListOrdersQuery) => void navigate(`?${writeOrdersSearch(next)}`, { replace: true }),
    [navigate],
  );

  return (
    <div className="page grid gap-5 py-6">
      <div className="flex flex-wrap items-end gap-x-6 gap-y-1">
        <PageTitle title="Orders" />
        <ViewBar search={writeOrdersSearch({ ...query, page: undefined })} />
      </div>
      <OrdersFilter query={query} counts={data?.counts} onQuery={onQuery} />
      {isPending ? (
        <Pending what="Fetching the orders…" />
      ) : data === undefined ? (
        <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
      ) : (
        <>
          {error !== null && (
            <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
          )}
          {data.rows.length === 0 ? (
            <EmptyState
              title={isNarrowed(query) ? 'No order is like that' : 'There are no orders yet'}
              action={
                isNarrowed(query) && (
                  <LinkButton to={paths.staffOrders} kind="secondary">
                    Show all orders
                  </LinkButton>
                )
              }
            >
              {isNarrowed(query)
                ? 'Take something away from what narrows the list.'
                : 'They appear here as soon as the first customer has sent one.'}
            </EmptyState>
          ) : (
            <Rim
              label="Orders"
              className={classNames('overflow-hidden', isPlaceholderData && 'opacity-60')}
            >
              {table ? (
                <OrdersTable rows={data.rows} query={asked} locale={locale} />
              ) : (
                <OrdersCards rows={data.rows} locale={locale} />
              )}
            </Rim>
          )}
          <Pager list={data} query={query} />
        </>
      )}
    </div>
  );
}
