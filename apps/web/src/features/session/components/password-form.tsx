import { type SessionView, signInWithPassword } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useSignInWithPassword } from '../api/sign-in-with-password.ts';

/** Staff sign in by e-mail and password. */
export function PasswordForm({
  onEntered,
}: {
  readonly onEntered: (session: SessionView) => void;
}) {
  const { form, failure, submit } = useContractForm(signInWithPassword, {
    email: '',
    password: '',
  });
  const { mutateAsync, isPending } = useSignInWithPassword();
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={submit(async (values) => onEntered(await mutateAsync(values)))}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('email')}
        label="E-mail address"
        type="email"
        autoComplete="username"
        inputMode="email"
        error={errorOf(errors, 'email')}
      />
      <TextField
        {...form.register('password')}
        label="Password"
        type="password"
        autoComplete="current-password"
        error={errorOf(errors, 'password')}
      />
      <div>
        <Button type="submit" pending={isPending}>
          Sign in
        </Button>
      </div>
    </form>
  );
}
