import type { Price } from '#shared/contracts/estimates.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList } from '#web/components/ui/data-list.tsx';

type Props = {
  readonly price: Price;
  /** What stands before the total. */
  readonly totalLabel: string;
  readonly locale: string;
};

/** The price line by line, its total, and what is due when. */
export function PriceList({ price, totalLabel, locale }: Props) {
  const money = (minor: number) => formatMoney(minor, price.currency, locale);
  const lines = price.lines.map((line, at) => ({
    key: `${at} ${line.kind}`,
    label: line.label,
    value: money(line.amountMinor),
  }));
  return (
    <div className="grid gap-2">
      <DataList
        ends
        rows={[
          ...lines,
          { key: 'total', label: totalLabel, value: money(price.totalMinor), total: true },
        ]}
      />
      {price.taxInclusive && price.taxMinor > 0 && (
        <p className="text-sm text-slate">Includes {money(price.taxMinor)} of tax.</p>
      )}
      {price.depositMinor > 0 && (
        <p className="text-sm text-slate">Deposit: {money(price.depositMinor)}.</p>
      )}
    </div>
  );
}
