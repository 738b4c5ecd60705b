import type { PriceLine } from '#shared/contracts/estimates.ts';

/** One line; a line of no tax category (a discount) lies on all categories in proportion. */
export function lineOf(
  kind: PriceLine['kind'],
  label: string,
  quantity: number,
  amountMinor: number,
  taxCategory: string | null,
): PriceLine {
  return { kind, label, quantity, amountMinor, taxCategory };
}

/** What lines of one currency come to; whole minor units, so plain adding is exact. */
export function sumOf(lines: readonly PriceLine[]): number {
  return lines.reduce((sum, it) => sum + it.amountMinor, 0);
}
