import { type ReactNode, useId } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { Fieldset } from './fieldset.tsx';

export type RadioRow<V extends string> = {
  readonly value: V;
  readonly label: ReactNode;
  readonly description?: ReactNode;
  /** A drawing beside the words. */
  readonly picture?: ReactNode;
  /** The verdict at the end of the row. */
  readonly verdict?: ReactNode;
};

type Props<V extends string> = {
  readonly legend: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly name?: string;
  readonly large?: boolean;
  readonly rows: readonly RadioRow<V>[];
  readonly value: V | null;
  readonly onValue: (value: V) => void;
};

/** One of a few, each a row with room for a picture, a line of words and a verdict. */
export function RadioGroup<V extends string>({
  legend,
  hint,
  error,
  name,
  large,
  rows,
  value,
  onValue,
}: Props<V>) {
  const group = useId();
  return (
    <Fieldset legend={legend} hint={hint} error={error} name={name} large={large}>
      <div className="divide-y divide-seam">
        {rows.map((row) => (
          <RadioLine
            key={row.value}
            row={row}
            group={name ?? group}
            chosen={row.value === value}
            onChoose={() => onValue(row.value)}
          />
        ))}
      </div>
    </Fieldset>
  );
}

type LineProps<V extends string> = {
  readonly row: RadioRow<V>;
  readonly group: string;
  readonly chosen: boolean;
  readonly onChoose: () => void;
};

function RadioLine<V extends string>({ row, group, chosen, onChoose }: LineProps<V>) {
  const id = useId();
  return (
    <label
      htmlFor={id}
      className={classNames(
        'flex min-h-14 cursor-pointer items-center gap-x-4 px-3 py-3 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-cobalt',
        chosen ? 'rounded-action bg-cobalt-tint' : 'hover:bg-cloud',
      )}
    >
      <input
        id={id}
        type="radio"
        name={group}
        value={row.value}
        checked={chosen}
        onChange={onChoose}
        aria-labelledby={`${id}-label`}
        aria-describedby={row.description || row.verdict ? `${id}-more` : undefined}
        className="peer sr-only"
      />
      <RadioDot chosen={chosen} />
      {row.picture && <span className="shrink-0">{row.picture}</span>}
      <span className="grid min-w-0 flex-1 gap-x-6 gap-y-1 sm:grid-cols-[1fr_auto] sm:items-center">
        <span className="grid gap-0.5">
          <span
            id={`${id}-label`}
            className="font-display text-lg leading-snug font-semibold text-balance"
          >
            {row.label}
          </span>
          {row.description && <span className="text-sm text-slate">{row.description}</span>}
        </span>
        {row.verdict && <span className="text-sm font-semibold sm:max-w-44">{row.verdict}</span>}
      </span>
      <span id={`${id}-more`} hidden>
        {row.description} {row.verdict}
      </span>
    </label>
  );
}

/** The drawn dot of a radio button; the input itself lies hidden before it. */
export function RadioDot({ chosen }: { readonly chosen: boolean }) {
  return (
    <svg
      viewBox="0 0 24 24"
      className={classNames('size-6 shrink-0', chosen ? 'text-cobalt' : 'text-slate')}
      aria-hidden="true"
    >
      {chosen ? (
        <>
          <circle cx="12" cy="12" r="11" fill="currentColor" />
          <circle cx="12" cy="12" r="4.2" fill="var(--color-enamel)" />
        </>
      ) : (
        <circle
          cx="12"
          cy="12"
          r="10"
          fill="var(--color-enamel)"
          stroke="currentColor"
          strokeWidth="1.8"
        />
      )}
    </svg>
  );
}
