import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { confirmationLook } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** The last look before confirming: the price, and the e-mail as it will go with that note. */
export function confirmationQuery(number: number, note: string) {
  return queryOptions({
    queryKey: [...staffKeys.order(number), 'confirmation', note],
    queryFn: ({ signal }) =>
      request({
        path: `/api/staff/orders/${number}/confirmation`,
        query: { note: note === '' ? undefined : note },
        answer: confirmationLook,
        signal,
      }),
    placeholderData: keepPreviousData,
    // A last look is never an old one.
    staleTime: 0,
    gcTime: 0,
  });
}

export function useConfirmation(number: number, note: string) {
  return useQuery(confirmationQuery(number, note));
}
