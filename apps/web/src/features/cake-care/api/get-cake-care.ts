import { queryOptions } from '@tanstack/react-query';
import { cakeCare } from '#shared/contracts/cards.ts';
import { request } from '#web/lib/http.ts';

/** A cake by the code on its care card; nobody has to be signed in for it. */
export function cakeCareQuery(code: string) {
  return queryOptions({
    queryKey: ['cake-care', code],
    queryFn: ({ signal }) =>
      request({ path: `/api/care/${encodeURIComponent(code)}`, answer: cakeCare, signal }),
  });
}
