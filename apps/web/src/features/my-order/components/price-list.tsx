import type { Price } from '#shared/contracts/estimates.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList } from '#web/components/ui/data-list.tsx';

type Props = {
  readonly price: Price;
  readonly agreed: boolean;
  readonly locale: string;
};

/** The price line by line. */
export function PriceList({ price, agreed, locale }: Props) {
  const money = (minor: number) => formatMoney(minor, price.currency, locale);
  const lines = price.lines.map((line, at) => ({
    key: `${at}`,
    label: line.label,
    value: money(line.amountMinor),
  }));
  return (
    <DataList
      ends
      rows={[
        ...lines,
        {
          key: 'total',
          label: agreed ? 'Agreed price' : 'Estimate, before the baker has looked',
          value: money(price.totalMinor),
          total: true,
        },
      ]}
    />
  );
}
