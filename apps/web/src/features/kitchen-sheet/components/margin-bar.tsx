import type { OrderCost } from '#shared/contracts/kitchen-sheet.ts';
import { shareText } from './cost-words.ts';

type Props = { readonly cost: OrderCost; readonly locale: string };

/**
 * The price as a length: what making takes of it from the left, what is left, and a mark where the
 * cost may end at the most. A cost over the price fills it all.
 */
export function MarginBar({ cost, locale }: Props) {
  const { netPriceMinor, totalMinor, targetMarginPpm, marginPpm } = cost;
  if (netPriceMinor <= 0 || marginPpm === null) return null;
  const taken = Math.min(1, totalMinor / netPriceMinor) * 300;
  const may = (1 - targetMarginPpm / 1e6) * 300;
  const pays = marginPpm >= targetMarginPpm;
  return (
    <svg
      viewBox="-1 -6 302 30"
      className="w-full max-w-md"
      role="img"
      aria-label={`Making takes ${shareText(1e6 - marginPpm, locale)} of the price; it may take ${shareText(1e6 - targetMarginPpm, locale)}.`}
    >
      <rect
        width="300"
        height="16"
        rx="4"
        fill={pays ? 'var(--color-leaf-tint)' : 'var(--color-butter-tint)'}
        stroke="var(--color-ink)"
      />
      <rect width={taken} height="16" rx="4" fill="var(--color-slate)" />
      <path d={`M${may} -5v26`} stroke="var(--color-cobalt)" strokeWidth="2" />
      <path d={`M${may - 4} -6h8l-4 5z`} fill="var(--color-cobalt)" />
    </svg>
  );
}
