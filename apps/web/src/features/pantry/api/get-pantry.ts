import { queryOptions, useQuery } from '@tanstack/react-query';
import { pantry } from '#shared/contracts/pantry.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** Everything the kitchen works from; pages, needs, eggs and cost are worked out from it. */
export function pantryQuery() {
  return queryOptions({
    queryKey: staffKeys.pantry,
    queryFn: ({ signal }) => request({ path: '/api/pantry', answer: pantry, signal }),
  });
}

export function usePantry() {
  return useQuery(pantryQuery());
}
