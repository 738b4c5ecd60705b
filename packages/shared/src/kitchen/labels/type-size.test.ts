import { describe, expect, it } from 'vitest';
import { netWeightText, smallestFigureMm, smallestXHeightMm } from './type-size.ts';

describe('the smallest type', () => {
  // Regulation (EU) 1169/2011 article 13(2), (3) and Annex IV; 21 CFR 101.2(c).
  it.each([
    ['EU', 80, 1.2],
    ['EU', 79.9, 0.9],
    ['UK', 1200, 1.2],
    ['US', 10, 25.4 / 16],
  ] as const)('in the %s on a panel of %d cm2', (region, cm2, mm) => {
    expect(smallestXHeightMm(region, cm2)).toBe(mm);
  });

  // 21 CFR 101.7(i) by panel; Directive 76/211/EEC Annex I 3.1 by weight.
  it.each([
    ['US', 500, 5, 1 / 16],
    ['US', 500, 25, 1 / 8],
    ['US', 500, 100, 3 / 16],
    ['US', 500, 400, 1 / 4],
    ['US', 500, 401, 1 / 2],
  ] as const)('of a net weight in the %s, %d g on %d square inches', (region, g, sqIn, inches) => {
    expect(smallestFigureMm(region, g, sqIn * 6.4516 - 1e-6)).toBeCloseTo(inches * 25.4);
  });

  it.each([
    [50, 2],
    [51, 3],
    [200, 3],
    [201, 4],
    [1000, 4],
    [1001, 6],
  ])('of a net weight in the EU of %d g', (g, mm) => {
    expect(smallestFigureMm('EU', g, 500)).toBe(mm);
  });
});

describe('a net weight', () => {
  // 21 CFR 101.7(j): from one pound to four in ounces with pounds beside them; 1 oz = 28.349523125 g.
  it.each([
    ['US', 400, 'Net Wt 14 oz (400 g)'],
    ['US', 453.59237, 'Net Wt 16 oz (1 lb) 453 g'],
    ['US', 1000, 'Net Wt 35 oz (2 lb 3 oz) 1.00 kg'],
    ['US', 1815, 'Net Wt 4 lb (1.81 kg)'],
    ['US', 4000, 'Net Wt 8 lb 13 oz (4.00 kg)'],
    ['EU', 999.9, '999 g'],
    ['UK', 4399, '4.39 kg'],
  ] as const)('in the %s of %d g', (region, g, text) => {
    expect(netWeightText(region, g)).toBe(text);
  });
});
