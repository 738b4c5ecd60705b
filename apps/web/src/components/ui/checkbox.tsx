import { type ComponentProps, type ReactNode, useId } from 'react';
import { fieldId } from '#web/lib/forms.ts';
import { FieldError } from './field-frame.tsx';

type Props = Omit<ComponentProps<'input'>, 'id' | 'type'> & {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
};

/** Yes or no. Takes what react-hook-form's `register` gives. */
export function Checkbox({ label, hint, error, className, ...input }: Props) {
  const own = useId();
  const id = input.name === undefined ? own : fieldId(input.name);
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : '']
    .filter((it) => it !== '')
    .join(' ');
  return (
    <div className={className}>
      <FieldError id={`${id}-error`} message={error} />
      <div className="grid grid-cols-[auto_1fr] gap-x-3">
        <span className="relative mt-2.5 size-6">
          <input
            {...input}
            id={id}
            type="checkbox"
            aria-invalid={error ? true : undefined}
            aria-describedby={described || undefined}
            className="peer block size-6 appearance-none rounded-mark border-[1.8px] border-slate bg-enamel checked:border-cobalt checked:bg-cobalt aria-invalid:border-2 aria-invalid:border-berry"
          />
          <svg
            viewBox="0 0 24 24"
            className="pointer-events-none absolute inset-0 size-6 text-enamel opacity-0 peer-checked:opacity-100"
            aria-hidden="true"
          >
            <path
              d="M6.5 12.5l3.8 3.8 7.4-8"
              fill="none"
              stroke="currentColor"
              strokeWidth="2.4"
              strokeLinecap="round"
              strokeLinejoin="round"
            />
          </svg>
        </span>
        <label htmlFor={id} className="flex min-h-11 cursor-pointer items-center py-2">
          <span className="leading-snug">{label}</span>
        </label>
        {hint && (
          <p id={`${id}-hint`} className="col-start-2 -mt-1 text-sm text-slate">
            {hint}
          </p>
        )}
      </div>
    </div>
  );
}
