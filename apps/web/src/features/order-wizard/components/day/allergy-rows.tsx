import type { Declaration } from '#shared/contracts/design.ts';
import { AllergyRow } from './allergy-row.tsx';

type Props = {
  readonly rows: readonly Declaration[];
  readonly onRows: (rows: Declaration[], undo?: string) => void;
};

/** What was declared so far, each to change or take out. */
export function AllergyRows({ rows, onRows }: Props) {
  return (
    <ul className="grid gap-5">
      {rows.map((row, at) => (
        <AllergyRow
          // Rows have no name of their own, and are only added at the end.
          key={at}
          at={at}
          row={row}
          onChange={(next) => onRows(rows.map((it, i) => (i === at ? next : it)))}
          onRemove={() =>
            onRows(
              rows.filter((_, i) => i !== at),
              'Allergy taken out.',
            )
          }
        />
      ))}
    </ul>
  );
}
