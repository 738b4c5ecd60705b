import { describe, expect, it } from 'vitest';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import { designWith, roundTier } from '#shared/kitchen/testing/design-fixture.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { Book } from './book.ts';
import { checkAddition, checkPlan, gatherStanding } from './check-plan.ts';
import { expandDesign } from './expand-design.ts';
import type { Fault } from './plan-fault.ts';
import type { PlannedOrder, Supply } from './model.ts';
import { placeWork, readyDemand } from './place-work.ts';
import { makeDemand, makeSupply } from './testing/small-studio.ts';
import { defaultWorkTimes } from './work-times.ts';

const supply = makeSupply({ cold: [{ widthMm: 300, depthMm: 300, heightMm: 200, places: 2 }] });

function plan(orderId = 'order', date = '2027-06-17', from: Supply = supply): PlannedOrder {
  const window = from.windows.get(date)?.at(-1);
  if (window === undefined) throw new Error(`no window on ${date}`);
  const placement = placeWork(new Book(from, []), readyDemand(makeDemand()), window, orderId);
  if (!placement.found) throw new Error('no place');
  return placement.order;
}

const good = plan();

/** The plan with one piece of work moved by some minutes. */
function moved(key: string, minutes: number): PlannedOrder {
  return {
    ...good,
    places: good.places.map((it) =>
      it.key === key ? { ...it, startAt: it.startAt + minutes } : it,
    ),
  };
}

function rules(
  order: PlannedOrder,
  standing: readonly PlannedOrder[] = [],
  by: Supply = supply,
): Fault['rule'][] {
  return [...new Set(checkAddition(gatherStanding(by, standing), order).map((it) => it.rule))];
}

/** A cake of one tier with two sugar flowers, made ahead, placed in the small studio. */
function flowered(): PlannedOrder {
  const design = designWith({
    cake: { tiers: [roundTier(6)] },
    look: {
      decorations: [
        {
          decorationId: 'sugar-flower',
          tier: null,
          quantity: 2,
          colour: null,
          source: 'studio',
        },
      ],
    },
  });
  const menu = {
    ...menuFixture,
    decorations: menuFixture.decorations.map((it) =>
      it.id === 'sugar-flower' ? { ...it, madeAhead: true, keepsDays: 120, noticeDays: 0 } : it,
    ),
  };
  const demand = expandDesign({
    resolved: resolveDesign(design, menu),
    workTimes: defaultWorkTimes,
    equipment: { bowlG: 6000, decks: 2, deckMm2: 700 * 500 },
    noticeDays: 0,
  });
  const window = supply.windows.get('2027-06-18')?.at(-1);
  if (window === undefined) throw new Error('no window');
  const placement = placeWork(new Book(supply, []), readyDemand(demand), window, 'flowers');
  if (!placement.found) throw new Error(`no place: ${JSON.stringify(placement.refusal)}`);
  return placement.order;
}

describe('what dries before it goes on', () => {
  it('has its day to dry in a plan, and the checker sees to it', () => {
    const order = flowered();
    expect(checkPlan(supply, [order])).toEqual([]);
    const end = (key: string) => {
      const work = order.demand.work.find((it) => it.key === key);
      const place = order.places.find((it) => it.key === key);
      return (place?.startAt ?? 0) + (work?.minutes ?? 0);
    };
    const start = order.places.find((it) => it.key === 'decorate:0/on')?.startAt ?? 0;
    expect(start - end('decorate:0')).toBeGreaterThanOrEqual(24 * 60);
    const tooLate = {
      ...order,
      places: order.places.map((it) =>
        it.key === 'decorate:0' ? { ...it, startAt: start - 23 * 60 } : it,
      ),
    };
    expect(rules(tooLate)).toContain('gap');
  });
});

describe('the checker', () => {
  it('finds nothing wrong with a good plan', () => {
    expect(checkPlan(supply, [good])).toEqual([]);
  });

  it.each<[string, PlannedOrder, Fault['rule']]>([
    ['work left out', { ...good, places: good.places.slice(1) }, 'missing-work'],
    [
      'work twice',
      { ...good, places: [...good.places, ...good.places.slice(0, 1)] },
      'missing-work',
    ],
    [
      'work that is nobody’s',
      { ...good, places: [...good.places, { key: 'x', shiftKey: '2027-06-17 480', startAt: 0 }] },
      'unknown-work',
    ],
    ['a sponge filled too warm', moved('fill', -1), 'gap'],
    ['work past the pickup', moved('box', 1), 'after-pickup'],
    ['work outside its shift', moved('bake', -600), 'outside-shift'],
    ['work on half a minute', moved('bake', -0.5), 'outside-shift'],
    ['a sponge that keeps no longer', moved('bake', -4 * 1440), 'shelf-life'],
    ['a cake filled too early', moved('fill', -4 * 1440), 'too-early'],
    ['a cake warm for a night', { ...good, coldFrom: '2027-06-18' }, 'cold'],
    ['a cake out of the cold too soon', { ...good, coldUntil: '2027-06-16' }, 'cold'],
    [
      'a window that is not there',
      { ...good, pickup: { ...good.pickup, startMinute: 1 } },
      'closed',
    ],
    [
      'a window at another time',
      { ...good, pickup: { ...good.pickup, startAt: good.pickup.startAt + 60 } },
      'window',
    ],
    ['too little notice', { ...good, demand: { ...good.demand, noticeDays: 4 } }, 'notice'],
  ])('finds %s', (_what, order, rule) => {
    expect(rules(order)).toContain(rule);
  });

  it('finds a plan in the past', () => {
    expect(rules(good, [], makeSupply({ today: '2027-06-17', nowMinute: 9 * 60 + 30 }))).toContain(
      'in-the-past',
    );
  });

  it('finds a book that is not open', () => {
    expect(rules(good, [], { ...supply, bookOpenUntil: '2027-06-16' })).toEqual(['book-not-open']);
  });

  it('finds capacities, caps and places overdrawn by what stands', () => {
    const twins = ['a', 'b'].map((orderId) => ({ ...good, orderId }));
    // Two people, one mixer: three orders with the very same times cannot be.
    expect(rules(good, twins)).toEqual(expect.arrayContaining(['hands']));
    const tight = { ...supply, shifts: supply.shifts.map((it) => ({ ...it, benchMinutes: 200 })) };
    expect(rules(good, twins, tight)).toContain('capacity');
    expect(
      rules(good, [], {
        ...supply,
        shifts: supply.shifts.map((it) => ({ ...it, endAt: it.endAt })),
      }),
    ).toEqual([]);
    const capped = {
      ...supply,
      caps: [{ occasionId: 'birthday', weekday: 4, date: null, maxOrders: 2 }],
    };
    expect(rules(good, twins, capped)).toContain('cap');
    expect(rules(good, twins.slice(1), capped)).not.toContain('cap');
    expect(rules(good, twins, { ...supply, keptBack: 6 })).toContain('kept-back');
    const full = new Map(
      [...supply.windows].map(([date, windows]) => [
        date,
        windows.map((it) => ({ ...it, handovers: 2 })),
      ]),
    );
    expect(rules(good, twins, { ...supply, windows: full })).toContain('window');
    const overnight = twins.map((it) => ({
      ...it,
      coldFrom: '2027-06-15',
      coldUntil: '2027-06-18',
    }));
    expect(rules({ ...good, coldFrom: '2027-06-16' }, overnight)).toContain('cold');
  });

  it('finds one order that takes more of a shift than there is', () => {
    const work = good.demand.work.map((it) => ({ ...it, benchMinutes: 100 }));
    expect(rules({ ...good, demand: { ...good.demand, work } })).toContain('one-order-a-shift');
  });

  it('finds work with an allergen before work that is kept apart from it', () => {
    const nuts = { ...good, orderId: 'nuts', demand: makeDemand({ contains: ['tree-nuts'] }) };
    const apart = { ...good, demand: makeDemand({ contains: ['egg'], apart: ['tree-nuts'] }) };
    expect(rules(apart, [nuts])).toContain('allergen');
    expect(rules(nuts, [apart])).toContain('allergen');
  });
});
