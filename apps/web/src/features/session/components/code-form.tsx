import { type SecondFactorCode, secondFactorCode } from '#shared/contracts/accounts.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';

type Props = {
  readonly label: string;
  readonly hint: string;
  readonly action: string;
  readonly pending: boolean;
  readonly onCode: (code: SecondFactorCode) => Promise<unknown>;
};

/** Asks for a code of the authenticator. */
export function CodeForm({ label, hint, action, pending, onCode }: Props) {
  const { form, failure, submit } = useContractForm(secondFactorCode, { code: '' });
  return (
    <form noValidate className="grid gap-4" onSubmit={submit(onCode)}>
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('code')}
        label={label}
        hint={hint}
        autoComplete="one-time-code"
        spellCheck={false}
        className="max-w-64 font-display text-lg tabular-nums"
        error={errorOf(form.formState.errors, 'code')}
      />
      <div>
        <Button type="submit" pending={pending}>
          {action}
        </Button>
      </div>
    </form>
  );
}
