import { Failure } from '#web/components/ui/failure.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useOrderCost } from '../api/get-order-cost.ts';
import { CostLines } from './cost-lines.tsx';
import { CostSummary } from './cost-summary.tsx';
import { Levers } from './levers.tsx';

type Props = { readonly number: number; readonly locale: string };

/** What the order costs to make and what it leaves; only the owner is shown it. */
export function CostSection({ number, locale }: Props) {
  const { data, error, isPending, isFetching, refetch } = useOrderCost(number);
  return (
    // For the owner's eyes: it stays out of what is printed.
    <div data-print="no">
      <Section title="Cost and margin">
        {isPending ? (
          <Pending what="Reckoning its cost…" />
        ) : data === undefined ? (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        ) : (
          <div className="grid gap-4">
            <CostSummary cost={data} locale={locale} />
            <Levers levers={data.levers} />
            <Fold label="Every line of the cost">
              <CostLines cost={data} locale={locale} />
            </Fold>
          </div>
        )}
      </Section>
    </div>
  );
}
