import { queryOptions } from '@tanstack/react-query';
import { done } from '#shared/contracts/common.ts';
import { request } from '#web/lib/http.ts';

/**
 * Exchanges the key of a private link for a cookie good for that order. Doing it again changes
 * nothing, so it may run like a query: once for each link.
 */
export function privateLinkQuery(code: string, key: string) {
  return queryOptions({
    queryKey: ['private-link', code, key],
    queryFn: ({ signal }) =>
      request({
        method: 'POST',
        path: '/api/order-access',
        body: { code, key },
        answer: done,
        signal,
      }),
    staleTime: Infinity,
  });
}
