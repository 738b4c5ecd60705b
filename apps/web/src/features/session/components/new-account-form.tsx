import { type SessionView, acceptInvitation } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useAcceptInvitation } from '../api/accept-invitation.ts';

type Props = {
  readonly token: string;
  /** The first owner's link was sent to no address, so the form asks for one. */
  readonly asksEmail: boolean;
  /** As the invitation has it; theirs to change. */
  readonly name: string;
  readonly onEntered: (session: SessionView) => void;
};

/** A member of staff makes their account from an invitation. */
export function NewAccountForm({ token, asksEmail, name, onEntered }: Props) {
  const { form, failure, submit } = useContractForm(acceptInvitation, {
    token,
    name,
    password: '',
    ...(asksEmail ? { email: '' } : {}),
  });
  const { mutateAsync, isPending } = useAcceptInvitation();
  const { errors } = form.formState;
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={submit(async (values) => onEntered(await mutateAsync(values)))}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('name')}
        label="Your name"
        autoComplete="name"
        error={errorOf(errors, 'name')}
      />
      {asksEmail && (
        <TextField
          {...form.register('email')}
          label="Your e-mail address"
          hint="You sign in with it."
          type="email"
          autoComplete="username"
          inputMode="email"
          error={errorOf(errors, 'email')}
        />
      )}
      <TextField
        {...form.register('password')}
        label="A password"
        hint="At least 15 characters; a few plain words do well. No other rules."
        type="password"
        autoComplete="new-password"
        error={errorOf(errors, 'password')}
      />
      <div>
        <Button type="submit" pending={isPending}>
          Make my account
        </Button>
      </div>
    </form>
  );
}
