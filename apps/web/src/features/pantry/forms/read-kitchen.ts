import { benchCelsius, parseDuration, type TemperatureLead } from '#shared/kitchen/measures.ts';
import { readNumber } from '#web/lib/read-number.ts';

/**
 * °C out of "240 F", "115 °C" or a bare figure, which is read in the studio's leading scale; null
 * where nothing is typed, NaN where it cannot be read.
 */
export function degreesOf(text: string, lead: TemperatureLead): number | null {
  if (text.trim() === '') return null;
  const value = readNumber(text);
  const letters = text.replaceAll(/[^a-z]/gi, '').toUpperCase();
  const scale = letters === '' ? lead : letters.charAt(0);
  if (value === null || (scale !== 'F' && scale !== 'C')) return Number.NaN;
  const celsius = scale === 'F' ? benchCelsius(value) : value;
  return Math.round(celsius * 100) / 100;
}

/**
 * Whole hours out of "36 h", "5 days", "2 days and 12 h", "2 weeks", "3 months" or a bare figure of
 * hours; NaN for anything else. "2-3 days" is nobody's shelf life: which of the two is meant is
 * asked and not added up.
 */
export function hoursOf(text: string): number | null {
  const tidy = text.trim().toLowerCase();
  if (tidy === '') return null;
  const figures = /(\d+(?:[.,]\d+)?)\s*([a-z]*)/g;
  if (!/^(?:,|and|\s)*$/.test(tidy.replaceAll(figures, ' '))) return Number.NaN;
  const parts = [...tidy.matchAll(figures)];
  let hours = 0;
  for (const [, figure = '', unit = ''] of parts) {
    const each = unit === '' && parts.length > 1 ? null : hoursPer(unit);
    if (each === null) return Number.NaN;
    hours += Number(figure.replace(',', '.')) * each;
  }
  return Math.round(hours);
}

function hoursPer(unit: string): number | null {
  if (unit === '' || /^h(?:rs?|ours?)?$/.test(unit)) return 1;
  if (/^d(?:ays?)?$/.test(unit)) return 24;
  if (/^w(?:eeks?)?$/.test(unit)) return 7 * 24;
  return /^mo(?:nths?)?$/.test(unit) ? 30 * 24 : null;
}

/** Hours as they are typed: "36 h", "5 days". */
export function shelfText(hours: number | null): string {
  if (hours === null) return '';
  return hours >= 48 && hours % 24 === 0 ? `${hours / 24} days` : `${hours} h`;
}

/** Seconds out of "17 s", "40 min", "6 h", "1 h 30"; a bare figure is minutes. */
export function secondsOf(text: string): number | null {
  if (text.trim() === '') return null;
  const seconds = /^\s*(\d+)\s*(?:s|sec|secs|seconds?)\s*$/i.exec(text)?.[1];
  if (seconds !== undefined) return Number(seconds);
  const minutes = parseDuration(text);
  return minutes === null ? Number.NaN : minutes * 60;
}

/** Whole minutes out of "90", "1 h 30", "1:30". */
export function minutesOf(text: string): number | null {
  return text.trim() === '' ? 0 : (parseDuration(text) ?? Number.NaN);
}
