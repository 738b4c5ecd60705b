import { requestSignInLink } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useRequestSignInLink } from '../api/request-sign-in-link.ts';

/** Customers sign in by a one-time link in an e-mail. */
export function LinkForm({ next }: { readonly next: string }) {
  const { form, failure, submit } = useContractForm(requestSignInLink, { email: '', next });
  const { mutateAsync, isPending, isSuccess, variables, reset } = useRequestSignInLink();

  if (isSuccess) {
    return (
      <Notice tone="leaf" title="Look in your mail" live="polite">
        <p>
          If <strong>{variables.email}</strong> can sign in here, a link is on its way to it. It
          works once, for 15 minutes. Nothing there? Look among unwanted mail, or{' '}
          <button type="button" className="link" onClick={reset}>
            try another address
          </button>
          .
        </p>
      </Notice>
    );
  }
  return (
    <form noValidate className="grid gap-4" onSubmit={submit((values) => mutateAsync(values))}>
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('email')}
        label="E-mail address"
        hint="We send a link to it; no password needed."
        type="email"
        autoComplete="email"
        inputMode="email"
        error={errorOf(form.formState.errors, 'email')}
      />
      <div>
        <Button type="submit" pending={isPending}>
          Send me a link
        </Button>
      </div>
    </form>
  );
}
