import { useState } from 'react';
import type { Declaration } from '#shared/contracts/design.ts';
import { severities, type AllergenId } from '#shared/contracts/vocabulary.ts';
import {
  allergenName,
  declarableAllergens,
  declarableSpecies,
  speciesName,
  spelledFor,
} from '#shared/kitchen/allergen-names.ts';
import { isAbout, isListed } from '#shared/kitchen/clashes.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Button } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { declaredName } from '../../design/contains.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { severityWords } from './severity-words.ts';

const ownWords = 'own-words';

type Props = {
  readonly at: number;
  readonly row: Declaration;
  readonly onChange: (row: Declaration) => void;
  readonly onRemove: () => void;
};

/** One thing guests keep from: what, how serious it is, how many of them. */
export function AllergyRow({ at, row, onChange, onRemove }: Props) {
  const { menu } = useWizard();
  const region = menu.studio.labelRegion;
  const path = `day.allergies.${at}`;
  const textProblem = useProblemAt(`${path}.text`);
  const [inWords, setInWords] = useState(row.text !== '');
  const own = row.allergen === null && (inWords || row.text !== '');
  const open = row.allergen === null && !own;
  const guestsProblem = useProblemAt(`${path}.guests`);
  const allergens = declarableAllergens(region);
  const handled = isListed(row) && menu.studio.handles.some((it) => isAbout(it, row));
  const species = row.allergen === null ? [] : declarableSpecies(row.allergen, region);

  const chooseAllergen = (value: string) => {
    const allergen: AllergenId | null = allergens.find((id) => id === value) ?? null;
    setInWords(value === ownWords);
    onChange({ ...row, allergen, species: null });
  };

  return (
    <li className="grid gap-4 border-l-2 border-cobalt pl-4">
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          // While nothing is chosen, what is missing is missing here.
          name={open ? `${path}.text` : `${path}.allergen`}
          label="What is it?"
          error={open ? textProblem : undefined}
          value={open ? '' : (row.allergen ?? ownWords)}
          onChange={(event) => chooseAllergen(event.target.value)}
        >
          {open && <option value="">Choose one</option>}
          {allergens.map((id) => (
            <option key={id} value={id}>
              {capitalise(allergenName(id, region))}
            </option>
          ))}
          <option value={ownWords}>Something else, in my words</option>
        </Select>
        {species.length > 0 && (
          <Select
            name={`${path}.species`}
            label="Which of them?"
            value={row.species ?? ''}
            onChange={(event) => onChange({ ...row, species: event.target.value || null })}
          >
            <option value="">Any of them</option>
            {species.map((id) => (
              <option key={id} value={id}>
                {capitalise(speciesName(id))}
              </option>
            ))}
          </Select>
        )}
        {own && (
          <TextField
            name={`${path}.text`}
            label="Your words"
            hint="A baker reads this and answers before anything is agreed."
            maxLength={200}
            error={textProblem}
            value={row.text}
            onChange={(event) => onChange({ ...row, text: event.target.value })}
          />
        )}
        <Select
          name={`${path}.severity`}
          label="How serious is it?"
          value={row.severity}
          onChange={(event) => {
            const severity = severities.find((it) => it === event.target.value);
            if (severity !== undefined) onChange({ ...row, severity });
          }}
        >
          {severities.map((id) => (
            <option key={id} value={id}>
              {spelledFor(region, severityWords[id])}
            </option>
          ))}
        </Select>
        <NumberField
          name={`${path}.guests`}
          label="For how many guests?"
          error={guestsProblem}
          value={row.guests}
          onValue={(value) => onChange({ ...row, guests: value ?? Number.NaN })}
        />
      </div>
      {(row.allergen !== null || row.text.trim() !== '') && (
        <p className="measure text-sm">
          {handled && (
            <strong>
              We handle {declaredName(row, region)} in this kitchen, so traces can get into any
              cake.{' '}
            </strong>
          )}
          A baker reads this before anything is promised, and talks it over with you wherever it
          needs it.
        </p>
      )}
      <div>
        <Button kind="quiet" className="-ml-2" onClick={onRemove}>
          Take this one out
        </Button>
      </div>
    </li>
  );
}
