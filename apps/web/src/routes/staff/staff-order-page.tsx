import { useEffect } from 'react';
import { Link, useLocation, useParams } from 'react-router-dom';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths } from '#web/config/paths.ts';
import { CostSection } from '#web/features/kitchen-sheet/components/cost-section.tsx';
import { MarginLine } from '#web/features/kitchen-sheet/components/margin-line.tsx';
import { KitchenSection } from '#web/features/kitchen-sheet/components/kitchen-section.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { CardsSection } from '#web/features/order-cards/components/cards-section.tsx';
import { useStaffOrder } from '#web/features/staff-order/api/get-staff-order.ts';
import { OrderView } from '#web/features/staff-order/components/order-view.tsx';
import { ApiProblem } from '#web/lib/http.ts';
import { NotFoundPage } from '../not-found-page.tsx';

/** `/staff/orders/:number` */
export function StaffOrderPage() {
  const number = Number(useParams().number);
  return Number.isInteger(number) && number > 0 ? (
    <OneOrder key={number} number={number} />
  ) : (
    <NotFoundPage />
  );
}

function OneOrder({ number }: { readonly number: number }) {
  const menu = useMenu();
  const { data, error, isPending, refetch, isFetching } = useStaffOrder(number);
  const { locale } = menu.studio;
  useFragment(data !== undefined);
  return (
    <div className="page grid gap-4 py-6">
      <p data-print="no">
        <Link to={paths.staffOrders} className="link inline-block py-1">
          All orders
        </Link>
      </p>
      {data !== undefined ? (
        <OrderView
          order={data}
          menu={menu}
          parts={{
            cost: data.can.seeCost && <CostSection number={number} locale={locale} />,
            margin: data.can.seeCost && <MarginLine number={number} locale={locale} />,
            kitchen: data.can.seeKitchen && <KitchenSection number={number} locale={locale} />,
            cards: (
              <CardsSection
                number={number}
                locale={locale}
                ingredientPath={data.can.seePantry ? paths.staffIngredient : null}
                careCardPaper={menu.studio.labelRegion === 'US' ? 'half-letter' : 'a5'}
              />
            ),
          }}
        />
      ) : (
        <>
          <PageTitle title={`No. ${number}`} />
          {isPending ? (
            <Pending what="Fetching the order…" />
          ) : error instanceof ApiProblem && error.code === 'not-found' ? (
            <p>There is no order with this number.</p>
          ) : (
            <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
          )}
        </>
      )}
    </div>
  );
}

/** Goes to the part of the page an address names, once it is there. */
function useFragment(ready: boolean): void {
  const { hash } = useLocation();
  useEffect(() => {
    if (!ready || hash === '') return;
    const part = document.getElementById(hash.slice(1));
    part?.scrollIntoView({ block: 'start' });
    part?.focus({ preventScroll: true });
  }, [ready, hash]);
}
