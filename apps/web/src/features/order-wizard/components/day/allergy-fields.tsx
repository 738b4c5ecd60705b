import { Suspense, lazy } from 'react';
import type { Declaration } from '#shared/contracts/design.ts';
import { dietIds } from '#shared/contracts/vocabulary.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { dietWords } from '../../design/diet-words.ts';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** Most orders have none, so the questions about them load when one is added. */
const AllergyRows = lazy(async () => ({
  default: (await import('./allergy-rows.tsx')).AllergyRows,
}));

const mostRows = 20;

/** Nothing is chosen for anybody: a guest's allergy must never be one that was left standing. */
const blank: Declaration = {
  allergen: null,
  species: null,
  text: '',
  severity: 'allergy',
  guests: 1,
};

/** What guests must keep from, before anything is chosen that would have to be unchosen. */
export function AllergyFields() {
  const { values, change } = useWizard();
  const { day } = values;
  const diets = useAnswer('day.diets');
  const dietNote = useAnswer('day.dietNote');
  const infants = useAnswer('day.infants');
  const susceptible = useAnswer('day.susceptible');

  const setRows = (allergies: Declaration[], undo?: string) =>
    change({ day: { ...day, allergies } }, undo);

  return (
    <section className="grid gap-5" aria-labelledby="allergies-heading">
      <div className="grid gap-1">
        <h2 id="allergies-heading">Allergies and diets</h2>
        <p className="measure text-slate">
          Tell us now, and every choice that follows says what it contains. If nobody has any, go on
          to the day.
        </p>
      </div>

      {day.allergies.length > 0 && (
        <Suspense fallback={<Pending what="One moment…" />}>
          <AllergyRows rows={day.allergies} onRows={setRows} />
        </Suspense>
      )}
      {day.allergies.length < mostRows ? (
        <div>
          <Button kind="secondary" onClick={() => setRows([...day.allergies, blank])}>
            {day.allergies.length === 0 ? 'Add an allergy' : 'Add another'}
          </Button>
        </div>
      ) : (
        <p className="text-slate">For more than twenty, please write to us.</p>
      )}

      <ChipChoices
        name={diets.name}
        legend="Diets at the table"
        hint="Any that apply."
        chips={dietIds.map((id) => ({ value: id, label: capitalise(dietWords[id]) }))}
        value={diets.value}
        onValue={diets.onValue}
      />
      <TextField
        name={dietNote.name}
        label="Anything more about what your guests eat"
        optional
        maxLength={300}
        error={dietNote.error}
        value={dietNote.value}
        onChange={(event) => dietNote.onValue(event.target.value)}
      />
      <div className="grid gap-1">
        <Checkbox
          name={infants.name}
          label="A baby under twelve months will eat with you"
          hint="Honey is not for them."
          checked={infants.value}
          onChange={(event) => infants.onValue(event.target.checked)}
        />
        <Checkbox
          name={susceptible.name}
          label="Somebody pregnant, very young, elderly or with weak defenses will eat it"
          hint="Then eggs that are not cooked through matter more."
          checked={susceptible.value}
          onChange={(event) => susceptible.onValue(event.target.checked)}
        />
      </div>
    </section>
  );
}
