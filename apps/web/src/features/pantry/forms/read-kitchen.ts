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

/** Whole hours out of "36 h", "5 days", "2 weeks", "3 months" or a bare figure of hours. */
export function hoursOf(text: string): number | null {
  if (text.trim() === '') return null;
  const parts = [...text.toLowerCase().matchAll(/(\d+(?:[.,]\d+)?)\s*([a-z]*)/g)];
  let hours = 0;
  for (const [, figure = '', unit = ''] of parts) {
    const each = hoursPer(unit);
    if (each === null) return Number.NaN;
    hours += Number(figure.replace(',', '.')) * each;
  }
  return parts.length === 0 ? Number.NaN : Math.round(hours);
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
