import { requestPasswordReset } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useRequestPasswordReset } from '../api/request-password-reset.ts';

/** Staff ask for a link to set a new password. */
export function ForgottenPasswordForm() {
  const { form, failure, submit } = useContractForm(requestPasswordReset, { email: '' });
  const { mutateAsync, isPending, isSuccess, variables } = useRequestPasswordReset();
  if (isSuccess) {
    return (
      <Notice tone="leaf" title="Look in your mail" live="polite">
        <p>
          If <strong>{variables.email}</strong> belongs to somebody of the studio, a link to set a
          new password is on its way to it.
        </p>
      </Notice>
    );
  }
  return (
    <form noValidate className="grid gap-4" onSubmit={submit((values) => mutateAsync(values))}>
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('email')}
        label="Your e-mail address"
        type="email"
        autoComplete="username"
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
