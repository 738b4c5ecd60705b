import { Op } from 'sequelize';
import { groupBy } from '#shared/group-by.ts';
import {
  addMonths,
  datesInRange,
  today,
  utcMinuteAt,
  weekdayOf,
} from '#shared/dates/local-time.ts';
import type { LocalDate, UtcMinute } from '#shared/dates/local-time.ts';
import type { Shift, Supply, Window, Worker } from '#shared/dates/model.ts';
import { Closure } from '#api/db/models/closure.ts';
import { ColdPlace } from '#api/db/models/cold-place.ts';
import { DayCap } from '#api/db/models/day-cap.ts';
import { Equipment } from '#api/db/models/equipment.ts';
import { Person } from '#api/db/models/person.ts';
import { PersonSkill } from '#api/db/models/person-skill.ts';
import { PickupWindow } from '#api/db/models/pickup-window.ts';
import { Shift as ShiftRow } from '#api/db/models/shift.ts';
import { Studio } from '#api/db/models/studio.ts';
import { WeeklyPickupWindow } from '#api/db/models/weekly-pickup-window.ts';
import { WeeklyShift } from '#api/db/models/weekly-shift.ts';

/** A shift before it is known what is left of it: the pattern's, or one that is written down. */
export type PlainShift = {
  readonly date: LocalDate;
  readonly startMinute: number;
  readonly endMinute: number;
  readonly weeklyShiftId: string | null;
  readonly people: readonly Worker[];
};

/** The studio's hours over a range of days, as rows say them. */
export type Hours = {
  readonly studio: Studio;
  readonly mixers: number;
  readonly decks: number;
  /** By day, in order of start; closed days have none. */
  readonly shifts: ReadonlyMap<LocalDate, readonly PlainShift[]>;
  readonly windows: ReadonlyMap<LocalDate, readonly Window[]>;
  /** By day: the closure in force. */
  readonly closures: ReadonlyMap<LocalDate, Closure>;
};

export const shiftKey = (date: LocalDate, startMinute: number): string => `${date} ${startMinute}`;

/** The weekly pattern with its exceptions and closures, day by day. */
export async function loadHours(from: LocalDate, to: LocalDate): Promise<Hours> {
  const between = { [Op.between]: [from, to] };
  const [studio, machines, people, skills, weekly, written, closures, weeklyWindows, windows] =
    await Promise.all([
      Studio.findByPk(1, { rejectOnEmpty: true }),
      Equipment.findAll({ where: { active: true } }),
      Person.findAll({ where: { active: true } }),
      PersonSkill.findAll(),
      WeeklyShift.findAll({ include: ['people'] }),
      ShiftRow.findAll({ where: { localDate: between }, include: ['people'] }),
      Closure.findAll({
        where: { reopenedAt: null, fromDate: { [Op.lte]: to }, toDate: { [Op.gte]: from } },
      }),
      WeeklyPickupWindow.findAll({ where: { active: true } }),
      PickupWindow.findAll({ where: { localDate: between } }),
    ]);
  const workers = new Map(
    people.map((person): [string, Worker] => [
      person.id,
      {
        id: person.id,
        name: person.name,
        skills: skills.filter((it) => it.personId === person.id).map((it) => it.skillId),
      },
    ]),
  );
  const dates = datesInRange(from, to);
  const closed = new Map<LocalDate, Closure>();
  for (const closure of closures) {
    for (const date of datesInRange(
      closure.fromDate < from ? from : closure.fromDate,
      closure.toDate > to ? to : closure.toDate,
    )) {
      closed.set(date, closure);
    }
  }
  const openDates = dates.filter((date) => !closed.has(date));
  const writtenByDate = groupBy(written, (it) => it.localDate);
  const exceptionsByDate = groupBy(windows, (it) => it.localDate);
  return {
    studio,
    mixers: machines.filter((it) => it.kind === 'mixer').length,
    decks: machines.filter((it) => it.kind === 'oven-deck').length,
    shifts: mapDates(openDates, (date) =>
      shiftsOn(date, weekly, writtenByDate.get(date) ?? [], workers),
    ),
    windows: mapDates(openDates, (date) =>
      windowsOn(date, weeklyWindows, exceptionsByDate.get(date) ?? [], studio.zone),
    ),
    closures: closed,
  };
}

function mapDates<T>(
  dates: readonly LocalDate[],
  of: (date: LocalDate) => readonly T[],
): Map<LocalDate, readonly T[]> {
  const days = new Map<LocalDate, readonly T[]>();
  for (const date of dates) {
    const found = of(date);
    if (found.length > 0) days.set(date, found);
  }
  return days;
}

/** The pattern's shifts, but where a written one takes their place; written ones of their own too. */
function shiftsOn(
  date: LocalDate,
  weekly: readonly WeeklyShift[],
  written: readonly ShiftRow[],
  workers: ReadonlyMap<string, Worker>,
): PlainShift[] {
  const weekday = weekdayOf(date);
  const patterns = weekly.filter(
    (it) =>
      it.weekday === weekday &&
      (it.validFrom === null || it.validFrom <= date) &&
      (it.validUntil === null || it.validUntil >= date) &&
      !written.some((row) => row.weeklyShiftId === it.id || row.startMinute === it.startMinute),
  );
  const workersOf = (rows: readonly { readonly personId: string }[] | undefined): Worker[] =>
    (rows ?? []).flatMap(({ personId }) => workers.get(personId) ?? []);
  return [
    ...patterns.map((it) => ({
      date,
      startMinute: it.startMinute,
      endMinute: it.endMinute,
      weeklyShiftId: it.id,
      people: workersOf(it.people),
    })),
    ...written
      .filter((it) => !it.off)
      .map((it) => ({
        date,
        startMinute: it.startMinute,
        endMinute: it.endMinute,
        weeklyShiftId: it.weeklyShiftId,
        people: workersOf(it.people),
      })),
  ].toSorted((a, b) => a.startMinute - b.startMinute);
}

/** The pattern's windows, but where an exception of the day says otherwise. */
function windowsOn(
  date: LocalDate,
  weekly: readonly WeeklyPickupWindow[],
  exceptions: readonly PickupWindow[],
  zone: string,
): Window[] {
  const weekday = weekdayOf(date);
  const usual = weekly.filter(
    (it) =>
      it.weekday === weekday && !exceptions.some((other) => other.startMinute === it.startMinute),
  );
  return [...usual, ...exceptions]
    .filter((it) => it.handovers > 0)
    .toSorted((a, b) => a.startMinute - b.startMinute)
    .map((it) => {
      const startAt = utcMinuteAt(date, it.startMinute, zone);
      return {
        date,
        startMinute: it.startMinute,
        minutes: it.minutes,
        startAt,
        endAt: startAt + it.minutes,
        handovers: it.handovers,
      };
    });
}

/** People, machines and minutes of a shift from a moment on; capacities round down. */
export function measureShift(
  plain: PlainShift,
  hours: Pick<Hours, 'studio' | 'mixers' | 'decks'>,
  now: UtcMinute,
): Shift {
  const { studio, mixers, decks } = hours;
  const startAt = utcMinuteAt(plain.date, plain.startMinute, studio.zone);
  const endAt = utcMinuteAt(plain.date, plain.endMinute, studio.zone);
  const opensAt = Math.min(Math.max(startAt, now), endAt);
  const left = endAt - opensAt;
  const bench = (people: number, minutes: number) =>
    Math.floor((people * minutes * studio.utilisationPpm) / 1_000_000);
  const skills = new Set(plain.people.flatMap((it) => it.skills));
  return {
    key: shiftKey(plain.date, plain.startMinute),
    date: plain.date,
    startMinute: plain.startMinute,
    endMinute: plain.endMinute,
    startAt,
    endAt,
    opensAt,
    people: plain.people,
    benchMinutes: bench(plain.people.length, left),
    wholeBenchMinutes: bench(plain.people.length, endAt - startAt),
    mixerMinutes: mixers * left,
    ovenMinutes: decks * left,
    mixers,
    decks,
    skillMinutes: new Map(
      [...skills].map((skill) => [
        skill,
        bench(plain.people.filter((it) => it.skills.includes(skill)).length, left),
      ]),
    ),
  };
}

/** The whole supply from a moment to a day. */
export async function loadSupply(now: UtcMinute, until: LocalDate): Promise<Supply> {
  const studio = await Studio.findByPk(1, { rejectOnEmpty: true });
  const day = today(new Date(now * 60_000), studio.zone);
  const [hours, caps, cold] = await Promise.all([
    loadHours(day, until),
    DayCap.findAll(),
    ColdPlace.findAll({ where: { active: true } }),
  ]);
  const shifts = [...hours.shifts.values()]
    .flat()
    .map((it) => measureShift(it, hours, now))
    .filter((it) => it.endAt > now && it.people.length > 0)
    .toSorted((a, b) => a.startAt - b.startAt);
  return {
    now,
    today: day,
    zone: studio.zone,
    shifts,
    windows: hours.windows,
    caps: caps.map((it) => ({
      occasionId: it.occasionId,
      weekday: it.weekday,
      date: it.localDate,
      maxOrders: it.maxOrders,
    })),
    keptBack: studio.regularsKeptBack,
    bookOpenUntil: addMonths(day, studio.bookOpenMonths),
    cold: cold.length === 0 ? null : cold,
  };
}
