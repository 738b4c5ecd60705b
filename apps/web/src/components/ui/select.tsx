import { type ComponentProps, useId } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { fieldId } from '#web/lib/forms.ts';
import { FieldFrame, type FieldText, controlClasses, describedBy } from './field-frame.tsx';

type Props = Omit<ComponentProps<'select'>, 'id'> & FieldText;

/** One of a longer list, by the device's own picker. Takes what `register` gives. */
export function Select({ label, hint, error, optional, className, children, ...select }: Props) {
  const own = useId();
  const id = select.name === undefined ? own : fieldId(select.name);
  const text = { label, hint, error, optional };
  return (
    <FieldFrame id={id} {...text}>
      <span className={classNames('relative block', className)}>
        <select
          {...select}
          id={id}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, text)}
          className={controlClasses(error, 'appearance-none pr-10')}
        >
          {children}
        </select>
        <svg
          viewBox="0 0 12 8"
          className="pointer-events-none absolute top-1/2 right-3.5 w-3 -translate-y-1/2 text-cobalt"
          aria-hidden="true"
        >
          <path
            d="M1 1.5l5 5 5-5"
            fill="none"
            stroke="currentColor"
            strokeWidth="2"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </svg>
      </span>
    </FieldFrame>
  );
}
