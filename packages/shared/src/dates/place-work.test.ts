import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Book } from './book.ts';
import { checkPlan } from './check-plan.ts';
import { fitsTheCold } from './cold.ts';
import { formatTime } from './format.ts';
import { localAtUtcMinute, utcMinuteAt } from './local-time.ts';
import type { Demand, PlannedOrder, Supply } from './model.ts';
import { placeWork, readyDemand } from './place-work.ts';
import { makeDemand, makeSupply, makeWork, placeOf } from './testing/small-studio.ts';

function windowAt(supply: Supply, date: string, startMinute = 900) {
  const window = supply.windows.get(date)?.find((it) => it.startMinute === startMinute);
  if (window === undefined) throw new Error(`no window on ${date}`);
  return window;
}

function place(
  supply: Supply,
  demand: Demand,
  date: string,
  standing: readonly PlannedOrder[] = [],
) {
  const book = new Book(supply, standing);
  return placeWork(book, readyDemand(demand), windowAt(supply, date), 'new');
}

function placed(
  supply: Supply,
  demand: Demand,
  date: string,
  standing: readonly PlannedOrder[] = [],
) {
  const placement = place(supply, demand, date, standing);
  if (!placement.found) throw new Error(JSON.stringify(placement.refusal));
  return placement.order;
}

const local = (supply: Supply, minute: number) => {
  const at = localAtUtcMinute(minute, supply.zone);
  return `${at.date} ${formatTime(at.minute)}`;
};

describe('the simple planner', () => {
  it('places each piece as late as what follows it allows', () => {
    const supply = makeSupply();
    const order = placed(supply, makeDemand(), '2027-06-17');
    const at = (key: string) => local(supply, placeOf(order, key).startAt);
    // Pickup 15:00: box 15, words 20, 20 of rest, coat 25, 30 of rest, fill 30, 120 of cooling.
    expect(at('box')).toBe('2027-06-17 14:45');
    expect(at('words')).toBe('2027-06-17 14:25');
    expect(at('coat')).toBe('2027-06-17 13:40');
    expect(at('fill')).toBe('2027-06-17 12:40');
    expect(at('buttercream')).toBe('2027-06-17 12:05');
    expect(at('bake')).toBe('2027-06-17 09:25');
    expect(order.coldFrom).toBe('2027-06-17');
    expect(checkPlan(supply, [order])).toEqual([]);
  });

  it('skips closed days and weekends, and keeps gaps in elapsed minutes across them', () => {
    const supply = makeSupply({ closed: ['2027-06-21'] });
    // Tuesday at ten, with only two hours of that day before it.
    const window = windowAt(supply, '2027-06-22', 600);
    const placement = placeWork(new Book(supply, []), readyDemand(makeDemand()), window, 'new');
    if (!placement.found) throw new Error('no place');
    const days = placement.order.places.map((it) => it.shiftKey.slice(0, 10));
    expect([...new Set(days)].toSorted()).toEqual(['2027-06-18', '2027-06-22']);
    expect(checkPlan(supply, [placement.order])).toEqual([]);
  });

  it('offers only what is left of the running shift', () => {
    const demand = makeDemand({
      work: [makeWork({ key: 'box', kind: 'box', minutes: 60 })],
      links: [],
      noticeDays: 0,
    });
    const early = makeSupply({ today: '2027-06-15', nowMinute: 13 * 60 + 30 });
    expect(local(early, placeOf(placed(early, demand, '2027-06-15'), 'box').startAt)).toBe(
      '2027-06-15 14:00',
    );
    const late = makeSupply({ today: '2027-06-15', nowMinute: 14 * 60 + 10 });
    expect(place(late, demand, '2027-06-15').found).toBe(false);
  });

  it('needs somebody with the skill', () => {
    const one = makeWork({ key: 'words', kind: 'decorate', minutes: 240, skill: 'lettering' });
    const supply = makeSupply();
    const demand = makeDemand({ work: [one], links: [], noticeDays: 0 });
    // Seven tenths of eight hours of the one who letters is 336 minutes: one such piece a day.
    const first = placed(supply, demand, '2027-06-17');
    const second = placed(supply, demand, '2027-06-17', [{ ...first, orderId: 'first' }]);
    expect(placeOf(first, 'words').shiftKey).toBe('2027-06-17 480');
    expect(placeOf(second, 'words').shiftKey).toBe('2027-06-16 480');
    const nobody = makeDemand({ work: [{ ...one, skill: 'sculpting' }], links: [], noticeDays: 0 });
    expect(place(supply, nobody, '2027-06-17').found).toBe(false);
  });

  it('never gives one order more of a shift than the shift is long', () => {
    const supply = makeSupply({ people: 6 });
    const work = Array.from({ length: 10 }, (_, n) =>
      makeWork({ key: `flowers ${n}`, kind: 'decorate', minutes: 100 }),
    );
    const order = placed(supply, makeDemand({ work, links: [] }), '2027-06-18');
    const onFriday = order.places.filter((it) => it.shiftKey === '2027-06-18 480');
    expect(onFriday).toHaveLength(4);
    expect(checkPlan(supply, [order])).toEqual([]);
  });

  it('does not let a sponge wait longer than it keeps', () => {
    const supply = makeSupply({ closed: ['2027-06-21', '2027-06-22', '2027-06-23'] });
    const demand = makeDemand({
      work: [
        makeWork({ key: 'bake', kind: 'bake', minutes: 60 }),
        makeWork({ key: 'fill', kind: 'fill-and-crumb-coat', minutes: 60 }),
      ],
      links: [{ before: 'bake', after: 'fill', gap: 12 * 60, keeps: 72 * 60 }],
    });
    // Filled on Thursday the 24th it would have to be baked on Friday the 18th: six days.
    expect(place(supply, demand, '2027-06-24')).toMatchObject({
      found: false,
      refusal: { kind: 'no-place', work: { key: 'bake' } },
    });
    expect(place(supply, demand, '2027-06-25').found).toBe(true);
  });

  it('keeps work apart from an allergen before any that contains it in its shift', () => {
    const supply = makeSupply();
    const nuts = placed(supply, makeDemand({ contains: ['tree-nuts'] }), '2027-06-17');
    const demand = makeDemand({ contains: ['egg'], apart: ['tree-nuts'] });
    const apart = placed(supply, demand, '2027-06-17', [{ ...nuts, orderId: 'nuts' }]);
    for (const { key } of demand.work) {
      const mine = placeOf(apart, key);
      for (const other of nuts.places) {
        if (other.shiftKey === mine.shiftKey) expect(mine.endAt).toBeLessThanOrEqual(other.startAt);
      }
    }
    // And whoever comes after with nuts starts after it.
    const third = placed(supply, makeDemand({ contains: ['tree-nuts'] }), '2027-06-18', [
      { ...nuts, orderId: 'nuts' },
      { ...apart, orderId: 'apart' },
    ]);
    const all = [{ ...nuts, orderId: 'nuts' }, { ...apart, orderId: 'apart' }, third];
    expect(checkPlan(supply, all).filter((it) => it.rule === 'allergen')).toEqual([]);
  });

  it('fills no cake before every night up to its pickup has a place in the cold', () => {
    const cold = [{ widthMm: 300, depthMm: 300, heightMm: 200, places: 1 }];
    const supply = makeSupply({ cold });
    const early = {
      ...placed(supply, makeDemand(), '2027-06-17'),
      orderId: 'early',
      coldFrom: '2027-06-14',
    };
    // Ten o'clock on the 18th: the night of the 17th is free, those before are not.
    const window = windowAt(supply, '2027-06-18', 600);
    const second = placeWork(
      new Book(supply, [early]),
      readyDemand(makeDemand()),
      window,
      'second',
    );
    if (!second.found) throw new Error('no place');
    expect(second.order.coldFrom).toBe('2027-06-17');
    expect(checkPlan(supply, [early, second.order])).toEqual([]);
    const third = placeWork(
      new Book(supply, [early, second.order]),
      readyDemand(makeDemand()),
      window,
      'third',
    );
    expect(third.found).toBe(false);
  });

  it('plans around the clock change: minutes are elapsed, not read off the wall', () => {
    // 14 March 2027, 02:00 to 03:00 does not exist in New York (15 U.S.C. 260a).
    const supply = makeSupply({ today: '2027-03-08', days: 20 });
    const demand = makeDemand({
      work: [
        makeWork({ key: 'bake', kind: 'bake', minutes: 60 }),
        makeWork({ key: 'fill', kind: 'fill-and-crumb-coat', minutes: 60 }),
      ],
      // Friday 16:00 to Tuesday 09:00 is 89 hours on the wall and 88 elapsed.
      links: [{ before: 'bake', after: 'fill', gap: 88 * 60 + 1, keeps: null }],
    });
    const window = windowAt(supply, '2027-03-16', 600);
    const placement = placeWork(new Book(supply, []), readyDemand(demand), window, 'new');
    if (!placement.found) throw new Error('no place');
    const bake = placeOf(placement.order, 'bake');
    const fill = placeOf(placement.order, 'fill');
    expect(fill.startAt).toBe(utcMinuteAt('2027-03-16', 9 * 60, supply.zone));
    expect(bake.endAt).toBe(utcMinuteAt('2027-03-12', 15 * 60 + 59, supply.zone));
    expect(fill.startAt - bake.endAt).toBe(88 * 60 + 1);
  });

  it('leaves the book as it was', () => {
    const supply = makeSupply();
    const standing = [{ ...placed(supply, makeDemand(), '2027-06-17'), orderId: 'standing' }];
    const book = new Book(supply, standing);
    const before = supply.shifts.map((it) => book.freeBenchOf(it.date));
    const first = placeWork(book, readyDemand(makeDemand()), windowAt(supply, '2027-06-17'), 'new');
    expect(supply.shifts.map((it) => book.freeBenchOf(it.date))).toEqual(before);
    expect(
      placeWork(book, readyDemand(makeDemand()), windowAt(supply, '2027-06-17'), 'new'),
    ).toEqual(first);
  });

  it('refuses links that go round in a circle', () => {
    const demand = makeDemand();
    const links = [...demand.links, { before: 'box', after: 'bake', gap: 0, keeps: null }];
    expect(() => readyDemand({ ...demand, links })).toThrow(/circle/);
  });
});

describe('any studio and book', () => {
  const scenario = fc.record({
    people: fc.integer({ min: 1, max: 5 }),
    mixers: fc.integer({ min: 1, max: 2 }),
    decks: fc.integer({ min: 1, max: 3 }),
    handovers: fc.integer({ min: 1, max: 3 }),
    nowMinute: fc.integer({ min: 0, max: 1200 }),
    places: fc.constantFrom(null, 2, 6),
    orders: fc.array(
      fc.record({
        day: fc.integer({ min: 1, max: 14 }),
        late: fc.boolean(),
        scale: fc.integer({ min: 1, max: 8 }),
        nuts: fc.boolean(),
        apart: fc.boolean(),
      }),
      { minLength: 1, maxLength: 25 },
    ),
  });

  it('every placement passes the checker, together with all that stand', () => {
    fc.assert(
      fc.property(scenario, ({ places, orders, ...options }) => {
        const cold =
          places === null ? null : [{ widthMm: 300, depthMm: 300, heightMm: 200, places }];
        const supply = makeSupply({ ...options, cold, days: 30 });
        const dates = [...supply.windows.keys()];
        const standing: PlannedOrder[] = [];
        for (const [n, { day, late, scale, nuts, apart }] of orders.entries()) {
          const date = dates[day % dates.length];
          const window = supply.windows.get(date ?? '')?.[late ? 1 : 0];
          if (window === undefined) continue;
          const demand = makeDemand({
            scale,
            noticeDays: 0,
            contains: nuts ? ['egg', 'tree-nuts'] : ['egg'],
            apart: apart && !nuts ? ['tree-nuts'] : [],
          });
          const placement = placeWork(
            new Book(supply, standing),
            readyDemand(demand),
            window,
            `order ${n}`,
          );
          if (placement.found) standing.push(placement.order);
        }
        expect(checkPlan(supply, standing)).toEqual([]);
      }),
      { numRuns: 150 },
    );
  });
});

describe('the cold', () => {
  const box = (widthMm: number, heightMm = 100) => ({ widthMm, depthMm: widthMm, heightMm });
  it('moves a small cake over where a large one needs to stand', () => {
    const cold = [
      { widthMm: 500, depthMm: 500, heightMm: 300, places: 1 },
      { widthMm: 300, depthMm: 300, heightMm: 200, places: 1 },
    ];
    expect(fitsTheCold(cold, [box(250), box(450)])).toBe(true);
    expect(fitsTheCold(cold, [box(250), box(450), box(200)])).toBe(false);
    expect(fitsTheCold(cold, [box(450), box(450)])).toBe(false);
    expect(fitsTheCold(cold, [box(250, 250), box(250, 250)])).toBe(false);
  });
});
