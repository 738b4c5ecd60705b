import { queryOptions, useQuery } from '@tanstack/react-query';
import { allergyTable } from '#shared/contracts/allergy-table.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** What the owner takes, talks over and refuses, and says of the kitchen. */
export function allergyTableQuery() {
  return queryOptions({
    queryKey: staffKeys.allergyTable,
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/allergy-table', answer: allergyTable, signal }),
  });
}

export function useAllergyTable() {
  return useQuery(allergyTableQuery());
}
