import { gPerOunce, gPerPound } from '#shared/kitchen/measures.ts';
import { minorDigits } from '#shared/kitchen/money.ts';
import { readNumber } from '#web/lib/read-number.ts';

/** Null where nothing is typed, NaN where it cannot be read: the contract then says what is wanted. */
export function numberOf(text: string): number | null {
  return text.trim() === '' ? null : (readNumber(text) ?? Number.NaN);
}

const perUnit: Readonly<Record<string, number>> = {
  '': 1,
  g: 1,
  gram: 1,
  grams: 1,
  kg: 1000,
  kilo: 1000,
  kilos: 1000,
  lb: gPerPound,
  lbs: gPerPound,
  pound: gPerPound,
  pounds: gPerPound,
  oz: gPerOunce,
  ounce: gPerOunce,
  ounces: gPerOunce,
};

/** Grams out of "454", "454 g", "2.5 kg", "1 lb", "16 oz"; null and NaN as `numberOf`. */
export function gramsOf(text: string): number | null {
  if (text.trim() === '') return null;
  const unit = /([a-z]*)\.?\s*$/i.exec(text)?.[1]?.toLowerCase() ?? '';
  const factor = perUnit[unit];
  const count = readNumber(text);
  if (factor === undefined || count === null) return Number.NaN;
  // No scale of ours shows less than a thousandth of a gram.
  return Math.round(count * factor * 1000) / 1000;
}

/** Minor units out of an amount in the currency's own unit: "5.45" USD is 545. */
export function minorOf(text: string, currency: string): number | null {
  const amount = numberOf(text.replaceAll(/[^\d.,\s-]/g, ''));
  if (amount === null) return text.trim() === '' ? null : Number.NaN;
  return Math.round(amount * 10 ** minorDigits(currency));
}

/** Minor units as they are typed: 545 USD is "5.45". */
export function minorText(minor: number, currency: string): string {
  const digits = minorDigits(currency);
  return (minor / 10 ** digits).toFixed(digits);
}

/** Parts per million out of a percent: "98.5" is 985,000. */
export function ppmOf(text: string): number | null {
  const percent = numberOf(text.replace('%', ''));
  return percent === null ? null : Math.round(percent * 10_000);
}

export function ppmText(ppm: number): string {
  return String(ppm / 10_000);
}
