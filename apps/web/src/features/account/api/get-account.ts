import { queryOptions } from '@tanstack/react-query';
import { accountView } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** A customer's own account with its orders, newest first. */
export function accountQuery() {
  return queryOptions({
    queryKey: ['account'],
    queryFn: ({ signal }) => request({ path: '/api/account', answer: accountView, signal }),
  });
}
