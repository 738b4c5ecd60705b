import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query';
import { eggPlan } from '#shared/contracts/kitchen-sheet.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';
import type { EggSearch } from '../search/egg-search.ts';

/** Which eggs to crack in a span of days. */
export function eggPlanQuery(search: EggSearch) {
  return queryOptions({
    queryKey: [...staffKeys.eggs, search],
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/eggs', query: { ...search }, answer: eggPlan, signal }),
    placeholderData: keepPreviousData,
  });
}

export function useEggPlan(search: EggSearch) {
  return useQuery(eggPlanQuery(search));
}
