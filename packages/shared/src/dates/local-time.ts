/**
 * Local days and times in the studio's zone, and the instants they stand for.
 *
 * A day is `YYYY-MM-DD`; a time is minutes since its midnight; an instant is a `Date` or, in the
 * planner, whole minutes since 1970 in UTC. Where the clocks change, RFC 5545 section 3.3.5
 * decides: a time that does not exist is read with the offset before the gap (02:30 becomes
 * 03:30), a time that comes twice is the first of the two.
 */

/** Whole minutes since 1970-01-01T00:00Z. */
export type UtcMinute = number;
/** `YYYY-MM-DD`, Gregorian. */
export type LocalDate = string;

const dayMs = 86_400_000;
const minuteMs = 60_000;

const clocks = new Map<string, Intl.DateTimeFormat>();

function clockOf(zone: string): Intl.DateTimeFormat {
  let clock = clocks.get(zone);
  if (clock === undefined) {
    clock = new Intl.DateTimeFormat('en-US', {
      timeZone: zone,
      calendar: 'gregory',
      hourCycle: 'h23',
      era: 'short',
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: 'numeric',
      minute: 'numeric',
      second: 'numeric',
    });
    clocks.set(zone, clock);
  }
  return clock;
}

/** What the wall clock of the zone shows at an instant, as if it were UTC; milliseconds. */
function wallMs(instantMs: number, zone: string): number {
  const read = { year: 0, month: 0, day: 0, hour: 0, minute: 0, second: 0 };
  for (const part of clockOf(zone).formatToParts(instantMs)) {
    if (
      part.type === 'year' ||
      part.type === 'month' ||
      part.type === 'day' ||
      part.type === 'hour' ||
      part.type === 'minute' ||
      part.type === 'second'
    ) {
      read[part.type] = Number(part.value);
    }
  }
  return Date.UTC(read.year, read.month - 1, read.day, read.hour, read.minute, read.second);
}

/** Offsets in minutes already asked about, by zone; a planner asks for the same days over and over. */
const offsets = new Map<string, Map<number, number>>();

function offsetMs(instantMs: number, zone: string): number {
  let known = offsets.get(zone);
  if (known === undefined) {
    known = new Map();
    offsets.set(zone, known);
  }
  // Clocks have changed on whole minutes, by whole minutes, since 1972.
  const minute = Math.floor(instantMs / minuteMs);
  let offset = known.get(minute);
  if (offset === undefined) {
    offset = wallMs(minute * minuteMs, zone) - minute * minuteMs;
    if (known.size >= 20_000) known.clear();
    known.set(minute, offset);
  }
  return offset;
}

/** Whether a text is a day that exists. */
export function isLocalDate(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const ms = Date.parse(`${text}T00:00:00Z`);
  return !Number.isNaN(ms) && new Date(ms).toISOString().startsWith(text);
}

/** The day's midnight as if it were in UTC; throws a RangeError for a day that does not exist. */
function civilMs(date: LocalDate): number {
  if (!isLocalDate(date)) throw new RangeError(`Not a day: ${date}`);
  return Date.parse(`${date}T00:00:00Z`);
}

function dateOfMs(ms: number): LocalDate {
  return new Date(ms).toISOString().slice(0, 10);
}

/** The day so many days later (earlier when negative). */
export function addDays(date: LocalDate, days: number): LocalDate {
  return dateOfMs(civilMs(date) + days * dayMs);
}

/** The same day of the month so many months later, or that month's last day. */
export function addMonths(date: LocalDate, months: number): LocalDate {
  const start = new Date(civilMs(date));
  const first = Date.UTC(start.getUTCFullYear(), start.getUTCMonth() + months, 1);
  const lastDay = new Date(
    Date.UTC(start.getUTCFullYear(), start.getUTCMonth() + months + 1, 0),
  ).getUTCDate();
  return dateOfMs(first + (Math.min(start.getUTCDate(), lastDay) - 1) * dayMs);
}

/** Days from one day to another; negative when `to` is earlier. */
export function daysBetween(from: LocalDate, to: LocalDate): number {
  return Math.round((civilMs(to) - civilMs(from)) / dayMs);
}

/** Every day from one to the other, both included; empty when `to` is earlier. */
export function datesInRange(from: LocalDate, to: LocalDate): LocalDate[] {
  const count = daysBetween(from, to) + 1;
  return Array.from({ length: Math.max(0, count) }, (_, n) => addDays(from, n));
}

/** ISO 8601 weekday: Monday is 1, Sunday 7. */
export function weekdayOf(date: LocalDate): number {
  return ((new Date(civilMs(date)).getUTCDay() + 6) % 7) + 1;
}

/** The Monday of the day's week. */
export function mondayOf(date: LocalDate): LocalDate {
  return addDays(date, 1 - weekdayOf(date));
}

/** The instant of a local day and minute in a zone; 1440 is the next midnight. */
export function instantAt(date: LocalDate, minuteOfDay: number, zone: string): Date {
  const wall = civilMs(date) + minuteOfDay * minuteMs;
  const offsetBefore = offsetMs(wall - dayMs, zone);
  const offsetAfter = offsetMs(wall + dayMs, zone);
  const first = wall - offsetBefore;
  if (offsetBefore === offsetAfter || offsetMs(first, zone) === offsetBefore)
    return new Date(first);
  const second = wall - offsetAfter;
  return new Date(offsetMs(second, zone) === offsetAfter ? second : first);
}

/** As `instantAt`, in whole UTC minutes. */
export function utcMinuteAt(date: LocalDate, minuteOfDay: number, zone: string): UtcMinute {
  return Math.floor(instantAt(date, minuteOfDay, zone).getTime() / minuteMs);
}

/** The local day and minute an instant falls on. */
export function localAt(instant: Date, zone: string): { date: LocalDate; minute: number } {
  const ms = instant.getTime();
  const wall = ms + offsetMs(ms, zone);
  const midnight = Math.floor(wall / dayMs) * dayMs;
  return { date: dateOfMs(midnight), minute: Math.floor((wall - midnight) / minuteMs) };
}

/** As `localAt`, from whole UTC minutes. */
export function localAtUtcMinute(
  minute: UtcMinute,
  zone: string,
): { date: LocalDate; minute: number } {
  return localAt(new Date(minute * minuteMs), zone);
}

/** The day it is in the zone at an instant. */
export function today(now: Date, zone: string): LocalDate {
  return localAt(now, zone).date;
}

/** Whole UTC minutes of an instant, rounded down. */
export function toUtcMinute(instant: Date): UtcMinute {
  return Math.floor(instant.getTime() / minuteMs);
}

export function fromUtcMinute(minute: UtcMinute): Date {
  return new Date(minute * minuteMs);
}
