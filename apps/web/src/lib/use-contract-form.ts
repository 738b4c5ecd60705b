import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import {
  type DefaultValues,
  type FieldPath,
  type FieldValues,
  type UseFormReturn,
  useForm,
} from 'react-hook-form';
import type * as z from 'zod/mini';
import { placeServerIssues } from './forms.ts';
import { ApiProblem } from './http.ts';

type Contract<In extends FieldValues, Out> = z.ZodMiniType<Out, In>;

export type ContractForm<In extends FieldValues, Out> = {
  readonly form: UseFormReturn<In, unknown, Out>;
  /** What went wrong with sending that belongs to no field. */
  readonly failure: unknown;
  /** A form's `onSubmit`: checks by the contract, sends, and puts what the server says in place. */
  readonly submit: (
    send: (values: Out) => Promise<unknown>,
  ) => (event?: React.BaseSyntheticEvent) => void;
};

/** A form of one contract: the same rules here and at the server, both on their fields. */
export function useContractForm<In extends FieldValues, Out>(
  contract: Contract<In, Out>,
  defaultValues: DefaultValues<In>,
): ContractForm<In, Out> {
  const [failure, setFailure] = useState<unknown>(null);
  const form = useForm<In, unknown, Out>({
    resolver: zodResolver(contract),
    defaultValues,
    // The summary takes the focus and leads to each field.
    shouldFocusError: false,
  });
  const knows = (path: string): path is FieldPath<In> => path !== '' && path in form.getValues();
  return {
    form,
    failure,
    submit: (send) => (event) => {
      setFailure(null);
      void form.handleSubmit(async (values) => {
        try {
          await send(values);
        } catch (error) {
          const homeless = placeServerIssues(error, form.setError, knows);
          const placed = error instanceof ApiProblem && error.issues.length > homeless.length;
          if (!placed) setFailure(error);
        }
      })(event);
    },
  };
}
