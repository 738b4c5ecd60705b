import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Design } from '#shared/contracts/design.ts';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { allergenIds, type AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { evaluateDesign } from './evaluate-design.ts';
import { arbitraryDeclaration, arbitraryDesign } from './testing/arbitraries.ts';
import { entry } from './testing/contents-fixture.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const today = '2027-05-01';
const date = '2027-07-17';
const advise = (design: Design, menu: Menu = menuFixture): Advice[] =>
  evaluateDesign({ design, date }, menu, today).advice;

const order: readonly AdviceLevel[] = ['ok', 'care', 'stop'];
const runs = { numRuns: 40 };

/** The gravest level by subject: `allergen:egg`, `may-contain:egg` and `kitchen:egg` are about egg. */
function gravest(advice: readonly Advice[], subjectOf: (about: string) => string) {
  const levels = new Map<string, number>();
  for (const { about, level } of advice) {
    const subject = subjectOf(about);
    levels.set(subject, Math.max(levels.get(subject) ?? 0, order.indexOf(level)));
  }
  return levels;
}

function neverLighter(before: Map<string, number>, after: Map<string, number>): void {
  for (const [subject, level] of before) {
    expect(after.get(subject) ?? -1, subject).toBeGreaterThanOrEqual(level);
  }
}

const aboutFood: readonly Advice['code'][] = ['allergen', 'allergen-unknown', 'kitchen'];
const foodStops = (advice: readonly Advice[]) =>
  advice.filter((it) => it.level === 'stop' && aboutFood.includes(it.code)).map((it) => it.about);

describe('advice on any design', () => {
  it('gives every stop a reason, the same plainly to staff, and an alternative or that there is none', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        for (const stop of advise(design).filter((it) => it.level === 'stop')) {
          expect(stop.sentence.length).toBeGreaterThan(10);
          expect(stop.plain.length).toBeGreaterThan(10);
          expect(stop.instead, stop.about).not.toBe('');
        }
      }),
      runs,
    );
  });

  it('is never taken away by one more declaration', () => {
    fc.assert(
      fc.property(arbitraryDesign, arbitraryDeclaration, (design, declared) => {
        const { guests } = design;
        const more = {
          ...design,
          guests: { ...guests, allergies: [...guests.allergies, declared] },
        };
        neverLighter(
          gravest(advise(design), (about) => about),
          gravest(advise(more), (about) => about),
        );
      }),
      runs,
    );
  });

  it('is never made lighter by one more allergen in a part', () => {
    const added = fc.record({
      allergen: fc.constantFrom(...allergenIds),
      state: fc.constantFrom('contains' as const, 'may-contain' as const, 'unknown' as const),
      nth: fc.nat(20),
    });
    fc.assert(
      fc.property(arbitraryDesign, added, (design, { allergen, state, nth }) => {
        const sponges = menuFixture.sponges.map((it, at) =>
          at === nth % menuFixture.sponges.length
            ? {
                ...it,
                contents: {
                  ...it.contents,
                  allergens: [...it.contents.allergens, entry(allergen, [], state)],
                },
              }
            : it,
        );
        const bySubject = (about: string) => about.slice(about.indexOf(':') + 1);
        const ofFood = (menu: Menu) =>
          gravest(
            advise(design, menu).filter((it) => aboutFood.includes(it.code)),
            bySubject,
          );
        neverLighter(ofFood(menuFixture), ofFood({ ...menuFixture, sponges }));
      }),
      runs,
    );
  });

  it('leads out of every stop in one press, and into no other about what guests cannot eat', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        const before = advise(design);
        for (const { about, level, ways } of before) {
          for (const { patch, label } of ways) {
            const after = advise({ ...design, ...patch });
            if (level === 'stop') {
              const left = after.filter((it) => it.level === 'stop').map((it) => it.about);
              expect(left, label).not.toContain(about);
            }
            const known = foodStops(before);
            expect(foodStops(after).filter((it) => !known.includes(it))).toEqual([]);
          }
        }
      }),
      runs,
    );
  });

  it('says of every way what it changes, unless its name alone does', () => {
    fc.assert(
      fc.property(arbitraryDesign, (design) => {
        for (const { changes } of advise(design).flatMap((it) => it.ways)) {
          for (const line of changes) expect(line).toMatch(/^\p{L}.*\.$/u);
        }
      }),
      runs,
    );
  });
});
