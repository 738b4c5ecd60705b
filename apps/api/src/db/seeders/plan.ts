import { addDays, weekdayOf } from '#shared/dates/local-time.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import { defaultWorkTimes } from '#shared/dates/work-times.ts';
import { Closure } from '#api/db/models/closure.ts';
import { ColdPlace } from '#api/db/models/cold-place.ts';
import { DayCap } from '#api/db/models/day-cap.ts';
import { Equipment } from '#api/db/models/equipment.ts';
import { NoticeRule } from '#api/db/models/notice-rule.ts';
import { PersonSkill } from '#api/db/models/person-skill.ts';
import { Person } from '#api/db/models/person.ts';
import { Studio } from '#api/db/models/studio.ts';
import { WeeklyPickupWindow } from '#api/db/models/weekly-pickup-window.ts';
import { WeeklyShiftPerson } from '#api/db/models/weekly-shift-person.ts';
import { WeeklyShift } from '#api/db/models/weekly-shift.ts';
import { WorkTimeVersion } from '#api/db/models/work-time-version.ts';
import { noteSettingsChange } from '#api/db/plan-versions.ts';

const kg = 1_000_000;

const people = [
  {
    id: 'ida',
    name: 'Ida Thorne',
    skills: ['lettering', 'fine-piping', 'sugar-flowers', 'sculpting', 'driving'],
  },
  { id: 'noor', name: 'Noor Haddad', skills: ['lettering', 'fine-piping', 'sugar-flowers'] },
  { id: 'joss', name: 'Joss Wren', skills: ['fine-piping', 'sculpting', 'driving'] },
] as const;

/** Who is at the bench, Monday first; somebody who letters and makes sugar flowers always is. */
const pairs: readonly (readonly [weekday: number, who: readonly string[]])[] = [
  [1, ['noor', 'joss']],
  [2, ['ida', 'noor']],
  [3, ['ida', 'joss']],
  [4, ['noor', 'joss']],
  [5, ['ida', 'noor']],
  [6, ['ida', 'joss']],
];

const morning = { startMinute: 8 * 60, endMinute: 12 * 60 };
const afternoon = { startMinute: 13 * 60, endMinute: 17 * 60 };

/** Half hours in which customers may collect, Tuesday to Saturday. */
const windowStarts = ['10:00', '10:30', '11:00', '11:30', '15:30', '16:00', '16:30', '17:00'].map(
  (text) => Number(text.slice(0, 2)) * 60 + Number(text.slice(3)),
);

/**
 * Who and what the studio works with, when, and how long things take. Two at the bench for eight
 * hours at three quarters' use make 12 hours a day, 6 on Saturdays. The studio's row, occasions
 * and skills must be there.
 */
export async function seedPlan({
  now,
  today,
}: {
  readonly now: Date;
  readonly today: LocalDate;
}): Promise<void> {
  await Studio.update({ utilisationPpm: 750_000 }, { where: { id: 1 } });
  await Person.bulkCreate(people.map(({ id, name }) => ({ id, name })));
  await PersonSkill.bulkCreate(
    people.flatMap(({ id, skills }) => skills.map((skillId) => ({ personId: id, skillId }))),
  );
  await seedWeek();
  await Equipment.bulkCreate([
    { id: 'mixer', kind: 'mixer', name: 'Floor mixer', capacityMg: 6 * kg },
    {
      id: 'deck-upper',
      kind: 'oven-deck',
      name: 'Upper deck',
      widthMm: 700,
      depthMm: 500,
      heightMm: 180,
    },
    {
      id: 'deck-lower',
      kind: 'oven-deck',
      name: 'Lower deck',
      widthMm: 700,
      depthMm: 500,
      heightMm: 180,
    },
  ]);
  await ColdPlace.bulkCreate([
    { id: 'walk-in', name: 'Walk-in shelf', widthMm: 760, depthMm: 560, heightMm: 280, places: 10 },
    {
      id: 'reach-in',
      name: 'Reach-in shelf',
      widthMm: 400,
      depthMm: 400,
      heightMm: 220,
      places: 18,
    },
  ]);
  await DayCap.create({ id: 'saturday-weddings', occasionId: 'wedding', weekday: 6, maxOrders: 2 });
  await NoticeRule.bulkCreate([
    { itemKind: 'tiered', days: 4 },
    { itemKind: 'sheet', days: 3 },
    { itemKind: 'pieces', days: 3 },
    { itemKind: 'cutting', days: 3 },
    { itemKind: 'tasting-box', days: 7 },
    { itemKind: 'stand', days: 2 },
    { itemKind: 'extra', days: 0 },
  ]);
  await Closure.bulkCreate(closuresFrom(today));
  await WorkTimeVersion.create({ n: 1, content: { ...defaultWorkTimes }, validFrom: now });
  await noteSettingsChange();
}

async function seedWeek(): Promise<void> {
  for (const [weekday, who] of pairs) {
    for (const shift of weekday === 6 ? [morning] : [morning, afternoon]) {
      const id = `day-${weekday}-${shift.startMinute}`;
      await WeeklyShift.create({ id, weekday, ...shift });
      await WeeklyShiftPerson.bulkCreate(who.map((personId) => ({ weeklyShiftId: id, personId })));
    }
  }
  await WeeklyPickupWindow.bulkCreate(
    [2, 3, 4, 5, 6].flatMap((weekday) =>
      windowStarts.map((startMinute) => ({
        id: `day-${weekday}-${startMinute}`,
        weekday,
        startMinute,
        minutes: 30,
        handovers: 2,
      })),
    ),
  );
}

/** Feast days of the next two years, and a week in the workshop some way ahead. */
function closuresFrom(today: LocalDate) {
  const year = Number(today.slice(0, 4));
  const feasts = [year, year + 1].flatMap((of) => [
    holiday(`${of}-01-01`, `${of}-01-01`, "New Year's Day"),
    holiday(`${of}-07-04`, `${of}-07-04`, 'Independence Day'),
    holiday(thanksgivingOf(of), thanksgivingOf(of), 'Thanksgiving'),
    holiday(`${of}-12-24`, `${of}-12-26`, 'Christmas'),
  ]);
  const monday = addDays(today, 57 - weekdayOf(today) + 1);
  return [
    ...feasts,
    {
      id: 'workshop',
      fromDate: monday,
      toDate: addDays(monday, 2),
      kind: 'blocked' as const,
      reason: 'Sugar flower workshop',
    },
  ];
}

function holiday(fromDate: LocalDate, toDate: LocalDate, reason: string) {
  return { id: `holiday-${fromDate}`, fromDate, toDate, kind: 'holiday' as const, reason };
}

/** The fourth Thursday of November (5 U.S.C. 6103). */
function thanksgivingOf(year: number): LocalDate {
  const first = `${year}-11-01`;
  return addDays(first, ((4 - weekdayOf(first) + 7) % 7) + 21);
}
