import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useAnswer } from '../../steps/use-answer.ts';
import { reachWords } from './reach-words.ts';

const reachChips = [
  { value: 'email', label: reachWords.email },
  { value: 'phone', label: reachWords.phone },
  { value: 'text', label: reachWords.text },
] as const;

/** Name, address, number; and somebody else where somebody else collects. */
export function ContactFields() {
  const name = useAnswer('you.name');
  const email = useAnswer('you.email');
  const phone = useAnswer('you.phone');
  const reachBy = useAnswer('you.reachBy');
  const otherCollects = useAnswer('you.otherCollects');
  const collectorName = useAnswer('you.collectorName');
  const collectorPhone = useAnswer('you.collectorPhone');
  return (
    <div className="grid gap-6 sm:max-w-lg">
      <TextField
        name={name.name}
        label="Your name"
        autoComplete="name"
        dir="auto"
        error={name.error}
        value={name.value}
        onChange={(event) => name.onValue(event.target.value)}
      />
      <TextField
        name={email.name}
        label="E-mail"
        hint="Your order’s own link goes there, and everything that follows."
        type="email"
        inputMode="email"
        autoComplete="email"
        autoCapitalize="none"
        spellCheck={false}
        error={email.error}
        value={email.value}
        onChange={(event) => email.onValue(event.target.value)}
      />
      <ChipChoice
        name={reachBy.name}
        legend="How may we reach you if something is unclear?"
        chips={reachChips}
        value={reachBy.value}
        onValue={reachBy.onValue}
      />
      <TextField
        name={phone.name}
        label="Telephone"
        optional={reachBy.value === 'email'}
        hint="For the day itself, too."
        type="tel"
        inputMode="tel"
        autoComplete="tel"
        error={phone.error}
        value={phone.value}
        onChange={(event) => phone.onValue(event.target.value)}
      />
      <Checkbox
        name={otherCollects.name}
        label="Somebody else collects the cake"
        checked={otherCollects.value}
        onChange={(event) => otherCollects.onValue(event.target.checked)}
      />
      {otherCollects.value && (
        <div className="grid gap-6 border-l-2 border-cobalt pl-4">
          <TextField
            name={collectorName.name}
            label="Who collects it"
            dir="auto"
            error={collectorName.error}
            value={collectorName.value}
            onChange={(event) => collectorName.onValue(event.target.value)}
          />
          <TextField
            name={collectorPhone.name}
            label="Their telephone"
            optional
            type="tel"
            inputMode="tel"
            error={collectorPhone.error}
            value={collectorPhone.value}
            onChange={(event) => collectorPhone.onValue(event.target.value)}
          />
        </div>
      )}
    </div>
  );
}
