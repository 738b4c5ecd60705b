import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { datesResponse } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** Which days of a range are open to a customer for this order's cake. */
export function orderDatesQuery(number: number, design: Design, from: string, to: string) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'dates', from, to, design],
    queryFn: ({ signal }) =>
      request({
        method: 'POST',
        path: '/api/dates',
        body: { design, from, to },
        answer: datesResponse,
        signal,
      }),
    placeholderData: keepPreviousData,
  });
}

export function useOrderDates(number: number, design: Design, from: string, to: string) {
  return useQuery(orderDatesQuery(number, design, from, to));
}
