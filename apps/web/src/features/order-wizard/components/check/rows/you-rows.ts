import type { OrderForm } from '../../../draft/empty-order.ts';
import { reachWords } from '../../you/reach-words.ts';
import type { CheckRow } from '../check-rows.tsx';

/** Who orders, who collects, what was agreed to. */
export function youRows({ you, consents, day }: OrderForm): CheckRow[] {
  const rows: CheckRow[] = [
    { label: 'Name', value: you.name, field: 'you.name' },
    { label: 'E-mail', value: you.email, field: 'you.email' },
    { label: 'Telephone', value: you.phone || 'None', field: 'you.phone' },
    { label: 'Reach you by', value: reachWords[you.reachBy], field: 'you.reachBy' },
    {
      label: 'Who collects',
      value: you.otherCollects
        ? [you.collectorName, you.collectorPhone].filter((it) => it !== '').join(', ')
        : 'You',
      field: 'you.otherCollects',
    },
    {
      label: 'Policies',
      value: consents.policies ? 'Read and agreed' : 'Not agreed',
      field: 'consents.policies',
    },
  ];
  if (day.allergies.length > 0) {
    rows.push({
      label: 'Keeping allergy data',
      value: consents.allergyData ? 'Allowed for this order' : 'Not allowed',
      field: 'consents.allergyData',
    });
  }
  rows.push({
    label: 'Showing photos',
    value: consents.showPhotos ? 'Allowed' : 'Not without asking you',
    field: 'consents.showPhotos',
  });
  return rows;
}
