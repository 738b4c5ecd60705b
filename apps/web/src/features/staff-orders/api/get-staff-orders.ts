import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { type ListOrdersQuery, orderList } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** One page of the orders, found, filtered and sorted by the server. */
export function staffOrdersQuery(query: ListOrdersQuery) {
  return queryOptions({
    queryKey: [...staffKeys.orders, 'list', query],
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/orders', query, answer: orderList, signal }),
    placeholderData: keepPreviousData,
    refetchInterval: 60_000,
  });
}

export function useStaffOrders(query: ListOrdersQuery) {
  return useQuery(staffOrdersQuery(query));
}
