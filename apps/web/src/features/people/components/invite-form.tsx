import { inviteStaff } from '#shared/contracts/accounts.ts';
import { staffRoles } from '#shared/contracts/vocabulary.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { RadioGroup } from '#web/components/ui/radio-group.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useInviteStaff } from '../api/invite-staff.ts';
import { roleWords } from './role-words.ts';

/** Invites somebody; they choose their own password by the link in the e-mail. */
export function InviteForm() {
  const { form, failure, submit } = useContractForm(inviteStaff, {
    name: '',
    email: '',
    role: 'counter',
  });
  const { mutateAsync, isPending } = useInviteStaff();
  const toast = useToast();
  const { errors } = form.formState;
  const role = form.watch('role');
  return (
    <form
      noValidate
      className="grid max-w-xl gap-4"
      onSubmit={submit(async (values) => {
        await mutateAsync(values);
        form.reset();
        toast({ message: `An invitation is on its way to ${values.email}.` });
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('name')}
        label="Name"
        autoComplete="off"
        error={errorOf(errors, 'name')}
      />
      <TextField
        {...form.register('email')}
        label="E-mail address"
        hint="The invitation goes there; they sign in with it."
        type="email"
        inputMode="email"
        autoComplete="off"
        error={errorOf(errors, 'email')}
      />
      <RadioGroup
        legend="Role"
        name="role"
        value={role}
        onValue={(value) => form.setValue('role', value)}
        error={errorOf(errors, 'role')}
        rows={staffRoles.map((value) => ({
          value,
          label: roleWords[value].name,
          description: roleWords[value].may,
        }))}
      />
      <div>
        <Button type="submit" pending={isPending}>
          Send the invitation
        </Button>
      </div>
    </form>
  );
}
