import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useLabels } from '../api/get-labels.ts';
import { CareCardChoice } from './care-card-choice.tsx';
import { LabelChoices } from './label-choices.tsx';
import { LabelPreview } from './label-preview.tsx';
import { LabelReasons } from './label-reasons.tsx';

type Props = {
  readonly number: number;
  readonly locale: string;
  /** Of the product a label waits for, where whoever looks may go there. */
  readonly ingredientPath: ((id: string) => string) | null;
  readonly careCardPaper: 'a5' | 'half-letter';
};

/** What will be printed for an order and what keeps it from that, with the ways to print it. */
export function CardsSection({ number, locale, ingredientPath, careCardPaper }: Props) {
  const { data, error, isPending, isFetching, refetch } = useLabels(number);
  return (
    <div id="cards" tabIndex={-1} data-print="no">
      <Section title="Labels and care card">
        {isPending ? (
          <Pending what="Working out the labels…" />
        ) : data === undefined ? (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        ) : (
          <div className="grid gap-6">
            <LabelReasons number={number} labels={data} ingredientPath={ingredientPath} />
            {data.labels.length > 0 && (
              <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1.2fr)_minmax(0,1fr)]">
                <div className="grid gap-4">
                  {data.labels.map((it) => (
                    <LabelPreview key={it.id} label={it} locale={locale} />
                  ))}
                </div>
                <div className="grid gap-6">
                  {data.can.printLabels && <LabelChoices number={number} labels={data.labels} />}
                  {data.can.printCareCard && (
                    <CareCardChoice number={number} labels={data} paper={careCardPaper} />
                  )}
                  <ul className="grid gap-1 text-sm text-slate">
                    {data.reminders.map((it) => (
                      <li key={it}>{it}</li>
                    ))}
                  </ul>
                </div>
              </div>
            )}
          </div>
        )}
      </Section>
    </div>
  );
}
