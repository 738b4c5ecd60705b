import { queryOptions, useQuery } from '@tanstack/react-query';
import { orderLabels } from '#shared/contracts/cards.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** What the labels of an order will say, and what keeps them from being printed. */
export function labelsQuery(number: number) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'labels'],
    queryFn: ({ signal }) =>
      request({ path: `/api/staff/orders/${number}/labels`, answer: orderLabels, signal }),
  });
}

export function useLabels(number: number) {
  return useQuery(labelsQuery(number));
}
