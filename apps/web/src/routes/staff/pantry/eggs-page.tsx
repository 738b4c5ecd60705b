import { useNavigate, useSearchParams } from 'react-router-dom';
import type { EggPlanView } from '#shared/contracts/kitchen-sheet.ts';
import { today as todayIn } from '#shared/dates/local-time.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useEggPlan } from '#web/features/egg-plan/api/get-egg-plan.ts';
import { CartonsInstead, EggCartons } from '#web/features/egg-plan/components/egg-cartons.tsx';
import { EggDays } from '#web/features/egg-plan/components/egg-days.tsx';
import { EggFields } from '#web/features/egg-plan/components/egg-fields.tsx';
import { EggLeftovers } from '#web/features/egg-plan/components/egg-leftovers.tsx';
import { SpanFields } from '#web/features/egg-plan/components/span-fields.tsx';
import { WhoseOrders } from '#web/features/egg-plan/components/whose-orders.tsx';
import {
  readEggSearch,
  writeEggSearch,
  type EggSearch,
} from '#web/features/egg-plan/search/egg-search.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { classNames } from '#web/lib/class-names.ts';
import { BakersOnly, isRefused } from './bakers-only.tsx';

/** `/staff/pantry/eggs?from&to&size&whites&yolks`: whites, yolks and whole eggs planned together. */
export function EggsPage() {
  const { locale, zone } = useMenu().studio;
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const today = todayIn(new Date(), zone);
  const search = readEggSearch(params, today);
  const { data, error, isPending, isPlaceholderData, isFetching, refetch } = useEggPlan(search);
  const onSearch = (next: EggSearch) =>
    void navigate(`?${writeEggSearch(next)}`, { replace: true });
  if (isRefused(error)) return <BakersOnly title="Eggs" />;
  return (
    <div className="page grid gap-6 py-6 print:block print:space-y-4 print:px-0 print:pt-3">
      <PageTitle title="Eggs" />
      <form
        role="search"
        data-print="no"
        className="grid gap-4"
        onSubmit={(event) => event.preventDefault()}
      >
        <SpanFields
          span={search}
          today={today}
          onSpan={(span) => onSearch({ ...search, ...span })}
        />
        <EggFields search={search} onSearch={onSearch} />
      </form>
      {isPending ? (
        <Pending what="Counting eggs…" />
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
          <Plan plan={data} locale={locale} />
        </div>
      )}
    </div>
  );
}

function Plan({ plan, locale }: { readonly plan: EggPlanView; readonly locale: string }) {
  const { days, eggs, cartons, alternatives, leftovers } = plan;
  if (days.length === 0 && cartons.length === 0) {
    return (
      <EmptyState title="No eggs on these days">
        Nothing that takes egg is planned then. Choose other days, or place the orders that wait.
      </EmptyState>
    );
  }
  return (
    <>
      {days.length > 0 && (
        <Rim label="Eggs to crack" className="overflow-hidden print:border-0">
          <p className="border-b border-seam px-5 py-4 sm:px-7">
            <strong className="font-display text-2xl tabular-nums">{eggs}</strong>{' '}
            {eggs === 1 ? 'egg' : 'eggs'} to crack in all: the fewest that cover every need. Weigh
            what you take; eggs differ.
          </p>
          <EggDays days={days} locale={locale} />
        </Rim>
      )}
      <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-2 print:block print:space-y-4">
        {days.length > 0 && (
          <Section title="Left over" className="print:block">
            <EggLeftovers leftovers={leftovers} locale={locale} />
          </Section>
        )}
        <div className="grid gap-8 print:block print:space-y-4">
          {cartons.length > 0 && (
            <Section title="Out of cartons" className="print:block">
              <EggCartons cartons={cartons} locale={locale} />
            </Section>
          )}
          {alternatives.length > 0 && (
            <Section title="Cartons instead" className="print:block">
              <CartonsInstead alternatives={alternatives} locale={locale} />
            </Section>
          )}
        </div>
      </div>
    </>
  );
}
