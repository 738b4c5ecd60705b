import type { Declaration } from '#shared/contracts/design.ts';
import { dietIds } from '#shared/contracts/vocabulary.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { fieldId } from '#web/lib/forms.ts';
import { dietWords } from '../../design/contains.ts';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { AllergyRow } from './allergy-row.tsx';

const mostRows = 20;

const blank: Declaration = {
  allergen: 'milk',
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
        <ul className="grid gap-5">
          {day.allergies.map((row, at) => (
            <AllergyRow
              // Rows have no name of their own, and are only added at the end.
              key={at}
              at={at}
              row={row}
              onChange={(next) => setRows(day.allergies.map((it, i) => (i === at ? next : it)))}
              onRemove={() =>
                setRows(
                  day.allergies.filter((_, i) => i !== at),
                  'Allergy taken out.',
                )
              }
            />
          ))}
        </ul>
      )}
      {day.allergies.length < mostRows ? (
        <div>
          <Button
            kind="secondary"
            onClick={() => {
              setRows([...day.allergies, blank]);
              focusRow(day.allergies.length);
            }}
          >
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
          label="Somebody pregnant, very young, elderly or with weak defences will eat it"
          hint="Then eggs that are not cooked through matter more."
          checked={susceptible.value}
          onChange={(event) => susceptible.onValue(event.target.checked)}
        />
      </div>
    </section>
  );
}

/** Moves to the first question of a new row once it is drawn. */
function focusRow(at: number): void {
  requestAnimationFrame(() => {
    document.getElementById(fieldId(`day.allergies.${at}.allergen`))?.focus();
  });
}
