import { describe, expect, it } from 'vitest';
import { formatSyrupTarget, syrupTargetAt } from './syrup.ts';

/*
 * Colorado State University Extension: about 2 °F lower for each 1,000 ft. Conversions by GNU
 * units 2.22: 1,000 ft = 304.8 m; 1,609.344 m = 5,280 ft; 229.44 °F = 109.69 °C.
 */
describe('a syrup', () => {
  it('is boiled to its mark at sea level', () => {
    expect(syrupTargetAt(115, 0)).toBe(115);
    expect(formatSyrupTarget(115, 0, 'F')).toBe('240 °F / 115 °C');
    expect(formatSyrupTarget(115, 0, 'C')).toBe('115 °C / 240 °F');
  });

  it('is done 2 °F lower for each 1,000 ft of height', () => {
    expect(syrupTargetAt(115, 304.8)).toBeCloseTo(115 - 2 / 1.8, 9);
    // A mile up: 240 - 10.56 = 229.44 °F.
    expect(formatSyrupTarget(115, 1609.344, 'F')).toBe('229 °F / 109 °C');
    expect(syrupTargetAt(115.5556, 1609.344)).toBeCloseTo(109.69, 2);
  });

  it('is done hotter below the sea', () => {
    expect(syrupTargetAt(115, -304.8)).toBeGreaterThan(115);
  });
});
