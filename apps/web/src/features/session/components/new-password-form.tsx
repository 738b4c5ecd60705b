import { resetPassword } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useResetPassword } from '../api/reset-password.ts';

/** Sets a new password with the link from the e-mail. */
export function NewPasswordForm({
  token,
  onDone,
}: {
  readonly token: string;
  readonly onDone: () => void;
}) {
  const { form, failure, submit } = useContractForm(resetPassword, { token, password: '' });
  const { mutateAsync, isPending } = useResetPassword();
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={submit(async (values) => {
        await mutateAsync(values);
        onDone();
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('password')}
        label="Your new password"
        hint="At least 15 characters; a few plain words do well. No other rules."
        type="password"
        autoComplete="new-password"
        error={errorOf(form.formState.errors, 'password')}
      />
      <div>
        <Button type="submit" pending={isPending}>
          Set the password
        </Button>
      </div>
    </form>
  );
}
