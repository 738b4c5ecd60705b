import { minorDigits } from '#shared/kitchen/money.ts';
import { readNumber } from '#web/lib/read-number.ts';

/** "5.40" in minor units of the currency; null for what says no amount, or one finer than a coin. */
export function readAmount(text: string, currency: string): number | null {
  const value = readNumber(text);
  if (value === null) return null;
  const exact = value * 10 ** minorDigits(currency);
  const whole = Math.round(exact);
  return Math.abs(exact - whole) < 1e-6 ? whole : null;
}

/** An amount as it is typed: "5.40", "540" in a currency without minor units. */
export function writeAmount(minor: number, currency: string): string {
  const digits = minorDigits(currency);
  return (minor / 10 ** digits).toFixed(digits);
}

/** "8.875" or "8.875 %" in parts per million. */
export function readShare(text: string): number | null {
  const value = readNumber(text);
  return value === null ? null : Math.round(value * 10_000);
}

export function writeShare(ppm: number): string {
  return String(ppm / 10_000);
}
