import { queryOptions, useQuery } from '@tanstack/react-query';
import { staffOrder } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** One order, everything in one place. */
export function staffOrderQuery(number: number) {
  return queryOptions({
    queryKey: staffKeys.order(number),
    queryFn: ({ signal }) =>
      request({ path: `/api/staff/orders/${number}`, answer: staffOrder, signal }),
  });
}

export function useStaffOrder(number: number) {
  return useQuery(staffOrderQuery(number));
}
