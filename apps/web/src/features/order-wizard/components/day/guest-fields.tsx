import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** How many, for what, and how large a slice. */
export function GuestFields() {
  const { menu } = useWizard();
  const headCount = useAnswer('day.headCount');
  const occasion = useAnswer('day.occasionId');
  const portion = useAnswer('day.portionSizeId');
  const otherDesserts = useAnswer('day.otherDesserts');
  const chosen = menu.portionSizes.find((it) => it.id === portion.value);
  return (
    <div className="grid gap-6">
      <NumberField
        name={headCount.name}
        label="Number of people"
        hint="Everybody who gets a slice, children too."
        unit="people"
        error={headCount.error}
        value={headCount.value}
        onValue={(value) => headCount.onValue(value ?? Number.NaN)}
      />
      <ChipChoice
        name={occasion.name}
        legend="What is the occasion?"
        error={occasion.error}
        chips={menu.occasions.map((it) => ({ value: it.id, label: it.name }))}
        value={occasion.value}
        onValue={occasion.onValue}
      />
      <ChipChoice
        name={portion.name}
        legend="How large is a slice?"
        hint={chosen?.blurb}
        chips={menu.portionSizes.map((it) => ({ value: it.id, label: it.name }))}
        value={portion.value}
        onValue={portion.onValue}
      />
      <Checkbox
        name={otherDesserts.name}
        label="There are other desserts too"
        hint="Then fewer take cake, and a smaller one will do."
        checked={otherDesserts.value}
        onChange={(event) => otherDesserts.onValue(event.target.checked)}
      />
    </div>
  );
}
