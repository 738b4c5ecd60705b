import { get, useController, useFormContext, useFormState } from 'react-hook-form';
import type { FieldPath, FieldPathValue } from 'react-hook-form';
import type { OrderForm } from '../draft/empty-order.ts';

export type Answer<Name extends FieldPath<OrderForm>> = {
  readonly name: Name;
  readonly value: FieldPathValue<OrderForm, Name>;
  readonly onValue: (value: FieldPathValue<OrderForm, Name>) => void;
  readonly error: string | undefined;
};

/** One answer of the form, for a control that shows and sets it. */
export function useAnswer<Name extends FieldPath<OrderForm>>(name: Name): Answer<Name> {
  const { field, fieldState } = useController<OrderForm, Name>({ name });
  return {
    name,
    value: field.value,
    onValue: field.onChange,
    error: fieldState.error?.message,
  };
}

/** What is wrong at a path of the form, for controls that change more than one answer. */
export function useProblemAt(path: string): string | undefined {
  const { control } = useFormContext<OrderForm>();
  const { errors } = useFormState({ control });
  const found: unknown = get(errors, path);
  return typeof found === 'object' && found !== null && 'message' in found
    ? String(found.message)
    : undefined;
}
