import { describe, expect, it } from 'vitest';
import type { FormulaStep, FormulaVersion } from '#shared/contracts/pantry.ts';
import { bookOf, shelf, version, type LineRow } from '#shared/kitchen/testing/pantry-fixture.ts';
import { compareVersions } from './compare-versions.ts';
import { indexPantry } from './pantry-index.ts';

const index = indexPantry(
  bookOf(
    shelf,
    [
      version('custard', [['milk', 1000]]),
      version(
        'custard',
        [
          ['milk', 900],
          ['eggs', 100],
        ],
        { n: 2 },
      ),
    ],
    { custard: 'Custard' },
  ),
);

const lines: LineRow[] = [
  ['butter', 1000],
  ['powdered-sugar', 1650],
  ['salt', 4],
];
const step = (text: string, given: Partial<FormulaStep> = {}): FormulaStep => ({
  text,
  activeMinutes: 5,
  waitingMinutes: 0,
  resource: 'mixer',
  critical: null,
  syrupTargetC: null,
  ...given,
});
const texts = (
  before: readonly LineRow[],
  after: readonly LineRow[],
  old: Partial<FormulaVersion> = {},
  now: Partial<FormulaVersion> = {},
) =>
  compareVersions(
    version('house', before, old),
    version('house', after, { n: 2, ...now }),
    index,
  ).map((it) => it.text);

describe('what changed', () => {
  it('is nothing between a version and itself', () => {
    expect(texts(lines, lines)).toEqual([]);
  });

  it('is told line by line: heavier, lighter, in, out', () => {
    const after: LineRow[] = [
      ['butter', 950],
      ['powdered-sugar', 1650],
      ['honey', 50],
    ];
    expect(texts(lines, after).slice(0, 3)).toEqual([
      'Wildflower honey comes in: 50 g.',
      'Fine salt is left out; it was 4 g.',
      'Unsalted butter, 82 % fat: 1000 g → 950 g, 50 g (5 %) less.',
    ]);
  });

  it('tells a formula written larger in one sentence', () => {
    const twice = lines.map(([part, grams]): LineRow => [part, grams * 2]);
    expect(texts(lines, twice)).toEqual(['All lines are 2 times as heavy; the proportions stay.']);
    expect(texts(twice, lines)).toEqual(['All lines are 50 % as heavy; the proportions stay.']);
  });

  it('tells another order, another step, and another version inside', () => {
    expect(texts(lines, lines.toReversed())).toEqual(['The lines stand in another order.']);
    const steps = { steps: [step('Beat.'), step('Add.')] };
    expect(texts([['butter', 5]], [['butter', 5, 1]], steps, steps)).toEqual([
      'Unsalted butter, 82 % fat goes in at step 2, not 1.',
    ]);
    expect(texts([['@custard-1', 5]], [['@custard-2', 5]])).toEqual([
      'Custard: version 1 → version 2.',
      'Now contains egg.',
      'Now has egg that is neither pasteurized nor cooked through in it, or a label that does not rule it out.',
      expect.stringMatching(/^The ingredients of a kilogram cost .* more\.$/u),
    ]);
  });

  it('tells allergens and never says free from', () => {
    const without = texts(
      [
        ['butter', 100],
        ['flour', 100],
      ],
      [['butter', 100]],
    );
    expect(without).toContain('Its labels do not name wheat any more in the way they did.');
    expect(without.join(' ')).not.toMatch(/free|safe/u);
    expect(
      texts(
        [['butter', 100]],
        [
          ['butter', 100],
          ['flour', 100],
        ],
      ),
    ).toContain('Now contains wheat.');
  });

  it('tells cost per kilogram, and a price that is not known any more', () => {
    // Butter costs 545 / 454 a gram, powdered sugar 1880 / 11,340: equal parts against 1 to 3.
    const dear = 545 / 454 / 2 + 1880 / 11_340 / 2;
    const cheap = 545 / 454 / 4 + (1880 / 11_340) * 0.75;
    const percent = Number(((1 - cheap / dear) * 100).toPrecision(2));
    expect(
      texts(
        [
          ['butter', 500],
          ['powdered-sugar', 500],
        ],
        [
          ['butter', 250],
          ['powdered-sugar', 750],
        ],
      ),
    ).toContain(`The ingredients of a kilogram cost ${percent} % less.`);
    expect(
      texts(
        [['butter', 500]],
        [
          ['butter', 500],
          ['honey', 5],
        ],
      ),
    ).toContain('What it costs is not known any more: no price for Wildflower honey.');
  });

  it('tells steps, limits, yield and how it keeps', () => {
    const before = {
      yieldPpm: 970_000,
      holdsToC: 26,
      keepsChilledHours: 120,
      refrigerate: true,
      steps: [
        step('Whisk over hot water.', { critical: { limitC: 71, seconds: null, note: '' } }),
        step('Whip.'),
        step('Butter.'),
      ],
    };
    const after = {
      yieldPpm: 965_000,
      holdsToC: 24,
      keepsChilledHours: 96,
      refrigerate: false,
      note: 'Try it cold.',
      steps: [
        step('Whisk over hot water.', { critical: { limitC: 72, seconds: 60, note: '' } }),
        step('Butter.', { activeMinutes: 8 }),
        step('Whip long.'),
        step('Rest.'),
      ],
    };
    expect(texts(lines, lines, before, after)).toEqual([
      expect.stringMatching(/cost .* more/u),
      'Yield: 97 % → 96.5 %.',
      'Step 1, limit: 160 °F / 71 °C → 162 °F / 72 °C (1 min).',
      'Step 2, hands: 5 min → 8 min.',
      'Step 3 is new: Whip long.',
      'Step 4 is new: Rest.',
      'Step 2 is gone: Whip.',
      'Holds to: 79 °F / 26 °C → 75 °F / 24 °C.',
      'It is not refrigerated any more: by a tested reason or the local authority’s word.',
      'Chilled: 120 h → 96 h.',
      'The note reads differently.',
    ]);
    expect(
      texts(lines, lines, { steps: [step('A'), step('B')] }, { steps: [step('B'), step('A')] }),
    ).toEqual(['The steps stand in another order.']);
  });

  it('is told of an unsound draft too, without what depends on soundness', () => {
    expect(texts(lines, [...lines, ['gone', 5]])).toEqual(['gone comes in: 5 g.']);
  });
});
