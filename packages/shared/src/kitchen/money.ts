/**
 * ISO 4217 currencies whose minor unit is not a hundredth. The table is kept here, because the
 * whole list would weigh more than everything else the browser needs for prices; a test compares
 * it with the full list. Never taken from `Intl`, which says 0 for HUF where ISO 4217 says 2.
 */
const minorDigitsBesidesTwo: Readonly<Record<string, number>> = {
  BIF: 0,
  CLP: 0,
  DJF: 0,
  GNF: 0,
  ISK: 0,
  JPY: 0,
  KMF: 0,
  KRW: 0,
  PYG: 0,
  RWF: 0,
  UGX: 0,
  UYI: 0,
  VND: 0,
  VUV: 0,
  XAF: 0,
  XOF: 0,
  XPF: 0,
  BHD: 3,
  IQD: 3,
  JOD: 3,
  KWD: 3,
  LYD: 3,
  OMR: 3,
  TND: 3,
  CLF: 4,
  UYW: 4,
};

/** Decimal digits of a currency's minor unit by ISO 4217: USD 2, JPY 0, KWD 3, HUF 2. */
export function minorDigits(currency: string): number {
  return minorDigitsBesidesTwo[currency] ?? 2;
}

const formats = new Map<string, Intl.NumberFormat>();

/** An amount in minor units as the locale writes it, always with all its digits: "$412.50". */
export function formatMoney(amountMinor: number, currency: string, locale: string): string {
  const digits = minorDigits(currency);
  const key = `${locale} ${currency}`;
  let format = formats.get(key);
  if (format === undefined) {
    format = new Intl.NumberFormat(locale, {
      style: 'currency',
      currency,
      minimumFractionDigits: digits,
      maximumFractionDigits: digits,
    });
    formats.set(key, format);
  }
  return format.format(amountMinor / 10 ** digits);
}

/**
 * Splits an amount by weights into whole minor units that add up to it exactly: everybody gets
 * the rounded-down share, what is left goes to the largest remainders, earlier ones first.
 * Weights are not negative; all zero gives everything to the first.
 */
export function splitByLargestRemainder(amountMinor: number, weights: readonly number[]): number[] {
  if (weights.length === 0) return [];
  const sign = amountMinor < 0 ? -1n : 1n;
  const amount = BigInt(amountMinor) * sign;
  const whole = weights.some((it) => it > 0) ? weights : weights.map((_, i) => (i === 0 ? 1 : 0));
  const total = whole.reduce((sum, it) => sum + BigInt(it), 0n);
  const shares = whole.map((weight, index) => {
    const product = amount * BigInt(weight);
    return { index, floor: product / total, remainder: product % total };
  });
  let left = amount - shares.reduce((sum, it) => sum + it.floor, 0n);
  const result = shares.map((it) => it.floor);
  const byRemainder = shares.toSorted((a, b) =>
    a.remainder === b.remainder ? a.index - b.index : a.remainder > b.remainder ? -1 : 1,
  );
  for (const { index } of byRemainder) {
    if (left === 0n) break;
    result[index] = (result[index] ?? 0n) + 1n;
    left -= 1n;
  }
  return result.map((it) => Number(it * sign));
}
