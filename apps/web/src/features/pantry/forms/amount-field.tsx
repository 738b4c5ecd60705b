import { type ComponentProps, useId } from 'react';
import {
  FieldFrame,
  type FieldText,
  controlClasses,
  describedBy,
} from '#web/components/ui/field-frame.tsx';
import { fieldId } from '#web/lib/forms.ts';

type Props = Omit<ComponentProps<'input'>, 'id' | 'placeholder' | 'value' | 'onChange' | 'type'> &
  FieldText & {
    /** As typed; whoever owns the form reads it. */
    readonly value: string;
    readonly onText: (text: string) => void;
    /** Stands after the box: "g", "per pack". */
    readonly unit?: string;
  };

/** An amount, kept as it is typed until the form is read. */
export function AmountField({
  label,
  hint,
  error,
  optional,
  value,
  onText,
  unit,
  className,
  ...input
}: Props) {
  const own = useId();
  const id = input.name === undefined ? own : fieldId(input.name);
  const text = { label, hint, error, optional };
  return (
    <FieldFrame id={id} {...text}>
      <span className="flex items-center gap-2">
        <input
          autoComplete="off"
          inputMode="decimal"
          {...input}
          id={id}
          type="text"
          value={value}
          aria-invalid={error ? true : undefined}
          aria-describedby={
            [describedBy(id, text), unit ? `${id}-unit` : undefined].filter(Boolean).join(' ') ||
            undefined
          }
          className={controlClasses(error, className ?? 'max-w-32 tabular-nums')}
          onChange={(event) => onText(event.target.value)}
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
