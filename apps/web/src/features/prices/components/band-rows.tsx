import { type ReactNode, useState } from 'react';
import { Button } from '#web/components/ui/button.tsx';
import { Fieldset } from '#web/components/ui/fieldset.tsx';
import { usePriceDraft } from '../draft/price-draft.ts';

type Props<Row> = {
  readonly legend: string;
  readonly hint: ReactNode;
  /** Its place in the book. */
  readonly place: string;
  readonly rows: readonly Row[];
  readonly onRows: (rows: Row[]) => void;
  /** What a new row starts as. */
  readonly fresh: () => Row;
  readonly addLabel: string;
  /** What a row is called where it is taken out: "the first band". */
  readonly nameOf: (at: number) => string;
  readonly children: (row: Row, at: number, put: (change: Partial<Row>) => void) => ReactNode;
};

/** A list in the book that grows and shrinks: bands, taxes. */
export function BandRows<Row>(props: Props<Row>) {
  const { legend, hint, place, rows, onRows, fresh, addLabel, nameOf, children } = props;
  const { problemAt } = usePriceDraft();
  // What is half typed belongs to its row: rows that move up start their fields afresh.
  const [taken, setTaken] = useState(0);
  return (
    <Fieldset legend={legend} hint={hint} name={place} error={problemAt(place)}>
      <ul className="grid divide-y divide-seam">
        {rows.map((row, at) => (
          <li
            key={`${taken}-${at}`}
            className="flex flex-wrap items-start gap-x-6 gap-y-3 py-3 first:pt-1"
          >
            {children(row, at, (change) =>
              onRows(rows.map((it, index) => (index === at ? { ...it, ...change } : it))),
            )}
            <Button
              kind="quiet"
              className="sm:mt-7"
              aria-label={`Take out ${nameOf(at)}`}
              onClick={() => {
                setTaken(taken + 1);
                onRows(rows.filter((_, index) => index !== at));
              }}
            >
              Take out
            </Button>
          </li>
        ))}
      </ul>
      <div>
        <Button kind="secondary" onClick={() => onRows([...rows, fresh()])}>
          {addLabel}
        </Button>
      </div>
    </Fieldset>
  );
}
