import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { usualKitchen } from '#shared/contracts/kitchen-rules.ts';
import { colourDifference, colourPicks, reachableTint } from './colour.ts';
import { styles } from './testing/menu-parts-fixture.ts';
import { sharmaPairs } from './testing/sharma-pairs.ts';

const styleColour = (id: string) => styles.find((it) => it.id === id)?.colour ?? '';
const bases = styles.map(({ colour }) => ({ colour }));

describe('the difference of two colours', () => {
  // Sharma, Wu, Dalal 2005, table 1; printed to four decimals.
  it.each(sharmaPairs.map((pair, index) => [index + 1, ...pair] as const))(
    'agrees with the published pair %i',
    (_, [l1, a1, b1], [l2, a2, b2], difference) => {
      const one = { mode: 'lab65' as const, l: l1, a: a1, b: b1 };
      const two = { mode: 'lab65' as const, l: l2, a: a2, b: b2 };
      expect(colourDifference(one, two)).toBeCloseTo(difference, 4);
      expect(colourDifference(two, one)).toBeCloseTo(difference, 4);
    },
  );

  it('has all 34 pairs', () => {
    expect(sharmaPairs).toHaveLength(34);
  });

  it('refuses what is not a colour', () => {
    expect(() => colourDifference('#ffffff', 'teal-ish')).toThrow(RangeError);
  });
});

describe('a wanted colour on a base', () => {
  it('does not come as a clean pale blue on bright yellow, but turns green', () => {
    const { reach, reached, difference } = reachableTint(
      '#bcd7ea',
      styleColour('french'),
      usualKitchen,
    );
    expect(reach).toBe('not-on-this-base');
    expect(difference).toBeGreaterThan(20);
    const [red, green, blue] = [1, 3, 5].map((at) =>
      Number.parseInt(reached.slice(at, at + 2), 16),
    );
    expect(green).toBeGreaterThan(red ?? 0);
    expect(green).toBeGreaterThan(blue ?? 0);
  });

  it('is close under 3, shifts under 10 and does not come from 10 on', () => {
    const greys = Array.from({ length: 60 }, (_, at) => (255 - at).toString(16));
    for (const grey of greys) {
      const { difference, reach } = reachableTint(
        '#ffffff',
        `#${grey}${grey}${grey}`,
        usualKitchen,
      );
      expect(reach).toBe(
        difference < 3 ? 'close' : difference < 10 ? 'shifts' : 'not-on-this-base',
      );
    }
  });

  it('comes close on any base where it is deep', () => {
    for (const { colour } of bases) {
      expect(reachableTint('#2d4372', colour, usualKitchen).reach).toBe('close');
    }
  });

  it('never comes lighter than the base in any channel', () => {
    const hex = fc
      .integer({ min: 0, max: 0xffffff })
      .map((it) => `#${it.toString(16).padStart(6, '0')}`);
    fc.assert(
      fc.property(hex, fc.constantFrom(...bases), (wanted, base) => {
        const { reached } = reachableTint(wanted, base.colour, usualKitchen);
        for (const at of [1, 3, 5]) {
          const channel = (it: string) => Number.parseInt(it.slice(at, at + 2), 16);
          expect(channel(reached)).toBeLessThanOrEqual(channel(base.colour));
          expect(channel(reached)).toBeLessThanOrEqual(channel(wanted));
        }
      }),
    );
  });

  it('of our picks all come on plain white, and most on bright yellow do not', () => {
    const coming = (base: string) =>
      colourPicks
        .filter(
          ({ colour }) => reachableTint(colour, base, usualKitchen).reach !== 'not-on-this-base',
        )
        .map(({ name }) => name);
    expect(coming('#ffffff')).toHaveLength(colourPicks.length);
    expect(coming(styleColour('french'))).toContain('Fir');
    expect(coming(styleColour('french'))).not.toContain('Morning sky');
    expect(coming(styleColour('french')).length).toBeLessThan(colourPicks.length / 2 + 3);
  });
});
