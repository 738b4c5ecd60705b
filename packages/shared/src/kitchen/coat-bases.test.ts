import { describe, expect, it } from 'vitest';
import { coatBases, tryOnCoats } from './coat-bases.ts';
import { menuFixture } from './testing/menu-fixture.ts';

const bases = coatBases(menuFixture, 'german');
const reachOf = (wanted: string) =>
  Object.fromEntries(
    tryOnCoats(wanted, bases, menuFixture).map(({ base, tint }) => [base.id, tint.reach]),
  );

describe('a colour on every coat', () => {
  it('is tried on the six buttercreams, on fondant over the chosen one, and on ganache', () => {
    expect(bases.map(({ id }) => id)).toEqual([
      ...menuFixture.styles.map(({ id }) => id),
      'fondant',
      'ganache',
    ]);
    expect(bases.find(({ id }) => id === 'fondant')).toMatchObject({
      covering: 'fondant',
      style: 'german',
    });
    expect(bases.find(({ id }) => id === 'ganache')?.style).toBeNull();
  });

  it('comes clean and pale blue on white, and never on bright yellow or on chocolate', () => {
    expect(reachOf('#bcd7ea')).toMatchObject({
      fondant: 'close',
      italian: 'close',
      russian: 'close',
      french: 'not-on-this-base',
      ganache: 'not-on-this-base',
    });
  });

  it('comes as a pink that is all but white on no yolk-coloured base', () => {
    expect(reachOf('#fdeef0')).toMatchObject({
      fondant: 'close',
      french: 'not-on-this-base',
      german: 'not-on-this-base',
      american: 'not-on-this-base',
    });
  });

  it('comes navy on every buttercream, since deep dyes cover', () => {
    const { ganache, ...others } = reachOf('#1f2a55');
    expect(new Set(Object.values(others))).toEqual(new Set(['close']));
    expect(ganache).toBe('not-on-this-base');
  });

  it('lists the nearest first', () => {
    const differences = tryOnCoats('#f5d3cf', bases, menuFixture).map(
      ({ tint }) => tint.difference,
    );
    expect(differences).toEqual(differences.toSorted((a, b) => a - b));
  });
});
