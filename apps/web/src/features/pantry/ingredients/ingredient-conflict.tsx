import type { IngredientDraft } from '#shared/contracts/pantry.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { type DraftField, differingFields } from './ingredient-form.ts';
import {
  eggPartWords,
  factWords,
  familyWords,
  measureWords,
  stateWords,
} from './ingredient-words.ts';

type Props = {
  readonly base: IngredientDraft;
  readonly theirs: IngredientDraft;
  readonly mine: IngredientDraft;
  readonly region: LabelRegion;
  readonly locale: string;
  readonly currency: string;
  readonly onJoin: () => void;
  readonly onTheirs: () => void;
  readonly onClose: () => void;
};

/** Somebody saved this ingredient meanwhile: both side by side, and nothing lost either way. */
export function IngredientConflict(props: Props) {
  const { base, theirs, mine, onJoin, onTheirs, onClose } = props;
  const fields = differingFields(theirs, mine);
  const changed = (draft: IngredientDraft, field: DraftField) =>
    differingFields(base, draft).includes(field);
  const say = (draft: IngredientDraft, field: DraftField) => inWords(draft, field, props);
  return (
    <Dialog open wide onClose={onClose} title="Somebody changed this meanwhile">
      <div className="overflow-x-auto">
        <table className="w-full border-collapse">
          <caption className="sr-only">Where the two differ</caption>
          <thead className="text-left text-sm text-slate">
            <tr>
              <th scope="col" className="py-2 pr-3 font-semibold">
                What
              </th>
              <th scope="col" className="px-3 py-2 font-semibold">
                Saved now
              </th>
              <th scope="col" className="py-2 pl-3 font-semibold">
                Yours
              </th>
            </tr>
          </thead>
          <tbody>
            {fields.map((field) => (
              <tr key={field} className="border-t border-seam align-top">
                <th scope="row" className="py-2 pr-3 text-left font-semibold">
                  {fieldWords[field]}
                </th>
                <td className="px-3 py-2">
                  {say(theirs, field)}
                  {changed(theirs, field) && <Mark />}
                </td>
                <td className="py-2 pl-3">
                  {say(mine, field)}
                  {changed(mine, field) && <Mark />}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="measure text-slate">
        Together: what only one of you changed stays changed; where both did, yours stands. Nothing
        is saved until you save.
      </p>
      <DialogActions>
        <Button onClick={onJoin}>Take both together</Button>
        <Button kind="secondary" onClick={onTheirs}>
          Drop mine
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Go on writing
        </Button>
      </DialogActions>
    </Dialog>
  );
}

function Mark() {
  return <span className="block text-sm font-semibold text-cobalt">changed</span>;
}

const fieldWords: Readonly<Record<DraftField, string>> = {
  ...factWords,
  name: 'Name',
  brand: 'Maker',
  labelName: 'Common name',
  labelContents: 'Made of',
  labelCheckedOn: 'Label read on',
  family: 'Family',
  pack: 'Pack and price',
  densityGPerMl: 'Density',
  roundingG: 'Weighed to',
  eggPart: 'Egg',
  pasteurised: 'Pasteurized',
  measures: 'Household measures',
  allergens: 'Allergens',
};

function inWords(
  draft: IngredientDraft,
  field: DraftField,
  { region, locale, currency }: Pick<Props, 'region' | 'locale' | 'currency'>,
): string {
  switch (field) {
    case 'family':
      return familyWords[draft.family];
    case 'pack':
      return draft.pack === null
        ? 'unknown'
        : `${draft.pack.grams} g for ${formatMoney(draft.pack.priceMinor, currency, locale)}`;
    case 'densityGPerMl':
      return draft.densityGPerMl === null ? 'none' : `${draft.densityGPerMl} g/mL`;
    case 'roundingG':
      return `${draft.roundingG} g`;
    case 'eggPart':
      return draft.eggPart === null ? 'not an egg' : eggPartWords[draft.eggPart];
    case 'measures':
      return (
        draft.measures
          .map(
            (it) =>
              `${measureWords[it.measure]}${it.qualifier === null ? '' : `, ${it.qualifier}`}: ${it.grams} g`,
          )
          .join('; ') || 'none'
      );
    case 'allergens':
      return (
        draft.allergens
          .map((it) => `${allergenLabel(it, region)}: ${stateWords[it.state]}`)
          .join('; ') || 'none named'
      );
    default:
      return draft[field] ?? 'none';
  }
}
