import type { OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import { formatDuration, formatList } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList } from '#web/components/ui/data-list.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { costWords, shareText } from './cost-words.ts';
import { MarginBar } from './margin-bar.tsx';

type Props = { readonly cost: OrderCost; readonly locale: string };

/** Cost by kind, and what the price leaves of it beside what the owner aims for. */
export function CostSummary({ cost, locale }: Props) {
  const money = (minor: number) => formatMoney(minor, cost.currency, locale);
  const incomplete = cost.unknown.length > 0;
  return (
    <div className="grid gap-4">
      <Verdict cost={cost} locale={locale} />
      <MarginBar cost={cost} locale={locale} />
      <DataList
        ends
        rows={[
          ...cost.lines.map((it) => ({
            key: it.kind,
            label:
              it.kind === 'labour'
                ? `${costWords.labour}, ${formatDuration(cost.minutes)}`
                : costWords[it.kind],
            value: money(it.amountMinor),
          })),
          {
            key: 'total',
            label: incomplete ? 'Costs at least' : 'Costs to make',
            value: money(cost.totalMinor),
            total: true,
          },
          {
            key: 'net',
            label: cost.agreed ? 'Agreed price, without tax' : 'Offer, without tax',
            value: money(cost.netPriceMinor),
          },
        ]}
      />
      {incomplete && (
        <Notice tone="butter" title="The cost is not complete">
          <p>
            Not known: {formatList([...new Set(cost.unknown)])}. They are left out of the sum, and
            counted as unknown, not as nothing.
          </p>
        </Notice>
      )}
    </div>
  );
}

function Verdict({ cost, locale }: Props) {
  const { marginMinor, marginPpm, targetMarginPpm, unknown } = cost;
  const money = formatMoney(Math.abs(marginMinor), cost.currency, locale);
  if (marginPpm === null) return <p>Nothing is charged for it.</p>;
  const most = unknown.length > 0 ? 'at most ' : '';
  if (marginMinor < 0) {
    return (
      <p className="font-display text-xl font-semibold text-berry">
        It loses {unknown.length > 0 ? 'at least ' : ''}
        {money}.
      </p>
    );
  }
  return (
    <p>
      <span className="font-display text-xl font-semibold">
        It leaves {most}
        {money}, {shareText(marginPpm, locale)}.
      </span>{' '}
      <span className="text-slate">You aim for {shareText(targetMarginPpm, locale)}.</span>
    </p>
  );
}
