import { eggSize, type EggSizeName } from '#shared/contracts/kitchen-sheet.ts';
import { eggKeeping } from '#shared/kitchen/eggs/plan-eggs.ts';
import { eggSizes } from '#shared/kitchen/eggs/egg-sizes.ts';
import { dozenOunces } from '#shared/kitchen/eggs/egg-weights.ts';
import { Select } from '#web/components/ui/select.tsx';
import type { EggSearch } from '../search/egg-search.ts';

type Props = { readonly search: EggSearch; readonly onSearch: (search: EggSearch) => void };

const sizeNames: Readonly<Record<EggSizeName, string>> = {
  jumbo: 'Jumbo',
  'extra-large': 'Extra large',
  large: 'Large',
  medium: 'Medium',
};

const { leastDays, mostDays } = eggKeeping;
const dayChoices = Array.from({ length: mostDays - leastDays + 1 }, (_, at) => leastDays + at);

/** The size that is cracked, and how long loose parts are kept in this kitchen. */
export function EggFields({ search, onSearch }: Props) {
  const days = (key: 'whiteDays' | 'yolkDays', label: string) => (
    <Select
      label={label}
      value={search[key]}
      onChange={({ target: { value } }) => onSearch({ ...search, [key]: Number(value) })}
    >
      {dayChoices.map((it) => (
        <option key={it} value={it}>
          {it} days
        </option>
      ))}
    </Select>
  );
  return (
    <div className="flex flex-wrap items-end gap-x-5 gap-y-3">
      <Select
        label="Eggs"
        value={search.size}
        onChange={({ target: { value } }) => {
          const size = eggSize.safeParse(value);
          if (size.success) onSearch({ ...search, size: size.data });
        }}
      >
        {eggSizes.map((it) => (
          <option key={it} value={it}>
            {sizeNames[it]}, {dozenOunces[it]} oz a dozen
          </option>
        ))}
      </Select>
      {days('whiteDays', 'Loose whites keep')}
      {days('yolkDays', 'Loose yolks keep')}
    </div>
  );
}
