import { queryOptions, useQuery } from '@tanstack/react-query';
import { kitchenSettings } from '#shared/contracts/kitchen-rules.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** The figures the kitchen goes by. */
export function kitchenRulesQuery() {
  return queryOptions({
    queryKey: staffKeys.kitchenRules,
    queryFn: ({ signal }) =>
      request({ path: '/api/staff/kitchen-rules', answer: kitchenSettings, signal }),
  });
}

export function useKitchenRules() {
  return useQuery(kitchenRulesQuery());
}
