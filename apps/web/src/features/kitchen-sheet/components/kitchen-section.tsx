import { Failure } from '#web/components/ui/failure.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { paths } from '#web/config/paths.ts';
import { useKitchenSheet } from '../api/get-kitchen-sheet.ts';
import { BoughtList } from './bought-list.tsx';
import { FormulaSheets, KitchenSummary } from './kitchen-parts.tsx';

type Props = { readonly number: number; readonly locale: string };

/** What goes into an order, on its page: weights in sight, formulas one press away. */
export function KitchenSection({ number, locale }: Props) {
  const { data, error, isPending, isFetching, refetch } = useKitchenSheet(number);
  return (
    <Section title="What goes into it">
      {isPending ? (
        <Pending what="Weighing it out…" />
      ) : data === undefined ? (
        <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
      ) : (
        <div className="grid gap-4">
          <KitchenSummary sheet={data} locale={locale} />
          <Fold
            label={
              data.formulas.length === 1 ? 'Its formula' : `Its ${data.formulas.length} formulas`
            }
          >
            <FormulaSheets sheet={data} locale={locale} />
          </Fold>
          <Fold label="All of it, as bought">
            <BoughtList ingredients={data.ingredients} locale={locale} />
          </Fold>
          <p data-print="no">
            <LinkButton to={paths.staffKitchenSheet(number)} kind="secondary">
              Kitchen sheet to print
            </LinkButton>
          </p>
        </div>
      )}
    </Section>
  );
}
