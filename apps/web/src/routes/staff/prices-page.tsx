import { useQueryClient } from '@tanstack/react-query';
import { today } from '#shared/dates/local-time.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { menuQuery, useMenu } from '#web/features/menu/api/get-menu.ts';
import { usePrices } from '#web/features/prices/api/get-prices.ts';
import { PriceBookForm } from '#web/features/prices/components/price-book-form.tsx';
import { ApiProblem } from '#web/lib/http.ts';

/** `/staff/studio/prices`: the studio's price book. */
export function PricesPage() {
  const menu = useMenu();
  const client = useQueryClient();
  const { data, error, isPending, refetch, isFetching } = usePrices();
  return (
    <div className="page grid gap-8 py-6">
      <header className="grid gap-2">
        <PageTitle title="Prices" />
        <p className="measure text-slate">
          Every price of the studio. Saving writes a new version; the earlier ones stay for the
          orders that were priced by them.
        </p>
      </header>
      {isPending ? (
        <Pending what="Fetching the price book…" />
      ) : data === undefined ? (
        error instanceof ApiProblem && error.code === 'not-allowed' ? (
          <Notice title="Prices are the owner’s to look after">
            <p>What a cake sells for is on the menu, and on each order line by line.</p>
          </Notice>
        ) : (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        )
      ) : (
        <PriceBookForm
          prices={data}
          menu={menu}
          today={today(new Date(), menu.studio.zone)}
          onSaved={() => void client.invalidateQueries({ queryKey: menuQuery().queryKey })}
        />
      )}
    </div>
  );
}
