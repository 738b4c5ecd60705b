import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import type { Advice, Estimate } from '#shared/contracts/estimates.ts';
import type { StyleId } from '#shared/contracts/vocabulary.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { fareInHeat, warmthOf } from './heat.ts';
import { coat, designWith, indoors, roundTier } from './testing/design-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';
import { styles } from './testing/menu-parts-fixture.ts';
import {
  coldHoldingC,
  fsis,
  keepCoolText,
  minutesAllowed,
  type KeepCoolInput,
} from './time-out.ts';

const evaluate = (design: Design, date: string | null = '2027-06-19'): Estimate =>
  evaluateDesign({ design, date }, menuFixture, '2027-05-01');
const about = (estimate: Estimate, it: string): Advice | undefined =>
  estimate.advice.find((one) => one.about === it);

const inStyle = (style: StyleId, warmestC: number | null, place: 'indoors' | 'shade' | 'sun') =>
  designWith({ cake: { coating: coat({ style }) }, setting: { warmestC, place } });

describe('heat', () => {
  it('is ok at least 3 °C under the limit, care up to it, stop above', () => {
    expect(fareInHeat(26, 23, menuFixture.kitchen)).toBe('ok');
    expect(fareInHeat(26, 23.1, menuFixture.kitchen)).toBe('care');
    expect(fareInHeat(26, 26, menuFixture.kitchen)).toBe('care');
    expect(fareInHeat(26, 26.1, menuFixture.kitchen)).toBe('stop');
  });

  it('is told in a plain sentence with what would stand up', () => {
    const found = about(evaluate(inStyle('russian', 25, 'shade')), 'heat:buttercream-russian');
    expect(found).toMatchObject({
      level: 'stop',
      step: 'setting',
      sentence: 'Too warm outside for Russian buttercream; it holds to 73 °F / 23 °C.',
    });
    expect(found?.instead).toContain('Italian meringue buttercream');
    expect(found?.instead).toContain('would stand up.');
  });

  it('offers ways that bring it under the limit when pressed', () => {
    const design = inStyle('french', 27, 'shade');
    const found = about(evaluate(design), 'heat:buttercream-french');
    expect(found?.ways.length).toBeGreaterThan(1);
    for (const way of found?.ways ?? []) {
      const then = evaluate({ ...design, ...way.patch });
      expect(then.advice.filter((it) => it.code === 'heat' && it.level === 'stop')).toEqual([]);
    }
  });

  it('offers a dummy on show with cutting cakes kept cold', () => {
    const design = inStyle('swiss', 34, 'shade');
    const ways = about(evaluate(design), 'heat:buttercream-swiss')?.ways ?? [];
    const show = ways.find((it) => it.label.startsWith('A dummy'));
    expect(show?.label).toBe(
      'A dummy in Fondant over Swiss meringue on show, and cutting cakes kept cold',
    );
    expect(show?.changes[0]).toBe('The cake on show is a dummy: nobody eats from it.');
    const then = evaluate({ ...design, ...show?.patch });
    expect(then.advice.filter((it) => it.level === 'stop')).toEqual([]);
    expect(then.portions.fed).toBeGreaterThanOrEqual(70);
    expect(about(then, 'dummies')?.sentence).toContain('nothing of it is cut or eaten');
  });

  it('may stand out all afternoon as a dummy', () => {
    const design = designWith({ setting: { minutesOut: 300, warmestC: 20 } });
    const show = about(evaluate(design), 'time-out')?.ways.find((it) =>
      it.label.startsWith('A dummy'),
    );
    expect(about(evaluate({ ...design, ...show?.patch }), 'time-out')).toBeUndefined();
  });

  // Common practice, no source: French and German suffer most in warmth, Italian least.
  it('suits Italian best and French and German least of the six', () => {
    const order = evaluate(inStyle('swiss', 24, 'shade'))
      .ranks.filter((it) => it.covering === 'buttercream')
      .map((it) => it.style);
    expect(order[0]).toBe('italian');
    expect(order.slice(-2).sort()).toEqual(['french', 'german']);
  });

  it('never is ok where nobody knows how warm it will be', () => {
    for (const { id } of styles) {
      for (const date of ['2027-01-16', '2027-07-17', null]) {
        const estimate = evaluate(inStyle(id, null, 'indoors'), date);
        expect(estimate.ranks.map((it) => it.level)).not.toContain('ok');
        const found = about(estimate, `heat-unknown:buttercream-${id}`);
        expect(found?.level).not.toBe('ok');
        expect(found?.instead).toContain('three days before');
      }
    }
  });

  it('takes the studio’s figure for the month, and its warmest while there is no day', () => {
    const unknown = { ...indoors, warmestC: null };
    const outside = { ...unknown, place: 'shade' as const };
    expect(warmthOf(outside, menuFixture, '2027-01-16').celsius).toBe(4);
    // Common practice, no source: rooms are kept at 22 °C or so, however cold the day.
    expect(warmthOf(unknown, menuFixture, '2027-01-16').celsius).toBe(22);
    expect(warmthOf(unknown, menuFixture, '2027-06-19').celsius).toBe(28);
    expect(warmthOf(unknown, menuFixture, null).celsius).toBe(31);
    const found = about(
      evaluate(inStyle('swiss', null, 'shade')),
      'heat-unknown:buttercream-swiss',
    );
    expect(found?.sentence).toContain('for June we reckon with 82 °F / 28 °C');
  });

  it('in direct sun stops every coat, however mild', () => {
    for (const covering of ['buttercream', 'fondant', 'semi-naked'] as const) {
      const estimate = evaluate(
        designWith({
          cake: { coating: coat({ covering }) },
          setting: { place: 'sun', warmestC: 12 },
        }),
      );
      const found = about(estimate, `sun:${covering}-swiss`);
      expect(found?.level).toBe('stop');
      expect(found?.ways[0]?.patch.setting?.place).toBe('shade');
      expect(new Set(estimate.ranks.map((it) => it.level))).toEqual(new Set(['stop']));
    }
  });

  it('above a filling’s limit is care, and stop where it is soft under a tier', () => {
    const lemon = { fillingId: 'lemon-curd' };
    const single = designWith({
      cake: { tiers: [roundTier(8, lemon)] },
      setting: { warmestC: 25 },
    });
    expect(about(evaluate(single), 'heat:filling-lemon-curd')?.level).toBe('care');
    const stacked = designWith({
      cake: { tiers: [roundTier(10, lemon), roundTier(8)] },
      setting: { warmestC: 25 },
    });
    const found = about(evaluate(stacked), 'soft-filling:filling-lemon-curd');
    expect(found?.level).toBe('stop');
    for (const way of found?.ways ?? []) {
      const then = evaluate({ ...stacked, ...way.patch });
      expect(then.advice.filter((it) => it.code === 'soft-filling')).toEqual([]);
    }
  });
});

describe('time out of the fridge', () => {
  // USDA FSIS, "Danger Zone (40 °F - 140 °F)": two hours in all, one hour above 90 °F.
  it('is two hours in all, one above 90 °F', () => {
    expect(minutesAllowed(32)).toBe(120);
    expect(minutesAllowed(33)).toBe(60);
    // 90 °F is 32.2 °C and not above 90 °F.
    expect([minutesAllowed((90 - 32) * (5 / 9)), minutesAllowed((91 - 32) * (5 / 9))]).toEqual([
      120, 60,
    ]);
    expect([fsis.coldC, fsis.hotC]).toEqual([4, 60]);
    expect([fsis.coldF, fsis.hotF, fsis.hotDayF]).toEqual([40, 140, 90]);
  });

  const out = (minutesOut: number, driveMinutes: number, warmestC = 20) =>
    about(evaluate(designWith({ setting: { minutesOut, driveMinutes, warmestC } })), 'time-out');

  it('counts the drive', () => {
    expect(out(60, 30)).toBeUndefined();
    expect(out(90, 30)?.level).toBe('care');
    expect(out(90, 31)).toMatchObject({
      level: 'stop',
      sentence:
        '2 h 01 out of the fridge, the drive and setting up included, is too long: between 40 and 140 °F (4 and 60 °C) it may be out for 2 h in all (USDA FSIS).',
    });
    expect(out(45, 20, 34)?.level).toBe('stop');
  });

  it('is put right in one press where the drive leaves time', () => {
    const design = designWith({ setting: { minutesOut: 240, driveMinutes: 20 } });
    const [way] = about(evaluate(design), 'time-out')?.ways ?? [];
    expect(way?.patch.setting?.minutesOut).toBe(90);
    expect(about(evaluate({ ...design, ...way?.patch }), 'time-out')?.level).toBe('care');
    expect(out(0, 200)?.ways).toEqual([]);
    expect(out(0, 200)?.instead).toContain('cold box');
  });

  it('has a word about long drives', () => {
    const design = designWith({ setting: { minutesOut: 0, driveMinutes: 50 } });
    expect(about(evaluate(design), 'drive')?.level).toBe('care');
  });

  // FDA Food Code 2022, 3-501.16: 41 °F (5 °C); UK, 8 °C.
  it('keeps cold by the region', () => {
    expect([coldHoldingC('US'), coldHoldingC('EU'), coldHoldingC('UK')]).toEqual([5, 5, 8]);
    const text = (input: Partial<KeepCoolInput>) =>
      keepCoolText({
        setting: indoors,
        warmestC: 20,
        studio: menuFixture.studio,
        rules: menuFixture.kitchen,
        widestMm: 200,
        collectAt: null,
        perishable: true,
        ...input,
      });
    const uk = { labelRegion: 'UK', temperatureLead: 'C' } as const;
    expect(text({ setting: { ...indoors, driveMinutes: 45, minutesOut: 90 }, studio: uk })).toBe(
      'Keep it in the fridge, at 8 °C / 46 °F or colder, until 1 h 15 before you cut it. Between 4 and 60 °C (40 and 140 °F) it may be out for 2 h in all (USDA FSIS), the drive and setting up included.',
    );
    expect(text({ setting: null, warmestC: null })).toContain('41 °F / 5 °C');
    expect(text({ setting: { ...indoors, minutesOut: 0 } })).toContain('until you cut it');
    // Memory: one to three hours for a tier of 9 in or more to soften all through.
    expect(text({ widestMm: 254 })).toContain('takes 1 to 3 h to soften');
    expect(text({ widestMm: 254 })).toContain('the limit comes first');
    expect(text({ perishable: false })).not.toContain('fridge');
  });

  it('says the hour to leave it in the fridge until where serving is known', () => {
    const served = { ...indoors, minutesOut: 90, driveMinutes: 45, servedAt: 16 * 60 };
    const text = (collectAt: number | null, warmestC = 20) =>
      keepCoolText({
        setting: served,
        warmestC,
        studio: menuFixture.studio,
        rules: menuFixture.kitchen,
        widestMm: 200,
        collectAt,
        perishable: true,
      });
    // Two hours less the drive of 45 min: out at 14:45. Above 90 °F one hour: 15 min, out at 15:45.
    expect(text(10 * 60)).toContain('until 14:45; you cut it at 16:00.');
    expect(text(10 * 60, 34)).toContain('until 15:45; you cut it at 16:00.');
    expect(text(10 * 60, 34)).toContain('Above 90 °F / 32 °C it may be out for 1 h in all');
    expect(text(14 * 60 + 30)).toContain('Straight from us to the table: it is there at 15:15');
    const late = evaluateDesign(
      { design: designWith({ setting: served }), date: null, collectAt: 16 * 60 },
      menuFixture,
      '2027-05-01',
    );
    expect(about(late, 'arrival')?.sentence).toBe(
      'You cut it at 16:00, but it cannot be there before 16:45.',
    );
  });
});
