import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { maxAttempts, pauseAfter } from './retry-plan.ts';

const chance = fc.double({ min: 0, max: 1, maxExcluded: true, noNaN: true });

describe('pauseAfter', () => {
  it('grows and stays within a fifth of four hours', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100 }), chance, (attempt, random) => {
        const pause = pauseAfter(attempt, () => random);
        expect(pause).toBeGreaterThanOrEqual(8000);
        expect(pause).toBeLessThanOrEqual(4.8 * 3_600_000);
        expect(pauseAfter(attempt + 1, () => random)).toBeGreaterThanOrEqual(pause);
      }),
    );
  });

  it('spans about two days before giving up', () => {
    let total = 0;
    for (let attempt = 1; attempt < maxAttempts; attempt += 1) {
      total += pauseAfter(attempt, () => 0.5);
    }
    expect(total / 3_600_000).toBeCloseTo(47, 0);
  });
});
