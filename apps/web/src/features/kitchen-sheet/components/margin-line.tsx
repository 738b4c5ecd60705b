import { formatMoney } from '#shared/kitchen/money.ts';
import { useOrderCost } from '../api/get-order-cost.ts';
import { shareText } from './cost-words.ts';

type Props = { readonly number: number; readonly locale: string };

/** Cost and margin in one line, where the owner is about to say yes; nothing until it is known. */
export function MarginLine({ number, locale }: Props) {
  const { data } = useOrderCost(number);
  if (data === undefined || data.marginPpm === null) return null;
  const money = (minor: number) => formatMoney(minor, data.currency, locale);
  const least = data.unknown.length > 0;
  const cost = `costs ${least ? 'at least ' : ''}${money(data.totalMinor)} to make`;
  const aim = `you aim for ${shareText(data.targetMarginPpm, locale)}`;
  return data.marginMinor < 0 ? (
    <p className="text-sm">
      For you: {cost} and <strong>loses {money(-data.marginMinor)}</strong>; {aim}.
    </p>
  ) : (
    <p className="text-sm text-slate">
      For you: {cost} and leaves {least ? 'at most ' : ''}
      {money(data.marginMinor)}, {shareText(data.marginPpm, locale)}; {aim}.
    </p>
  );
}
