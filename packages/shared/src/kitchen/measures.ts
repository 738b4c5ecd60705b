/** Lengths, temperatures, weights and times: exact units, what people read and what they type. */

/** Exact by definition: 1 in = 25.4 mm; 1 US cup = 14.4375 in3; lb and oz avoirdupois. */
export const mmPerInch = 25.4;
export const mlPerUsCup = 236.5882365;
export const gPerPound = 453.59237;
export const gPerOunce = 28.349523125;

export type LengthLead = 'in' | 'cm';
export type TemperatureLead = 'F' | 'C';

export const mmToInches = (mm: number): number => mm / mmPerInch;
export const inchesToMm = (inches: number): number => inches * mmPerInch;
export const celsiusToFahrenheit = (celsius: number): number => (celsius * 9) / 5 + 32;
export const fahrenheitToCelsius = (fahrenheit: number): number => ((fahrenheit - 32) * 5) / 9;

const quarters = ['', '¼', '½', '¾'] as const;

/** Inches as bakers say them, to the quarter: `10`, `9¾`. */
export function inchFigure(mm: number): string {
  const count = Math.round(mmToInches(mm) * 4);
  const whole = Math.floor(count / 4);
  const quarter = quarters[count % 4] ?? '';
  return whole === 0 && quarter !== '' ? quarter : `${whole}${quarter}`;
}

/** Centimetres: whole ones from 10 up, halves below. */
export function cmFigure(mm: number): string {
  const cm = mm / 10;
  // Halves go down: 12 in are kept as 305 mm and are 30.48 cm.
  return String(cm >= 10 ? Math.ceil(cm - 0.5) : Math.round(cm * 2) / 2);
}

/** A bare figure in the studio's leading unit, for lists like "10, 8 and 5 in". */
export function lengthFigure(mm: number, lead: LengthLead): string {
  return lead === 'in' ? inchFigure(mm) : cmFigure(mm);
}

/** Both units, the studio's first: `10 in / 25 cm`. */
export function formatLength(mm: number, lead: LengthLead): string {
  const inches = `${inchFigure(mm)} in`;
  const cm = `${cmFigure(mm)} cm`;
  return lead === 'in' ? `${inches} / ${cm}` : `${cm} / ${inches}`;
}

/** Both scales in whole degrees, the studio's first: `73 °F / 23 °C`. */
export function formatTemperature(celsius: number, lead: TemperatureLead): string {
  return bothScales(Math.round(celsius), Math.round(celsiusToFahrenheit(celsius)), lead);
}

/**
 * Pairs the bench takes as one mark although the arithmetic lands a degree beside (common
 * practice, no source; 68 °C with 155 °F is the FDA Food Code's, 3-401.11).
 */
const benchPairs: readonly (readonly [celsius: number, fahrenheit: number])[] = [
  [4, 40],
  [21, 70],
  [27, 80],
  [68, 155],
  [71, 160],
  [93, 200],
  [115, 240],
];

/** °F by the bench's own pairs: 115 °C is its 240 °F, 71 °C its 160 °F; else by arithmetic. */
export function benchFahrenheit(celsius: number): number {
  const pair = benchPairs.find(([c]) => c === Math.round(celsius));
  return pair === undefined ? celsiusToFahrenheit(celsius) : pair[1];
}

/** °C by the bench's own pairs, the other way round: its 160 °F is 71 °C and not 71.1. */
export function benchCelsius(fahrenheit: number): number {
  const pair = benchPairs.find(([, f]) => f === fahrenheit);
  return pair === undefined ? fahrenheitToCelsius(fahrenheit) : pair[0];
}

/** As `formatTemperature`, with the bench's own pairs: 240 °F is 115 °C, 160 °F is 71 °C. */
export function formatBenchTemperature(celsius: number, lead: TemperatureLead): string {
  return bothScales(Math.round(celsius), Math.round(benchFahrenheit(celsius)), lead);
}

function bothScales(celsius: number, fahrenheit: number, lead: TemperatureLead): string {
  return lead === 'F' ? `${fahrenheit} °F / ${celsius} °C` : `${celsius} °C / ${fahrenheit} °F`;
}

/** `2.4 kg / 5 lb 5 oz`, the unit that goes with the studio's lengths first. */
export function formatWeight(grams: number, lead: LengthLead): string {
  const metric = grams < 1000 ? `${Math.round(grams)} g` : `${(grams / 1000).toFixed(1)} kg`;
  const ounces = Math.round(grams / gPerOunce);
  const pounds = Math.floor(ounces / 16);
  const rest = ounces % 16;
  const customary =
    pounds === 0 ? `${rest} oz` : rest === 0 ? `${pounds} lb` : `${pounds} lb ${rest} oz`;
  return lead === 'in' ? `${customary} / ${metric}` : `${metric} / ${customary}`;
}

/** Fractions that are one letter, by what they are worth. */
export const vulgarFractions: Readonly<Record<string, number>> = {
  '¼': 0.25,
  '½': 0.5,
  '¾': 0.75,
  '⅓': 1 / 3,
  '⅔': 2 / 3,
  '⅛': 0.125,
  '⅜': 0.375,
  '⅝': 0.625,
  '⅞': 0.875,
  '⅕': 0.2,
  '⅖': 0.4,
  '⅗': 0.6,
  '⅘': 0.8,
  '⅙': 1 / 6,
  '⅚': 5 / 6,
};

type Typed = { readonly value: number; readonly unit: string };

/** A number as people write it (`7 1/2`, `7½`, `7,5`, `-3.5`) and whatever follows it. */
function readFigure(text: string): Typed | null {
  const match =
    /^([+\-−]?)\s*(?:(\d+)\s+(\d+)\s*\/\s*(\d+)|(\d+)\s*\/\s*(\d+)|(\d+(?:[.,]\d+)?)?\s*([¼½¾⅓⅔⅛])?)\s*(.*)$/u.exec(
      text.trim(),
    );
  if (match === null) return null;
  const [, sign, whole, over, under, top, bottom, plain, glyph, unit = ''] = match;
  let value: number;
  if (whole !== undefined) value = Number(whole) + Number(over) / Number(under);
  else if (top !== undefined) value = Number(top) / Number(bottom);
  else if (plain === undefined && glyph === undefined) return null;
  else
    value =
      Number((plain ?? '0').replace(',', '.')) +
      (glyph === undefined ? 0 : (vulgarFractions[glyph] ?? 0));
  if (!Number.isFinite(value)) return null;
  return { value: sign === '-' || sign === '−' ? -value : value, unit: unit.trim().toLowerCase() };
}

const inchUnits = ['in', 'in.', 'inch', 'inches', '"', '”', '″', "''"];
const cmUnits = ['cm', 'cms', 'centimetre', 'centimetres', 'centimeter', 'centimeters'];
const mmUnits = ['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters'];

/** `7 inches`, `7 1/2"`, `18cm`, `180 mm` or a bare figure in the leading unit, to whole mm. */
export function parseLength(text: string, lead: LengthLead): number | null {
  const typed = readFigure(text);
  if (typed === null || typed.value < 0) return null;
  const unit = typed.unit === '' ? lead : typed.unit;
  if (inchUnits.includes(unit)) return Math.round(inchesToMm(typed.value));
  if (cmUnits.includes(unit)) return Math.round(typed.value * 10);
  if (mmUnits.includes(unit)) return Math.round(typed.value);
  return null;
}

/** A bare figure no warm table reaches in one scale is meant in the other. */
const coolestBareF = 45;
const warmestBareC = 50;

/**
 * `77 F`, `25 °C`, or a bare figure, to °C. A bare figure is read in the leading scale unless a
 * table would never be that cold or that hot in it; in doubt it is read as the warmer of the two,
 * and what was understood is always shown back in both.
 */
export function parseTemperature(text: string, lead: TemperatureLead): number | null {
  const typed = readFigure(text);
  if (typed === null) return null;
  const scale = typed.unit.replace(/^(?:°|º|deg(?:rees?)?\b)\s*/u, '');
  if (/^f(?:ahrenheit)?\.?$/u.test(scale)) return fahrenheitToCelsius(typed.value);
  if (/^c(?:elsius|entigrade)?\.?$/u.test(scale)) return typed.value;
  if (scale !== '') return null;
  const celsius = lead === 'F' ? typed.value <= coolestBareF : typed.value <= warmestBareC;
  return celsius ? typed.value : fahrenheitToCelsius(typed.value);
}

/** `90`, `90 min`, `1 h 30`, `1:30`, `1.5 hours`, to whole minutes. */
export function parseDuration(text: string): number | null {
  const trimmed = text.trim().toLowerCase();
  const clock = /^(\d{1,2}):([0-5]\d)$/u.exec(trimmed);
  if (clock !== null) return Number(clock[1]) * 60 + Number(clock[2]);
  const both =
    /^(\d+)\s*(?:h|hr|hrs|hour|hours)\s*(?:and\s+)?(\d+)\s*(?:m|min|mins|minutes?)?$/u.exec(
      trimmed,
    );
  if (both !== null) return Number(both[1]) * 60 + Number(both[2]);
  const typed = readFigure(trimmed);
  if (typed === null || typed.value < 0) return null;
  if (/^(?:h|hr|hrs|hours?)$/u.test(typed.unit)) return Math.round(typed.value * 60);
  return /^(?:m|min|mins|minutes?)?$/u.test(typed.unit) ? Math.round(typed.value) : null;
}
