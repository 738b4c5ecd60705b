import { describe, expect, it } from 'vitest';
import type { FormulaBook } from '#shared/kitchen/formulas/pantry-index.ts';
import { bookOf, bought, version } from '#shared/kitchen/testing/pantry-fixture.ts';
import { AppError } from '#api/platform/app-error.ts';
import { refuseUnsound } from './check-draft.ts';

const sugar = bought('sugar', 'Granulated sugar');

/** Formulas each holding the one before it so many times, beside a line of sugar. */
const tower = (levels: number, times: number): FormulaBook =>
  bookOf(
    [sugar],
    Array.from({ length: levels }, (_, level) =>
      version(`level${level}`, [
        ['sugar', 10],
        ...Array.from(
          { length: level === 0 ? 0 : times },
          () => [`@level${level - 1}-1`, 5] as const,
        ),
      ]),
    ),
  );

const holding = (level: number) => version('top', [[`@level${level}-1`, 100]]);

function messagesOf(work: () => void): string[] {
  try {
    work();
  } catch (error) {
    if (error instanceof AppError) return (error.issues ?? []).map((it) => it.message);
    throw error;
  }
  return [];
}

describe('a formula of formulas', () => {
  it('may be a hundred levels deep, and not so deep that nothing could read it', () => {
    expect(messagesOf(() => refuseUnsound(holding(99), tower(100, 1)))).toEqual([]);
    expect(messagesOf(() => refuseUnsound(holding(199), tower(200, 1)))).toEqual([]);
    expect(messagesOf(() => refuseUnsound(holding(200), tower(201, 1)))).toEqual([
      'Formulas inside one another go at most 200 levels deep.',
    ]);
  });

  it('may not double at every level', () => {
    expect(messagesOf(() => refuseUnsound(holding(5), tower(6, 2)))).toEqual([]);
    expect(messagesOf(() => refuseUnsound(holding(60), tower(61, 2)))).toEqual([
      'These formulas hold one another too many times over.',
    ]);
  });
});
