import { queryOptions, useQuery } from '@tanstack/react-query';
import { orderCost } from '#shared/contracts/kitchen-sheet.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** What an order costs to make and leaves. */
export function orderCostQuery(number: number) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'cost'],
    queryFn: ({ signal }) =>
      request({ path: `/api/staff/orders/${number}/cost`, answer: orderCost, signal }),
  });
}

export function useOrderCost(number: number) {
  return useQuery(orderCostQuery(number));
}
