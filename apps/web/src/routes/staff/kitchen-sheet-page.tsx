import { Link, useParams } from 'react-router-dom';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergyWords } from '#web/components/order/allergy-words.ts';
import { pickupWords } from '#web/components/order/order-times.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths } from '#web/config/paths.ts';
import { useKitchenSheet } from '#web/features/kitchen-sheet/api/get-kitchen-sheet.ts';
import { WholeSheet } from '#web/features/kitchen-sheet/components/kitchen-parts.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useStaffOrder } from '#web/features/staff-order/api/get-staff-order.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { NotFoundPage } from '../not-found-page.tsx';
import { BakersOnly, isRefused } from './pantry/bakers-only.tsx';

/** `/staff/orders/:number/kitchen`: what goes into it, to print and take to the bench. */
export function KitchenSheetPage() {
  const number = Number(useParams().number);
  return Number.isInteger(number) && number > 0 ? (
    <Sheet key={number} number={number} />
  ) : (
    <NotFoundPage />
  );
}

function Sheet({ number }: { readonly number: number }) {
  const { locale, labelRegion } = useMenu().studio;
  const order = useStaffOrder(number);
  const sheet = useKitchenSheet(number);
  const error = order.error ?? sheet.error;
  if (isRefused(error)) return <BakersOnly title={`Kitchen sheet, No. ${number}`} />;
  if (error instanceof ApiProblem && error.code === 'not-found') return <NotFoundPage />;
  return (
    <div className="page grid gap-5 py-6 print:block print:space-y-4 print:px-0 print:pt-3">
      <p data-print="no">
        <Link to={paths.staffOrder(number)} className="link inline-block py-1">
          The order
        </Link>
      </p>
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
        <PageTitle title={`Kitchen sheet, No. ${number}`} />
        <span data-print="no">
          <Button kind="secondary" onClick={() => window.print()}>
            Print it
          </Button>
        </span>
      </div>
      {order.data !== undefined && <Head order={order.data} region={labelRegion} locale={locale} />}
      {error !== null ? (
        <Failure
          error={error}
          onRetry={() => void Promise.all([order.refetch(), sheet.refetch()])}
          retrying={order.isFetching || sheet.isFetching}
        />
      ) : order.data === undefined || sheet.data === undefined ? (
        <Pending what="Weighing it out…" />
      ) : (
        <WholeSheet sheet={sheet.data} locale={locale} />
      )}
    </div>
  );
}

type HeadProps = {
  readonly order: StaffOrder;
  readonly region: LabelRegion;
  readonly locale: string;
};

/** When it is collected, and the allergies at the table, which go wherever the sheet goes. */
function Head({ order, region, locale }: HeadProps) {
  return (
    <div className="grid gap-3">
      <p>
        {pickupWords(order.pickup, locale)}, {order.design.guests.headCount} people
      </p>
      {order.allergies.length > 0 && (
        <Notice tone="berry" title="Allergies at the table">
          <ul>
            {order.allergies.map((it) => (
              <li key={it.id}>{allergyWords(it, region)}</li>
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
