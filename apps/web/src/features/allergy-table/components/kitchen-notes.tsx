import { memo } from 'react';
import type { AllergyTable } from '#shared/contracts/allergy-table.ts';
import type { AllergenId, LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatDay } from '#shared/dates/format.ts';
import {
  allergenLabel,
  allergenName,
  declarableAllergens,
} from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { noteOn, withNote, type TableDraft } from '../draft/table-draft.ts';

type Props = {
  readonly kitchen: TableDraft['kitchen'];
  readonly fromLabels: AllergyTable['fromLabels'];
  readonly region: LabelRegion;
  readonly locale: string;
  readonly today: string;
  readonly onKitchen: (kitchen: TableDraft['kitchen']) => void;
};

/** What is handled here: from the labels by itself, and what the owner adds, with the assessment. */
export const KitchenNotes = memo(function KitchenNotes({ fromLabels, region, ...props }: Props) {
  return (
    <ul className="grid">
      {declarableAllergens(region).map((allergen) => (
        <KitchenRow
          key={allergen}
          allergen={allergen}
          region={region}
          bought={fromLabels.filter((it) => it.allergen === allergen)}
          {...props}
        />
      ))}
    </ul>
  );
});

type RowProps = Omit<Props, 'fromLabels'> & {
  readonly allergen: AllergenId;
  readonly bought: AllergyTable['fromLabels'];
};

function KitchenRow({ allergen, region, bought, kitchen, locale, today, onKitchen }: RowProps) {
  const note = noteOn({ kitchen }, allergen);
  const name = capitalise(allergenName(allergen, region));
  return (
    <li className="grid gap-x-8 gap-y-2 border-b border-seam py-4 lg:grid-cols-[16rem_1fr]">
      <div className="grid content-start gap-1">
        <h3 className="text-base">{name}</h3>
        {bought.length > 0 ? (
          <p className="text-sm">
            Handled: {bought.map((it) => allergenLabel(it, region)).join(', ')}, by the labels of
            what you buy.
          </p>
        ) : (
          <Checkbox
            label="Handled here all the same"
            checked={note.handled}
            onChange={(event) =>
              onKitchen(withNote(kitchen, { ...note, handled: event.target.checked }, today))
            }
          />
        )}
      </div>
      <TextArea
        label={`Risk assessment: ${name}`}
        hint={
          note.assessedOn === null
            ? undefined
            : `Noted ${formatDay(note.assessedOn, { locale, year: true, weekday: false })}.`
        }
        optional
        rows={2}
        maxLength={2000}
        value={note.assessment}
        onChange={(event) =>
          onKitchen(withNote(kitchen, { ...note, assessment: event.target.value }, today))
        }
      />
    </li>
  );
}
