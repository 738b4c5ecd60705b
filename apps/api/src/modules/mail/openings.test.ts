import { describe, expect, it } from 'vitest';
import { openingsOf } from './openings.ts';

const window = (weekday: number, startMinute: number, minutes: number) => ({
  weekday,
  startMinute,
  minutes,
});

describe('openingsOf', () => {
  it('takes windows that meet together, and days with the same hours', () => {
    const week = [2, 3, 4, 5].flatMap((day) => [window(day, 630, 30), window(day, 600, 30)]);
    expect(openingsOf([...week, window(6, 540, 60)], 'en-US')).toEqual([
      'Tuesday to Friday, 10:00 to 11:00',
      'Saturday, 09:00 to 10:00',
    ]);
  });

  it('keeps a break in the day and a day between apart', () => {
    const windows = [
      window(1, 600, 60),
      window(1, 780, 60),
      window(2, 600, 60),
      window(4, 600, 60),
    ];
    expect(openingsOf(windows, 'en-US')).toEqual([
      'Monday, 10:00 to 11:00, 13:00 to 14:00',
      'Tuesday, 10:00 to 11:00',
      'Thursday, 10:00 to 11:00',
    ]);
  });

  it('joins two days by a word of their own, and says nothing of a closed week', () => {
    expect(openingsOf([window(6, 600, 60), window(7, 600, 60)], 'en-US')).toEqual([
      'Saturday and Sunday, 10:00 to 11:00',
    ]);
    expect(openingsOf([], 'en-US')).toEqual([]);
  });
});
