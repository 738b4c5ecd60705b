import { queryOptions, skipToken } from '@tanstack/react-query';
import type { Design } from '#shared/contracts/design.ts';
import { estimate } from '#shared/contracts/estimates.ts';
import { request } from '#web/lib/http.ts';

/** `POST /api/estimates`: the studio's own word on the price, asked for before sending. */
export function estimateQuery(design: Design | null, date: string | null) {
  return queryOptions({
    queryKey: ['estimate', design, date],
    queryFn:
      design === null
        ? skipToken
        : ({ signal }) =>
            request({
              method: 'POST',
              path: '/api/estimates',
              body: { design, date },
              answer: estimate,
              signal,
            }),
    staleTime: 30_000,
  });
}
