import { queryOptions, useQuery } from '@tanstack/react-query';
import { sessionView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** Who is there; null when nobody has signed in. */
export function sessionQuery() {
  return queryOptions({
    queryKey: ['session'],
    queryFn: ({ signal }) => request({ path: '/api/session', answer: sessionView, signal }),
    staleTime: 60_000,
  });
}

export function useSession() {
  return useQuery(sessionQuery());
}
