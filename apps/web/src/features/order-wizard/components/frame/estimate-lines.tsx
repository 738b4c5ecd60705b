import { useEffect, useState } from 'react';
import type { Estimate } from '#shared/contracts/estimates.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { PriceList } from '#web/components/order/price-list.tsx';

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
  const total = formatMoney(price.totalMinor, price.currency, locale);
  return (
    <div>
      <PriceList price={price} totalLabel={totalLabel} locale={locale} />
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
