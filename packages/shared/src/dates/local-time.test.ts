import { TZDate } from '@date-fns/tz';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDays,
  addMonths,
  datesInRange,
  daysBetween,
  instantAt,
  isLocalDate,
  localAt,
  mondayOf,
  today,
  weekdayOf,
} from './local-time.ts';

const newYork = 'America/New_York';

describe('the zone', () => {
  // Energy Policy Act of 2005, section 110 (15 U.S.C. 260a): second Sunday of March, first Sunday
  // of November, at 02:00.
  it('skips an hour on 14 March 2027: times in the gap are read with the offset before it', () => {
    expect(instantAt('2027-03-14', 119, newYork).toISOString()).toBe('2027-03-14T06:59:00.000Z');
    // RFC 5545, section 3.3.5.
    expect(instantAt('2027-03-14', 150, newYork).toISOString()).toBe('2027-03-14T07:30:00.000Z');
    expect(instantAt('2027-03-14', 180, newYork).toISOString()).toBe('2027-03-14T07:00:00.000Z');
    expect(localAt(new Date('2027-03-14T07:30:00Z'), newYork)).toEqual({
      date: '2027-03-14',
      minute: 210,
    });
  });

  it('repeats an hour on 7 November 2027: the first of the two is meant', () => {
    // RFC 5545, section 3.3.5.
    expect(instantAt('2027-11-07', 90, newYork).toISOString()).toBe('2027-11-07T05:30:00.000Z');
    expect(instantAt('2027-11-07', 120, newYork).toISOString()).toBe('2027-11-07T07:00:00.000Z');
    expect(localAt(new Date('2027-11-07T06:30:00Z'), newYork)).toEqual({
      date: '2027-11-07',
      minute: 90,
    });
  });

  it('knows which day it is near midnight', () => {
    expect(today(new Date('2027-06-15T03:59:59Z'), newYork)).toBe('2027-06-14');
    expect(today(new Date('2027-06-15T04:00:00Z'), newYork)).toBe('2027-06-15');
  });

  it('counts 23 and 25 hours in the days the clocks change', () => {
    const length = (date: string) =>
      (instantAt(date, 1440, newYork).getTime() - instantAt(date, 0, newYork).getTime()) /
      3_600_000;
    expect(length('2027-03-14')).toBe(23);
    expect(length('2027-06-15')).toBe(24);
    expect(length('2027-11-07')).toBe(25);
  });

  it('agrees with @date-fns/tz and comes back to where it started', () => {
    const zones = [newYork, 'Europe/London', 'Australia/Lord_Howe', 'Asia/Kathmandu', 'UTC'];
    fc.assert(
      fc.property(
        fc.constantFrom(...zones),
        fc.integer({ min: 0, max: 4000 }),
        fc.integer({ min: 0, max: 1439 }),
        (zone, day, minute) => {
          const date = addDays('2024-01-01', day);
          const instant = instantAt(date, minute, zone);
          const local = localAt(instant, zone);
          const [year, month, dayOfMonth] = local.date.split('-').map(Number);
          const theirs = new TZDate(instant.getTime(), zone);
          expect([theirs.getFullYear(), theirs.getMonth() + 1, theirs.getDate()]).toEqual([
            year,
            month,
            dayOfMonth,
          ]);
          expect(theirs.getHours() * 60 + theirs.getMinutes()).toBe(local.minute);
          // Only a time inside a gap moves, and never by more than the gap.
          const moved = daysBetween(date, local.date) * 1440 + local.minute - minute;
          expect(moved).toBeGreaterThanOrEqual(0);
          expect(moved).toBeLessThanOrEqual(60);
        },
      ),
      { numRuns: 500 },
    );
  });
});

describe('days', () => {
  it('are counted in the Gregorian calendar', () => {
    expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
    expect(addDays('2027-02-28', 1)).toBe('2027-03-01');
    expect(addMonths('2027-01-31', 1)).toBe('2027-02-28');
    expect(addMonths('2027-06-15', 18)).toBe('2028-12-15');
    expect(daysBetween('2027-03-01', '2027-02-27')).toBe(-2);
    expect(datesInRange('2027-12-30', '2028-01-02')).toEqual([
      '2027-12-30',
      '2027-12-31',
      '2028-01-01',
      '2028-01-02',
    ]);
    expect(datesInRange('2027-01-02', '2027-01-01')).toEqual([]);
  });

  it('have ISO weekdays', () => {
    // ISO 8601: 1 January 2000 was a Saturday.
    expect(weekdayOf('2000-01-01')).toBe(6);
    expect(weekdayOf('2027-06-14')).toBe(1);
    expect(mondayOf('2027-06-20')).toBe('2027-06-14');
    expect(mondayOf('2027-06-14')).toBe('2027-06-14');
  });

  it('that do not exist are refused', () => {
    expect(isLocalDate('2027-02-29')).toBe(false);
    expect(isLocalDate('2027-13-01')).toBe(false);
    expect(isLocalDate('27-01-01')).toBe(false);
    expect(() => addDays('2027-02-30', 1)).toThrow(RangeError);
  });
});
