import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { PhotoGrid } from '#web/components/photos/photo-grid.tsx';
import { DataList } from '#web/components/ui/data-list.tsx';

type Props = { readonly handover: NonNullable<StaffOrder['handover']>; readonly menu: Menu };

/** Who took the cake, when, and how it looked. */
export function HandoverRecord({ handover, menu }: Props) {
  const { zone, locale } = menu.studio;
  return (
    <div className="grid gap-4">
      <DataList
        rows={[
          { key: 'who', label: 'Collected by', value: <strong>{handover.collectedBy}</strong> },
          { key: 'when', label: 'When', value: instantWords(handover.at, zone, locale) },
          {
            key: 'condition',
            label: 'How it looked',
            value: handover.condition === '' ? 'not noted' : handover.condition,
          },
          { key: 'by', label: 'Handed over by', value: handover.by },
        ]}
      />
      {handover.photo !== null && <PhotoGrid photos={[handover.photo]} />}
    </div>
  );
}
