import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { shopping } from '#shared/contracts/kitchen-sheet.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';
import type { Span } from '../search/span.ts';

/** What to buy for a span of days. */
export function shoppingQuery(span: Span) {
  return queryOptions({
    queryKey: [...staffKeys.shopping, span],
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/shopping', query: { ...span }, answer: shopping, signal }),
    placeholderData: keepPreviousData,
  });
}

export function useShopping(span: Span) {
  return useQuery(shoppingQuery(span));
}
