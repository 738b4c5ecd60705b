import type { Menu } from '#shared/contracts/menu.ts';
import { allergenId, type AllergenId } from '#shared/contracts/vocabulary.ts';
import {
  allergenName,
  declarableAllergens,
  declarableSpecies,
  speciesName,
} from '#shared/kitchen/allergen-names.ts';
import { formatTemperature, parseTemperature } from '#shared/kitchen/measures.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { Button } from '#web/components/ui/button.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { noWish, type Wish } from './judge-part.ts';

type Props = {
  readonly menu: Menu;
  readonly wish: Wish;
  readonly onWish: (wish: Wish) => void;
};

/** A garden in summer, for whoever has no thermometer there: common practice, no source. */
const hotGardenC = 30;

/** What the whole menu is looked over for: an allergy, down to the kind, and a warm day. */
export function MenuWish({ menu, wish, onWish }: Props) {
  const { labelRegion, temperatureLead } = menu.studio;
  const { allergen, species, warmestC } = wish;
  const unreadable = warmestC !== null && Number.isNaN(warmestC);
  const kinds = allergen === null ? [] : declarableSpecies(allergen, labelRegion);
  const choose = (value: string): AllergenId | null => {
    const chosen = allergenId.safeParse(value);
    return chosen.success ? chosen.data : null;
  };
  return (
    <div
      data-print="no"
      className="flex flex-wrap items-end gap-x-6 gap-y-4 rounded-action bg-cloud p-4 sm:p-5"
    >
      <div className="min-w-56 flex-1 sm:max-w-72">
        <Select
          label="Somebody must not have"
          value={allergen ?? ''}
          onChange={(event) =>
            onWish({ ...wish, allergen: choose(event.target.value), species: null })
          }
        >
          <option value="">nothing in particular</option>
          {declarableAllergens(labelRegion).map((it) => (
            <option key={it} value={it}>
              {allergenName(it, labelRegion)}
            </option>
          ))}
        </Select>
      </div>
      {kinds.length > 0 && (
        <div className="min-w-44">
          <Select
            label="Which of them?"
            value={species ?? ''}
            onChange={(event) => onWish({ ...wish, species: event.target.value || null })}
          >
            <option value="">Any of them</option>
            {kinds.map((it) => (
              <option key={it} value={it}>
                {capitalise(speciesName(it))}
              </option>
            ))}
          </Select>
        </div>
      )}
      <NumberField
        label="The warmest it will get"
        hint={temperatureLead === 'F' ? '“77”, or “25 C”' : '“25”, or “77 F”'}
        inputMode="text"
        value={warmestC}
        onValue={(value) => onWish({ ...wish, warmestC: value })}
        read={(text) => parseTemperature(text, temperatureLead)}
        write={(value) => formatTemperature(value, temperatureLead)}
        error={
          unreadable ? `Write degrees, like ${temperatureLead === 'F' ? '77' : '25'}.` : undefined
        }
        className="max-w-44 tabular-nums"
      />
      <div className="flex flex-wrap gap-2">
        <Button kind="secondary" onClick={() => onWish({ ...wish, warmestC: hotGardenC })}>
          A hot garden
        </Button>
        {(allergen !== null || warmestC !== null) && (
          <Button kind="quiet" onClick={() => onWish(noWish)}>
            Show everything
          </Button>
        )}
      </div>
    </div>
  );
}
