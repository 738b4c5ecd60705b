import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { EggPart } from '#shared/contracts/pantry.ts';
import { addDays } from '#shared/dates/local-time.ts';
import { eggSizes, eggsFor, eggWeightsMg } from './egg-sizes.ts';
import { dozenOunces } from './egg-weights.ts';
import { eggKeeping, planEggs, type EggNeed } from './plan-eggs.ts';
import { cartonKeeping, planCartons } from './plan-cartons.ts';

/** Monday. */
const monday = '2027-06-07';
const saturday = addDays(monday, 5);
const need = (date: string, part: EggPart, grams: number): EggNeed => ({
  date,
  part,
  grams,
});

describe('an egg', () => {
  it('weighs what USDA SR28 lists for a large one: 50, 33, 17 g (01123, 01124, 01125)', () => {
    expect(eggWeightsMg('large')).toEqual({ whole: 50_000, white: 33_000, yolk: 17_000 });
  });

  it('follows the weight classes of USDA AMS 56: 30, 27, 24, 21 oz a dozen', () => {
    expect(eggSizes.map((it) => dozenOunces[it])).toEqual([30, 27, 24, 21]);
    for (const size of eggSizes) {
      const { whole, white, yolk } = eggWeightsMg(size);
      expect(white + yolk).toBe(whole);
      expect(Object.values(eggWeightsMg(size)).every(Number.isInteger)).toBe(true);
    }
  });

  it('comes within a gram of the whole weights SR28 lists by size: 63, 56, 44 (memory)', () => {
    expect(eggWeightsMg('jumbo').whole / 1000).toBeCloseTo(63, -0.5);
    expect(Math.abs(eggWeightsMg('extra-large').whole / 1000 - 56)).toBeLessThanOrEqual(1);
    expect(Math.abs(eggWeightsMg('medium').whole / 1000 - 44)).toBeLessThanOrEqual(1);
  });

  it('gives 200 g of yolks from about 12 (common practice, no source)', () => {
    expect(eggsFor(200, 'yolk', 'large')).toBe(12);
  });

  it('gives 3/4 cup of whites, about 180 g, from 6 (common practice, no source)', () => {
    expect(eggsFor(180, 'white', 'large')).toBe(6);
  });
});

describe('a plan of eggs', () => {
  it('cracks for whites and yolks together', () => {
    // 330 g of whites are ten eggs; 170 g of yolks come with them.
    const plan = planEggs([need(monday, 'white', 330), need(monday, 'yolk', 170)]);
    expect(plan.eggs).toBe(10);
    expect(plan.leftovers).toEqual([]);
  });

  it('says what is left over and until when it is good', () => {
    const plan = planEggs([need(monday, 'white', 330)]);
    expect(plan.days).toMatchObject([{ date: monday, crack: 10, whole: 0 }]);
    expect(plan.leftovers).toEqual([
      { part: 'yolk', crackedOn: monday, useBy: addDays(monday, 2), grams: 170 },
    ]);
  });

  it('uses the meringue’s yolks two days later', () => {
    const plan = planEggs([need(monday, 'white', 330), need(addDays(monday, 2), 'yolk', 170)]);
    expect(plan.eggs).toBe(10);
    expect(plan.days[1]).toMatchObject({
      crack: 0,
      uses: [{ from: [{ crackedOn: monday, part: 'yolk', grams: 170 }] }],
    });
  });

  it('does not fill Saturday’s French with Monday’s yolks, however long yolks may keep', () => {
    for (const yolkDays of [eggKeeping.leastDays, 3, eggKeeping.mostDays]) {
      const plan = planEggs([need(monday, 'white', 330), need(saturday, 'yolk', 170)], 'large', {
        ...eggKeeping,
        yolkDays,
      });
      expect(plan.eggs).toBe(20);
      expect(plan.days[1]).toMatchObject({ date: saturday, crack: 10 });
    }
  });

  it('takes whole egg as a white and a yolk, and says how many go in whole', () => {
    const plan = planEggs([need(monday, 'whole', 300), need(monday, 'white', 132)]);
    expect(plan.days).toMatchObject([{ crack: 10, whole: 6 }]);
    expect(plan.leftovers).toMatchObject([{ part: 'yolk', grams: 68 }]);
  });

  it('cracks nothing for nothing', () => {
    expect(planEggs([need(monday, 'white', 0)])).toEqual({ eggs: 0, days: [], leftovers: [] });
  });

  const smallNeeds = fc.array(
    fc.record({
      date: fc.integer({ min: 0, max: 4 }).map((days) => addDays(monday, days)),
      part: fc.constantFrom<EggPart>('white', 'yolk', 'whole'),
      grams: fc.integer({ min: 1, max: 90 }),
    }),
    { maxLength: 5 },
  );
  const keepings = fc.record({
    whiteDays: fc.integer({ min: 0, max: 4 }),
    yolkDays: fc.integer({ min: 0, max: 4 }),
  });

  it('covers all needs with the fewest eggs there are, against every way of cracking fewer', () => {
    fc.assert(
      fc.property(smallNeeds, keepings, (needs, keeping) => {
        const { eggs } = planEggs(needs, 'large', keeping);
        // One fewer is enough to try: an egg more never hurts.
        const ways = eggs === 0 ? [] : [...waysToCrack(5, eggs - 1)];
        expect(ways.some((fewer) => covers(fewer, needs, keeping))).toBe(false);
      }),
      { numRuns: 150 },
    );
  });

  it('takes for each need just what it wants, from eggs still good, and never more than they gave', () => {
    const manyNeeds = fc.array(
      fc.record({
        date: fc.integer({ min: 0, max: 13 }).map((days) => addDays(monday, days)),
        part: fc.constantFrom<EggPart>('white', 'yolk', 'whole'),
        grams: fc.double({ min: 0.1, max: 4000, noNaN: true }),
      }),
      { maxLength: 30 },
    );
    fc.assert(
      fc.property(manyNeeds, keepings, fc.constantFrom(...eggSizes), (needs, keeping, size) => {
        const plan = planEggs(needs, size, keeping);
        const uses = plan.days.flatMap((day) => day.uses.map((use) => ({ day, use })));
        expect(uses).toHaveLength(needs.length);
        for (const { day, use } of uses) {
          const got = use.from.reduce((sum, it) => sum + it.grams, 0);
          expect(got).toBeGreaterThanOrEqual(use.need.grams - 1e-6);
          expect(got).toBeLessThan(use.need.grams + 0.002);
          for (const { crackedOn, part } of use.from) {
            const days = part === 'white' ? keeping.whiteDays : keeping.yolkDays;
            expect(crackedOn <= day.date && day.date <= addDays(crackedOn, days)).toBe(true);
          }
        }
        for (const part of ['white', 'yolk'] as const) {
          const used = uses
            .flatMap(({ use }) => use.from)
            .filter((it) => it.part === part)
            .reduce((sum, it) => sum + it.grams, 0);
          const left = plan.leftovers
            .filter((it) => it.part === part)
            .reduce((sum, it) => sum + it.grams, 0);
          expect(used + left).toBeCloseTo((plan.eggs * eggWeightsMg(size)[part]) / 1000, 4);
        }
      }),
      { numRuns: 100 },
    );
  });
});

describe('cartons', () => {
  it('keep ten days unopened and three opened (FDA, refrigerator storage chart)', () => {
    expect(cartonKeeping).toEqual({ unopenedDays: 10, openedDays: 3 });
  });

  it('are shared while they keep, and opened anew after', () => {
    const near = planCartons(
      [
        { date: monday, grams: 400 },
        { date: addDays(monday, 3), grams: 500 },
      ],
      946,
    );
    expect(near).toMatchObject({ cartons: 1, leftG: 46 });
    expect(near.days).toEqual([
      {
        date: monday,
        open: 1,
        boughtFrom: addDays(monday, -10),
        useBy: addDays(monday, 3),
      },
    ]);
    const apart = planCartons(
      [
        { date: monday, grams: 400 },
        { date: addDays(monday, 4), grams: 500 },
      ],
      946,
    );
    expect(apart.cartons).toBe(2);
  });
});

/** Every way to crack so many eggs over so many days. */
function* waysToCrack(days: number, eggs: number): Generator<number[]> {
  if (days === 1) {
    yield [eggs];
    return;
  }
  for (let first = 0; first <= eggs; first += 1) {
    for (const rest of waysToCrack(days - 1, eggs - first)) yield [first, ...rest];
  }
}

/** Serves the needs day by day from the eggs that spoil first, one part at a time. */
function covers(
  cracked: readonly number[],
  needs: readonly EggNeed[],
  keeping: { readonly whiteDays: number; readonly yolkDays: number },
): boolean {
  const parts = [
    { perEgg: 33 * 50, keeps: keeping.whiteDays, of: { white: 50, yolk: 0, whole: 33 } },
    { perEgg: 17 * 50, keeps: keeping.yolkDays, of: { white: 0, yolk: 50, whole: 17 } },
  ];
  return parts.every(({ perEgg, keeps, of }) => {
    const left = cracked.map((count) => count * perEgg);
    return cracked.every((_, day) => {
      let wanted = needs
        .filter((it) => it.date === addDays(monday, day))
        .reduce((sum, it) => sum + it.grams * of[it.part], 0);
      for (let from = Math.max(0, day - keeps); from <= day; from += 1) {
        const taken = Math.min(left[from] ?? 0, wanted);
        left[from] = (left[from] ?? 0) - taken;
        wanted -= taken;
      }
      return wanted === 0;
    });
  });
}
