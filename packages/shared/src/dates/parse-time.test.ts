import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatTime } from './format.ts';
import { parseTime } from './parse-time.ts';

describe('a time as people type it', () => {
  it.each([
    ['16:00', 960],
    ['16.30', 990],
    ['1630', 990],
    ['9', 540],
    ['4 pm', 960],
    ['4:30pm', 990],
    ['4 p.m.', 960],
    ['12 am', 0],
    ['12pm', 720],
    ['noon', 720],
    ['7:05 AM', 425],
  ])('%s', (text, minutes) => {
    expect(parseTime(text)).toBe(minutes);
  });

  it.each(['', 'tea time', '25:00', '13 pm', '0 am', '16:60', '4 xm'])('not “%s”', (text) => {
    expect(parseTime(text)).toBeNull();
  });

  it('reads back what is written', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1439 }), (minute) => {
        expect(parseTime(formatTime(minute))).toBe(minute);
      }),
    );
  });
});
