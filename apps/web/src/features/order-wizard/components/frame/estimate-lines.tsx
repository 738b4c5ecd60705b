import { useEffect, useState } from 'react';
import type { Estimate } from '#shared/contracts/estimates.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList } from '#web/components/ui/data-list.tsx';

type Props = {
  readonly estimate: Estimate;
  readonly locale: string;
  /** What stands before the total. */
  readonly totalLabel?: string;
};

/** The price line by line, and its total, which is also said aloud once choosing rests. */
export function EstimateLines({
  estimate: { price },
  locale,
  totalLabel = 'Estimate, before the baker has looked',
}: Props) {
  const money = (amount: number) => formatMoney(amount, price.currency, locale);
  const total = money(price.totalMinor);
  return (
    <div>
      <DataList
        ends
        rows={[
          ...price.lines.map((line, at) => ({
            key: `${at} ${line.kind} ${line.label}`,
            label: line.label,
            value: money(line.amountMinor),
          })),
          { key: 'total', label: totalLabel, value: total, total: true },
        ]}
      />
      {price.taxInclusive && price.taxMinor > 0 && (
        <p className="pt-1 text-sm text-slate">Includes {money(price.taxMinor)} of tax.</p>
      )}
      {price.depositMinor > 0 && (
        <p className="pt-1 text-sm text-slate">
          A deposit of {money(price.depositMinor)} would be due once you and the baker agree.
        </p>
      )}
      <Aloud text={`${totalLabel}: ${total}`} />
    </div>
  );
}

/** Says its text to a screen reader once it has rested a second, so that typing is not talked over. */
export function Aloud({ text }: { readonly text: string }) {
  const [said, setSaid] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setSaid(text), 1_000);
    return () => clearTimeout(timer);
  }, [text]);
  return (
    <p role="status" className="sr-only">
      {said}
    </p>
  );
}
