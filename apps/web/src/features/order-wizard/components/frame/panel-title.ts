import type { Design } from '#shared/contracts/design.ts';
import { formatDay } from '#shared/dates/format.ts';
import type { OrderForm } from '../../draft/empty-order.ts';

/** "For 70, on Saturday 19 June", as far as it is known. */
export function panelTitle(values: OrderForm, design: Design | null): string {
  const { date } = values.day;
  if (design === null) return date === null ? 'Your cake' : `For ${formatDay(date)}`;
  const people = `For ${design.guests.headCount.toLocaleString('en-US')}`;
  return date === null ? people : `${people}, on ${formatDay(date)}`;
}
