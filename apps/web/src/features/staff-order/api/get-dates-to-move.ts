import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { datesResponse } from '#shared/contracts/dates.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** The days this order could move to, its own work set aside. */
export function datesToMoveQuery(number: number, from: string, to: string) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'dates-to-move', from, to],
    queryFn: ({ signal }) =>
      request({
        path: `/api/staff/orders/${number}/dates`,
        query: { from, to },
        answer: datesResponse,
        signal,
      }),
    placeholderData: keepPreviousData,
  });
}

export function useDatesToMove(number: number, from: string, to: string) {
  return useQuery(datesToMoveQuery(number, from, to));
}
