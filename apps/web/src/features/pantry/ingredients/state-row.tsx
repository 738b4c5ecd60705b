import { type ReactNode, useId } from 'react';
import { FieldError } from '#web/components/ui/field-frame.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { fieldId } from '#web/lib/forms.ts';

type Props<V extends string> = {
  readonly legend: ReactNode;
  readonly value: V;
  readonly options: readonly {
    readonly value: V;
    readonly label: string;
    readonly stop?: boolean;
  }[];
  readonly onValue: (value: V) => void;
  /** The field's path, so that the error summary can come here. */
  readonly name?: string;
  readonly error?: string | undefined;
  readonly children?: ReactNode;
};

/** One row of a label's table: what it is about, and one word of a few. */
export function StateRow<V extends string>({
  legend,
  value,
  options,
  onValue,
  name,
  error,
  children,
}: Props<V>) {
  const group = useId();
  return (
    <fieldset
      id={name === undefined ? undefined : fieldId(name)}
      tabIndex={name === undefined ? undefined : -1}
      aria-describedby={error ? `${group}-error` : undefined}
      className="grid gap-x-4 gap-y-1 border-b border-seam py-2 sm:grid-cols-[minmax(9rem,1fr)_minmax(0,24rem)] sm:items-center"
    >
      <legend className="contents">
        <span className="min-w-0 font-semibold">{legend}</span>
      </legend>
      <div
        className="grid overflow-hidden rounded-action border-[1.5px] border-slate"
        style={{ gridTemplateColumns: `repeat(${options.length}, minmax(0, 1fr))` }}
      >
        {options.map((option, at) => (
          <label
            key={option.value}
            className={classNames(
              'flex min-h-11 cursor-pointer items-center justify-center px-1 py-1 text-center text-sm leading-tight select-none',
              'has-focus-visible:outline-3 has-focus-visible:-outline-offset-3 has-focus-visible:outline-cobalt',
              at > 0 && 'border-l border-seam',
              option.value !== value && 'text-slate hover:bg-cloud',
              option.value === value &&
                (option.stop
                  ? 'bg-berry-tint font-semibold text-berry'
                  : 'bg-cobalt-tint font-semibold text-cobalt'),
            )}
          >
            <input
              type="radio"
              name={group}
              value={option.value}
              checked={option.value === value}
              onChange={() => onValue(option.value)}
              className="sr-only"
            />
            {option.label}
          </label>
        ))}
      </div>
      {(children || error) && (
        <div className="grid gap-2 sm:col-span-2">
          <FieldError id={`${group}-error`} message={error} />
          {children}
        </div>
      )}
    </fieldset>
  );
}
