import { describe, expect, it } from 'vitest';
import { gramsOf, minorOf, minorText, ppmOf, ppmText } from './read-amounts.ts';
import { degreesOf, hoursOf, minutesOf, secondsOf, shelfText } from './read-kitchen.ts';

describe('what is typed of a pack', () => {
  it.each([
    ['454', 454],
    ['454 g', 454],
    ['1,850 g', 1850],
    ['2.5 kg', 2500],
    // By definition: 1 lb = 453.59237 g, 1 oz = 28.349523125 g.
    ['1 lb', 453.592],
    ['16 oz.', 453.592],
    ['', null],
    ['a sack', Number.NaN],
    ['2 cups', Number.NaN],
  ])('reads %j as %j grams', (text, grams) => {
    expect(gramsOf(text)).toEqual(grams);
  });

  // Digits of the minor unit by ISO 4217: USD 2, JPY 0, KWD 3.
  it.each([
    ['5.45', 'USD', 545],
    ['$5.45', 'USD', 545],
    ['5,45', 'USD', 545],
    ['500', 'JPY', 500],
    ['1.250', 'KWD', 1250],
    ['', 'USD', null],
    ['cheap', 'USD', Number.NaN],
  ])('reads %j %s as %j', (text, currency, minor) => {
    expect(minorOf(text, currency)).toEqual(minor);
    if (minor !== null && !Number.isNaN(minor)) {
      expect(minorOf(minorText(minor, currency), currency)).toBe(minor);
    }
  });

  it('reads percent to the hundredth of a percent and back', () => {
    expect(ppmOf('98.5 %')).toBe(985_000);
    expect(ppmOf(ppmText(933_333))).toBe(933_333);
    expect(ppmOf('most')).toBeNaN();
  });
});

describe('what is typed of a step', () => {
  it.each([
    ['160 F', 71],
    ['160', 71],
    ['71 °C', 71],
    ['240 °F', 115],
    ['-4 F', -20],
    ['', null],
    ['hot', Number.NaN],
  ])('reads %j as %j °C', (text, celsius) => {
    expect(degreesOf(text, 'F')).toEqual(celsius);
  });

  it.each([
    ['36', 36],
    ['36 h', 36],
    ['5 days', 120],
    ['2 days 12 h', 60],
    ['1 week', 168],
    ['2 months', 1440],
    ['', null],
    ['2 days and 12 h', 60],
    ['1.5 days', 36],
    ['long', Number.NaN],
    ['-3 h', Number.NaN],
    ['2-3 days', Number.NaN],
    ['2 3 days', Number.NaN],
    ['about 5 days', Number.NaN],
    ['5 days?', Number.NaN],
  ])('reads %j as %j hours', (text, hours) => {
    expect(hoursOf(text)).toEqual(hours);
    if (hours !== null && !Number.isNaN(hours)) expect(hoursOf(shelfText(hours))).toBe(hours);
  });

  it.each([
    ['17 s', 17],
    ['40 min', 2400],
    ['6 h', 21_600],
    ['1 h 30', 5400],
    ['', null],
    ['soon', Number.NaN],
  ])('reads %j as %j seconds', (text, seconds) => {
    expect(secondsOf(text)).toEqual(seconds);
  });

  it('takes no minutes for none', () => {
    expect([minutesOf(''), minutesOf('1 h 30'), minutesOf('a while')]).toEqual([0, 90, Number.NaN]);
  });
});
