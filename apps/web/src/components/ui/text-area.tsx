import { type ComponentProps, useId } from 'react';
import { fieldId } from '#web/lib/forms.ts';
import { FieldFrame, type FieldText, controlClasses, describedBy } from './field-frame.tsx';

type Props = Omit<ComponentProps<'textarea'>, 'id' | 'placeholder'> & FieldText;

/** Several lines of text. Takes what react-hook-form's `register` gives. */
export function TextArea({ label, hint, error, optional, className, rows = 4, ...area }: Props) {
  const own = useId();
  const id = area.name === undefined ? own : fieldId(area.name);
  const text = { label, hint, error, optional };
  return (
    <FieldFrame id={id} {...text}>
      <textarea
        {...area}
        rows={rows}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, text)}
        className={controlClasses(error, className)}
      />
    </FieldFrame>
  );
}
