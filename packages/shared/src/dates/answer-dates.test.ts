import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DayAnswer } from '../contracts/dates.ts';
import { answerDates, openBook, planWindow } from './answer-dates.ts';
import { checkPlan } from './check-plan.ts';
import { addDays } from './local-time.ts';
import type { Demand, PlannedOrder, Supply } from './model.ts';
import { makeDemand, makeSupply, makeWork } from './testing/small-studio.ts';
import type { StudioOptions } from './testing/small-studio.ts';

function answer(
  supply: Supply,
  demand: Demand,
  date: string,
  standing: readonly PlannedOrder[] = [],
): DayAnswer {
  const { days, faults } = answerDates(openBook(supply, standing), demand, date, date);
  expect(faults).toEqual([]);
  const [day] = days;
  if (day === undefined) throw new Error('no answer');
  return day;
}

/** So many orders with plans for a day, each in the latest window that takes it. */
function fill(supply: Supply, demand: Demand, date: string, most: number): PlannedOrder[] {
  const standing: PlannedOrder[] = [];
  for (let n = 0; n < most; n += 1) {
    for (const window of (supply.windows.get(date) ?? []).toReversed()) {
      const plan = planWindow(openBook(supply, standing), demand, window, `order ${n}`);
      if (plan.order === null) continue;
      standing.push(plan.order);
      break;
    }
  }
  return standing;
}

// Monday 14 June 2027.
const monday = '2027-06-14';

describe('the answer for a day', () => {
  it('is open with its windows and how full the bench is', () => {
    const day = answer(makeSupply(), makeDemand(), '2027-06-17');
    expect(day).toMatchObject({ date: '2027-06-17', answer: 'open', reason: null, fill: 0 });
    expect(day.windows).toEqual([
      { start: 600, minutes: 60, answer: 'open' },
      { start: 900, minutes: 60, answer: 'open' },
    ]);
  });

  it('is closed where there are no pickups', () => {
    const supply = makeSupply({ closed: ['2027-06-24'] });
    for (const date of ['2027-06-20', '2027-06-21', '2027-06-24']) {
      expect(answer(supply, makeDemand(), date)).toMatchObject({
        answer: 'closed',
        reason: { code: 'closed-day' },
        windows: [],
      });
    }
  });

  it('is too soon until the notice is over, and says when that is', () => {
    const demand = makeDemand({ noticeDays: 5 });
    // Five days from Monday is Saturday; the next pickups are on Tuesday.
    expect(answer(makeSupply(), demand, '2027-06-18').reason).toMatchObject({
      code: 'too-soon',
      earliest: '2027-06-22',
      sentence: expect.stringContaining('Tuesday 22 June'),
    });
    expect(answer(makeSupply(), demand, '2027-06-22').answer).toBe('open');
    expect(answer(makeSupply(), demand, '2027-06-10').reason?.code).toBe('too-soon');
  });

  it('is too far where the book is not open yet', () => {
    expect(answer(makeSupply(), makeDemand(), '2029-01-02').reason?.code).toBe('too-far');
  });

  it('is too big for a fridge or a shift that could never hold it', () => {
    const cold = [{ widthMm: 300, depthMm: 300, heightMm: 200, places: 4 }];
    const boxes = [{ widthMm: 480, depthMm: 480, heightMm: 120 }];
    expect(answer(makeSupply({ cold }), makeDemand({ boxes }), '2027-06-17').reason?.code).toBe(
      'too-big',
    );
    const work = [makeWork({ key: 'sculpt', kind: 'decorate', minutes: 481 })];
    expect(answer(makeSupply(), makeDemand({ work, links: [] }), '2027-06-18').reason?.code).toBe(
      'too-big',
    );
  });

  it('is full by the windows and by the owner’s own caps', () => {
    const one = makeSupply({ handovers: 1, people: 4 });
    const taken = fill(one, makeDemand(), '2027-06-17', 2);
    expect(answer(one, makeDemand(), '2027-06-17', taken).reason?.code).toBe('window-full');
    expect(
      answer(one, makeDemand(), '2027-06-17', taken.slice(1)).windows.map((it) => it.answer),
    ).toEqual(['closed', 'last-place']);
    const caps = [{ occasionId: 'wedding', weekday: 4, date: null, maxOrders: 1 }];
    const capped = makeSupply({ caps });
    const wedding = makeDemand({ occasionId: 'wedding' });
    expect(answer(capped, wedding, '2027-06-17').answer).toBe('last-place');
    const first = fill(capped, wedding, '2027-06-17', 1);
    expect(answer(capped, wedding, '2027-06-17', first).reason).toMatchObject({
      code: 'full',
      resource: 'orders',
    });
    expect(answer(capped, makeDemand(), '2027-06-17', first).answer).toBe('open');
    expect(answer(capped, wedding, '2027-06-18', first).answer).toBe('open');
    const kept = makeSupply({ keptBack: 7 });
    expect(answer(kept, makeDemand(), '2027-06-17').answer).toBe('last-place');
    expect(
      answer(kept, makeDemand(), '2027-06-17', fill(kept, makeDemand(), '2027-06-17', 1)).answer,
    ).toBe('closed');
  });

  it('is full at the bench only where no plan at all could be, and names the day', () => {
    const supply = makeSupply({ handovers: 100 });
    const work = [makeWork({ key: 'decorate', kind: 'decorate', minutes: 300, within: 10 * 60 })];
    const demand = makeDemand({ work, links: [], noticeDays: 0 });
    // 672 minutes of bench on Thursday hold two of these; they may not be done before.
    const standing = fill(supply, demand, '2027-06-17', 5);
    expect(standing).toHaveLength(2);
    expect(answer(supply, demand, '2027-06-17', standing)).toMatchObject({
      answer: 'closed',
      reason: { code: 'full', resource: 'bench', day: '2027-06-17' },
    });
    expect(answer(supply, demand, '2027-06-17', standing.slice(1)).answer).toBe('last-place');
    expect(answer(supply, demand, '2027-06-18', standing).answer).toBe('open');
  });

  it('is "ask us" where this planner finds no place but another plan may', () => {
    const supply = makeSupply({ people: 1, handovers: 100 });
    const piece = (key: string) =>
      makeDemand({
        work: [makeWork({ key, kind: 'decorate', minutes: 200 })],
        links: [],
        noticeDays: 0,
      });
    // Work that may be done any day before stands on Tuesday; the new work fits nowhere else.
    const tuesday = supply.windows.get('2027-06-15')?.at(-1);
    if (tuesday === undefined) throw new Error('no window');
    const easy = planWindow(
      openBook(supply, []),
      piece('easy'),
      { date: '2027-06-15', startMinute: 900 },
      'easy',
    );
    if (easy.order === null) throw new Error('no plan');
    const later = {
      ...easy.order,
      pickup: supply.windows.get('2027-06-17')?.at(-1) ?? easy.order.pickup,
    };
    const urgent = makeDemand({
      work: [makeWork({ key: 'urgent', kind: 'decorate', minutes: 200, within: 8 * 60 })],
      links: [],
      noticeDays: 0,
    });
    expect(answer(supply, urgent, '2027-06-15', [later])).toMatchObject({
      answer: 'ask-us',
      reason: null,
    });
    expect(answer(supply, urgent, '2027-06-15').answer).toBe('last-place');
  });

  it('tells how much of the day is taken', () => {
    const supply = makeSupply();
    const demand = makeDemand({
      work: [makeWork({ key: 'box', kind: 'box', minutes: 168 })],
      links: [],
    });
    const standing = fill(supply, demand, '2027-06-17', 1);
    // 168 of 672 minutes.
    expect(answer(supply, demand, '2027-06-17', standing).fill).toBe(0.25);
  });
});

describe('for any studio, book and design', () => {
  const book = fc.record({
    people: fc.integer({ min: 1, max: 4 }),
    handovers: fc.integer({ min: 1, max: 4 }),
    nowMinute: fc.integer({ min: 0, max: 900 }),
    orders: fc.array(
      fc.record({ day: fc.integer({ min: 0, max: 12 }), scale: fc.integer({ min: 1, max: 9 }) }),
      { maxLength: 18 },
    ),
    scale: fc.integer({ min: 1, max: 9 }),
  });
  type Drawn = typeof book extends fc.Arbitrary<infer T> ? T : never;

  function build({ orders, scale, ...options }: Drawn, more: StudioOptions = {}) {
    const supply = makeSupply({ ...options, ...more, days: 24 });
    const dates = [...supply.windows.keys()];
    let standing: PlannedOrder[] = [];
    for (const [n, { day, scale: of }] of orders.entries()) {
      const date = dates[day % dates.length] ?? monday;
      const [window] = supply.windows.get(date) ?? [];
      if (window === undefined) continue;
      const demand = makeDemand({ scale: of, noticeDays: 0 });
      const { order } = planWindow(openBook(supply, standing), demand, window, `order ${n}`);
      if (order !== null) standing = [...standing, order];
    }
    return { supply, standing, demand: makeDemand({ scale, noticeDays: 0 }) };
  }

  const isOpen = (it: DayAnswer) => it.answer === 'open' || it.answer === 'last-place';

  it('every open window has a plan that the checker accepts beside all that stand', () => {
    fc.assert(
      fc.property(book, (drawn) => {
        const { supply, standing, demand } = build(drawn);
        const open = openBook(supply, standing);
        const { days, faults } = answerDates(open, demand, monday, addDays(monday, 20));
        expect(faults).toEqual([]);
        for (const day of days) {
          expect(isOpen(day)).toBe(
            day.windows.some((it) => it.answer === 'open' || it.answer === 'last-place'),
          );
          for (const window of day.windows) {
            const plan = planWindow(
              open,
              demand,
              { date: day.date, startMinute: window.start },
              'new',
            );
            // What a window is told is what sending an order for it comes to.
            expect(plan.answer === 'closed').toBe(window.answer === 'closed');
            // A window can also be open by an earlier window's plan, which `plan` verifies alike.
            if (plan.order === null) continue;
            expect(checkPlan(supply, [...standing, plan.order])).toEqual([]);
          }
        }
      }),
      { numRuns: 40 },
    );
  });

  it('taking every order out never closes a day that was not closed', () => {
    fc.assert(
      fc.property(book, (drawn) => {
        const { supply, standing, demand } = build(drawn);
        const with_ = answerDates(
          openBook(supply, standing),
          demand,
          monday,
          addDays(monday, 20),
        ).days;
        const without = answerDates(openBook(supply, []), demand, monday, addDays(monday, 20)).days;
        for (const [n, day] of with_.entries()) {
          if (day.answer !== 'closed') expect(without[n]?.answer).not.toBe('closed');
        }
      }),
      { numRuns: 40 },
    );
  });

  it('taking an order out never turns a day that is not closed into a closed one', () => {
    fc.assert(
      fc.property(book, fc.nat(), (drawn, pick) => {
        const { supply, standing, demand } = build(drawn);
        if (standing.length === 0) return;
        const fewer = standing.filter((_, n) => n !== pick % standing.length);
        const before = answerDates(
          openBook(supply, standing),
          demand,
          monday,
          addDays(monday, 20),
        ).days;
        const after = answerDates(
          openBook(supply, fewer),
          demand,
          monday,
          addDays(monday, 20),
        ).days;
        for (const [n, day] of before.entries()) {
          if (day.answer !== 'closed') expect(after[n]?.answer).not.toBe('closed');
        }
      }),
      { numRuns: 40 },
    );
  });

  it('another pair of hands never turns a day that is not closed into a closed one', () => {
    fc.assert(
      fc.property(book, (drawn) => {
        const { supply, standing, demand } = build(drawn);
        const larger = makeSupply({ ...drawn, people: drawn.people + 1, days: 24 });
        const before = answerDates(
          openBook(supply, standing),
          demand,
          monday,
          addDays(monday, 20),
        ).days;
        const after = answerDates(
          openBook(larger, standing),
          demand,
          monday,
          addDays(monday, 20),
        ).days;
        for (const [n, day] of before.entries()) {
          if (day.answer !== 'closed') expect(after[n]?.answer).not.toBe('closed');
        }
      }),
      { numRuns: 40 },
    );
  });
});
