import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type AcceptLiftedStop, orderView } from '#shared/contracts/orders.ts';
import { request } from '#web/lib/http.ts';
import { orderQuery } from './get-order.ts';

/** Says that the customer has read, and accepts, why the studio takes the order against a stop. */
export function acceptLiftedStop(code: string, body: AcceptLiftedStop) {
  const path = `/api/orders/${encodeURIComponent(code)}/accept-lifted-stop`;
  return request({ method: 'POST', path, body, answer: orderView });
}

/** Accepts it; whatever comes of it, the page shows the order as it stands. */
export function useAcceptLiftedStop(code: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: AcceptLiftedStop) => acceptLiftedStop(code, body),
    onSuccess: (order) => client.setQueryData(orderQuery(code).queryKey, order),
    onError: () => client.invalidateQueries({ queryKey: orderQuery(code).queryKey }),
  });
}
