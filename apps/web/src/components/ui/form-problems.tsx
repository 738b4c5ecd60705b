import type { FieldErrors, FieldValues, UseFormReturn } from 'react-hook-form';
import { listFieldProblems } from '#web/lib/forms.ts';
import { Failure } from './failure.tsx';
import { FormErrorSummary } from './form-error-summary.tsx';

type Props<In extends FieldValues, Out> = {
  readonly form: UseFormReturn<In, unknown, Out>;
  /** What went wrong that belongs to no field. */
  readonly failure: unknown;
};

/** The top of a form: what to look at again, and what went wrong with sending. */
export function FormProblems<In extends FieldValues, Out>({ form, failure }: Props<In, Out>) {
  const { errors, submitCount } = form.formState;
  return (
    <>
      <FormErrorSummary problems={listFieldProblems(errors)} attempt={submitCount} />
      {failure !== null && <Failure error={failure} />}
    </>
  );
}

/** A field's message, for its `error`. */
export function errorOf<T extends FieldValues>(
  errors: FieldErrors<T>,
  name: string,
): string | undefined {
  return listFieldProblems(errors).find((it) => it.name === name)?.message;
}
