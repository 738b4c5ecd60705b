import { queryOptions } from '@tanstack/react-query';
import { orderView } from '#shared/contracts/orders.ts';
import { request } from '#web/lib/http.ts';

/** What a customer sees of an order; asked for again now and then, since the studio moves it on. */
export function orderQuery(code: string) {
  return queryOptions({
    queryKey: ['order', code],
    queryFn: ({ signal }) =>
      request({ path: `/api/orders/${encodeURIComponent(code)}`, answer: orderView, signal }),
    refetchInterval: 60_000,
  });
}
