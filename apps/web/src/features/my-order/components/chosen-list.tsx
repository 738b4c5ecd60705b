import type { Menu } from '#shared/contracts/menu.ts';
import type { OrderView } from '#shared/contracts/orders.ts';
import { allergenName, speciesName } from '#shared/kitchen/allergen-names.ts';
import { chosenRows } from '#shared/kitchen/chosen-words.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { settingWords } from '#web/components/order/setting-words.ts';
import { DataList, type DataRow } from '#web/components/ui/data-list.tsx';

/** What was asked for, to be read over beside the drawing. */
export function ChosenList({ order, menu }: { readonly order: OrderView; readonly menu: Menu }) {
  const { guests, setting, look } = order.design;
  const region = menu.studio.labelRegion;
  const rows: (DataRow | null)[] = [
    {
      key: 'guests',
      label: 'For',
      value: `${guests.headCount} people, ${(menu.occasions.find((it) => it.id === guests.occasionId)?.name ?? '').toLowerCase()}`,
    },
    guests.allergies.length === 0
      ? null
      : {
          key: 'allergies',
          label: 'Allergies you told us',
          value: guests.allergies
            .map((it) => {
              const named =
                it.allergen === null
                  ? it.text
                  : it.species === null
                    ? allergenName(it.allergen, region)
                    : speciesName(it.species);
              return `${capitalise(named)} (${it.guests} ${it.guests === 1 ? 'guest' : 'guests'})`;
            })
            .join(', '),
        },
    setting === null
      ? null
      : {
          key: 'setting',
          label: 'Where it stands',
          value: settingWords(setting, menu.studio),
        },
    ...chosenRows(order.design, menu).map((it) => ({ key: it.label, ...it })),
    look === null || look.note === ''
      ? null
      : {
          key: 'note',
          label: 'Your note',
          value: <span className="whitespace-pre-line">{look.note}</span>,
        },
    {
      key: 'collects',
      label: 'Who collects',
      value: order.collector?.name ?? order.orderedBy.name,
    },
    {
      key: 'photos',
      label: 'Showing photos of it',
      value: order.showPhotos ? 'You allow it' : 'Not without asking you',
    },
  ];
  return <DataList rows={rows.filter((it) => it !== null)} />;
}
