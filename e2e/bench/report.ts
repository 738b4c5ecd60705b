/** One figure that was to be reached, and what came of it. */
export type Figure = {
  readonly what: string;
  readonly target: string;
  readonly measured: string;
  readonly reached: boolean;
};

/** A part of the bench that can be run by itself. */
export type Part = {
  readonly name: string;
  /** What it does, for whoever runs it. */
  readonly about: string;
  run(note: (line: string) => void): Promise<readonly Figure[]>;
};

export const atLeast = (what: string, target: number, measured: number): Figure => ({
  what,
  target: `≥ ${target}`,
  measured: measured.toFixed(2),
  reached: measured >= target,
});

export const atMost = (what: string, target: number, measured: number): Figure => ({
  what,
  target: `≤ ${target}`,
  measured: measured.toFixed(2),
  reached: measured <= target,
});

/** How often something went wrong that must never. */
export const never = (what: string, times: number): Figure => ({
  what,
  target: 'never',
  measured: times === 0 ? 'never' : `${times} times`,
  reached: times === 0,
});

/** The figures below each other, as wide as their widest. */
export function table(figures: readonly Figure[]): string {
  const rows = [
    ['', 'target', 'measured', ''],
    ...figures.map(({ what, target, measured, reached }) => [
      what,
      target,
      measured,
      reached ? 'reached' : 'MISSED',
    ]),
  ];
  const widths = [0, 1, 2].map((at) => Math.max(...rows.map((row) => [...(row[at] ?? '')].length)));
  const pad = (text: string, width: number) => text + ' '.repeat(width - [...text].length);
  return rows
    .map((row) =>
      row
        .map((text, at) => pad(text, widths[at] ?? text.length))
        .join('   ')
        .trimEnd(),
    )
    .join('\n');
}

/** The middle one, or the mean of the middle two. */
export function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  const half = sorted.length / 2;
  const upper = sorted[Math.floor(half)] ?? Number.NaN;
  return Number.isInteger(half) ? ((sorted[half - 1] ?? Number.NaN) + upper) / 2 : upper;
}
