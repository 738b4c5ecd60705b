import { describe, expect, it } from 'vitest';
import {
  formatDay,
  formatDuration,
  formatHours,
  formatList,
  formatMonth,
  formatTime,
  formatWeekday,
  formatWindow,
} from './format.ts';

describe('days and times for people', () => {
  it('reads as the studio says it', () => {
    expect(formatDay('2027-06-19')).toBe('Saturday 19 June');
    expect(formatDay('2027-06-09', { year: true })).toBe('Wednesday 9 June 2027');
    expect(formatDay('2027-06-09', { weekday: false })).toBe('9 June');
    expect(formatDay('2027-06-19', { locale: 'fr-FR' })).toBe('samedi 19 juin');
    expect(formatWeekday('2027-06-19', 'short')).toBe('Sat');
    expect(formatMonth('2027-06-19')).toBe('June 2027');
    expect(formatTime(545)).toBe('09:05');
    expect(formatWindow(600, 30)).toBe('10:00 to 10:30');
    expect(formatDuration(380)).toBe('6 h 20');
    expect(formatDuration(125)).toBe('2 h 05');
    expect(formatDuration(120)).toBe('2 h');
    expect(formatDuration(40)).toBe('40 min');
    expect(formatHours(564)).toBe('9.4');
    expect(formatHours(720)).toBe('12');
    expect(formatList(['Thursday', 'Friday'])).toBe('Thursday and Friday');
    expect(formatList(['one', 'two', 'three'])).toBe('one, two and three');
    expect(formatList(['Friday'])).toBe('Friday');
  });
});
