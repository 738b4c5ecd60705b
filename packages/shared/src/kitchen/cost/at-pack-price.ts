/** What a pack weighs and costs. */
export type Pack = { readonly grams: number; readonly priceMinor: number };

/**
 * What so many grams out of packs cost, whole minor units, halves up. Weights count to the
 * milligram, and the division is exact.
 */
export function atPackPrice(grams: number, pack: Pack): number {
  return divideHalfUp(
    BigInt(Math.round(grams * 1000)) * BigInt(pack.priceMinor),
    BigInt(Math.round(pack.grams * 1000)),
  );
}

/** What minutes cost at an hourly rate, whole minor units, halves up. */
export function atHourlyRate(minutes: number, perHourMinor: number): number {
  return divideHalfUp(BigInt(minutes) * BigInt(perHourMinor), 60n);
}

/** Not negative by positive. */
function divideHalfUp(dividend: bigint, divisor: bigint): number {
  return Number((2n * dividend + divisor) / (2n * divisor));
}
