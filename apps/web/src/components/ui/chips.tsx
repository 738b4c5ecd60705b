import { type ReactNode, useId } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { Fieldset } from './fieldset.tsx';

export type Chip<V extends string> = {
  readonly value: V;
  readonly label: ReactNode;
  /** A small drawing before the words. */
  readonly picture?: ReactNode;
};

type Common<V extends string> = {
  readonly legend: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly optional?: boolean;
  readonly name?: string;
  readonly large?: boolean;
  readonly chips: readonly Chip<V>[];
};

type OneProps<V extends string> = Common<V> & {
  readonly value: V | null;
  readonly onValue: (value: V) => void;
};
type ManyProps<V extends string> = Common<V> & {
  readonly value: readonly V[];
  readonly onValue: (value: V[]) => void;
};

/** One of a few short answers, side by side. */
export function ChipChoice<V extends string>({ chips, value, onValue, ...text }: OneProps<V>) {
  const group = useId();
  return (
    <Fieldset {...text}>
      <div className="flex flex-wrap gap-2">
        {chips.map((chip) => (
          <ChipLabel key={chip.value} chip={chip}>
            <input
              type="radio"
              name={text.name ?? group}
              value={chip.value}
              checked={chip.value === value}
              onChange={() => onValue(chip.value)}
              className="sr-only"
            />
          </ChipLabel>
        ))}
      </div>
    </Fieldset>
  );
}

/** Any of a few short answers, side by side; pressing again takes one back. */
export function ChipChoices<V extends string>({ chips, value, onValue, ...text }: ManyProps<V>) {
  const group = useId();
  return (
    <Fieldset {...text}>
      <div className="flex flex-wrap gap-2">
        {chips.map((chip) => (
          <ChipLabel key={chip.value} chip={chip} ticked={value.includes(chip.value)}>
            <input
              type="checkbox"
              name={text.name ?? group}
              value={chip.value}
              checked={value.includes(chip.value)}
              onChange={(event) =>
                onValue(
                  event.target.checked
                    ? [...value, chip.value]
                    : value.filter((it) => it !== chip.value),
                )
              }
              className="sr-only"
            />
          </ChipLabel>
        ))}
      </div>
    </Fieldset>
  );
}

type LabelProps<V extends string> = {
  readonly chip: Chip<V>;
  readonly ticked?: boolean;
  readonly children: ReactNode;
};

function ChipLabel<V extends string>({ chip, ticked = false, children }: LabelProps<V>) {
  return (
    <label
      className={classNames(
        'relative inline-flex min-h-11 cursor-pointer items-center gap-2 rounded-action border-[1.5px] border-slate px-4 py-1.5 font-semibold tabular-nums select-none',
        'hover:bg-cloud has-checked:border-cobalt has-checked:bg-cobalt-tint has-checked:text-cobalt has-checked:ring-1 has-checked:ring-cobalt',
        'has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-cobalt',
      )}
    >
      {children}
      {ticked && (
        <svg viewBox="0 0 16 16" className="size-4 shrink-0" aria-hidden="true">
          <path
            d="M3 8.5l3.2 3.2L13 4.8"
            fill="none"
            stroke="currentColor"
            strokeWidth="2.2"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </svg>
      )}
      {chip.picture}
      <span>{chip.label}</span>
    </label>
  );
}
