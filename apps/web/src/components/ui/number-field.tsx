import { type ComponentProps, useId, useState } from 'react';
import { fieldId } from '#web/lib/forms.ts';
import { readNumber } from '#web/lib/read-number.ts';
import { FieldFrame, type FieldText, controlClasses, describedBy } from './field-frame.tsx';

type Props = Omit<
  ComponentProps<'input'>,
  'id' | 'placeholder' | 'value' | 'onChange' | 'type' | 'inputMode'
> &
  FieldText & {
    readonly value: number | null;
    /** Null when empty, NaN when it cannot be read: the contract's own message then says why. */
    readonly onValue: (value: number | null) => void;
    /** Reads what was typed: a number in the value's unit, or null if it says none. */
    readonly read?: (text: string) => number | null;
    /** Writes the value once the field is left. */
    readonly write?: (value: number) => string;
    /** Shown after the box: "people", "min". */
    readonly unit?: string;
    readonly inputMode?: 'numeric' | 'decimal' | 'text';
  };

/**
 * A number, typed as people type it: "70", "1,200", "7 inches", "18cm" (with a `read` that knows
 * the unit). The text stays as typed until the field is left, and stays for good if it cannot be
 * read, so that nothing typed is lost.
 */
export function NumberField({
  label,
  hint,
  error,
  optional,
  value,
  onValue,
  read = readNumber,
  write = String,
  unit,
  inputMode = 'numeric',
  className,
  onBlur,
  ...input
}: Props) {
  const own = useId();
  const id = input.name === undefined ? own : fieldId(input.name);
  const [typed, setTyped] = useState<string | null>(null);
  const text = { label, hint, error, optional };
  const shown = typed ?? (value === null || Number.isNaN(value) ? '' : write(value));
  return (
    <FieldFrame id={id} {...text}>
      <span className="flex items-center gap-3">
        <input
          autoComplete="off"
          {...input}
          id={id}
          type="text"
          inputMode={inputMode}
          value={shown}
          aria-invalid={error ? true : undefined}
          aria-describedby={
            [describedBy(id, text), unit ? `${id}-unit` : undefined].filter(Boolean).join(' ') ||
            undefined
          }
          className={controlClasses(
            error,
            className ?? 'max-w-36 font-display text-lg font-semibold tabular-nums',
          )}
          onChange={(event) => {
            const next = event.target.value;
            setTyped(next);
            onValue(next.trim() === '' ? null : (read(next) ?? Number.NaN));
          }}
          onBlur={(event) => {
            if (typed !== null && (typed.trim() === '' || read(typed) !== null)) setTyped(null);
            onBlur?.(event);
          }}
        />
        {unit && (
          <span id={`${id}-unit`} className="text-slate">
            {unit}
          </span>
        )}
      </span>
    </FieldFrame>
  );
}
