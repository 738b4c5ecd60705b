const second = 1000;
const hour = 3600 * second;

const firstPause = 10 * second;
const growth = 3;
const longestPause = 4 * hour;

/** Tries before giving up: with the pauses between them they span about two days. */
export const maxAttempts = 19;

/**
 * Milliseconds to wait after a failed attempt (the first is 1): 10 s, then three times as long
 * each time, four hours at most; a fifth more or less by chance, so that what failed together
 * does not come back together.
 * @param random in [0, 1)
 */
export function pauseAfter(attempt: number, random: () => number): number {
  const pause = Math.min(firstPause * growth ** (attempt - 1), longestPause);
  return Math.round(pause * (0.8 + 0.4 * random()));
}
