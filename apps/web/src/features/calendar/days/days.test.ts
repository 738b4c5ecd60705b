import { describe, expect, test } from 'vitest';
import { rangeOf, readPlace, stepFrom, titleOf } from './calendar-range.ts';
import { fillOf, hoursWords, loadOf, loadWords } from './day-load.ts';

const day = {
  date: '2027-06-18',
  closed: null,
  benchMinutes: 720,
  plannedMinutes: 0,
  pickups: 0,
  shifts: [],
  why: [],
};

describe('a day’s load', () => {
  test('full is good news, only more than there is at the bench is not', () => {
    expect(loadOf({ ...day, plannedMinutes: 306 })).toBe('room');
    expect(hoursWords({ ...day, plannedMinutes: 306 })).toBe('5.1 of 12 h');
    expect(loadWords({ ...day, plannedMinutes: 720 })).toBe('full, and it fits');
    expect(loadWords({ ...day, plannedMinutes: 800 })).toBe('1 h 20 too much');
    expect(fillOf({ ...day, plannedMinutes: 800 })).toBeGreaterThan(1);
  });

  test('a closed day with work on it is overfull, not hidden', () => {
    const closed = { ...day, closed: { id: 'c', reason: 'Holiday' }, benchMinutes: 0 };
    expect(loadOf(closed)).toBe('closed');
    expect(loadOf({ ...closed, plannedMinutes: 60 })).toBe('overfull');
    expect(fillOf({ ...closed, plannedMinutes: 60 })).toBeGreaterThan(1);
    expect(hoursWords({ ...closed, plannedMinutes: 60 })).toBe('1 h of work');
    expect(loadWords({ ...closed, plannedMinutes: 60 })).toBe('but closed');
  });
});

describe('what the calendar shows', () => {
  const today = '2027-06-15';

  test('an address that makes no sense is this week', () => {
    const place = readPlace(new URLSearchParams('view=year&date=2027-02-30'), today);
    expect(place).toEqual({ view: 'week', date: today });
  });

  test('weeks begin on Monday, months come in whole weeks', () => {
    expect(rangeOf({ view: 'week', date: today })).toEqual({
      from: '2027-06-14',
      to: '2027-06-20',
    });
    expect(rangeOf({ view: 'month', date: today })).toEqual({
      from: '2027-05-31',
      to: '2027-07-04',
    });
  });

  test('a month’s step does not skip a short month', () => {
    expect(stepFrom({ view: 'month', date: '2027-01-31' }, 1)).toBe('2027-02-01');
    expect(stepFrom({ view: 'week', date: today }, -1)).toBe('2027-06-08');
  });

  test('titles say no more than is needed', () => {
    const title = (view: 'day' | 'week' | 'month', date: string) =>
      titleOf({ view, date }, today, 'en-US');
    expect(title('week', today)).toBe('14 to 20 June');
    expect(title('week', '2027-06-30')).toBe('28 June to 4 July');
    expect(title('week', '2028-01-05')).toBe('3 to 9 January 2028');
    expect(title('day', today)).toBe('Tuesday 15 June');
    expect(title('month', today)).toBe('June 2027');
  });
});
