import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { formatList } from '#shared/dates/format.ts';
import { decorationWords } from '#shared/kitchen/chosen-words.ts';
import { CakeChoices } from '#web/components/order/cake-choices.tsx';
import { settingWords } from '#web/components/order/setting-words.ts';
import { Palette } from '#web/components/photos/palette.tsx';
import { DataList, type DataRow } from '#web/components/ui/data-list.tsx';

/** Everything that was chosen, from the top tier down, then the table it is for. */
export function OrderChoices({ order, menu }: { readonly order: StaffOrder; readonly menu: Menu }) {
  const { guests, cake, setting, look, extras } = order.design;
  const { estimate } = order;
  const whole = look?.decorations.filter((it) => it.tier === null) ?? [];
  const rows: (DataRow | false)[] = [
    whole.length > 0 && {
      key: 'whole',
      label: 'On the whole cake',
      value: whole.map((it) => decorationWords(it, menu)).join('; '),
    },
    look !== null &&
      look.palette.length > 0 && {
        key: 'palette',
        label: 'Colors',
        value: <Palette colours={look.palette} />,
      },
    look !== null &&
      look.note !== '' && {
        key: 'note',
        label: 'Their note',
        value: <span className="whitespace-pre-line">{look.note}</span>,
      },
    setting !== null && {
      key: 'setting',
      label: 'Where it stands',
      value: settingWords(setting, menu.studio),
    },
    {
      key: 'guests',
      label: 'Who eats it',
      value: [
        `${guests.headCount} people`,
        guests.otherDesserts ? 'other desserts too' : '',
        guests.infants ? 'infants under twelve months' : '',
        guests.susceptible ? 'pregnant, elderly or frail guests' : '',
      ]
        .filter((it) => it !== '')
        .join(', '),
    },
    (guests.diets.length > 0 || guests.dietNote !== '') && {
      key: 'diets',
      label: 'Diets',
      value: [formatList(guests.diets.map((it) => it.replaceAll('-', ' '))), guests.dietNote]
        .filter((it) => it !== '')
        .join(': '),
    },
    extras.length > 0 && {
      key: 'extras',
      label: 'Beside the cake',
      value: extras
        .map(
          (it) =>
            `${it.quantity} × ${menu.extras.find((known) => known.id === it.extraId)?.name ?? it.extraId}`,
        )
        .join(', '),
    },
    {
      key: 'portions',
      label: 'Portions',
      value: `${estimate.portions.fed} of ${estimate.portions.wanted} wanted, ${menu.portionSizes.find((it) => it.id === guests.portionSizeId)?.name.toLowerCase() ?? guests.portionSizeId}`,
    },
  ];
  return (
    <div className="grid gap-4">
      {cake !== null && (
        <CakeChoices
          cake={cake}
          look={look}
          menu={menu}
          perTier={estimate.portions.perTier}
          perCuttingCake={estimate.portions.perCuttingCake}
        />
      )}
      <DataList rows={rows.filter((it) => it !== false)} />
    </div>
  );
}
