import type { Menu } from '#shared/contracts/menu.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { allergyWords } from '#web/components/order/allergy-words.ts';
import { dietWords } from '../../../design/diet-words.ts';
import type { OrderForm } from '../../../draft/empty-order.ts';
import type { CheckRow } from '../check-rows.tsx';

/** Who eats and when, as it was told. */
export function dayRows({ day }: OrderForm, menu: Menu): CheckRow[] {
  const region = menu.studio.labelRegion;
  const occasion = menu.occasions.find((it) => it.id === day.occasionId)?.name ?? '';
  const portion = menu.portionSizes.find((it) => it.id === day.portionSizeId)?.name ?? '';
  const rows: CheckRow[] = [
    {
      label: 'Day',
      value: day.date === null ? 'Not chosen' : formatDay(day.date, { year: true }),
      field: 'day.date',
    },
    {
      label: 'Collect from',
      value: day.windowStart === null ? 'Not chosen' : formatTime(day.windowStart),
      field: 'day.windowStart',
    },
    { label: 'People', value: String(day.headCount), field: 'day.headCount' },
    { label: 'Occasion', value: occasion, field: 'day.occasionId' },
    {
      label: 'Slices',
      value: day.otherDesserts ? `${portion}, beside other desserts` : portion,
      field: 'day.portionSizeId',
    },
    ...day.allergies.map((it, at) => ({
      label: at === 0 ? 'Allergies' : 'and',
      value: allergyWords(it, region),
      field: `day.allergies.${at}.allergen`,
    })),
  ];
  if (day.allergies.length === 0) {
    rows.push({ label: 'Allergies', value: 'None told', field: 'day.diets' });
  }
  if (day.diets.length > 0 || day.dietNote.trim() !== '') {
    const diets = day.diets.map((it) => dietWords[it]).join(', ');
    rows.push({
      label: 'Diets',
      value: [capitalise(diets), day.dietNote.trim()].filter((it) => it !== '').join('. '),
      field: 'day.diets',
    });
  }
  if (day.infants || day.susceptible) {
    rows.push({
      label: 'At the table',
      value: [
        day.infants && 'A baby under twelve months',
        day.susceptible && 'Somebody for whom undercooked eggs matter more',
      ]
        .filter((it) => it !== false)
        .join('; '),
      field: 'day.infants',
    });
  }
  return rows;
}
