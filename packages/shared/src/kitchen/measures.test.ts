import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  celsiusToFahrenheit,
  fahrenheitToCelsius,
  benchCelsius,
  formatBenchTemperature,
  formatLength,
  formatTemperature,
  formatWeight,
  gPerOunce,
  gPerPound,
  inchesToMm,
  mlPerUsCup,
  mmPerInch,
  mmToInches,
  parseDuration,
  parseLength,
  parseTemperature,
} from './measures.ts';

describe('units', () => {
  // NIST Handbook 44 (2024), appendix C, exact by definition.
  it('are exact', () => {
    expect(mmPerInch).toBe(25.4);
    expect(gPerPound).toBe(453.59237);
    expect(gPerOunce).toBeCloseTo(gPerPound / 16, 12);
    expect((mlPerUsCup * 1000) / mmPerInch ** 3).toBeCloseTo(14.4375, 10);
  });

  // Debian units 2.22: units -t 'tempF(240)' tempC and so on.
  it.each([
    [240, 115.55556],
    [160, 71.111111],
    [90, 32.222222],
    [73.4, 23],
  ])('%f °F is %f °C', (fahrenheit, celsius) => {
    expect(fahrenheitToCelsius(fahrenheit)).toBeCloseTo(celsius, 5);
    expect(celsiusToFahrenheit(celsius)).toBeCloseTo(fahrenheit, 4);
  });

  it('turn back into themselves', () => {
    fc.assert(
      fc.property(fc.double({ min: -50, max: 500, noNaN: true }), (value) => {
        expect(mmToInches(inchesToMm(value))).toBeCloseTo(value, 9);
        expect(celsiusToFahrenheit(fahrenheitToCelsius(value))).toBeCloseTo(value, 9);
      }),
    );
  });
});

describe('what people read', () => {
  it.each([
    [254, 'in', '10 in / 25 cm'],
    [305, 'in', '12 in / 30 cm'],
    [203, 'in', '8 in / 20 cm'],
    [127, 'cm', '13 cm / 5 in'],
    [75, 'cm', '7.5 cm / 3 in'],
    [250, 'in', '9¾ in / 25 cm'],
    [5, 'in', '¼ in / 0.5 cm'],
  ] as const)('writes %i mm, %s first, as %s', (mm, lead, text) => {
    expect(formatLength(mm, lead)).toBe(text);
  });

  it('writes both scales in whole degrees', () => {
    expect(formatTemperature(23, 'C')).toBe('23 °C / 73 °F');
    expect(formatTemperature(23, 'F')).toBe('73 °F / 23 °C');
  });

  // Common practice, no source: the bench takes 240 °F as 115 °C, 200 °F as 93 °C and 160 °F as
  // 71 °C; 80 °F as 27 °C is memory. Every other mark is by arithmetic.
  it.each([
    [115, '240 °F / 115 °C'],
    [71, '160 °F / 71 °C'],
    [4, '40 °F / 4 °C'],
    [93, '200 °F / 93 °C'],
    [27, '80 °F / 27 °C'],
    [100, '212 °F / 100 °C'],
  ])('gives the bench %i °C as %s', (celsius, text) => {
    expect(formatBenchTemperature(celsius, 'F')).toBe(text);
    // What is typed back by its °F is the same mark again.
    expect(benchCelsius(Number(text.split(' ')[0]))).toBeCloseTo(celsius, 6);
  });

  it('writes weights in both systems', () => {
    expect(formatWeight(2410, 'in')).toBe('5 lb 5 oz / 2.4 kg');
    expect(formatWeight(907.18474, 'cm')).toBe('907 g / 2 lb');
    expect(formatWeight(90, 'in')).toBe('3 oz / 90 g');
  });
});

describe('what people type', () => {
  it.each([
    ['7 inches', 'cm', 178],
    ['7"', 'cm', 178],
    ['7 1/2 in', 'cm', 191],
    ['7½', 'in', 191],
    ['18cm', 'in', 180],
    ['18,5 cm', 'in', 185],
    ['180 mm', 'in', 180],
    ['8', 'in', 203],
    ['20', 'cm', 200],
  ] as const)('reads the length %s, %s leading, as %i mm', (text, lead, mm) => {
    expect(parseLength(text, lead)).toBe(mm);
  });

  it.each(['', 'wide', '8 miles', '-3 in', '1/0 in'])('does not read %j as a length', (text) => {
    expect(parseLength(text, 'in')).toBeNull();
  });

  it.each([
    ['77 F', 'C', 25],
    ['77°F', 'C', 25],
    ['25 °C', 'F', 25],
    ['25 degrees c', 'F', 25],
    ['77', 'F', 25],
    ['25', 'C', 25],
    ['25', 'F', 25],
    ['77', 'C', 25],
    ['-2', 'C', -2],
  ] as const)('reads the temperature %s, %s leading, as %i °C', (text, lead, celsius) => {
    expect(parseTemperature(text, lead)).toBeCloseTo(celsius, 9);
  });

  it.each(['', 'warm', '20 K'])('does not read %j as a temperature', (text) => {
    expect(parseTemperature(text, 'C')).toBeNull();
  });

  it.each([
    ['90', 90],
    ['90 min', 90],
    ['1 h 30', 90],
    ['1:30', 90],
    ['1.5 hours', 90],
    ['1 hour and 30 minutes', 90],
    ['2h', 120],
  ])('reads the time %s as %i minutes', (text, minutes) => {
    expect(parseDuration(text)).toBe(minutes);
  });

  it.each(['', 'soon', '-5', '1:75'])('does not read %j as a time', (text) => {
    expect(parseDuration(text)).toBeNull();
  });

  it('reads its own writing back', () => {
    fc.assert(
      fc.property(fc.integer({ min: 4, max: 64 }), (quarters) => {
        const mm = Math.round(inchesToMm(quarters / 4));
        const [inches = ''] = formatLength(mm, 'in').split(' / ');
        expect(parseLength(inches, 'cm')).toBe(mm);
      }),
    );
  });
});
