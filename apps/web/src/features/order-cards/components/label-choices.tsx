import { useState } from 'react';
import { type LabelPaper, type LabelText, labelsPerSheet } from '#shared/contracts/cards.ts';
import { actionClasses } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { labelsAddress } from '../print-address.ts';

type Props = { readonly number: number; readonly labels: readonly LabelText[] };

const papers: readonly { readonly id: LabelPaper; readonly name: string }[] = [
  { id: 'single', name: 'One label, 100 × 62 mm' },
  { id: 'letter', name: 'US Letter, six labels of 4 × 3⅓ in' },
  { id: 'a4', name: 'A4, eight labels of 99 × 68 mm' },
];

/** Which label, on what, from which place of a sheet on, how often, and what the scale says. */
export function LabelChoices({ number, labels }: Props) {
  const [first] = labels;
  const [paper, setPaper] = useState<LabelPaper>('single');
  const [label, setLabel] = useState(first?.id ?? '');
  const [start, setStart] = useState(1);
  const [copies, setCopies] = useState<number | null>(first?.copies ?? 1);
  const [weighedG, setWeighedG] = useState<number | null>(null);
  const places = labelsPerSheet[paper];
  const isWhole = (it: number | null, least: number, most: number) =>
    it !== null && Number.isInteger(it) && it >= least && it <= most;
  const copiesError = isWhole(copies, 1, 40) ? undefined : 'Write how many, 1 to 40.';
  const weighedError =
    weighedG === null || isWhole(weighedG, 1, 200_000)
      ? undefined
      : 'Write whole grams, or leave it out.';
  const ready = copiesError === undefined && weighedError === undefined && copies !== null;
  return (
    <div className="grid gap-4">
      <h3>Print labels</h3>
      {labels.length > 1 && (
        <Select
          label="Which label"
          value={label}
          onChange={(event) => {
            const chosen = labels.find((it) => it.id === event.target.value);
            setLabel(event.target.value);
            setCopies(chosen?.copies ?? 1);
            setWeighedG(null);
          }}
        >
          {labels.map((it) => (
            <option key={it.id} value={it.id}>
              {it.product}
            </option>
          ))}
        </Select>
      )}
      <Select
        label="On what"
        value={paper}
        onChange={(event) => {
          setPaper(papers.find((it) => it.id === event.target.value)?.id ?? 'single');
          setStart(1);
        }}
      >
        {papers.map((it) => (
          <option key={it.id} value={it.id}>
            {it.name}
          </option>
        ))}
      </Select>
      {places > 1 && (
        <Select
          label="First free place on the sheet"
          hint="Counted in rows from the upper left."
          value={String(start)}
          onChange={(event) => setStart(Number(event.target.value))}
        >
          {Array.from({ length: places }, (_, at) => (
            <option key={at} value={String(at + 1)}>
              {at + 1}
            </option>
          ))}
        </Select>
      )}
      <div className="flex flex-wrap gap-x-6 gap-y-4">
        <NumberField
          label="Copies"
          hint="One for each box."
          value={copies}
          onValue={setCopies}
          error={copiesError}
        />
        <NumberField
          key={label}
          label="On the scale"
          optional
          hint="Boards taken off."
          unit="g"
          value={weighedG}
          onValue={setWeighedG}
          error={weighedError}
        />
      </div>
      {ready ? (
        <div>
          <a
            href={labelsAddress(number, { paper, label, start, copies, weighedG })}
            target="_blank"
            rel="noreferrer"
            className={actionClasses('primary', 'normal', false)}
          >
            Open the labels to print
          </a>
        </div>
      ) : (
        <p className="text-sm text-slate">The labels open once these figures can be read.</p>
      )}
    </div>
  );
}
