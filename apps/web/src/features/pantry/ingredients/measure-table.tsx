import { householdMeasure, householdMeasures } from '#shared/contracts/pantry.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { type FieldProblem, fieldId } from '#web/lib/forms.ts';
import { AmountField } from '../forms/amount-field.tsx';
import { problemAt } from '../forms/check-draft.ts';
import { type MeasureRow, nextKey } from './ingredient-form.ts';
import { measureWords } from './ingredient-words.ts';

type Props = {
  readonly rows: readonly MeasureRow[];
  readonly problems: readonly FieldProblem[];
  readonly onRows: (rows: MeasureRow[]) => void;
};

/** What one of each household measure weighs; each is weighed, since measures do not multiply. */
export function MeasureTable({ rows, problems, onRows }: Props) {
  const change = (key: number, patch: Partial<MeasureRow>) =>
    onRows(rows.map((it) => (it.key === key ? { ...it, ...patch } : it)));
  const unused = householdMeasures.find((it) => !rows.some((row) => row.measure === it)) ?? 'cup';
  return (
    <div className="grid gap-3">
      {rows.length > 0 && (
        <ol className="divide-y divide-seam border-y border-seam">
          {rows.map((row, at) => (
            <li
              key={row.key}
              id={fieldId(`measures.${at}`)}
              tabIndex={-1}
              className="grid grid-cols-2 items-end gap-x-3 gap-y-2 py-3 sm:grid-cols-[8.5rem_minmax(0,1fr)_7rem_minmax(0,1.4fr)_auto]"
            >
              <Select
                label="One"
                name={`measures.${at}.measure`}
                error={problemAt(problems, `measures.${at}`)}
                value={row.measure}
                onChange={(event) => {
                  const measure = householdMeasure.safeParse(event.target.value);
                  if (measure.success) change(row.key, { measure: measure.data });
                }}
              >
                {householdMeasures.map((it) => (
                  <option key={it} value={it}>
                    {measureWords[it]}
                  </option>
                ))}
              </Select>
              <TextField
                label="How"
                name={`measures.${at}.qualifier`}
                value={row.qualifier}
                error={problemAt(problems, `measures.${at}.qualifier`)}
                onChange={(event) => change(row.key, { qualifier: event.target.value })}
              />
              <AmountField
                label="Weighs"
                name={`measures.${at}.grams`}
                unit="g"
                value={row.grams}
                error={problemAt(problems, `measures.${at}.grams`)}
                onText={(grams) => change(row.key, { grams })}
              />
              <TextField
                label="Where from"
                name={`measures.${at}.source`}
                value={row.source}
                error={problemAt(problems, `measures.${at}.source`)}
                onChange={(event) => change(row.key, { source: event.target.value })}
              />
              <Button
                kind="quiet"
                aria-label={`Take the ${measureWords[row.measure]} away`}
                onClick={() => onRows(rows.filter((it) => it.key !== row.key))}
              >
                Take away
              </Button>
            </li>
          ))}
        </ol>
      )}
      <div>
        <Button
          kind="secondary"
          onClick={() =>
            onRows([
              ...rows,
              {
                key: nextKey(rows),
                measure: unused,
                qualifier: '',
                grams: '',
                source: 'our scales',
              },
            ])
          }
        >
          Add a measure
        </Button>
      </div>
    </div>
  );
}
