import { queryOptions } from '@tanstack/react-query';
import { ownSessions } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** Where one is signed in. */
export function sessionsQuery() {
  return queryOptions({
    queryKey: ['account', 'sessions'],
    queryFn: ({ signal }) =>
      request({ path: '/api/account/sessions', answer: ownSessions, signal }),
  });
}
