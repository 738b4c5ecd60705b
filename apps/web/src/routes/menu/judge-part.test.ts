import { describe, expect, it } from 'vitest';
import type { StyleId } from '#shared/contracts/vocabulary.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { judgeCoat, judgeContents, judgeFilling, noWish } from './judge-part.ts';

const judge = (id: StyleId, wish: Parameters<typeof judgeCoat>[1]) => {
  const style = menuFixture.styles.find((it) => it.id === id);
  if (!style) throw new Error(`The fixture has no ${id}.`);
  return judgeCoat(style, wish, menuFixture);
};

describe('judgeCoat', () => {
  // Common practice, no source: American and Russian are the two of the six without egg.
  it.each([
    ['american', 'ok'],
    ['russian', 'ok'],
    ['swiss', 'stop'],
    ['italian', 'stop'],
    ['french', 'stop'],
    ['german', 'stop'],
  ] as const)('with an egg allergy %s is %s', (id, level) => {
    const verdict = judge(id, { ...noWish, allergen: 'egg' });
    expect(verdict.level).toBe(level);
    if (level === 'stop') expect(verdict.reasons.join()).toMatch(/egg/);
  });

  it('lets a style near its warmth stand with care, above it fall away, with the figure', () => {
    const style = menuFixture.styles.find((it) => it.id === 'french');
    const limit = style?.holdsToC ?? 0;
    expect(judge('french', { ...noWish, warmestC: limit - 3 })).toEqual({
      level: 'ok',
      reasons: [],
    });
    expect(judge('french', { ...noWish, warmestC: limit }).level).toBe('care');
    expect(judge('french', { ...noWish, warmestC: limit + 1 })).toMatchObject({
      level: 'stop',
      reasons: [expect.stringContaining(`${limit} °C`)],
    });
  });

  it('gives every reason', () => {
    expect(judge('french', { ...noWish, allergen: 'egg', warmestC: 35 }).reasons).toHaveLength(2);
  });
});

describe('an allergy to one kind alone', () => {
  const almond = menuFixture.sponges.find((it) => /almond/i.test(it.name));
  const judged = (species: string | null) =>
    almond &&
    judgeContents(almond.contents, { ...noWish, allergen: 'tree-nuts', species }, menuFixture);

  it('spares what holds another kind', () => {
    expect(judged(null)).toEqual({ level: 'stop', reasons: ['Contains tree nuts'] });
    expect(judged('almond')).toEqual({ level: 'stop', reasons: ['Contains almond'] });
    expect(judged('pecan')?.level).not.toBe('stop');
  });
});

describe('a filling on a warm day', () => {
  it('asks for care above its limit, but does not fall away', () => {
    for (const filling of menuFixture.fillings) {
      const { level } = judgeFilling(filling, { ...noWish, warmestC: 40 }, menuFixture);
      expect(level).toBe('care');
    }
  });
});
