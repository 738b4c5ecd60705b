import { queryOptions, useQuery } from '@tanstack/react-query';
import { kitchenSheet } from '#shared/contracts/kitchen-sheet.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** What goes into an order. */
export function kitchenSheetQuery(number: number) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'kitchen'],
    queryFn: ({ signal }) =>
      request({ path: `/api/staff/orders/${number}/kitchen`, answer: kitchenSheet, signal }),
  });
}

export function useKitchenSheet(number: number) {
  return useQuery(kitchenSheetQuery(number));
}
