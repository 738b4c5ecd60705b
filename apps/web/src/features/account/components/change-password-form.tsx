import { changePassword } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useChangePassword } from '../api/change-password.ts';

/** Staff change their own password. */
export function ChangePasswordForm() {
  const { form, failure, submit } = useContractForm(changePassword, {
    password: '',
    newPassword: '',
  });
  const { mutateAsync, isPending } = useChangePassword();
  const toast = useToast();
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="grid max-w-md gap-4"
      onSubmit={submit(async (values) => {
        await mutateAsync(values);
        form.reset();
        toast({ message: 'Your password is changed; your other sessions have ended.' });
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('password')}
        label="Your present password"
        type="password"
        autoComplete="current-password"
        error={errorOf(errors, 'password')}
      />
      <TextField
        {...form.register('newPassword')}
        label="A new one"
        hint="At least 15 characters; a few plain words do well. No other rules."
        type="password"
        autoComplete="new-password"
        error={errorOf(errors, 'newPassword')}
      />
      <div>
        <Button type="submit" kind="secondary" pending={isPending}>
          Change it
        </Button>
      </div>
    </form>
  );
}
