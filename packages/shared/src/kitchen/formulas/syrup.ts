import { benchFahrenheit, type TemperatureLead } from '#shared/kitchen/measures.ts';

/**
 * Syrup comes to the same strength about 2 °F lower for each 1,000 ft of altitude: Colorado State
 * University Extension on cooking at high altitude.
 */
export const syrupFPer1000Ft = 2;
const metresPerFoot = 0.3048;

/** How far below its sea-level mark a syrup is done, °F. */
function lowerF(altitudeM: number): number {
  return (syrupFPer1000Ft * altitudeM) / metresPerFoot / 1000;
}

/** Where a syrup is boiled to at a height above the sea, °C; the formula's target is at sea level. */
export function syrupTargetAt(seaLevelC: number, altitudeM: number): number {
  return seaLevelC - (lowerF(altitudeM) * 5) / 9;
}

/**
 * The corrected target in whole degrees of both scales, the studio's first. It starts from the
 * bench's own mark, whose 240 °F is 115 °C.
 */
export function formatSyrupTarget(
  seaLevelC: number,
  altitudeM: number,
  lead: TemperatureLead,
): string {
  const f = `${Math.round(benchFahrenheit(seaLevelC) - lowerF(altitudeM))} °F`;
  const c = `${Math.round(syrupTargetAt(seaLevelC, altitudeM))} °C`;
  return lead === 'F' ? `${f} / ${c}` : `${c} / ${f}`;
}
