import { queryOptions, useQuery } from '@tanstack/react-query';
import { staffPeople } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** Everybody who works here, and who is invited. */
export function peopleQuery() {
  return queryOptions({
    queryKey: staffKeys.people,
    queryFn: ({ signal }) => request({ path: '/api/staff/people', answer: staffPeople, signal }),
  });
}

export function usePeople() {
  return useQuery(peopleQuery());
}
