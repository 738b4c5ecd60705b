import { queryOptions, useQuery } from '@tanstack/react-query';
import { sentMailView } from '#shared/contracts/staff.ts';
import { request } from '#web/lib/http.ts';
import { staffKeys } from '#web/lib/staff-keys.ts';

/** One e-mail, exactly as it was sent. */
export function sentMailQuery(id: string) {
  return queryOptions({
    queryKey: [...staffKeys.mail, id],
    queryFn: ({ signal }) =>
      request({
        path: `/api/staff/mail/${encodeURIComponent(id)}`,
        answer: sentMailView,
        signal,
      }),
  });
}

export function useSentMail(id: string) {
  return useQuery(sentMailQuery(id));
}
