import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { PlannedTask } from '#shared/contracts/staff.ts';
import { taskKinds } from '#shared/contracts/vocabulary.ts';
import { addDays } from '#shared/dates/local-time.ts';
import { labelWidth } from './label-width.ts';
import { pickupHalf, stringBeads } from './string-beads.ts';
import { type TimeScale, reachOf, spanOf, xOf } from './time-scale.ts';

const monday = '2027-06-14';
const scale: TimeScale = {
  first: monday,
  days: 7,
  width: 840,
  span: { start: 7 * 60, end: 19 * 60 },
};

function task(
  date: string,
  start: number,
  kind: PlannedTask['kind'],
  id = `${kind} ${date} ${start}`,
) {
  const clock = `${String(Math.floor(start / 60)).padStart(2, '0')}:${String(start % 60).padStart(2, '0')}`;
  return {
    id,
    kind,
    label: kind,
    startAt: `${date}T${clock}:00.000Z`,
    date,
    start,
    minutes: 30,
    state: 'planned',
    pinned: false,
  } satisfies PlannedTask;
}

function pickup(date: string, start: number) {
  return { date, start, minutes: 30, zone: 'UTC', startAt: `${date}T12:00:00.000Z` };
}

describe('where a time lies', () => {
  test('the middle of the drawn day is the middle of its column', () => {
    expect(xOf(scale, monday, 13 * 60)).toBeCloseTo(60, 6);
    expect(xOf(scale, '2027-06-16', 13 * 60)).toBeCloseTo(300, 6);
  });

  test('days outside lie outside, times outside the drawn hours at the day’s edge', () => {
    expect(xOf(scale, '2027-06-13', 13 * 60)).toBeLessThan(0);
    expect(xOf(scale, '2027-06-21', 13 * 60)).toBeGreaterThan(840);
    expect(xOf(scale, monday, 3 * 60)).toBe(xOf(scale, monday, 7 * 60));
  });

  test('the drawn hours hold every shift, task and pickup', () => {
    const span = spanOf({
      days: [
        {
          date: monday,
          closed: null,
          benchMinutes: 0,
          plannedMinutes: 0,
          pickups: 0,
          shifts: [{ start: 6 * 60 + 30, end: 14 * 60, people: [] }],
          why: [],
        },
      ],
      lanes: [
        {
          number: 1,
          customer: '',
          summary: '',
          status: 'confirmed',
          pickup: pickup(monday, 17 * 60 + 30),
          tasks: [task(monday, 15 * 60, 'bake')],
          allergies: false,
          can: { ready: false, collect: false, start: false },
          rowVersion: 0,
        },
      ],
    });
    expect(span).toEqual({ start: 6 * 60, end: 18 * 60 });
  });
});

describe('a cake’s string', () => {
  test('goes from its first bead to its pickup, the handover being the pickup’s own box', () => {
    const string = stringBeads(
      {
        tasks: [
          task('2027-06-17', 10 * 60, 'final-coat'),
          task('2027-06-15', 8 * 60, 'bake'),
          task('2027-06-18', 11 * 60, 'handover'),
        ],
        pickup: pickup('2027-06-18', 11 * 60),
      },
      scale,
      labelWidth,
    );
    expect(string.beads.map((it) => it.sort)).toEqual(['bake', 'coat']);
    expect(string.from).toBe(string.beads[0]?.x);
    expect(string.to).toBe(string.pickup);
    expect(string.comesFromBefore).toBe(false);
    expect(string.goesOn).toBe(false);
  });

  test('shows that it comes from before and goes on after', () => {
    const string = stringBeads(
      { tasks: [task('2027-06-12', 600, 'bake')], pickup: pickup('2027-06-22', 600) },
      scale,
      labelWidth,
    );
    expect(string).toMatchObject({
      beads: [],
      pickup: null,
      from: 0,
      to: 840,
      comesFromBefore: true,
      goesOn: true,
    });
  });

  test('keeps labels clear of the name of a pickup beyond these days', () => {
    const beyond = 'pickup Tuesday 22 June';
    const string = stringBeads(
      {
        tasks: [
          task('2027-06-19', 480, 'bake'),
          task('2027-06-20', 540, 'buttercream'),
          task('2027-06-20', 600, 'fill-and-crumb-coat'),
        ],
        pickup: pickup('2027-06-22', 600),
      },
      scale,
      labelWidth,
      beyond,
    );
    for (const { x, label } of string.beads.filter((it) => it.side === 'below')) {
      expect(x + labelWidth(label) / 2).toBeLessThan(scale.width - labelWidth(beyond));
    }
  });

  test('work of one sort that lies close together is one bead', () => {
    const string = stringBeads(
      {
        tasks: [task(monday, 480, 'bake', 'a'), task(monday, 500, 'bake', 'b')],
        pickup: pickup('2027-06-18', 600),
      },
      scale,
      labelWidth,
    );
    expect(string.beads).toHaveLength(1);
    expect(string.beads[0]?.tasks.map((it) => it.id)).toEqual(['a', 'b']);
  });

  const anyTask = fc
    .record({
      day: fc.integer({ min: -2, max: 8 }),
      start: fc.integer({ min: 0, max: 1439 }),
      kind: fc.constantFrom(...taskKinds),
    })
    .map(({ day, start, kind }) => task(addDays(monday, day), start, kind));
  const anyLane = fc.record({
    tasks: fc
      .array(anyTask, { maxLength: 24 })
      .map((tasks) => tasks.map((it, n) => ({ ...it, id: String(n) }))),
    pickup: fc
      .record({ day: fc.integer({ min: -1, max: 9 }), start: fc.integer({ min: 420, max: 1140 }) })
      .map(({ day, start }) => pickup(addDays(monday, day), start)),
  });
  const widths = fc.integer({ min: 620, max: 1400 });

  test('the pickup’s box never lies on the work before it', () => {
    fc.assert(
      fc.property(anyLane, widths, (lane, width) => {
        const { beads, pickup: box } = stringBeads(lane, { ...scale, width }, labelWidth);
        if (box === null || box >= width - pickupHalf) return;
        const before = beads.filter((it) => it.tasks.every((t) => t.date <= lane.pickup.date));
        for (const bead of before) expect(bead.x).toBeLessThanOrEqual(box - pickupHalf);
      }),
    );
  });

  test('keeps the order of work, every piece of it, and each bead in its own day', () => {
    fc.assert(
      fc.property(anyLane, widths, (lane, width) => {
        const wide = { ...scale, width };
        const { beads } = stringBeads(lane, wide, labelWidth);
        const shown = lane.tasks.filter(
          (it) => it.kind !== 'handover' && it.date >= monday && it.date <= '2027-06-20',
        );
        expect(beads.flatMap((it) => it.tasks)).toHaveLength(shown.length);
        for (const [n, bead] of beads.entries()) {
          expect(bead.x).toBeGreaterThanOrEqual(beads[n - 1]?.x ?? 0);
          for (const { date } of bead.tasks) {
            const [left, right] = reachOf(wide, date);
            expect(bead.x).toBeGreaterThanOrEqual(left - 1e-6);
            expect(bead.x).toBeLessThanOrEqual(right + 1e-6);
          }
        }
      }),
    );
  });

  test('labels of one side never touch and stay inside', () => {
    fc.assert(
      fc.property(anyLane, widths, (lane, width) => {
        const { beads } = stringBeads(lane, { ...scale, width }, labelWidth);
        for (const side of ['above', 'below'] as const) {
          let taken = 0;
          for (const bead of beads.filter((it) => it.side === side)) {
            const half = labelWidth(bead.label) / 2;
            expect(bead.x - half).toBeGreaterThanOrEqual(taken);
            expect(bead.x + half).toBeLessThanOrEqual(width);
            taken = bead.x + half;
          }
        }
      }),
    );
  });
});
