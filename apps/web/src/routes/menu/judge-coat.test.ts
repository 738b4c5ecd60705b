import { describe, expect, it } from 'vitest';
import type { StyleId } from '#shared/contracts/vocabulary.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { judgeCoat } from './judge-coat.ts';

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
    const verdict = judge(id, { allergen: 'egg', warmestC: null });
    expect(verdict.level).toBe(level);
    if (level === 'stop') expect(verdict.reasons.join()).toMatch(/egg/);
  });

  it('lets a style near its warmth stand with care, above it fall away, with the figure', () => {
    const style = menuFixture.styles.find((it) => it.id === 'french');
    const limit = style?.holdsToC ?? 0;
    expect(judge('french', { allergen: null, warmestC: limit - 3 })).toEqual({
      level: 'ok',
      reasons: [],
    });
    expect(judge('french', { allergen: null, warmestC: limit }).level).toBe('care');
    expect(judge('french', { allergen: null, warmestC: limit + 1 })).toMatchObject({
      level: 'stop',
      reasons: [expect.stringContaining(`${limit} °C`)],
    });
  });

  it('gives every reason', () => {
    expect(judge('french', { allergen: 'egg', warmestC: 35 }).reasons).toHaveLength(2);
  });
});
