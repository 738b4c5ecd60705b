import type { AllergenId, AllergenState, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergenStates } from './allergen-rows.ts';
import {
  allergenName,
  declarableAllergens,
  declarableSpecies,
  speciesName,
} from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Button } from '#web/components/ui/button.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { FieldError } from '#web/components/ui/field-frame.tsx';
import { fieldId, type FieldProblem } from '#web/lib/forms.ts';
import { problemAt } from '../forms/check-draft.ts';
import { type AllergenRow, nextKey } from './ingredient-form.ts';
import { StateRow } from './state-row.tsx';

type Props = {
  readonly rows: readonly AllergenRow[];
  /** What an allergen is that has no row: unknown on an unread label, else not declared. */
  readonly unnamed: AllergenState;
  readonly region: LabelRegion;
  readonly problems: readonly FieldProblem[];
  readonly onRows: (rows: AllergenRow[]) => void;
};

/** The law's list beside what the label says of each; species where the law wants them named. */
export function AllergenTable({ rows, unnamed, region, problems, onRows }: Props) {
  const change = (key: number, patch: Partial<AllergenRow>) =>
    onRows(rows.map((it) => (it.key === key ? { ...it, ...patch } : it)));
  const add = (allergen: AllergenId, state: AllergenState) =>
    onRows([...rows, { key: nextKey(rows), allergen, species: [], state }]);
  return (
    <div id={fieldId('allergens')} tabIndex={-1} className="border-t border-seam">
      <FieldError id="allergens-error" message={problemAt(problems, 'allergens')} />
      {declarableAllergens(region).map((allergen) => {
        const own = rows.filter((it) => it.allergen === allergen);
        const species = speciesFor(allergen, region, own);
        const name = capitalise(allergenName(allergen, region));
        if (own.length === 0) {
          return (
            <StateRow
              key={allergen}
              legend={name}
              value={unnamed}
              options={allergenStates}
              onValue={(state) => add(allergen, state)}
            />
          );
        }
        return own.map((row, at) => (
          <StateRow
            key={row.key}
            legend={at === 0 ? name : `${name}, others`}
            value={row.state}
            name={`allergens.${rows.indexOf(row)}`}
            error={rowProblem(problems, rows.indexOf(row))}
            options={allergenStates}
            onValue={(state) => change(row.key, { state })}
          >
            {species.length > 0 && row.state !== 'not-declared' && (
              <>
                <ChipChoices
                  legend={<span className="text-sm text-slate">Which of them</span>}
                  hint={
                    row.species.length === 0 ? 'None chosen: it may be any of them.' : undefined
                  }
                  value={row.species}
                  onValue={(value) => change(row.key, { species: value })}
                  chips={species.map((it) => ({ value: it, label: speciesName(it) }))}
                />
                <div className="flex flex-wrap gap-2">
                  {at === own.length - 1 && row.species.length > 0 && (
                    <Button kind="quiet" onClick={() => add(allergen, 'may-contain')}>
                      Say something else of others
                    </Button>
                  )}
                  {own.length > 1 && (
                    <Button
                      kind="quiet"
                      onClick={() => onRows(rows.filter((it) => it.key !== row.key))}
                    >
                      Take this row away
                    </Button>
                  )}
                </div>
              </>
            )}
          </StateRow>
        ));
      })}
    </div>
  );
}

/** What is wrong with a row, in any part of it. */
function rowProblem(problems: readonly FieldProblem[], at: number): string | undefined {
  return problems.find(({ name }) => /^allergens\.(\d+)/.exec(name)?.[1] === String(at))?.message;
}

/** The region's species, and any other a row already names. */
function speciesFor(
  allergen: AllergenId,
  region: LabelRegion,
  rows: readonly AllergenRow[],
): readonly string[] {
  const listed = declarableSpecies(allergen, region);
  return [...new Set([...listed, ...rows.flatMap((it) => it.species)])];
}
