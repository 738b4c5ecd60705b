import type { ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';

export type DataRow = {
  readonly key: string;
  readonly label: ReactNode;
  readonly value: ReactNode;
  /** The row that matters: larger, with the butter line under it. */
  readonly total?: boolean;
};

/** Names and values, a hairline between; figures line up at the end. */
export function DataList({
  rows,
  ends = false,
}: {
  readonly rows: readonly DataRow[];
  readonly ends?: boolean;
}) {
  return (
    <dl className="grid">
      {rows.map((row) => (
        <div
          key={row.key}
          className={classNames(
            ends
              ? 'flex items-baseline justify-between gap-6'
              : 'grid gap-x-6 sm:grid-cols-[minmax(7rem,12rem)_minmax(0,2fr)]',
            'border-b py-2.5',
            row.total ? 'border-b-2 border-butter' : 'border-seam',
          )}
        >
          <dt className={ends ? 'min-w-0' : 'text-slate'}>{row.label}</dt>
          <dd
            className={classNames(
              'tabular-nums',
              ends && 'shrink-0 text-right',
              row.total && 'font-display text-2xl font-bold',
            )}
          >
            {row.value}
          </dd>
        </div>
      ))}
    </dl>
  );
}
