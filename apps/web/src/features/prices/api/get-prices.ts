import { queryOptions, useQuery } from '@tanstack/react-query';
import { pricesView } from '#shared/contracts/prices.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** The price book in force, with what it prices. */
export function pricesQuery() {
  return queryOptions({
    queryKey: staffKeys.prices,
    queryFn: ({ signal }) => request({ path: '/api/staff/prices', answer: pricesView, signal }),
  });
}

export function usePrices() {
  return useQuery(pricesQuery());
}
