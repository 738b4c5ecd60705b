import { queryOptions } from '@tanstack/react-query';
import { linkLook } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** What a one-time link is for, without spending it. */
export function lookAtLinkQuery(token: string) {
  return queryOptions({
    queryKey: ['link', token],
    queryFn: ({ signal }) =>
      request({
        method: 'POST',
        path: '/api/session/links/look',
        body: { token },
        answer: linkLook,
        signal,
      }),
    staleTime: Infinity,
  });
}
