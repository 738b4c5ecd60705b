import { type ComponentProps, useId } from 'react';
import { fieldId } from '#web/lib/forms.ts';
import { FieldFrame, type FieldText, controlClasses, describedBy } from './field-frame.tsx';

type Props = Omit<ComponentProps<'input'>, 'id' | 'placeholder'> & FieldText;

/** One line of text. Takes what react-hook-form's `register` gives. */
export function TextField({ label, hint, error, optional, className, ...input }: Props) {
  const own = useId();
  const id = input.name === undefined ? own : fieldId(input.name);
  const text = { label, hint, error, optional };
  return (
    <FieldFrame id={id} {...text}>
      <input
        type="text"
        {...input}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, text)}
        className={controlClasses(error, className)}
      />
    </FieldFrame>
  );
}
