import { addDays, addMonths, datesInRange, utcMinuteAt, weekdayOf } from '../local-time.ts';
import type { LocalDate } from '../local-time.ts';
import type { Demand, PlannedOrder, Shift, Supply, Window, Work } from '../model.ts';

/** A studio for tests: two at the bench from eight to four on weekdays, pickups Tuesday to Friday. */
export type StudioOptions = {
  readonly today?: LocalDate;
  readonly days?: number;
  readonly zone?: string;
  readonly people?: number;
  readonly utilisationPpm?: number;
  readonly mixers?: number;
  readonly decks?: number;
  readonly handovers?: number;
  readonly closed?: readonly LocalDate[];
  readonly caps?: Supply['caps'];
  readonly keptBack?: number;
  readonly cold?: Supply['cold'];
  /** Minutes of the day; 0 is the start of today. */
  readonly nowMinute?: number;
};

export function makeSupply({
  today = '2027-06-14',
  days = 60,
  zone = 'America/New_York',
  people = 2,
  utilisationPpm = 700_000,
  mixers = 1,
  decks = 2,
  handovers = 4,
  closed = [],
  caps = [],
  keptBack = 0,
  cold = null,
  nowMinute = 0,
}: StudioOptions = {}): Supply {
  const now = utcMinuteAt(today, nowMinute, zone);
  const dates = datesInRange(today, addDays(today, days)).filter((it) => !closed.includes(it));
  const shifts = dates
    .filter((date) => weekdayOf(date) <= 5)
    .map((date): Shift => {
      const startAt = utcMinuteAt(date, 8 * 60, zone);
      const endAt = utcMinuteAt(date, 16 * 60, zone);
      const opensAt = Math.min(Math.max(startAt, now), endAt);
      const bench = (minutes: number, of = people) =>
        Math.floor((of * minutes * utilisationPpm) / 1_000_000);
      return {
        key: `${date} 480`,
        date,
        startMinute: 480,
        endMinute: 960,
        startAt,
        endAt,
        opensAt,
        people: Array.from({ length: people }, (_, n) => ({
          id: `p${n}`,
          name: `Person ${n}`,
          skills: n === 0 ? ['lettering'] : [],
        })),
        benchMinutes: bench(endAt - opensAt),
        wholeBenchMinutes: bench(endAt - startAt),
        mixerMinutes: mixers * (endAt - opensAt),
        ovenMinutes: decks * (endAt - opensAt),
        mixers,
        decks,
        skillMinutes: new Map([['lettering', bench(endAt - opensAt, 1)]]),
      };
    })
    .filter((it) => it.endAt > now);
  const windows = new Map(
    dates
      .filter((date) => weekdayOf(date) >= 2 && weekdayOf(date) <= 5)
      .map((date): [LocalDate, Window[]] => [
        date,
        [10 * 60, 15 * 60].map((startMinute) => {
          const startAt = utcMinuteAt(date, startMinute, zone);
          return { date, startMinute, minutes: 60, startAt, endAt: startAt + 60, handovers };
        }),
      ]),
  );
  return {
    now,
    today,
    zone,
    shifts,
    windows,
    caps,
    keptBack,
    bookOpenUntil: addMonths(today, 18),
    cold,
  };
}

export function makeWork(work: Partial<Work> & Pick<Work, 'key' | 'kind' | 'minutes'>): Work {
  return {
    label: work.key,
    tier: null,
    benchMinutes: work.minutes,
    mixerMinutes: 0,
    ovenMinutes: 0,
    skill: null,
    batch: null,
    within: null,
    ...work,
  };
}

/** One tier from oven to box: bake, buttercream, fill, coat, write, box. */
export function makeDemand(changes: Partial<Demand> & { readonly scale?: number } = {}): Demand {
  const { scale = 1, ...rest } = changes;
  const of = (minutes: number) => Math.max(1, Math.round(minutes * scale));
  return {
    occasionId: 'birthday',
    noticeDays: 2,
    work: [
      makeWork({
        key: 'bake',
        kind: 'bake',
        minutes: of(30) + 45,
        benchMinutes: of(30),
        mixerMinutes: Math.min(15, of(30)),
        ovenMinutes: 45,
      }),
      makeWork({ key: 'buttercream', kind: 'buttercream', minutes: of(35), mixerMinutes: of(30) }),
      makeWork({ key: 'fill', kind: 'fill-and-crumb-coat', minutes: of(30), within: 96 * 60 }),
      makeWork({ key: 'coat', kind: 'final-coat', minutes: of(25) }),
      makeWork({ key: 'words', kind: 'decorate', minutes: of(20), skill: 'lettering' }),
      makeWork({ key: 'box', kind: 'box', minutes: of(15) }),
    ],
    links: [
      { before: 'bake', after: 'fill', gap: 120, keeps: 72 * 60 },
      { before: 'buttercream', after: 'fill', gap: 0, keeps: 96 * 60 },
      { before: 'buttercream', after: 'coat', gap: 0, keeps: 96 * 60 },
      { before: 'fill', after: 'coat', gap: 30, keeps: null },
      { before: 'coat', after: 'words', gap: 20, keeps: null },
      { before: 'words', after: 'box', gap: 0, keeps: null },
    ],
    boxes: [{ widthMm: 280, depthMm: 280, heightMm: 120 }],
    contains: ['egg', 'milk', 'gluten-cereals'],
    apart: [],
    ...rest,
  };
}

/** The place of one piece of an order. @throws when it has none */
export function placeOf(order: PlannedOrder, key: string) {
  const place = order.places.find((it) => it.key === key);
  const work = order.demand.work.find((it) => it.key === key);
  if (place === undefined || work === undefined) throw new Error(`${key} has no place`);
  return { startAt: place.startAt, endAt: place.startAt + work.minutes, shiftKey: place.shiftKey };
}
