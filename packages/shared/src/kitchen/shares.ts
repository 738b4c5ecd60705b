import { dinero, halfUp, multiply, toSnapshot, transformScale } from 'dinero.js';
import { minorDigits } from './money.ts';

/** Share of an amount in parts per million, halves up, in whole minor units. */
export function shareOf(amountMinor: number, ppm: number, currency: string): number {
  const exponent = minorDigits(currency);
  const money = dinero({ amount: amountMinor, currency: { code: currency, base: 10, exponent } });
  const exact = multiply(money, { amount: ppm, scale: 6 });
  return toSnapshot(transformScale(exact, exponent, halfUp)).amount;
}

/** To the nearest multiple of the step, halves up; a step of 1 or less leaves it as it is. */
export function roundToStep(amountMinor: number, stepMinor: number): number {
  return stepMinor > 1
    ? Math.floor((2 * amountMinor + stepMinor) / (2 * stepMinor)) * stepMinor
    : amountMinor;
}
