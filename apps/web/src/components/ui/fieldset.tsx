import { type ReactNode, useId } from 'react';
import { fieldId } from '#web/lib/forms.ts';
import { FieldError } from './field-frame.tsx';

type Props = {
  readonly legend: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly optional?: boolean;
  /** The field's path, so that the error summary can come here. */
  readonly name?: string;
  /** A legend as large as a heading of its section. */
  readonly large?: boolean;
  readonly children: ReactNode;
};

/** Controls that answer one question together. */
export function Fieldset({ legend, hint, error, optional, name, large = false, children }: Props) {
  const own = useId();
  const id = name === undefined ? own : fieldId(name);
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : '']
    .filter((it) => it !== '')
    .join(' ');
  return (
    <fieldset
      id={id}
      tabIndex={-1}
      aria-describedby={described || undefined}
      className="grid min-w-0 gap-2"
    >
      <legend className={large ? 'mb-1 font-display text-xl font-semibold' : 'mb-1 font-semibold'}>
        {legend}
        {optional && <span className="font-normal text-slate"> (if you like)</span>}
      </legend>
      {hint && (
        <p id={`${id}-hint`} className="-mt-1 text-sm text-slate">
          {hint}
        </p>
      )}
      <FieldError id={`${id}-error`} message={error} />
      {children}
    </fieldset>
  );
}
