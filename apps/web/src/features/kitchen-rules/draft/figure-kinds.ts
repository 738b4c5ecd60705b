import type { StudioCard } from '#shared/contracts/menu.ts';
import { formatDuration } from '#shared/dates/format.ts';
import {
  celsiusToFahrenheit,
  formatTemperature,
  mmPerInch,
  parseDuration,
  parseLength,
  parseTemperature,
} from '#shared/kitchen/measures.ts';
import { readNumber } from '#web/lib/read-number.ts';

/** How a figure is typed and told. */
export type FigureKind =
  'thin' | 'length' | 'warmth' | 'degrees' | 'share' | 'minutes' | 'altitude' | 'number';

type Leads = Pick<StudioCard, 'lengthLead' | 'temperatureLead'>;

const mmPerFoot = 12 * mmPerInch;
const trimmed = (value: number, digits: number) => String(Number(value.toFixed(digits)));

/** A quarter of an inch that is kept as whole millimeters is that quarter: 102 mm are 4 in. */
function inches(mm: number): string {
  const quarters = Math.round((mm / mmPerInch) * 4) / 4;
  return trimmed(Math.round(quarters * mmPerInch) === mm ? quarters : mm / mmPerInch, 2);
}

/** In the one unit that stands in the field. */
export function writeFigure(kind: FigureKind, value: number, leads: Leads): string {
  const inInches = leads.lengthLead === 'in';
  const inF = leads.temperatureLead === 'F';
  switch (kind) {
    case 'thin':
      return `${trimmed(value, 2)} mm`;
    case 'length':
      return inInches ? `${inches(value)} in` : `${trimmed(value / 10, 1)} cm`;
    case 'warmth':
      return inF ? `${trimmed(celsiusToFahrenheit(value), 0)} °F` : `${trimmed(value, 1)} °C`;
    case 'degrees':
      return inF ? `${trimmed(value * 1.8, 1)} °F` : `${trimmed(value, 1)} °C`;
    case 'share':
      return `${trimmed(value / 10_000, 2)} %`;
    case 'minutes':
      return formatDuration(value);
    case 'altitude':
      return inInches ? `${trimmed((value * 1000) / mmPerFoot, 0)} ft` : `${value} m`;
    case 'number':
      return trimmed(value, 3);
  }
}

/** In both systems where there are two, the studio's first. */
export function tellFigure(kind: FigureKind, value: number, leads: Leads, unit = ''): string {
  const own = writeFigure(kind, value, leads);
  switch (kind) {
    case 'thin':
      return `${own} / ${trimmed(value / mmPerInch, 2)} in`;
    case 'length':
      return `${own} / ${writeFigure(kind, value, otherLeads(leads))}`;
    case 'warmth':
      return formatTemperature(value, leads.temperatureLead);
    case 'degrees':
    case 'altitude':
      return `${own} / ${writeFigure(kind, value, otherLeads(leads))}`;
    case 'share':
    case 'minutes':
      return own;
    case 'number':
      return unit === '' ? own : `${own} ${unit}`;
  }
}

const otherLeads = ({ lengthLead, temperatureLead }: Leads): Leads => ({
  lengthLead: lengthLead === 'in' ? 'cm' : 'in',
  temperatureLead: temperatureLead === 'F' ? 'C' : 'F',
});

/** What was typed, in either system, as the figure it is kept as; null where it says none. */
export function readFigure(kind: FigureKind, text: string, leads: Leads): number | null {
  switch (kind) {
    case 'thin':
      // A bare figure is millimetres, and their tenths count: parseLength rounds them away.
      return /^[\d\s.,]+(?:mm.*)?$/iu.test(text) ? readNumber(text) : parseLength(text, 'in');
    case 'length':
      return parseLength(text, leads.lengthLead);
    case 'warmth': {
      const celsius = parseTemperature(text, leads.temperatureLead);
      return celsius === null ? null : rounded(celsius, 2);
    }
    case 'degrees': {
      const value = readNumber(text.replaceAll(/[°º]|degrees?/giu, ' '));
      if (value === null) return null;
      const inF = /f/iu.test(text) || (leads.temperatureLead === 'F' && !/c/iu.test(text));
      return rounded(inF ? value / 1.8 : value, 2);
    }
    case 'share': {
      const value = readNumber(text);
      return value === null ? null : Math.round(value * 10_000);
    }
    case 'minutes':
      return parseDuration(text);
    case 'altitude': {
      const value = readNumber(text);
      if (value === null) return null;
      const named = /m/iu.test(text) ? 'm' : /f|['’′]/iu.test(text) ? 'ft' : null;
      const inFeet = (named ?? (leads.lengthLead === 'in' ? 'ft' : 'm')) === 'ft';
      return Math.round(inFeet ? (value * mmPerFoot) / 1000 : value);
    }
    case 'number':
      return readNumber(text);
  }
}

const rounded = (value: number, digits: number) => Number(value.toFixed(digits));
